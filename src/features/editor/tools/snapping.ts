/** Where a moved face comes to rest: on a face, a step or a bearing edge nearby, else on the grid. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { sectionSpans } from '@shared/layout/shaft-geometry'
import { bearingExtent, hubExtent, roundMm } from './part'

export type SnapKind = 'shaft end' | 'section step' | 'hub face' | 'bearing edge'

export interface SnapTarget {
  stationMm: number
  kind: SnapKind
}

export interface SnapResult {
  stationMm: number
  /** Faces it rests on; empty when the grid decided or nothing did. */
  guides: SnapTarget[]
}

/** Near enough to be pulled, on screen. */
export const SNAP_DISTANCE_PX = 7
/** Two stations closer than this are one place. */
const SAME_PLACE_MM = 1e-3

/** The grid is 1 mm at working zooms, finer when zoomed in, coarser when a pixel is many millimetres. */
export function gridStepMm(mmPerPx: number): number {
  if (mmPerPx <= 0.02) return 0.1
  if (mmPerPx <= 0.07) return 0.5
  if (mmPerPx <= 1.4) return 1
  if (mmPerPx <= 4) return 5
  return 10
}

export const roundToGrid = (valueMm: number, stepMm: number) => roundMm(Math.round(valueMm / stepMm) * stepMm)

/** Every place something may rest on, except those that move along. */
export function snapTargets(document: LayoutDocument, exceptIds: readonly string[]): SnapTarget[] {
  const except = new Set(exceptIds)
  const targets: SnapTarget[] = []
  const sections = sectionSpans(document)
  sections.forEach(({ section, endMm }, index) => {
    if (index === 0) targets.push({ stationMm: 0, kind: 'shaft end' })
    if (except.has(section.id)) return
    const kind = index === sections.length - 1 ? 'shaft end' : 'section step'
    targets.push({ stationMm: roundMm(endMm), kind })
  })
  for (const hub of document.hubs) {
    if (except.has(hub.id)) continue
    const extent = hubExtent(document, hub)
    targets.push(
      { stationMm: extent.leftMm, kind: 'hub face' },
      { stationMm: extent.rightMm, kind: 'hub face' },
    )
  }
  for (const bearing of document.bearings) {
    if (except.has(bearing.id)) continue
    const extent = bearingExtent(document, bearing)
    targets.push(
      { stationMm: extent.leftMm, kind: 'bearing edge' },
      { stationMm: extent.rightMm, kind: 'bearing edge' },
    )
  }
  return targets
}

export interface SnapSettings {
  mmPerPx: number
  /** The free value under the pointer, no pull at all. */
  isFree: boolean
}

/** Rests one face. */
export function snapStation(
  targets: readonly SnapTarget[],
  stationMm: number,
  settings: SnapSettings,
): SnapResult {
  const { deltaMm, guides } = snapShift(targets, [stationMm], 0, settings)
  return { stationMm: roundMm(stationMm + deltaMm), guides }
}

/**
 * Rests a group of faces that move together. The first face is the one the grid counts from.
 * @returns the shift with the pull added, and what the faces rest on
 */
export function snapShift(
  targets: readonly SnapTarget[],
  facesMm: readonly number[],
  shiftMm: number,
  settings: SnapSettings,
): { deltaMm: number; guides: SnapTarget[] } {
  if (settings.isFree) return { deltaMm: roundMm(shiftMm), guides: [] }

  let pullMm = Infinity
  for (const face of facesMm) {
    for (const target of targets) {
      const distance = target.stationMm - (face + shiftMm)
      if (Math.abs(distance) < Math.abs(pullMm)) pullMm = distance
    }
  }
  if (Math.abs(pullMm) <= SNAP_DISTANCE_PX * settings.mmPerPx) {
    const deltaMm = roundMm(shiftMm + pullMm)
    const guides = targets.filter((target) =>
      facesMm.some((face) => Math.abs(target.stationMm - (face + deltaMm)) < SAME_PLACE_MM),
    )
    return { deltaMm, guides: withoutRepeats(guides) }
  }
  const first = facesMm[0] ?? 0
  return { deltaMm: roundMm(roundToGrid(first + shiftMm, gridStepMm(settings.mmPerPx)) - first), guides: [] }
}

const withoutRepeats = (guides: SnapTarget[]) =>
  guides.filter(
    (guide, index) =>
      guides.findIndex((other) => Math.abs(other.stationMm - guide.stationMm) < SAME_PLACE_MM) === index,
  )
