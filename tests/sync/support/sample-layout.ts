import type { LayoutDocument } from '@shared/layout/layout-document'
import { parseLayoutFile } from '@shared/layout/layout-file'

/** Three sections, two hubs, two bearings, two load cases: every kind of target is there. */
export function sampleLayout(): LayoutDocument {
  const friction = { circumferential: 0.14, axial: 0.14, pressing: 0.12 }
  const parsed = parseLayoutFile({
    format: 'hubstead-layout',
    version: 1,
    name: 'Sample shaft',
    shaft: {
      material: '42CrMo4-QT',
      sections: [
        { id: 's1', lengthMm: 60, outerDiameterMm: 50, rightFilletMm: 1 },
        { id: 's2', lengthMm: 80, outerDiameterMm: 56 },
        { id: 's3', lengthMm: 40, outerDiameterMm: 50 },
      ],
    },
    hubs: [
      {
        id: 'A',
        name: 'Pinion',
        role: 'gear',
        stationMm: 10,
        lengthMm: 45,
        outerDiameterMm: 96,
        material: '16MnCr5-CH',
        fit: { kind: 'iso286', hole: 'H7', shaft: 'u6' },
        friction,
        joining: { method: 'heat-hub', side: 'left', ambientC: 20 },
        phaseDeg: null,
        massKg: 3.1,
      },
      {
        id: 'B',
        name: 'Cam',
        role: 'cam',
        stationMm: 80,
        lengthMm: 40,
        outerDiameterMm: 90,
        material: 'C45-N',
        fit: { kind: 'limits', minInterferenceUm: 35, maxInterferenceUm: 60 },
        friction,
        joining: { method: 'press', side: 'right' },
        phaseDeg: 36,
      },
    ],
    bearings: [
      { id: 'L', name: 'Left bearing', stationMm: 4, widthMm: 8, kind: 'locating' },
      { id: 'R', name: 'Right bearing', stationMm: 170, widthMm: 8, kind: 'floating' },
    ],
    loadCases: [
      {
        id: 'run',
        name: 'Running',
        speedRpm: 1450,
        applicationFactor: 1.25,
        hubTemperaturesC: { A: 75 },
        loads: [
          { hub: 'A', stationMm: 32, torqueNm: 300, forceYN: 1200 },
          { hub: 'B', stationMm: 100, torqueNm: -300 },
        ],
      },
      { id: 'start', name: 'Starting', speedRpm: 0, loads: [{ hub: 'A', stationMm: 32, torqueNm: 500 }] },
    ],
    timing: [{ hub: 'B', phaseDeg: 36, toleranceDeg: 0.5 }],
  })
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems))
  return parsed.document
}
