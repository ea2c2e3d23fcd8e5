import {
  DEFAULT_CRITERIA,
  LAYOUT_FORMAT,
  LAYOUT_VERSION,
  type LayoutDocument,
} from '@shared/layout/layout-document'

interface Size {
  hubs: number
  sections: number
  loadCases: number
  /** Shifts every hub's diameter a little, so that nothing of another variant can be reused. */
  variant?: number
}

/** A long shaft with evenly spread hubs, each loaded in every case; drives and take-offs alternate. */
export function generatedLayout({ hubs, sections, loadCases, variant = 0 }: Size): LayoutDocument {
  const pitchMm = 60
  const lengthMm = pitchMm * hubs
  const sectionMm = lengthMm / sections
  const ids = Array.from({ length: hubs }, (_, index) => `h${index + 1}`)
  return {
    format: LAYOUT_FORMAT,
    version: LAYOUT_VERSION,
    name: `Generated, ${hubs} hubs`,
    shaft: {
      material: '42CrMo4-QT',
      sections: Array.from({ length: sections }, (_, index) => ({
        id: `s${index + 1}`,
        lengthMm: sectionMm,
        outerDiameterMm: 60 + 2 * Math.min(index, sections - 1 - index),
        boreDiameterMm: 0,
        roughnessRzUm: 4 + variant * 1e-4,
        rightFilletMm: 1,
      })),
    },
    hubs: ids.map((id, index) => ({
      id,
      name: `Hub ${index + 1}`,
      role: index % 3 === 0 ? 'gear' : 'cam',
      stationMm: index * pitchMm + 12,
      lengthMm: 36,
      chamferLeftMm: 1,
      chamferRightMm: 1,
      outerDiameterMm: 105 + (index % 5) + variant * 1e-3,
      material: 'C45-QT',
      roughnessRzUm: 6.3,
      fit: { kind: 'iso286', hole: 'H7', shaft: index % 2 === 0 ? 'u6' : 't6' },
      friction: { circumferential: 0.14, axial: 0.14, pressing: 0.12 },
      joining: { method: 'heat-hub', side: index < hubs / 2 ? 'left' : 'right' },
      phaseDeg: (index * 37) % 360,
      group: null,
    })),
    bearings: Array.from({ length: 4 }, (_, index) => ({
      id: `b${index + 1}`,
      name: `Bearing ${index + 1}`,
      stationMm: 4 + (index * (lengthMm - 8)) / 3,
      widthMm: 8,
      kind: index === 0 ? ('locating' as const) : ('floating' as const),
      housing: 'split' as const,
    })),
    loadCases: Array.from({ length: loadCases }, (_, caseIndex) => ({
      id: `case${caseIndex + 1}`,
      name: `Case ${caseIndex + 1}`,
      speedRpm: 600 + 300 * caseIndex,
      applicationFactor: 1.25,
      shaftC: 40 + caseIndex * 5,
      hubC: 45 + caseIndex * 5,
      loads: ids.map((id, index) => ({
        id: `l${index + 1}`,
        hub: id,
        stationMm: index * pitchMm + 30,
        torqueNm: (index % 2 === 0 ? 200 : -200) * (1 + caseIndex / 10),
        forceYN: 400 * Math.sin(index + caseIndex),
        forceZN: -500 * Math.cos(index * 2 + caseIndex) + variant,
        axialN: index % 4 === 0 ? 100 : 0,
        momentYNm: 0,
        momentZNm: index % 4 === 0 ? 5 : 0,
      })),
    })),
    timing: [],
    criteria: { ...DEFAULT_CRITERIA },
  }
}
