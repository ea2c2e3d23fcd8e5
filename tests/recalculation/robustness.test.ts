/** Whatever satisfies the schema is answered with finite numbers, nulls and reasons, never with an error. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { blankLayout } from '@shared/layout/blank-layout'
import { layoutDocumentSchema, type LayoutDocument } from '@shared/layout/layout-document'
import { deriveQuantity } from '@shared/recalculation/derive-quantity'
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { arbitraryLayout } from '../support/arbitrary-layout'
import { everyReference } from './every-reference'
import { scenario } from './scenario-files'

/** Paths of numbers that are NaN or infinite, and of undefined values: neither survives JSON. */
function unspeakable(value: unknown, path = 'results'): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path]
  if (value === undefined) return [path]
  if (Array.isArray(value)) return value.flatMap((item, index) => unspeakable(item, `${path}[${index}]`))
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, item]) => unspeakable(item, `${path}.${key}`))
}

describe('any document of the schema', () => {
  it('is calculated without NaN, Infinity or an exception', () => {
    fc.assert(
      fc.property(arbitraryLayout, (document) => {
        const checked = layoutDocumentSchema.safeParse(document)
        // a generator that leaves the schema would prove nothing
        if (!checked.success) throw new Error(JSON.stringify(checked.error.issues.slice(0, 3)))
        const results = recalculateLayout(document)
        expect(unspeakable(results)).toEqual([])
        expect(JSON.parse(JSON.stringify(results))).toEqual(JSON.parse(JSON.stringify(results)))
        for (const finding of results.findings) {
          expect(finding.message).not.toMatch(/NaN|Infinity|undefined|null/)
          expect(finding.remedy).not.toMatch(/NaN|Infinity|undefined|null/)
          expect(finding.message).toMatch(/\.$/)
        }
        const fails = results.findings.some((finding) => finding.severity === 'fails')
        expect(results.verdict).toBe(fails ? 'fails' : 'passes')
      }),
      { numRuns: 400 },
    )
  })

  it('opens every number without an exception, equal to the result', () => {
    fc.assert(
      fc.property(arbitraryLayout, (document) => {
        const results = recalculateLayout(document)
        for (const { reference, value } of everyReference(document, results)) {
          const derivation = deriveQuantity(document, reference)
          expect(derivation.result.value, JSON.stringify(reference)).toBe(value)
          expect(unspeakable(derivation)).toEqual([])
          if (value === null) expect(derivation.notComputable ?? '').not.toBe('')
        }
      }),
      { numRuns: 60 },
    )
  })
})

describe('half-drawn layouts', () => {
  const base = scenario('s1-fixed')
  const cases: Record<string, LayoutDocument> = {
    'no section': { ...base, shaft: { ...base.shaft, sections: [] } },
    'no hub': { ...base, hubs: [] },
    'no bearing': { ...base, bearings: [] },
    'one bearing': { ...base, bearings: base.bearings.slice(0, 1) },
    'two bearings at one station': {
      ...base,
      bearings: base.bearings.map((bearing) => ({ ...bearing, stationMm: 100 })),
    },
    'no load case': { ...base, loadCases: [] },
    'a hub beside the shaft': {
      ...base,
      hubs: base.hubs.map((hub, index) => (index === 0 ? { ...hub, stationMm: 900 } : hub)),
    },
    'a bore as large as its hub': {
      ...base,
      hubs: base.hubs.map((hub, index) => (index === 0 ? { ...hub, outerDiameterMm: 65 } : hub)),
    },
    'a shaft without a wall': {
      ...base,
      shaft: {
        ...base.shaft,
        sections: base.shaft.sections.map((section) => ({ ...section, boreDiameterMm: 70 })),
      },
    },
  }

  it.each(Object.entries(cases))('%s', (_name, document) => {
    const results = recalculateLayout(document)
    expect(unspeakable(results)).toEqual([])
    expect(results.hubs).toHaveLength(document.hubs.length)
    expect(results.shaft.loadCases).toHaveLength(document.loadCases.length)
  })

  it('keeps the numbers of the other hubs when one cannot be calculated', () => {
    const document = cases['a bore as large as its hub'] as LayoutDocument
    const [broken, whole] = recalculateLayout(document).hubs
    expect(broken?.verdict).toBe('notComputable')
    expect(broken?.notComputable).toEqual([
      'the outer diameter of 65 mm is not larger than the bore of 65 mm',
    ])
    expect(whole?.loadCases[0]?.slipSafety).toBeGreaterThan(1.5)
  })

  it('says which bearings are missing', () => {
    const codes = (document: LayoutDocument) =>
      recalculateLayout(document)
        .findings.filter((finding) => finding.severity === 'fails')
        .map((finding) => finding.code)
    expect(codes(cases['no bearing'] as LayoutDocument)).toContain('unsupported')
    expect(codes(cases['one bearing'] as LayoutDocument)).toContain('unsupported')
    expect(codes(cases['two bearings at one station'] as LayoutDocument)).toContain('unsupported')
  })

  it('passes a blank layout', () => {
    const results = recalculateLayout(blankLayout('New'))
    expect(results.verdict).toBe('passes')
    expect(results.shaft.lateralCriticalRpm[0]).toBeGreaterThan(0)
  })
})
