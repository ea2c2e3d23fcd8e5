import { describe, expect, it } from 'vitest'
import { findSource } from '@shared/engineering/sources/source-registry'
import { ALL_CHECKS } from '@shared/validation/all-checks'
import { runCheck, type ValidationCheck } from '@shared/validation/validation-check'

// Sources stand beside each check in shared/validation; this runs the same table that the product shows.
describe('validation table', () => {
  it.each(ALL_CHECKS.map((check) => [check.id, check] as const))('%s', (_id, check) => {
    const outcome = runCheck(check)
    expect(
      outcome.passes,
      `${check.title}: ${outcome.ours.join(' / ')} against ${check.reference.join(' / ')}`,
    ).toBe(true)
  })

  it('holds at least 60 checks from at least 12 sources, each with its own id', () => {
    expect(ALL_CHECKS.length).toBeGreaterThanOrEqual(60)
    expect(new Set(ALL_CHECKS.map((check) => check.source)).size).toBeGreaterThanOrEqual(12)
    expect(new Set(ALL_CHECKS.map((check) => check.id)).size).toBe(ALL_CHECKS.length)
    for (const check of ALL_CHECKS) expect(findSource(check.source).id).toBe(check.source)
  })

  it('fails a check that is off, gives too few numbers or no number', () => {
    const honest: ValidationCheck = {
      ...ALL_CHECKS[0]!,
      reference: [1, 2],
      tolerance: { kind: 'absolute', value: 0.1 },
    }
    expect(runCheck({ ...honest, ours: () => [1, 2.05] }).passes).toBe(true)
    expect(runCheck({ ...honest, ours: () => [1, 2.2] }).passes).toBe(false)
    expect(runCheck({ ...honest, ours: () => [1] }).passes).toBe(false)
    expect(runCheck({ ...honest, ours: () => [1, NaN] }).passes).toBe(false)
  })
})
