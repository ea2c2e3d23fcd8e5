/** Edits of load cases as plain operations: data in, plan out. */
import { newPartId } from '@shared/layout/new-ids'
import type { Hub, LayoutDocument, Load, LoadCase } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'

export interface LoadCaseEdit {
  label: string
  operations: Operation[]
  /** The case to show afterwards. */
  showId: string | null
}

/** `Running`, `Running 2`, `Running 3`: a name not yet taken. */
export function freeName(wanted: string, taken: readonly string[]): string {
  if (!taken.includes(wanted)) return wanted
  for (let number = 2; ; number += 1) {
    const name = `${wanted} ${number}`
    if (!taken.includes(name)) return name
  }
}

export function addLoadCase(layout: LayoutDocument): LoadCaseEdit {
  const id = newPartId('case')
  const name = freeName(
    'Load case',
    layout.loadCases.map((loadCase) => loadCase.name),
  )
  return {
    label: `Add ${name}`,
    showId: id,
    operations: [
      {
        type: 'add',
        collection: 'loadCases',
        index: layout.loadCases.length,
        item: { id, name, speedRpm: 0, applicationFactor: 1, shaftC: 20, hubC: 20, loads: [] },
      },
    ],
  }
}

export function duplicateLoadCase(layout: LayoutDocument, loadCase: LoadCase): LoadCaseEdit {
  const id = newPartId('case')
  const name = freeName(
    `${loadCase.name}, copy`,
    layout.loadCases.map((other) => other.name),
  )
  return {
    label: `Duplicate ${loadCase.name}`.slice(0, 120),
    showId: id,
    operations: [
      {
        type: 'add',
        collection: 'loadCases',
        index: layout.loadCases.indexOf(loadCase) + 1,
        item: {
          ...loadCase,
          id,
          name: name.slice(0, 120),
          loads: loadCase.loads.map((load) => ({ ...load, id: newPartId('load') })),
        },
      },
    ],
  }
}

export function removeLoadCase(layout: LayoutDocument, loadCase: LoadCase): LoadCaseEdit {
  const index = layout.loadCases.indexOf(loadCase)
  const next = layout.loadCases[index + 1] ?? layout.loadCases[index - 1]
  return {
    label: `Delete ${loadCase.name}`.slice(0, 120),
    showId: next?.id ?? null,
    operations: [{ type: 'remove', target: { kind: 'loadCase', id: loadCase.id } }],
  }
}

export function moveLoadCase(layout: LayoutDocument, loadCase: LoadCase, by: 1 | -1): LoadCaseEdit {
  return {
    label: `Move ${loadCase.name} ${by > 0 ? 'down' : 'up'}`.slice(0, 120),
    showId: loadCase.id,
    operations: [
      {
        type: 'reorder',
        target: { kind: 'loadCase', id: loadCase.id },
        index: layout.loadCases.indexOf(loadCase) + by,
      },
    ],
  }
}

/** A load in the middle of the hub. */
export function addLoad(loadCase: LoadCase, hub: Hub): Operation {
  return {
    type: 'add',
    collection: 'loads',
    loadCaseId: loadCase.id,
    index: loadCase.loads.length,
    item: {
      id: newPartId('load'),
      hub: hub.id,
      stationMm: hub.stationMm + hub.lengthMm / 2,
      torqueNm: 0,
      forceYN: 0,
      forceZN: 0,
      axialN: 0,
      momentYNm: 0,
      momentZNm: 0,
    },
  }
}

const COPIED_FIELDS = [
  'stationMm',
  'torqueNm',
  'forceYN',
  'forceZN',
  'axialN',
  'momentYNm',
  'momentZNm',
] as const

/** Gives another case the same load: onto the hub's load there, or as a new one. */
export function copyLoad(load: Load, to: LoadCase): Operation[] {
  const existing = to.loads.find(({ hub }) => hub === load.hub)
  if (existing === undefined) {
    return [
      {
        type: 'add',
        collection: 'loads',
        loadCaseId: to.id,
        index: to.loads.length,
        item: { ...load, id: newPartId('load') },
      },
    ]
  }
  return COPIED_FIELDS.filter((field) => existing[field] !== load[field]).map((field) => ({
    type: 'set',
    target: { kind: 'load', loadCaseId: to.id, id: existing.id },
    field,
    before: existing[field],
    value: load[field],
  }))
}

/** Puts what is left of the torque balance on one hub, so that the case is in balance. */
export function balanceOnHub(loadCase: LoadCase, hub: Hub, residualNm: number): Operation {
  const rounded = (value: number) => Number(value.toPrecision(12))
  const load = loadCase.loads.find((item) => item.hub === hub.id)
  if (load === undefined) {
    const added = addLoad(loadCase, hub)
    return added.type === 'add' && added.collection === 'loads'
      ? { ...added, item: { ...added.item, torqueNm: rounded(-residualNm) } }
      : added
  }
  return {
    type: 'set',
    target: { kind: 'load', loadCaseId: loadCase.id, id: load.id },
    field: 'torqueNm',
    before: load.torqueNm,
    value: rounded(load.torqueNm - residualNm),
  }
}
