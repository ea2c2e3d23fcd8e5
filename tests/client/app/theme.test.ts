/**
 * Colours of both themes. Contrast by WCAG 2.2, success criteria 1.4.3 (text 4.5 : 1) and 1.4.11
 * (boundaries of controls 3 : 1); relative luminance as WCAG defines it.
 */
import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { PRESENCE_COLOURS, PRESENCE_INK } from '@/components/presence-colours'
import { THEME_COLOURS } from '@/lib/theme-colours'

const css = readFileSync('src/app/theme.css', 'utf8')
const tokens = new Map(
  [...css.matchAll(/--([a-z-]+): light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\);/g)].map(
    ([, name = '', light = '', dark = '']) => [name, { light, dark }],
  ),
)

function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5].map((at) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue
}
function contrast(one: string, other: string): number {
  const [darker = 0, lighter = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b)
  return (lighter + 0.05) / (darker + 0.05)
}

const TEXT_PAIRS: [text: string, ground: string][] = [
  ...['ink', 'quiet', 'steel', 'good', 'bad', 'plum', 'bronze-ink', 'straw-ink'].flatMap(
    (text): [string, string][] => [
      [text, 'paper'],
      [text, 'card'],
    ],
  ),
  ['ink', 'steel-soft'],
  ['quiet', 'steel-soft'],
  ['steel', 'steel-soft'],
  ['good', 'good-soft'],
  ['ink', 'good-soft'],
  ['bad', 'bad-soft'],
  ['ink', 'bad-soft'],
  ['straw-ink', 'straw-soft'],
  ['ink', 'straw-soft'],
  ['bar-ink', 'bar'],
  ['bar-quiet', 'bar'],
  ['on-fill', 'steel'],
  ['on-fill', 'bad'],
  ['on-straw', 'straw-bright'],
]

describe.each(['light', 'dark'] as const)('%s theme', (theme) => {
  const colour = (name: string): string => {
    const token = tokens.get(name)
    if (!token) throw new Error(`theme.css has no --${name}`)
    return token[theme]
  }

  it.each(TEXT_PAIRS)('%s is readable on %s', (text, ground) => {
    expect(contrast(colour(text), colour(ground))).toBeGreaterThanOrEqual(4.5)
  })

  it.each(['paper', 'card'])('edges of controls and focus rings are seen on %s', (ground) => {
    expect(contrast(colour('edge'), colour(ground))).toBeGreaterThanOrEqual(3)
    expect(contrast(colour('steel'), colour(ground))).toBeGreaterThanOrEqual(3)
  })

  it('gives the canvas the colours of the style sheet', () => {
    for (const [name, hex] of Object.entries(THEME_COLOURS[theme])) {
      expect([name, hex]).toEqual([
        name,
        colour(name.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`)),
      ])
    }
  })
})

it.each(PRESENCE_COLOURS)('initials are readable on %s', (fill) => {
  expect(contrast(PRESENCE_INK, fill)).toBeGreaterThanOrEqual(4.5)
})
