/** The interference window: from the least interference that holds to the most the parts stand. */
import { requireFinite } from '../engineering-input-error'
import type { Length } from '../quantities/quantity'

/** One mark a window can end on, with what sets it. `Cause` is whatever the caller names causes by. */
export interface WindowMark<Cause> {
  interference: Length
  cause: Cause
}

export interface InterferenceWindow<Cause> {
  required: WindowMark<Cause> | null
  permissible: WindowMark<Cause> | null
  isEmpty: boolean
}

/**
 * The window of as-made interference from the marks of every criterion and load case.
 *
 * Model: the largest of the lower marks and the smallest of the upper marks govern.
 * @param lowerMarks [m] as-made diametral interference each holding criterion needs
 * @param upperMarks [m] as-made diametral interference each stress or joining limit permits
 * @returns [m] governing marks with their causes; empty when the required exceeds the permissible
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: marks must hold for the same seat; an earlier mark governs when two are equal.
 * Source: din-7190-1 (least and most permissible interference, from memory)
 * Example: no published number; marks 40, 61 and 190, 150 µm give 61 to 150 µm
 */
export function interferenceWindow<Cause>(
  lowerMarks: readonly WindowMark<Cause>[],
  upperMarks: readonly WindowMark<Cause>[],
): InterferenceWindow<Cause> {
  let required: WindowMark<Cause> | null = null
  for (const mark of lowerMarks) {
    requireFinite(mark.interference, 'lowerMarks')
    if (!required || mark.interference > required.interference) required = mark
  }
  let permissible: WindowMark<Cause> | null = null
  for (const mark of upperMarks) {
    requireFinite(mark.interference, 'upperMarks')
    if (!permissible || mark.interference < permissible.interference) permissible = mark
  }
  const isEmpty =
    required !== null && permissible !== null && required.interference > permissible.interference
  return { required, permissible, isEmpty }
}
