/** Edits on whole parts: remove, duplicate, paste, flip the joining side. Pure; ids come from outside. */
import type { Bearing, Hub, LayoutDocument, ShaftSection } from '@shared/layout/layout-document'
import { applyOperations } from '@shared/layout/apply-operations'
import type { PartIdPrefix } from '@shared/layout/new-ids'
import type { Operation } from '@shared/layout/operations'
import { removeHubOperations } from '@shared/layout/remove-hub-operations'
import { sectionSpans } from '@shared/layout/shaft-geometry'
import { followStepOperations } from './move-parts'
import { freeName } from './new-parts'
import { partName, roundMm } from './part'

export type NewPartId = (prefix: PartIdPrefix) => string

/** A duplicate stands this far right of its original, clear of it. */
const DUPLICATE_GAP_MM = 5

/** "Pinion", or "3 parts". */
export function partsLabel(document: LayoutDocument, ids: readonly string[]): string {
  const [only] = ids
  return ids.length === 1 && only !== undefined ? partName(document, only) : `${ids.length} parts`
}

/**
 * Removes parts with everything that names them. Where a section goes, the shaft closes up and what
 * lay right of it goes along; a hub on the removed section stays and shows that it has no seat.
 */
export function removePartsOperations(document: LayoutDocument, ids: readonly string[]): Operation[] {
  const wanted = new Set(ids)
  const operations: Operation[] = [
    ...document.hubs
      .filter(({ id }) => wanted.has(id))
      .flatMap(({ id }) => removeHubOperations(document, id)),
    ...document.bearings
      .filter(({ id }) => wanted.has(id))
      .map(({ id }): Operation => ({ type: 'remove', target: { kind: 'bearing', id } })),
  ]
  let current = applyOperations(document, operations).document
  // From right to left: closing one gap then never shifts a gap still to be closed.
  for (const { section, endMm } of sectionSpans(document).reverse()) {
    if (!wanted.has(section.id)) continue
    const step: Operation[] = [
      { type: 'remove', target: { kind: 'section', id: section.id } },
      ...followStepOperations(current, endMm, -section.lengthMm),
    ]
    operations.push(...step)
    current = applyOperations(current, step).document
  }
  return operations
}

export interface PartsEdit {
  operations: Operation[]
  /** Ids of the new parts, to select them. */
  ids: string[]
}

/** "Pinion 2" after "Pinion", "Gear 3" after "Gear 2". */
function copyName(name: string, taken: readonly string[]): string {
  const word = name.replace(/ \d+$/, '')
  const next = freeName(word, [...taken, `${word} 1`])
  return next.length <= 120 ? next : name
}

const copyOfHub = (hub: Hub, id: string, stationMm: number, taken: readonly string[]): Hub => ({
  ...hub,
  id,
  name: copyName(hub.name, taken),
  stationMm: roundMm(stationMm),
  // The shoulder is the original's; a copy elsewhere would be told that it misses it.
  abutmentStationMm: null,
})

/** Loads are not copied: they balance each other per load case, and a copied torque would not. */
export function duplicateOperations(
  document: LayoutDocument,
  ids: readonly string[],
  newPartId: NewPartId,
): PartsEdit {
  const wanted = new Set(ids)
  const operations: Operation[] = []
  const newIds: string[] = []
  const names = document.hubs.map(({ name }) => name)
  for (const hub of document.hubs.filter(({ id }) => wanted.has(id))) {
    const item = copyOfHub(hub, newPartId('hub'), hub.stationMm + hub.lengthMm + DUPLICATE_GAP_MM, names)
    names.push(item.name)
    operations.push({ type: 'add', collection: 'hubs', index: document.hubs.length + newIds.length, item })
    newIds.push(item.id)
  }
  const bearingNames = document.bearings.map(({ name }) => name)
  for (const bearing of document.bearings.filter(({ id }) => wanted.has(id))) {
    const item: Bearing = {
      ...bearing,
      id: newPartId('bearing'),
      name: copyName(bearing.name, bearingNames),
      stationMm: roundMm(bearing.stationMm + bearing.widthMm + DUPLICATE_GAP_MM),
      kind: 'floating',
    }
    bearingNames.push(item.name)
    operations.push({ type: 'add', collection: 'bearings', index: document.bearings.length, item })
    newIds.push(item.id)
  }
  let current = document
  for (const { section, endMm } of sectionSpans(document).reverse()) {
    if (!wanted.has(section.id)) continue
    const index = current.shaft.sections.findIndex(({ id }) => id === section.id) + 1
    const item: ShaftSection = { ...section, id: newPartId('section') }
    const step: Operation[] = [
      ...followStepOperations(current, endMm, section.lengthMm),
      { type: 'add', collection: 'sections', index, item },
    ]
    operations.push(...step)
    newIds.push(item.id)
    current = applyOperations(current, step).document
  }
  return { operations, ids: newIds }
}

export interface CopiedParts {
  hubs: Hub[]
  bearings: Bearing[]
}

export function copyParts(document: LayoutDocument, ids: readonly string[]): CopiedParts {
  const wanted = new Set(ids)
  return {
    hubs: document.hubs.filter(({ id }) => wanted.has(id)),
    bearings: document.bearings.filter(({ id }) => wanted.has(id)),
  }
}

/** Pastes with the left face of the leftmost part at a station; without one, beside where they were. */
export function pasteOperations(
  document: LayoutDocument,
  copied: CopiedParts,
  leftMm: number | null,
  newPartId: NewPartId,
): PartsEdit {
  const lefts = [
    ...copied.hubs.map((hub) => hub.stationMm),
    ...copied.bearings.map((bearing) => bearing.stationMm - bearing.widthMm / 2),
  ]
  if (lefts.length === 0) return { operations: [], ids: [] }
  const rights = [
    ...copied.hubs.map((hub) => hub.stationMm + hub.lengthMm),
    ...copied.bearings.map((bearing) => bearing.stationMm + bearing.widthMm / 2),
  ]
  const first = Math.min(...lefts)
  const shiftMm = leftMm === null ? Math.max(...rights) - first + DUPLICATE_GAP_MM : leftMm - first
  const names = document.hubs.map(({ name }) => name)
  const bearingNames = document.bearings.map(({ name }) => name)
  const nameFor = (name: string, taken: readonly string[]) =>
    taken.includes(name) ? copyName(name, taken) : name
  const hubs = copied.hubs.map((hub) => {
    const item = copyOfHub(hub, newPartId('hub'), hub.stationMm + shiftMm, [])
    item.name = nameFor(hub.name, names)
    names.push(item.name)
    return item
  })
  const bearings = copied.bearings.map((bearing): Bearing => {
    const name = nameFor(bearing.name, bearingNames)
    bearingNames.push(name)
    return { ...bearing, id: newPartId('bearing'), name, stationMm: roundMm(bearing.stationMm + shiftMm) }
  })
  return {
    operations: [
      ...hubs.map((item, index): Operation => {
        return { type: 'add', collection: 'hubs', index: document.hubs.length + index, item }
      }),
      ...bearings.map((item, index): Operation => {
        return { type: 'add', collection: 'bearings', index: document.bearings.length + index, item }
      }),
    ],
    ids: [...hubs, ...bearings].map(({ id }) => id),
  }
}

/** Each hub, and each bearing that is threaded on, comes from the other end. */
export function flipSideOperations(document: LayoutDocument, ids: readonly string[]): Operation[] {
  const wanted = new Set(ids)
  const other = (side: 'left' | 'right') => (side === 'left' ? 'right' : 'left')
  return [
    ...document.hubs
      .filter(({ id }) => wanted.has(id))
      .map(({ id, joining }): Operation => ({
        type: 'set',
        target: { kind: 'hub', id },
        field: 'joining.side',
        before: joining.side,
        value: other(joining.side),
      })),
    ...document.bearings
      .filter(({ id, housing }) => wanted.has(id) && housing === 'ring')
      .map(({ id, side }): Operation => ({
        type: 'set',
        target: { kind: 'bearing', id },
        field: 'side',
        before: side ?? null,
        value: other(side ?? 'left'),
      })),
  ]
}
