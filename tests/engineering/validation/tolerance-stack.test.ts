/**
 * Source: R. G. Budynas, J. K. Nisbett, Shigley's Mechanical Engineering Design, Example 1-7: a shouldered screw with
 * three hollow parts, a = 1.750 ± 0.003, b = 0.750 ± 0.001, c = 0.120 ± 0.005, d = 0.875 ± 0.001 in (from memory).
 */
import { describe, expect, it } from 'vitest'
import { chanceBelow, toleranceStack, type ToleranceMember } from '@shared/engineering/batch/tolerance-stack'
import { inch, toInch } from '@shared/engineering/quantities/units'

const member = (nominal: number, half: number, sign: 1 | -1): ToleranceMember => ({
  nominal: inch(nominal),
  lower: inch(-half),
  upper: inch(half),
  sign,
})
const gap = [
  member(1.75, 0.003, 1),
  member(0.75, 0.001, -1),
  member(0.12, 0.005, -1),
  member(0.875, 0.001, -1),
]

describe('Shigley Example 1-7', () => {
  const stack = toleranceStack(gap, 1)
  it('has a mean gap of 0.005 in and a worst case of ± 0.010 in', () => {
    expect(toInch(stack.mean)).toBeCloseTo(0.005, 9)
    expect(toInch(stack.worstLow)).toBeCloseTo(-0.005, 9)
    expect(toInch(stack.worstHigh)).toBeCloseTo(0.015, 9)
  })
  it('keeps a gap of 0.003 in in the worst case with d = 0.867 in', () => {
    const shortened = toleranceStack([...gap.slice(0, 3), member(0.867, 0.001, -1)], 1)
    expect(toInch(shortened.worstLow)).toBeCloseTo(0.003, 9)
  })
  it('has a root-sum-square tolerance of three standard deviations, √(3² + 1² + 5² + 1²) = 6 thousandths', () => {
    expect(3 * toInch(stack.standardDeviation)).toBeCloseTo(0.006, 9)
  })
  it('falls below its mean less three standard deviations with 0.00135', () => {
    const limit = (stack.mean - 3 * stack.standardDeviation) as typeof stack.mean
    expect(chanceBelow(stack, limit)).toBeCloseTo(0.00135, 5)
  })
})
