import { describe, expect, it } from 'vitest'
import { FIRST_REVISION_LETTER, nextRevisionLetter } from '@shared/protocol/revision-letter'

/** Letters left out by common practice, ASME Y14.35 (from memory): I, O, Q, S, X, Z. */
describe('nextRevisionLetter', () => {
  it('runs through the alphabet without the letters that are misread', () => {
    const letters = [FIRST_REVISION_LETTER]
    while (letters.length < 22) letters.push(nextRevisionLetter(letters.at(-1) ?? ''))
    expect(letters.join(' ')).toBe('A B C D E F G H J K L M N P R T U V W Y AA AB')
  })

  it('carries over into the letter before', () => {
    expect(nextRevisionLetter('AY')).toBe('BA')
    expect(nextRevisionLetter('YY')).toBe('AAA')
  })

  it('steps over letters it would not give itself', () => {
    expect(nextRevisionLetter('I')).toBe('J')
    expect(nextRevisionLetter('Z')).toBe('AA')
  })
})
