import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { applyOperations } from '@shared/layout/apply-operations'
import { canonicalJson } from '@shared/layout/canonical-json'
import { checkReferences } from '@shared/layout/check-references'
import { invertOperations } from '@shared/layout/invert-operations'
import { layoutDocumentSchema, LIST_LIMITS, type LayoutDocument } from '@shared/layout/layout-document'
import { operationSchema, type Operation, type Target } from '@shared/layout/operations'
import { removeHubOperations } from '@shared/layout/remove-hub-operations'
import { settableField, settableFieldNames } from '@shared/layout/settable-fields'
import { seededRandom } from '../sync/support/random'
import { everyTarget, randomOperations } from '../sync/support/random-operations'
import { sampleLayout } from '../sync/support/sample-layout'

const sample = sampleLayout()
const set = (target: Target, field: string, value: unknown): Operation => ({
  type: 'set',
  target,
  field,
  value,
})
const hubA: Target = { kind: 'hub', id: 'A' }
const run: Target = { kind: 'loadCase', id: 'run' }

function applyOne(operation: Operation, document: LayoutDocument = sample) {
  const result = applyOperations(document, [operation])
  return { ...result, reason: result.dropped[0]?.reason ?? null }
}

/** A document somewhere on the way, and operations to try on it. */
const situation = fc.integer({ min: 0, max: 1e9 }).map((seed) => {
  const random = seededRandom(seed)
  let document = sample
  for (let step = 0; step < 8; step += 1) {
    document = applyOperations(document, randomOperations(document, random)).document
  }
  return { document, operations: [1, 2, 3].flatMap(() => randomOperations(document, random)) }
})

describe('operations', () => {
  it('D1 name targets by id and clamp positions to the list as it is', () => {
    const item = { id: 's9', lengthMm: 5, outerDiameterMm: 30, boreDiameterMm: 0, roughnessRzUm: 4 }
    const { document, applied } = applyOne({ type: 'add', collection: 'sections', index: 900, item })
    expect(document.shaft.sections.map(({ id }) => id)).toEqual(['s1', 's2', 's3', 's9'])
    expect(applied[0]).toMatchObject({ index: 3 })

    const moved = applyOne({ type: 'reorder', target: { kind: 'section', id: 's1' }, index: 900 })
    expect(moved.document.shaft.sections.map(({ id }) => id)).toEqual(['s2', 's3', 's1'])
    expect(applyOne({ type: 'reorder', target: { kind: 'section', id: 's1' }, index: 0 }).reason).toBe(
      'noChange',
    )
    expect(applyOne(set({ kind: 'hub', id: 'gone' }, 'lengthMm', 3)).reason).toBe('targetMissing')
  })

  it('D2 are pure and total, whatever can be parsed', () => {
    fc.assert(
      fc.property(situation, ({ document, operations }) => {
        const parsed = operations.map((operation) => operationSchema.parse(operation))
        const before = canonicalJson(document)
        const first = applyOperations(document, parsed)
        const second = applyOperations(document, parsed)
        expect(canonicalJson(document)).toBe(before)
        expect(canonicalJson(first)).toBe(canonicalJson(second))
        // And what comes out is a whole document again.
        expect(layoutDocumentSchema.safeParse(first.document).error).toBeUndefined()
        expect(checkReferences(first.document)).toEqual([])
      }),
      { numRuns: 300 },
    )
  })

  it('D3 set only fields of the schema, to values it takes', () => {
    const names = everyTarget(sample).flatMap((target) =>
      settableFieldNames(target.kind).map((name) => `${target.kind}.${name}`),
    )
    expect(new Set(names)).toContain('hub.joining.clearanceUm')
    expect(new Set(names)).toContain('loadCase.hubTemperaturesC.*')
    expect(new Set(names)).toContain('loadCase.criteria.slipSafety')
    for (const name of ['hub.id', 'section.id', 'load.id', 'timing.hub', 'shaft.sections', 'layout.hubs']) {
      expect(names).not.toContain(name)
    }
    const refused: [Target, string, unknown][] = [
      [hubA, 'id', 'Z'],
      [hubA, 'fit.hole', 'H8'],
      [hubA, 'material.yieldMPa', 300],
      [hubA, 'colour', 'red'],
      [hubA, 'constructor', 1],
      [hubA, 'joining.valueOf', 1],
      [hubA, 'lengthMm', -1],
      [hubA, 'lengthMm', '45'],
      [hubA, 'lengthMm', null],
      [hubA, 'fit', { kind: 'iso286', hole: 'h7', shaft: 'u6' }],
      [run, 'loads', []],
      [{ kind: 'layout' }, 'hubs', []],
    ]
    for (const [target, field, value] of refused) {
      expect([field, applyOne(set(target, field, value)).reason]).toEqual([field, 'invalidValue'])
    }
    const { document } = applyOne(set(hubA, 'joining.clearanceUm', 60))
    expect(document.hubs[0]?.joining).toEqual({
      method: 'heat-hub',
      side: 'left',
      ambientC: 20,
      clearanceUm: 60,
    })
    expect(document.hubs[1]).toBe(sample.hubs[1])
  })

  it('D4 clear a field by taking it away; null is never stored', () => {
    const cleared = applyOne(set(hubA, 'massKg', null)).document
    expect(Object.keys(cleared.hubs[0] ?? {})).not.toContain('massKg')
    expect(applyOne(set(hubA, 'massKg', null), cleared).reason).toBe('noChange')
    // A field with a default goes back to it.
    const bored = applyOne(set({ kind: 'section', id: 's1' }, 'boreDiameterMm', 10)).document
    expect(applyOne(set({ kind: 'section', id: 's1' }, 'boreDiameterMm', null), bored).document).toEqual(
      sample,
    )
    // The last own temperature takes the empty record with it.
    const cooler = applyOne(set(run, 'hubTemperaturesC.A', null)).document
    expect(Object.keys(cooler.loadCases[0] ?? {})).not.toContain('hubTemperaturesC')
    fc.assert(
      fc.property(situation, ({ document, operations }) => {
        expect(JSON.stringify(applyOperations(document, operations).document)).not.toContain('null')
      }),
      { numRuns: 100 },
    )
  })

  it('D5 keep ids unique', () => {
    const [hub] = sample.hubs
    const [bearing] = sample.bearings
    const [loadCase] = sample.loadCases
    if (!hub || !bearing || !loadCase) throw new Error('The sample is not what it was')
    const twice: Operation[] = [
      { type: 'add', collection: 'hubs', index: 0, item: hub },
      { type: 'add', collection: 'hubs', index: 0, item: { ...hub, id: 's1' } },
      { type: 'add', collection: 'bearings', index: 0, item: { ...bearing, id: 'A' } },
      { type: 'add', collection: 'loadCases', index: 0, item: loadCase },
      { type: 'add', collection: 'loads', loadCaseId: 'run', index: 0, item: loadCase.loads[0]! },
      { type: 'add', collection: 'timing', index: 0, item: { hub: 'B', phaseDeg: 1, toleranceDeg: 1 } },
    ]
    for (const operation of twice) expect(applyOne(operation).reason).toBe('duplicateId')
  })

  it('D6 a hub that goes takes along everything that names it, one by one', () => {
    const { document, applied } = applyOne({ type: 'remove', target: hubA })
    expect(applied.map((operation) => operation.type)).toEqual(['remove', 'remove', 'set', 'remove'])
    expect(applied.at(-1)).toMatchObject({ target: hubA, name: 'Pinion' })
    expect(document.loadCases.flatMap(({ loads }) => loads.map(({ hub }) => hub))).toEqual(['B'])
    expect(document.loadCases[0]?.hubTemperaturesC).toBeUndefined()
    expect(applyOperations(sample, removeHubOperations(sample, 'A')).document).toEqual(document)
    expect(applyOperations(sample, removeHubOperations(sample, 'B')).document.timing).toEqual([])
  })

  it('D7 nothing is added that names a missing hub or load case', () => {
    const load = { ...sample.loadCases[0]!.loads[0]!, id: 'load-9' }
    const missing: Operation[] = [
      { type: 'add', collection: 'loads', loadCaseId: 'run', index: 0, item: { ...load, hub: 'gone' } },
      { type: 'add', collection: 'loads', loadCaseId: 'gone', index: 0, item: load },
      { type: 'add', collection: 'timing', index: 0, item: { hub: 'gone', phaseDeg: 1, toleranceDeg: 1 } },
      set(run, 'hubTemperaturesC.gone', 50),
      set({ kind: 'load', loadCaseId: 'run', id: 'load-1' }, 'hub', 'gone'),
    ]
    for (const operation of missing) expect(applyOne(operation).reason).toBe('targetMissing')

    const withoutA = applyOne({ type: 'remove', target: hubA }).document
    const item = { ...sample.loadCases[0]!, id: 'run-2' }
    const restored = applyOne({ type: 'add', collection: 'loadCases', index: 0, item }, withoutA).document
    expect(restored.loadCases[0]?.loads.map(({ hub }) => hub)).toEqual(['B'])
    expect(restored.loadCases[0]?.hubTemperaturesC).toBeUndefined()
  })

  it('D8 what was applied gives the same result again', () => {
    fc.assert(
      fc.property(situation, ({ document, operations }) => {
        const { applied, document: after } = applyOperations(document, operations)
        const again = applyOperations(document, applied)
        expect(again.document).toEqual(after)
        expect(again.applied).toEqual(applied)
        expect(again.dropped).toEqual([])
      }),
      { numRuns: 300 },
    )
  })

  it('D9 the inverse gives back the document exactly', () => {
    fc.assert(
      fc.property(situation, ({ document, operations }) => {
        const after = applyOperations(document, operations).document
        const back = applyOperations(after, invertOperations(document, operations))
        expect(canonicalJson(back.document)).toBe(canonicalJson(document))
      }),
      { numRuns: 500 },
    )
  })

  it('D10 lists have a greatest length', () => {
    const hub = sample.hubs[0]!
    const hubs = Array.from({ length: LIST_LIMITS.hubs }, (_, at) => ({ ...hub, id: `h${at}` }))
    const full = { ...sample, hubs, loadCases: [], timing: [] }
    expect(applyOne({ type: 'add', collection: 'hubs', index: 0, item: hub }, full).reason).toBe(
      'invalidValue',
    )
    expect(layoutDocumentSchema.safeParse({ ...full, hubs: [...hubs, hub] }).success).toBe(false)
  })

  it('D11 neither numbers that are none nor hostile keys get in', () => {
    const hostile = JSON.parse('{"__proto__": 50}') as unknown
    const prototype = JSON.parse('{"__proto__": {"isAdmin": true}, "name": "x"}') as Record<string, unknown>
    const operations: Operation[] = [
      set(hubA, 'lengthMm', Number.NaN),
      set(hubA, 'lengthMm', Infinity),
      set(hubA, 'friction', { circumferential: NaN, axial: 0.1, pressing: 0.1 }),
      set(run, 'hubTemperaturesC', { A: NaN }),
      set(hubA, 'material', prototype),
      set(hubA, 'fit', { kind: 'limits', minInterferenceUm: 1, maxInterferenceUm: 2, extra: 1 }),
      { type: 'add', collection: 'hubs', index: 0, item: { ...sample.hubs[0]!, id: 'Z', lengthMm: NaN } },
      { type: 'add', collection: 'hubs', index: 0, item: { ...sample.hubs[0]!, id: '__proto__' } },
    ]
    for (const operation of operations) {
      const { reason, document } = applyOne(operation)
      expect([reason, document]).toEqual(['invalidValue', sample])
    }
    // A record leaves such a key out; what remains is an empty record.
    const emptied = applyOne(set(run, 'hubTemperaturesC', hostile)).document
    expect(emptied.loadCases[0]?.hubTemperaturesC).toBeUndefined()
    expect(({} as { isAdmin?: boolean }).isAdmin).toBeUndefined()
    expect(operationSchema.safeParse({ ...set(hubA, '__proto__', 1) }).success).toBe(false)
    expect(operationSchema.safeParse({ ...set(hubA, 'hubTemperaturesC.__proto__', 1) }).success).toBe(false)
    expect(settableField('loadCase', 'hubTemperaturesC.__proto__')).toBeNull()
  })
})
