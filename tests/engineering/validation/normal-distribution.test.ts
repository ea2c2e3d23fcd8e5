/**
 * Source: M. Abramowitz, I. A. Stegun, Handbook of Mathematical Functions, Table 26.1 (values from memory), and an
 * independent numerical integration of the density by Simpson's rule.
 */
import { describe, expect, it } from 'vitest'
import { normalProbability, normalQuantile } from '@shared/engineering/batch/normal-distribution'

describe('normal distribution', () => {
  it.each([
    [0, 0.5],
    [1, 0.8413447461],
    [1.96, 0.9750021049],
    [2, 0.9772498681],
    [3, 0.998650102],
    [-3, 0.001349898],
    [4, 0.9999683288],
  ])('Table 26.1: Φ(%s) = %s', (z, expected) => {
    expect(normalProbability(z)).toBeCloseTo(expected, 10)
  })

  it('agrees with Simpson integration of the density from −8', () => {
    const density = (x: number) => Math.exp((-x * x) / 2) / Math.sqrt(2 * Math.PI)
    for (const z of [-5.5, -3.1, -1.2, -0.3, 0.4, 1.7, 2.9]) {
      const n = 20_000
      const h = (z + 8.5) / n
      let sum = density(-8.5) + density(z)
      for (let i = 1; i < n; i++) sum += (i % 2 === 1 ? 4 : 2) * density(-8.5 + i * h)
      expect(Math.abs(normalProbability(z) - (sum * h) / 3)).toBeLessThan(1e-13)
    }
  })

  it('inverts itself over the whole range', () => {
    for (const p of [1e-12, 1e-6, 0.00135, 0.02, 0.075, 0.3, 0.5, 0.6, 0.93, 0.999, 1 - 1e-9])
      expect(normalProbability(normalQuantile(p)) / p).toBeCloseTo(1, 10)
  })

  it('has its 97.5 % point at 1.959964', () => {
    expect(normalQuantile(0.975)).toBeCloseTo(1.959964, 6)
  })

  it.each([0, 1, -0.1, NaN])('refuses a probability of %s', (p) => {
    expect(() => normalQuantile(p)).toThrow(expect.objectContaining({ path: 'probability' }) as Error)
  })
})
