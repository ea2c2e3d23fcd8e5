import { demoLayouts } from '@server/demo/layout-data'
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'

const NAMES = [
  'roller',
  'feed roller of the north line with a name that goes on and on, station',
  'cam Ω',
  'drive wheel',
  'take-off',
  'timing pulley',
]

/** Five sections of six hubs each, in five load cases: more than a drawing gets in practice. */
export function lineShaftWithThirtyHubs(): LayoutDocument {
  const base = demoLayouts()[2]?.document
  const [model] = base?.hubs ?? []
  const [loadCase] = base?.loadCases ?? []
  if (!base || !model || !loadCase) throw new Error('The line shaft of the demo has changed')
  const sections = Array.from({ length: 5 }, (_, index) => ({
    id: `s${index}`,
    lengthMm: 300,
    outerDiameterMm: 60 + 2 * index,
    boreDiameterMm: 0,
    roughnessRzUm: 4,
    rightFilletMm: 1,
  }))
  const hubs = sections.flatMap((section, row) =>
    NAMES.map((name, place): Hub => ({
      ...model,
      id: `H${row}${place}`,
      name: `${name} ${row}.${place}`,
      stationMm: row * 300 + 5 + place * 49,
      lengthMm: 40,
      outerDiameterMm: 120 + 10 * place,
      boreDiameterMm: section.outerDiameterMm,
      abutmentStationMm: null,
      phaseDeg: null,
      group: null,
    })),
  )
  const loads = hubs.map((hub, index) => ({
    id: `load-${index}`,
    hub: hub.id,
    stationMm: hub.stationMm + 20,
    torqueNm: index === 0 ? 290 : -10,
    forceYN: 100,
    forceZN: 50,
    axialN: 0,
    momentYNm: 0,
    momentZNm: 0,
  }))
  const bearing = { widthMm: 20, housing: 'split' as const, boreDiameterMm: 60 }
  return {
    ...base,
    name: 'Sorting line with thirty rollers, north hall, second stage, with spare seats for the later extension',
    shaft: { ...base.shaft, sections },
    hubs,
    timing: [],
    bearings: [
      { ...bearing, id: 'L', name: 'L', stationMm: 250, kind: 'locating' },
      { ...bearing, id: 'R', name: 'R', stationMm: 1250, kind: 'floating' },
    ],
    loadCases: Array.from({ length: 5 }, (_, index) => ({
      ...loadCase,
      id: `case-${index}`,
      name: `case ${index}`,
      loads,
    })),
  }
}
