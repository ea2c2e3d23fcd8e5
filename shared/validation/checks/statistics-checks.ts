import { normalProbability, normalQuantile } from '../../engineering/batch/normal-distribution'
import { toleranceStack, type ToleranceMember } from '../../engineering/batch/tolerance-stack'
import { inch, toInch } from '../../engineering/quantities/units'
import type { ValidationCheck } from '../validation-check'

const member = (nominal: number, half: number, sign: 1 | -1): ToleranceMember => ({
  nominal: inch(nominal),
  lower: inch(-half),
  upper: inch(half),
  sign,
})
const screw = (d: number) =>
  toleranceStack(
    [member(1.75, 0.003, 1), member(0.75, 0.001, -1), member(0.12, 0.005, -1), member(d, 0.001, -1)],
    1,
  )

const TABLE_26_1 = [
  [1, 0.8413447461],
  [1.96, 0.9750021049],
  [3, 0.998650102],
  [-3, 0.001349898],
] as const

export const STATISTICS_CHECKS: readonly ValidationCheck[] = [
  ...TABLE_26_1.map(([z, reference]): ValidationCheck => ({
    id: `normal-${z}`,
    topic: 'statistics',
    title: `Normal distribution below ${z}`,
    source: 'abramowitz-stegun',
    place: 'Table 26.1',
    evidence: 'published',
    isFromMemory: true,
    unit: '',
    reference: [reference],
    ours: () => [normalProbability(z)],
    tolerance: { kind: 'absolute', value: 5e-11 },
    reason: 'half a unit of the tenth digit',
  })),
  {
    id: 'normal-quantile',
    topic: 'statistics',
    title: '97.5 % point of the normal distribution',
    source: 'abramowitz-stegun',
    place: 'Table 26.1',
    evidence: 'published',
    isFromMemory: true,
    unit: '',
    reference: [1.959964],
    ours: () => [normalQuantile(0.975)],
    tolerance: { kind: 'absolute', value: 5e-7 },
    reason: 'half a unit of the last digit',
  },
  {
    id: 'screw-gap',
    topic: 'statistics',
    title: 'Mean gap of a screw with three parts, and its worst case half width',
    source: 'shigley-9',
    place: 'Example 1-7',
    evidence: 'published',
    isFromMemory: true,
    unit: 'in',
    reference: [0.005, 0.01],
    ours: () => {
      const stack = screw(0.875)
      return [toInch(stack.mean), (toInch(stack.worstHigh) - toInch(stack.worstLow)) / 2]
    },
    tolerance: { kind: 'absolute', value: 1e-9 },
    reason: 'exact inputs',
  },
  {
    id: 'screw-shortened',
    topic: 'statistics',
    title: 'Least gap when the last part is 0.867 in',
    source: 'shigley-9',
    place: 'Example 1-7',
    evidence: 'published',
    isFromMemory: true,
    unit: 'in',
    reference: [0.003],
    ours: () => [toInch(screw(0.867).worstLow)],
    tolerance: { kind: 'absolute', value: 1e-9 },
    reason: 'exact inputs',
  },
]
