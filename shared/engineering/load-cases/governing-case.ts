import { requirePositive } from '../engineering-input-error'

export interface JudgedCase {
  id: string
  /** Null without demand. */
  safety: number | null
  /** Safety this load case asks for, > 0. */
  limit: number
}

/**
 * The load case that comes nearest to its own limit.
 *
 * Model: smallest safety over limit; a transient may ask for less safety than the steady case.
 * @param cases [-] safety and limit of each load case, in order
 * @returns [-] id of the governing load case, null when none has demand
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: limits must be stated for the same kind of safety.
 * Source: statics
 * Example: no published number; 0.94 of 1.5 and 0.56 of 1.2: the second governs
 */
export function governingCase(cases: readonly JudgedCase[]): string | null {
  let governing: string | null = null
  let least = Infinity
  for (const judged of cases) {
    requirePositive(judged.limit, 'limit')
    if (judged.safety === null || judged.safety / judged.limit >= least) continue
    least = judged.safety / judged.limit
    governing = judged.id
  }
  return governing
}
