import { describe, expect, it } from 'vitest'
import {
  formatEntered,
  formatGiven,
  formatResult,
  formatResultPair,
  formatSafety,
  formatWithUnit,
} from '@/lib/format-quantity'
import { parseQuantity } from '@/lib/quantity-entry'
import { QUANTITY_KINDS, type QuantityKind } from '@/lib/quantity-units'

/** Narrow and no-break spaces as plain ones, to keep the expectations readable. */
const plain = (text: string) => text.replace(/[\u202f\u00a0]/g, ' ')

describe('calculated values', () => {
  it.each<[number | null, QuantityKind, string]>([
    [54.237, 'stress', '54.2 MPa'],
    [268.4, 'stress', '268 MPa'],
    [1405.3, 'torque', '1 405 N·m'],
    [8.24, 'interference', '8.2 µm'],
    [36.4, 'interference', '36 µm'],
    [-12.3, 'interference', '−12 µm'],
    [44_190, 'force', '44.2 kN'],
    [1982, 'force', '1 982 N'],
    [195.7, 'temperature', '196 °C'],
    [9840.2, 'speed', '9 840 rpm'],
    [1.284, 'slope', '1.28 mrad'],
    [-0.001, 'interference', '0.0 µm'],
    [2e-9, 'stress', '0 MPa'],
    [null, 'stress', '–'],
    [Number.NaN, 'stress', '–'],
  ])('%s as %s', (value, kind, expected) => {
    expect(plain(formatResult(value, kind, 'metric').text)).toBe(expected)
  })

  it('shows inch and pound units on request', () => {
    expect(plain(formatResult(50.8, 'interference', 'inch').text)).toBe('2.00 thou')
    expect(plain(formatResult(100, 'temperature', 'inch').text)).toBe('212 °F')
    expect(plain(formatResult(162.698, 'torque', 'inch').text)).toBe('120 lbf·ft')
  })

  it('gives a pair one unit', () => {
    expect(plain(formatResultPair(56_200, 6_100, 'force', 'metric').text)).toBe('56.2 / 6.1 kN')
    expect(plain(formatResultPair(1405, 820, 'torque', 'metric').text)).toBe('1 405 / 820 N·m')
    expect(plain(formatResultPair(36, 77, 'interference', 'metric', '…').text)).toBe('36…77 µm')
  })
})

describe('safeties', () => {
  it('has two decimals', () => {
    expect(formatSafety(0.9432)).toBe('0.94')
    expect(formatSafety(1.6532, 1.5)).toBe('1.65')
    expect(formatSafety(12.34)).toBe('12.3')
    expect(formatSafety(1234)).toBe('> 99')
    expect(formatSafety(null)).toBe('–')
  })

  it('does not round a failure up to its limit', () => {
    expect(formatSafety(1.497, 1.5)).toBe('1.497')
    expect(formatSafety(1.49999, 1.5)).toBe('< 1.50')
    expect(formatSafety(1.503, 1.5)).toBe('1.50')
  })
})

describe('entered values', () => {
  it('are shown in full and come back as the same stored value in both systems', () => {
    for (const kind of Object.keys(QUANTITY_KINDS) as QuantityKind[]) {
      for (const system of ['metric', 'inch'] as const) {
        const stored = kind === 'expansion' ? 1.15e-5 : 94.12
        const back = parseQuantity(formatEntered(stored, kind, system), { kind, system })
        expect(back.ok && back.value / stored, `${kind} in ${system}`).toBeCloseTo(1, 5)
      }
    }
  })

  it('are not padded', () => {
    expect(plain(formatGiven(50, 'length', 'metric').text)).toBe('50 mm')
    expect(plain(formatGiven(94.12, 'length', 'metric').text)).toBe('94.12 mm')
    expect(plain(formatGiven(36, 'angle', 'metric').text)).toBe('36°')
    expect(plain(formatGiven(50.8, 'length', 'inch').text)).toBe('2 in')
    expect(formatEntered(null, 'length', 'metric')).toBe('')
  })
})

it('formats numbers whose unit is only known as text', () => {
  expect(plain(formatWithUnit(0.9432, ''))).toBe('0.94')
  expect(plain(formatWithUnit(1522.4, 'N·m'))).toBe('1 522 N·m')
})
