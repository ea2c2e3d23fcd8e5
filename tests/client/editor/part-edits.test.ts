import {
  copyParts,
  duplicateOperations,
  flipSideOperations,
  pasteOperations,
  removePartsOperations,
} from '@/features/editor/tools/part-edits'
import { layoutDocumentSchema } from '@shared/layout/layout-document'
import { describe, expect, it } from 'vitest'
import { twoHubs } from './layouts'
import { after } from './tool-driver-steps'

const ids = () => {
  let count = 0
  return (prefix: string) => `${prefix}-new-${++count}`
}

describe('removing', () => {
  it('takes the loads and the timing of a hub along', () => {
    const document = twoHubs()
    const result = after(document, removePartsOperations(document, ['A']))
    expect(result.hubs.map(({ id }) => id)).toEqual(['B'])
    expect(result.loadCases.map(({ loads }) => loads.map(({ id }) => id))).toEqual([['run-B'], ['start-B']])
    expect(result.timing).toEqual([])
  })

  it('closes the shaft where a section goes, with all that lies right of it', () => {
    const document = twoHubs()
    const result = after(document, removePartsOperations(document, ['s1']))
    expect(result.shaft.sections.map(({ id }) => id)).toEqual(['s2', 's3'])
    expect(result.hubs.map(({ stationMm }) => stationMm)).toEqual([10, 70])
    expect(result.bearings.map(({ stationMm }) => stationMm)).toEqual([15, 145])
    expect(result.loadCases[0]?.loads.map(({ stationMm }) => stationMm)).toEqual([30, 90])
  })

  it('removes several sections in one go, each gap once', () => {
    const document = twoHubs()
    const result = after(document, removePartsOperations(document, ['s1', 's2']))
    expect(result.shaft.sections.map(({ id }) => id)).toEqual(['s3'])
    expect(result.bearings[1]?.stationMm).toBe(25)
  })
})

describe('duplicating', () => {
  it('puts the copy clear of the original, without its loads and its shoulder', () => {
    const document = twoHubs()
    const { operations, ids: newIds } = duplicateOperations(document, ['A'], ids())
    const result = after(document, operations)
    expect(result.hubs.at(-1)).toMatchObject({ id: newIds[0], name: 'A 2', stationMm: 95, lengthMm: 40 })
    expect(result.hubs.at(-1)?.abutmentStationMm ?? null).toBeNull()
    expect(result.loadCases).toBe(document.loadCases)
    expect(layoutDocumentSchema.safeParse(result).success).toBe(true)
  })

  it('counts on from a name that has a number', () => {
    const document = twoHubs()
    document.hubs[0] = { ...document.hubs[0]!, name: 'Gear 2' }
    document.hubs[1] = { ...document.hubs[1]!, name: 'Gear 3' }
    expect(after(document, duplicateOperations(document, ['A'], ids()).operations).hubs.at(-1)?.name).toBe(
      'Gear 4',
    )
  })

  it('repeats a section and moves what lies right of it', () => {
    const document = twoHubs()
    const result = after(document, duplicateOperations(document, ['s1'], ids()).operations)
    expect(result.shaft.sections.map(({ lengthMm }) => lengthMm)).toEqual([40, 40, 120, 40])
    expect(result.hubs.map(({ stationMm }) => stationMm)).toEqual([90, 150])
    expect(result.bearings[0]?.stationMm).toBe(15)
  })
})

describe('copy and paste', () => {
  it('keeps the distances between the parts', () => {
    const document = twoHubs()
    const { operations } = pasteOperations(document, copyParts(document, ['A', 'B']), 10, ids())
    expect(after(document, operations).hubs.map(({ stationMm }) => stationMm)).toEqual([50, 110, 10, 70])
  })

  it('keeps the name where it is free, as in another layout', () => {
    const source = twoHubs()
    const target = { ...twoHubs(), hubs: [], loadCases: [], timing: [] }
    const { operations } = pasteOperations(target, copyParts(source, ['A']), null, ids())
    expect(after(target, operations).hubs[0]?.name).toBe('A')
  })
})

describe('flipping the joining side', () => {
  it('turns hubs and threaded bearings, and leaves split ones', () => {
    const document = twoHubs()
    const result = after(document, flipSideOperations(document, ['A', 'L', 'R']))
    expect(result.hubs[0]?.joining.side).toBe('right')
    expect(result.bearings.map(({ side }) => side)).toEqual([undefined, 'left'])
  })
})
