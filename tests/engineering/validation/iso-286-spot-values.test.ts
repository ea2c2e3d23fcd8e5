/**
 * Sources: published limits of size in shared/validation/data/iso286-spot-values.ts, each with the source it was read in
 * or marked as from memory. Table values are exact: no tolerance.
 */
import { describe, expect, it } from 'vitest'
import { EngineeringInputError } from '@shared/engineering/engineering-input-error'
import { mm, toUm } from '@shared/engineering/quantities/units'
import { GRADES, knownToleranceClasses, limitsOfClass } from '@shared/engineering/tolerances/iso286-limits'
import { findSource } from '@shared/engineering/sources/source-registry'
import { ISO286_SPOT_VALUES } from '@shared/validation/data/iso286-spot-values'

const spotSources = [...new Set(ISO286_SPOT_VALUES.map((value) => value[4]))]

describe.each(spotSources.map((id) => [id, findSource(id).citation] as const))('%s: %s', (source) => {
  const values = ISO286_SPOT_VALUES.filter((value) => value[4] === source)
  it.each(values)('%f %s is %f / %f µm', (size, toleranceClass, upper, lower) => {
    const limits = limitsOfClass(mm(size), toleranceClass)
    expect(toUm(limits.upperDeviation)).toBeCloseTo(upper, 6)
    expect(toUm(limits.lowerDeviation)).toBeCloseTo(lower, 6)
  })
})

describe('classes the standard does not define', () => {
  const undefinedClasses: [number, string][] = [
    [10, 't6'],
    [12, 'v6'],
    [16, 'y6'],
    [1, 'a11'],
    [1, 'N9'],
    [0.8, 'H14'],
    [20, 'j8'],
    [20, 'K9'],
    [20, 'cd7'],
    [20, 'q6'],
    [20, 'H99'],
    [20, 'nonsense'],
  ]
  it.each(undefinedClasses)('%f %s is refused', (size, toleranceClass) => {
    expect(() => limitsOfClass(mm(size), toleranceClass)).toThrow(EngineeringInputError)
  })
  it('says which are known', () => {
    expect(() => limitsOfClass(mm(20), 'q6')).toThrow(/known in grade 6: .*\bu\b/)
    expect(() => limitsOfClass(mm(20), 'H99')).toThrow(/H is known in grades 01, 0, 1, 2/)
  })
  it('refuses sizes over 500 mm and no size at all', () => {
    expect(() => limitsOfClass(mm(500.001), 'H7')).toThrow(/up to 500 mm/)
    expect(() => limitsOfClass(mm(0), 'H7')).toThrow(EngineeringInputError)
  })
})

describe('rules of the standard', () => {
  it('puts a step limit into the lower step', () => {
    expect(toUm(limitsOfClass(mm(50), 'u6').lowerDeviation)).toBeCloseTo(70, 6)
    expect(toUm(limitsOfClass(mm(50.001), 'u6').lowerDeviation)).toBeCloseTo(87, 6)
    expect(toUm(limitsOfClass(mm(18), 'H7').upperDeviation)).toBeCloseTo(18, 6)
    expect(toUm(limitsOfClass(mm(18.001), 'H7').upperDeviation)).toBeCloseTo(21, 6)
  })
  it('gives the same fit in hole basis and in shaft basis (delta rule)', () => {
    for (const size of [6, 25, 50, 65, 120, 250, 400, 500]) {
      for (const letter of ['p', 'r', 's', 'u', 'x']) {
        const hole = limitsOfClass(mm(size), 'H7')
        const shaft = limitsOfClass(mm(size), `${letter}6`)
        const otherHole = limitsOfClass(mm(size), `${letter.toUpperCase()}7`)
        const otherShaft = limitsOfClass(mm(size), 'h6')
        expect(toUm(shaft.upperDeviation) - toUm(hole.lowerDeviation)).toBeCloseTo(
          toUm(otherShaft.upperDeviation) - toUm(otherHole.lowerDeviation),
          6,
        )
      }
    }
  })
  it('lists every class it can give, and no other', () => {
    const classes = [...knownToleranceClasses(mm(30), 'shaft'), ...knownToleranceClasses(mm(30), 'hole')]
    expect(classes).toContain('u6')
    expect(classes).toContain('H7')
    expect(classes).not.toContain('cd7')
    for (const toleranceClass of classes) expect(() => limitsOfClass(mm(30), toleranceClass)).not.toThrow()
    expect(GRADES).toHaveLength(20)
  })
})
