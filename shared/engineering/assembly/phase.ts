import { requireFinite, requireNonNegative } from '../engineering-input-error'
import type { Angle } from '../quantities/quantity'
import { radian } from '../quantities/units'

export interface PhaseCheck {
  /** Shortest way round from target to actual, positive in the sense of rotation. */
  deviation: Angle
  isWithin: boolean
  /** True when the angle read from the other end would be right. */
  mirrorMatches: boolean
}

const TURN = 2 * Math.PI
/** Degrees turned into radians and back lose the last digits; a limit value still counts as met. */
const ANGLE_TOLERANCE = 1e-9

/** Into (−π, π]. */
function wrapped(angle: number): number {
  const rest = angle - TURN * Math.round(angle / TURN)
  return rest <= -Math.PI ? rest + TURN : rest
}

/**
 * Angle of a part against its target, with the check whether it was read from the wrong end.
 *
 * Model: angles count from +y in the sense of rotation seen from the drive end; seen from the other end the same place
 * reads with the opposite sign (360° − φ).
 * @param actual [rad] angle of the part, any turn
 * @param target [rad] angle of the timing chart or of the group, any turn
 * @param tolerance [rad] permitted deviation either way, ≥ 0
 * @returns [rad] deviation, whether it is within tolerance, whether the mirrored angle would be
 * @throws EngineeringInputError `notFinite`, `negative`
 *
 * Validity: any angles.
 * Source: assembly-practice
 * Example: no published number; 165° against 195° deviates by −30° and its mirrored value matches
 */
export function checkPhase(actual: Angle, target: Angle, tolerance: Angle): PhaseCheck {
  requireFinite(actual, 'actual')
  requireFinite(target, 'target')
  requireNonNegative(tolerance, 'tolerance')
  const deviation = wrapped(actual - target)
  const isWithin = Math.abs(deviation) <= tolerance + ANGLE_TOLERANCE
  const mirrored = Math.abs(wrapped(-actual - target))
  return {
    deviation: radian(deviation),
    isWithin,
    mirrorMatches: !isWithin && mirrored <= Math.max(tolerance, 0) + ANGLE_TOLERANCE,
  }
}
