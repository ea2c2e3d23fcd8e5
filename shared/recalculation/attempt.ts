/** A refused input of the core becomes a reason; any other error is a defect and is thrown on. */
import { EngineeringInputError } from '../engineering/engineering-input-error'

export type Attempt<Value> = { value: Value; reason: null } | { value: null; reason: string }

export function attempt<Value>(compute: () => Value): Attempt<Value> {
  try {
    return { value: compute(), reason: null }
  } catch (error) {
    if (error instanceof EngineeringInputError) return { value: null, reason: error.message }
    throw error
  }
}

/** Results never carry NaN or Infinity: what overflows is "not computable", shown as no number. */
export function finiteOrNull(value: number | null): number | null {
  return value !== null && Number.isFinite(value) ? value : null
}
