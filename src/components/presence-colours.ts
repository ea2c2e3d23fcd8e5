/** Fills for people, told apart on paper and dark alike; white text on each is at least 4.5 : 1. */
export const PRESENCE_COLOURS = [
  '#2e7a5a',
  '#6b3a5b',
  '#9a5a22',
  '#2b6a8f',
  '#8a4140',
  '#4f5d9c',
  '#5f6b1f',
  '#86608a',
] as const

/** Initials and names on any of them. */
export const PRESENCE_INK = '#ffffff'

export const presenceColour = (index: number): string =>
  PRESENCE_COLOURS[Math.abs(index) % PRESENCE_COLOURS.length] ?? PRESENCE_COLOURS[0]
