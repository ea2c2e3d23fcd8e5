import { requireFinite, requirePositive } from '../engineering-input-error'
import type { Length } from '../quantities/quantity'
import { metre } from '../quantities/units'

export type ShaftEnd = 'left' | 'right'

/** A stretch of the shaft that a part may have to travel over. */
export interface PassageFeature {
  id: string
  start: Length
  end: Length
  /** Largest size it can have: upper limit of a seat, nominal elsewhere. */
  largestDiameter: Length
}

/** A ring on its way to its seat. */
export interface TravellingPart {
  start: Length
  end: Length
  /** Smallest bore at room temperature. */
  coldBore: Length
  /** Growth of the bore (or contraction of the shaft) while it travels, ≥ 0; 0 when pressed cold. */
  growth: Length
  /** Features it ends on; it fits these by design. */
  ownFeatureIds: readonly string[]
}

export interface Passage {
  isFree: boolean
  /** Features the part cannot get over, largest first. */
  blockers: PassageFeature[]
  /** Features it gets over only because it is hot (or the shaft cold). */
  tight: PassageFeature[]
  /** Least diametral clearance over what it passes; null when it passes nothing. */
  leastClearance: Length | null
}

/** Sizes are compared to a tenth of a micrometre. */
const SIZE_TOLERANCE = 1e-7

/**
 * Whether a ring can travel from one end of the shaft to its seat.
 *
 * Model: it must pass every feature between the end and its seat, bore_min + growth ≥ size_max; it may pass hot what it
 * would not pass cold.
 * @param part [m] place, smallest bore > 0, growth while travelling ≥ 0
 * @param features [m] stretches of the shaft with their largest diameters
 * @param from [-] end it enters from
 * @returns [m] blockers (largest first), features passed only hot, least clearance
 * @throws EngineeringInputError `notPositive`, `notFinite`
 *
 * Validity: rigid parts that stay hot until seated; parts already mounted are a matter of order, not of passage.
 * Source: assembly-practice
 * Example: no published number; a bore of 66 mm does not pass a seat of 70 mm
 */
export function passage(part: TravellingPart, features: readonly PassageFeature[], from: ShaftEnd): Passage {
  requirePositive(part.coldBore, 'part.coldBore')
  requireFinite(part.growth, 'part.growth')
  const blockers: PassageFeature[] = []
  const tight: PassageFeature[] = []
  let least: number | null = null
  for (const feature of features) {
    if (part.ownFeatureIds.includes(feature.id) || !liesOnTheWay(feature, part, from)) continue
    const clearance = part.coldBore + part.growth - feature.largestDiameter
    if (least === null || clearance < least) least = clearance
    if (clearance < -SIZE_TOLERANCE) blockers.push(feature)
    else if (part.coldBore - feature.largestDiameter < -SIZE_TOLERANCE) tight.push(feature)
  }
  blockers.sort((one, other) => other.largestDiameter - one.largestDiameter)
  return {
    isFree: blockers.length === 0,
    blockers,
    tight,
    leastClearance: least === null ? null : metre(least),
  }
}

const liesOnTheWay = (feature: PassageFeature, part: TravellingPart, from: ShaftEnd) =>
  from === 'left' ? feature.start < part.end - 1e-9 : feature.end > part.start + 1e-9
