/** What "new, blank" starts from: a small stepped shaft on two bearings that calculates at once. */
import { DEFAULT_CRITERIA, LAYOUT_FORMAT, LAYOUT_VERSION, type LayoutDocument } from './layout-document'

export function blankLayout(name: string): LayoutDocument {
  return {
    format: LAYOUT_FORMAT,
    version: LAYOUT_VERSION,
    name,
    shaft: {
      material: '42CrMo4-QT',
      sections: [
        {
          id: 's1',
          lengthMm: 30,
          outerDiameterMm: 40,
          boreDiameterMm: 0,
          roughnessRzUm: 4,
          rightFilletMm: 1,
        },
        {
          id: 's2',
          lengthMm: 140,
          outerDiameterMm: 50,
          boreDiameterMm: 0,
          roughnessRzUm: 4,
          rightFilletMm: 1,
        },
        { id: 's3', lengthMm: 30, outerDiameterMm: 40, boreDiameterMm: 0, roughnessRzUm: 4 },
      ],
    },
    hubs: [],
    bearings: [
      { id: 'L', name: 'Left bearing', stationMm: 15, widthMm: 18, kind: 'locating', housing: 'split' },
      { id: 'R', name: 'Right bearing', stationMm: 185, widthMm: 18, kind: 'floating', housing: 'split' },
    ],
    loadCases: [
      {
        id: 'run',
        name: 'Running',
        speedRpm: 1000,
        applicationFactor: 1.25,
        shaftC: 20,
        hubC: 20,
        loads: [],
      },
    ],
    timing: [],
    criteria: { ...DEFAULT_CRITERIA },
  }
}
