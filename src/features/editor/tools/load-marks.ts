/**
 * Where the loads of one load case are drawn under the section: an arrow for the force in the plane
 * of the drawing, a dot or cross beside it for the force out of it, a flat arrow for the axial force.
 * All lie below their hub, so that they never cross the names above it.
 */
import type { LayoutDocument, Load } from '@shared/layout/layout-document'
import { hubExtent } from './part'

export interface LoadMark {
  loadCaseId: string
  loadId: string
  hubId: string
  stationMm: number
  /** Radius of the hub: the arrow begins or ends here, below the centre line. */
  radiusMm: number
  /** Length on screen, signed: positive points up, onto the hub. 0 without force in the plane. */
  forceYPx: number
  /** 1 towards the reader (+z), -1 away, 0 none. */
  outOfPlane: -1 | 0 | 1
  /** Signed, positive to the right; 0 without axial force. */
  axialPx: number
  load: Load
}

const LONGEST_PX = 40
const SHORTEST_PX = 16

const lengthPx = (force: number, largest: number) =>
  force === 0 || largest === 0
    ? 0
    : Math.sign(force) * Math.max(SHORTEST_PX, (Math.abs(force) / largest) * LONGEST_PX)

export function loadMarks(document: LayoutDocument, loadCaseId: string | null): LoadMark[] {
  const loadCase = document.loadCases.find(({ id }) => id === loadCaseId)
  if (!loadCase) return []
  const largest = loadCase.loads.reduce(
    (most, load) => Math.max(most, Math.abs(load.forceYN), Math.abs(load.forceZN), Math.abs(load.axialN)),
    0,
  )
  return loadCase.loads.flatMap((load) => {
    const hub = document.hubs.find(({ id }) => id === load.hub)
    if (!hub) return []
    return [
      {
        loadCaseId: loadCase.id,
        loadId: load.id,
        hubId: hub.id,
        stationMm: load.stationMm,
        radiusMm: hubExtent(document, hub).outerRadiusMm,
        forceYPx: lengthPx(load.forceYN, largest),
        outOfPlane: load.forceZN > 0 ? 1 : load.forceZN < 0 ? -1 : 0,
        axialPx: lengthPx(load.axialN, largest),
        load,
      },
    ]
  })
}
