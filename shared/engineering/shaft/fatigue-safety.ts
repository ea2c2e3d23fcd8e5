/** Fatigue safety of one section by the distortion-energy criteria. */
import { requireFinite, requirePositive } from '../engineering-input-error'
import type { Pressure } from '../quantities/quantity'

export type FatigueCriterion = 'goodman' | 'gerber' | 'asmeElliptic' | 'soderberg'

export interface FatigueStress {
  /** Nominal amplitudes, ≥ 0. */
  bendingAmplitude: Pressure
  torsionAmplitude: Pressure
  /** Nominal means; axial stress counts with bending. */
  bendingMean: Pressure
  torsionMean: Pressure
  /** Fatigue notch factors of the amplitudes, ≥ 1. */
  bendingFactor: number
  torsionFactor: number
  /** Factors of the means: the same where the source applies them, 1 where means are taken nominal. */
  bendingMeanFactor: number
  torsionMeanFactor: number
}

export interface FatigueStrength {
  endurance: Pressure
  tensile: Pressure
  yield: Pressure
}

/** Von Mises of amplitude and of mean, each with its notch factors. */
function equivalents(stress: FatigueStress): { amplitude: number; mean: number } {
  const { bendingMeanFactor, torsionMeanFactor } = stress
  return {
    amplitude: Math.hypot(
      stress.bendingFactor * stress.bendingAmplitude,
      Math.sqrt(3) * stress.torsionFactor * stress.torsionAmplitude,
    ),
    mean: Math.hypot(
      bendingMeanFactor * stress.bendingMean,
      Math.sqrt(3) * torsionMeanFactor * stress.torsionMean,
    ),
  }
}

/**
 * Safety against fatigue at one section.
 *
 * Model: distortion energy; Goodman 1/n = σ_a/Se + σ_m/Rm, Gerber, ASME elliptic and Soderberg beside it; rotating
 * bending is all amplitude, steady torque all mean.
 * @param stress [Pa] nominal amplitudes and means with notch factors
 * @param strength [Pa] endurance limit, tensile and yield strength, > 0
 * @param criterion [-] which line to judge by
 * @returns [-] safety, null without stress
 * @throws EngineeringInputError `notFinite`, `notPositive`
 *
 * Validity: steels, unlimited life, steady proportional loading.
 * Source: shigley-9 Eqs. 7-7 to 7-14
 * Example: shigley-9 Example 7-1: Goodman 1.62, Soderberg 1.56
 */
export function fatigueSafety(
  stress: FatigueStress,
  strength: FatigueStrength,
  criterion: FatigueCriterion,
): number | null {
  requirePositive(strength.endurance, 'strength.endurance')
  requirePositive(strength.tensile, 'strength.tensile')
  requirePositive(strength.yield, 'strength.yield')
  const { amplitude, mean } = equivalents(stress)
  requireFinite(amplitude, 'stress.amplitude')
  requireFinite(mean, 'stress.mean')
  if (amplitude === 0 && mean === 0) return null
  const a = amplitude / strength.endurance
  switch (criterion) {
    case 'goodman':
      return 1 / (a + mean / strength.tensile) // Eq. 7-7
    case 'soderberg':
      return 1 / (a + mean / strength.yield) // Eq. 7-13
    case 'asmeElliptic':
      return 1 / Math.hypot(a, mean / strength.yield) // Eq. 7-11
    case 'gerber': {
      const m = mean / strength.tensile
      // Eq. 7-9; without amplitude it tends to the tensile strength
      return a === 0 ? 1 / m : 2 / (a * (1 + Math.sqrt(1 + ((2 * m) / a) ** 2)))
    }
  }
}
