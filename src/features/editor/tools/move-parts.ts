/** Edits that shift parts along the shaft. Every load belongs to a hub and goes with it. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'
import { partName, roundMm } from './part'

const shiftedLoads = (document: LayoutDocument, hubId: string, deltaMm: number): Operation[] =>
  document.loadCases.flatMap((loadCase) =>
    loadCase.loads
      .filter((load) => load.hub === hubId)
      .map((load) => ({
        type: 'set' as const,
        target: { kind: 'load' as const, loadCaseId: loadCase.id, id: load.id },
        field: 'stationMm',
        before: load.stationMm,
        value: roundMm(load.stationMm + deltaMm),
      })),
  )

/**
 * Shifts hubs (with their loads) and bearings. Sections stay: they make up the shaft itself.
 * An abutment stays too, because it names a shoulder of the shaft; a hub that leaves it is a finding.
 */
export function movePartsOperations(
  document: LayoutDocument,
  ids: readonly string[],
  deltaMm: number,
): Operation[] {
  if (deltaMm === 0) return []
  const wanted = new Set(ids)
  return [
    ...document.hubs
      .filter((hub) => wanted.has(hub.id))
      .flatMap((hub): Operation[] => [
        {
          type: 'set',
          target: { kind: 'hub', id: hub.id },
          field: 'stationMm',
          before: hub.stationMm,
          value: roundMm(hub.stationMm + deltaMm),
        },
        ...shiftedLoads(document, hub.id, deltaMm),
      ]),
    ...document.bearings
      .filter((bearing) => wanted.has(bearing.id))
      .map((bearing): Operation => ({
        type: 'set',
        target: { kind: 'bearing', id: bearing.id },
        field: 'stationMm',
        before: bearing.stationMm,
        value: roundMm(bearing.stationMm + deltaMm),
      })),
  ]
}

/**
 * What makes everything right of a step go along when the shaft before it grows or shrinks: hubs
 * with their loads and abutments, and bearings, whose middle lies right of the step.
 */
export function followStepOperations(document: LayoutDocument, stepMm: number, deltaMm: number): Operation[] {
  if (deltaMm === 0) return []
  const following = [
    ...document.hubs.filter((hub) => hub.stationMm + hub.lengthMm / 2 > stepMm),
    ...document.bearings.filter((bearing) => bearing.stationMm > stepMm),
  ].map((part) => part.id)
  const wanted = new Set(following)
  const abutments = document.hubs.flatMap((hub): Operation[] =>
    wanted.has(hub.id) && hub.abutmentStationMm != null
      ? [
          {
            type: 'set',
            target: { kind: 'hub', id: hub.id },
            field: 'abutmentStationMm',
            before: hub.abutmentStationMm,
            value: roundMm(hub.abutmentStationMm + deltaMm),
          },
        ]
      : [],
  )
  return [...movePartsOperations(document, following, deltaMm), ...abutments]
}

export function moveLabel(document: LayoutDocument, ids: readonly string[]): string {
  const [only] = ids
  return ids.length === 1 && only !== undefined
    ? `Move ${partName(document, only)}`
    : `Move ${ids.length} parts`
}

/** Parts that can be shifted, out of a selection. */
export const movableIds = (document: LayoutDocument, ids: readonly string[]): string[] =>
  ids.filter(
    (id) =>
      document.hubs.some((hub) => hub.id === id) || document.bearings.some((bearing) => bearing.id === id),
  )
