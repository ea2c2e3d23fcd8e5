/**
 * Source: Shigley's Mechanical Engineering Design, 9th ed., Examples 7-7 and 7-8 (p. 398), metric part: 34H11/c11.
 * Printed limits of size to a hundredth of a millimetre.
 */
import { expect, it } from 'vitest'
import { mm, toMm } from '@shared/engineering/quantities/units'
import { limitsOfClass } from '@shared/engineering/tolerances/iso286-limits'

it('34H11 is 34.000 to 34.160 mm, 34c11 is 33.720 to 33.880 mm', () => {
  const hole = limitsOfClass(mm(34), 'H11')
  const shaft = limitsOfClass(mm(34), 'c11')
  expect(34 + toMm(hole.lowerDeviation)).toBeCloseTo(34, 9)
  expect(34 + toMm(hole.upperDeviation)).toBeCloseTo(34.16, 9)
  expect(34 + toMm(shaft.lowerDeviation)).toBeCloseTo(33.72, 9)
  expect(34 + toMm(shaft.upperDeviation)).toBeCloseTo(33.88, 9)
})
