import type { SourceId } from '../engineering/sources/source-registry'

/**
 * What the reference is. `solver` is a general-purpose program or an independent numerical method, `closedForm` a
 * formula that the calculation itself does not use, `commonPractice` a fact of the trade without a source.
 */
export type Evidence = 'published' | 'solver' | 'closedForm' | 'commonPractice'

export interface ValidationCheck {
  id: string
  topic: ValidationTopic
  title: string
  source: SourceId
  /** Example, figure, table or case within the source. */
  place: string
  evidence: Evidence
  isFromMemory: boolean
  unit: string
  /** One number, or the upper and lower limit of a class. */
  reference: readonly number[]
  ours: () => readonly number[]
  tolerance: { kind: 'relative' | 'absolute'; value: number }
  /** Why the tolerance is what it is. */
  reason: string
}

export const VALIDATION_TOPICS = [
  'tolerances',
  'interferenceFit',
  'rotation',
  'temperature',
  'loads',
  'beam',
  'fatigue',
  'vibration',
  'statistics',
  'contact',
] as const
export type ValidationTopic = (typeof VALIDATION_TOPICS)[number]

export interface ValidationOutcome {
  check: ValidationCheck
  ours: readonly number[]
  /** Largest of the deviations: a share for relative, in the unit for absolute tolerances. */
  deviation: number
  passes: boolean
}

/** Runs one check. A wrong count of numbers or one that is not finite never passes. */
export function runCheck(check: ValidationCheck): ValidationOutcome {
  const ours = check.ours()
  const deviations = check.reference.map((reference, i) => {
    const difference = Math.abs((ours[i] ?? NaN) - reference)
    return check.tolerance.kind === 'relative' ? difference / Math.abs(reference) : difference
  })
  const deviation = Math.max(...deviations)
  // Floating-point dust must not decide at the very edge of a tolerance.
  const passes =
    ours.length === check.reference.length &&
    Number.isFinite(deviation) &&
    deviation <= check.tolerance.value * (1 + 1e-9)
  return { check, ours, deviation, passes }
}
