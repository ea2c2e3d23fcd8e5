/**
 * Revision letters of drawings run A, B, … Y, AA, AB, … and leave out I, O, Q, S, X and Z, which are
 * misread as figures or as marks: common practice, set down in ASME Y14.35 (from memory).
 */
const LETTERS = 'ABCDEFGHJKLMNPRTUVWY'

export const FIRST_REVISION_LETTER = 'A'

/** A letter outside the row (an imported or older one) counts as the last it follows. */
export function nextRevisionLetter(letter: string): string {
  const head = letter.slice(0, -1)
  const last = letter.slice(-1)
  const following = [...LETTERS].find((candidate) => candidate > last)
  if (following !== undefined) return head + following
  const first = LETTERS.charAt(0)
  return (head === '' ? first : nextRevisionLetter(head)) + first
}
