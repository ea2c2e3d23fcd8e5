/** A blocked part, and the hub whose enlarged seat is in its way: the seat and fit that let both live. */
import type { Hub, LayoutDocument } from '../layout/layout-document'
import { sectionSpans, seatUnder } from '../layout/shaft-geometry'
import { hasAbutment } from './abutment'
import type { AssemblyPart, ShaftFeature } from './assembly-parts'
import { attempt } from './attempt'
import { nextFit, slipSafetyWith } from './next-fit'
import { resolveSeat } from './seat'
import { caseState } from './seat-state'
import { seatWindow } from './seat-window'
import { capitalised, millimetreText, safetyText } from './wording'

/** Common practice: step seats by at least this much, so that no part rubs over another seat. */
const SMALLEST_STEP_MM = 1

export function reseatRemedy(
  document: LayoutDocument,
  blocked: AssemblyPart,
  blocker: ShaftFeature,
): string | null {
  // a proposal that cannot be calculated is none
  return attempt(() => smallerSeat(document, blocked, blocker)).value
}

function smallerSeat(document: LayoutDocument, blocked: AssemblyPart, blocker: ShaftFeature): string | null {
  const hub = document.hubs.find((one) => one.id === blocker.hubId)
  if (!hub) return null
  const diameterMm = smallerSeatMm(document, blocked, blocker)
  if (diameterMm === null) return null
  const changed = withSeat(document, hub, blocker.sectionId, diameterMm)
  const changedHub = changed.hubs.find((one) => one.id === hub.id)
  const seat = changedHub && resolveSeat(changed, changedHub).seat
  if (!changedHub || !seat) return null
  const states = seat.cases.map((seatCase) => caseState(seat, seatCase))
  const fit = nextFit(seat, seatWindow(seat, states))
  if (!fit) return null
  const safeties = seat.cases
    .map((seatCase) => slipSafetyWith(seat, fit.interference, seatCase.id))
    .filter((safety) => safety !== null)
  const least = Math.min(...safeties)
  const hasAxial = seat.cases.some((seatCase) => seatCase.demand.axialForce > 0)
  const load = hasAxial ? 'its load' : 'the torque'
  const carries = Number.isFinite(least) ? ` carries ${load} with ${safetyText(least)}` : ' holds'
  const abutmentMm = hub.abutmentStationMm
  const restores =
    typeof abutmentMm === 'number' &&
    !hasAbutment(document, hub, abutmentMm) &&
    hasAbutment(changed, changedHub, abutmentMm)
  return `${capitalised(hub.name)} at ${millimetreText(diameterMm)} with ${fit.label}${carries}${restores ? ' and restores its shoulder' : ''}.`
}

/** Half way between the bore that must pass and the next section outward, so that both steps stay. */
function smallerSeatMm(
  document: LayoutDocument,
  blocked: AssemblyPart,
  blocker: ShaftFeature,
): number | null {
  const spans = sectionSpans(document)
  const index = spans.findIndex((span) => span.section.id === blocker.sectionId)
  const isFromRight = (spans[index]?.startMm ?? 0) >= blocked.startMm
  const outward = spans[isFromRight ? index + 1 : index - 1]?.section.outerDiameterMm
  const largest = blocked.boreMm - SMALLEST_STEP_MM
  const wanted =
    outward !== undefined && outward < largest
      ? Math.round((blocked.boreMm + outward) / 2)
      : Math.floor(largest)
  return wanted > 0 && wanted <= largest ? wanted : null
}

/** The same layout with another diameter under one hub; null bores follow their section by themselves. */
function withSeat(document: LayoutDocument, hub: Hub, sectionId: string, diameterMm: number): LayoutDocument {
  const sections = document.shaft.sections.map((section) =>
    section.id === sectionId ? { ...section, outerDiameterMm: diameterMm } : section,
  )
  const hubs = document.hubs.map((other) => {
    const isOnSection = seatUnder(document, other)?.span.section.id === sectionId
    const followsBore = isOnSection && typeof other.boreDiameterMm === 'number'
    if (other.id !== hub.id && !followsBore) return other
    return { ...other, boreDiameterMm: diameterMm, joining: { ...other.joining, clearanceUm: undefined } }
  })
  return { ...document, shaft: { ...document.shaft, sections }, hubs }
}
