/** Small layouts for the tests of the editor, with numbers that are easy to follow. */
import { DEFAULT_CRITERIA, type Hub, type LayoutDocument } from '@shared/layout/layout-document'

export function hub(id: string, stationMm: number, lengthMm: number, more: Partial<Hub> = {}): Hub {
  return {
    id,
    name: id,
    role: 'gear',
    stationMm,
    lengthMm,
    chamferLeftMm: 1,
    chamferRightMm: 1,
    outerDiameterMm: 90,
    material: 'C45-N',
    roughnessRzUm: 6.3,
    fit: { kind: 'iso286', hole: 'H7', shaft: 's6' },
    friction: { circumferential: 0.14, axial: 0.14, pressing: 0.12 },
    joining: { method: 'heat-hub', side: 'left' },
    ...more,
  }
}

const load = (id: string, hubId: string, stationMm: number) => ({
  id,
  hub: hubId,
  stationMm,
  torqueNm: 100,
  forceYN: -1_000,
  forceZN: 0,
  axialN: 0,
  momentYNm: 0,
  momentZNm: 0,
})

/**
 * Sections 0..40 (⌀40), 40..160 (⌀50), 160..200 (⌀40). Hub A from 50 to 90, hub B from 110 to 150,
 * bearings of 20 mm at 15 and 185. Two load cases load both hubs in their middles.
 */
export function twoHubs(): LayoutDocument {
  const section = (id: string, lengthMm: number, outerDiameterMm: number) => ({
    id,
    lengthMm,
    outerDiameterMm,
    boreDiameterMm: 0,
    roughnessRzUm: 4,
  })
  const loadCase = (id: string) => ({
    id,
    name: id,
    speedRpm: 1_000,
    applicationFactor: 1,
    shaftC: 20,
    hubC: 20,
    loads: [load(`${id}-A`, 'A', 70), load(`${id}-B`, 'B', 130)],
  })
  return {
    format: 'hubstead-layout',
    version: 1,
    name: 'Two hubs',
    shaft: {
      material: 'C45-N',
      sections: [section('s1', 40, 40), section('s2', 120, 50), section('s3', 40, 40)],
    },
    hubs: [hub('A', 50, 40, { abutmentStationMm: 40 }), hub('B', 110, 40, { abutmentStationMm: 160 })],
    bearings: [
      { id: 'L', name: 'L', stationMm: 15, widthMm: 20, kind: 'locating', housing: 'split' },
      { id: 'R', name: 'R', stationMm: 185, widthMm: 20, kind: 'floating', housing: 'ring', side: 'right' },
    ],
    loadCases: [loadCase('run'), loadCase('start')],
    timing: [{ hub: 'A', phaseDeg: 30, toleranceDeg: 1 }],
    criteria: { ...DEFAULT_CRITERIA },
  }
}
