/**
 * Ids made in the browser. They are random, because two people may add a part at the same moment
 * and a counter would give both the same id.
 */

/** No vowels and no look-alikes: ids are read aloud now and then, and must not spell words. */
const ID_LETTERS = '23456789bcdfghjkmnpqrstvwxz'

export type PartIdPrefix = 'section' | 'hub' | 'bearing' | 'case' | 'load'

/** A part id such as `hub-7kq2mzr4`. */
export function newPartId(prefix: PartIdPrefix): string {
  return `${prefix}-${randomLetters(8)}`
}

/** Identifies one edit for ever: a re-sent edit has the same id. */
export function newEditId(): string {
  return `edit-${randomLetters(20)}`
}

/** Identifies one browser tab to the server. */
export function newClientId(): string {
  return `client-${randomLetters(20)}`
}

/** Identifies a layout, an epoch, a notice: anything of ours that only has to be unique. */
export function newId(prefix: string): string {
  return `${prefix}-${randomLetters(16)}`
}

function randomLetters(count: number): string {
  const bytes = new Uint8Array(count * 2)
  let letters = ''
  while (letters.length < count) {
    crypto.getRandomValues(bytes)
    for (const byte of bytes) {
      // 243 = 9 · 27: bytes beyond it would favour the first letters.
      if (byte < 243 && letters.length < count) letters += ID_LETTERS.charAt(byte % ID_LETTERS.length)
    }
  }
  return letters
}
