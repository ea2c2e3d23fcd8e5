import { bearingTool } from '@/features/editor/tools/bearing-tool'
import { hubTool } from '@/features/editor/tools/hub-tool'
import { loadTool } from '@/features/editor/tools/load-tool'
import { measureTool } from '@/features/editor/tools/measure-tool'
import { panTool } from '@/features/editor/tools/pan-tool'
import { sectionTool } from '@/features/editor/tools/section-tool'
import { layoutDocumentSchema } from '@shared/layout/layout-document'
import { describe, expect, it } from 'vitest'
import { twoHubs } from './layouts'
import { after, commits, takeUp } from './tool-driver-steps'

const empty = () => ({ ...twoHubs(), hubs: [], bearings: [], loadCases: [], timing: [] })

describe('the hub tool', () => {
  it('shows where a click would put a hub, and puts it there', () => {
    const document = empty()
    const hand = takeUp(hubTool, document, { hubRole: 'cam' })
    hand.move(90, 30)
    expect(hubTool.display(hand.state()).placement).toMatchObject({
      leftMm: 70,
      rightMm: 110,
      innerRadiusMm: 25,
    })
    hand.down(90, 30)
    hand.up(90, 30)
    const result = after(document, commits(hand.effects)[0]?.operations)
    expect(result.hubs[0]).toMatchObject({
      name: 'Cam 1',
      role: 'cam',
      stationMm: 70,
      lengthMm: 40,
      phaseDeg: 0,
    })
    expect(layoutDocumentSchema.safeParse(result).success).toBe(true)
    expect(hand.effects.slice(-2)).toEqual([
      { type: 'select', ids: [result.hubs[0]?.id] },
      { type: 'finish' },
    ])
  })

  it('draws the length with a drag, pulled to the step', () => {
    const document = empty()
    const hand = takeUp(hubTool, document)
    hand.down(80, 30)
    hand.move(41, 30)
    hand.up(41, 30)
    const result = after(document, commits(hand.effects)[0]?.operations)
    expect(result.hubs[0]).toMatchObject({ stationMm: 40, lengthMm: 40 })
  })

  it('gives up the drag on Escape, and the tool on the next', () => {
    const hand = takeUp(hubTool, empty())
    hand.down(80, 30)
    hand.move(60, 30)
    expect(hand.cancel()).toEqual([])
    hand.up(60, 30)
    expect(commits(hand.effects)).toEqual([])
    expect(hand.cancel()).toEqual([{ type: 'finish' }])
  })
})

describe('the bearing tool', () => {
  it('makes the first bearing locating and the next floating, named by letters', () => {
    const document = empty()
    const hand = takeUp(bearingTool, document)
    hand.down(15, 20)
    hand.up(15, 20)
    const one = after(document, commits(hand.effects)[0]?.operations)
    const next = takeUp(bearingTool, one, { newPartId: () => 'bearing-second' })
    next.down(185, 20)
    next.up(185, 20)
    const two = after(one, commits(next.effects)[0]?.operations)
    expect(two.bearings.map(({ name, kind, widthMm }) => [name, kind, widthMm])).toEqual([
      ['A', 'locating', 16],
      ['B', 'floating', 16],
    ])
  })
})

describe('the section tool', () => {
  const lengths = (document: ReturnType<typeof twoHubs>) =>
    document.shaft.sections.map((section) => [section.lengthMm, section.outerDiameterMm])

  it('splits the section under a click; nothing else changes', () => {
    const document = twoHubs()
    const hand = takeUp(sectionTool, document)
    hand.down(100, 10)
    hand.up(100, 10)
    const result = after(document, commits(hand.effects)[0]?.operations)
    expect(lengths(result)).toEqual([
      [40, 40],
      [60, 50],
      [60, 50],
      [40, 40],
    ])
    expect(result.hubs).toBe(document.hubs)
  })

  it('turns a dragged stretch into a collar with the diameter under the pointer', () => {
    const document = twoHubs()
    const hand = takeUp(sectionTool, document)
    hand.down(92, 10)
    hand.move(108, 35)
    hand.up(108, 35)
    expect(lengths(after(document, commits(hand.effects)[0]?.operations))).toEqual([
      [40, 40],
      [50, 50],
      [20, 70],
      [50, 50],
      [40, 40],
    ])
  })

  it('adds a new end right of the shaft', () => {
    const document = twoHubs()
    const hand = takeUp(sectionTool, document)
    hand.down(205, 10)
    hand.up(205, 10)
    expect(lengths(after(document, commits(hand.effects)[0]?.operations)).at(-1)).toEqual([40, 40])
  })

  it('replaces the whole section when the drag covers it', () => {
    const document = twoHubs()
    const hand = takeUp(sectionTool, document)
    hand.down(3, 10)
    hand.move(40, 30)
    hand.up(40, 30)
    const result = after(document, commits(hand.effects)[0]?.operations)
    expect(lengths(result)).toEqual([
      [5, 40],
      [35, 60],
      [120, 50],
      [40, 40],
    ])
  })

  it('does not split a section into nothing', () => {
    const hand = takeUp(sectionTool, twoHubs())
    hand.down(40.1, 10)
    hand.up(40.1, 10)
    expect(commits(hand.effects)).toEqual([])
  })
})

describe('the load tool', () => {
  it('puts 1 kN downwards on the middle of the hub, into the load case on screen', () => {
    const document = twoHubs()
    const hand = takeUp(loadTool, document, { loadCaseId: 'start' })
    hand.down(71, 10)
    hand.up(71, 10)
    const result = after(document, commits(hand.effects)[0]?.operations)
    expect(result.loadCases[1]?.loads.at(-1)).toMatchObject({ hub: 'A', stationMm: 70, forceYN: -1_000 })
    expect(result.loadCases[0]).toBe(document.loadCases[0])
  })

  it('sets the force with the drag, upwards positive', () => {
    const document = twoHubs()
    const hand = takeUp(loadTool, document)
    hand.down(70, 0)
    hand.move(70, 20)
    hand.up(70, 20)
    // 20 mm at 2 px a mm are 40 px of 50 N each.
    expect(after(document, commits(hand.effects)[0]?.operations).loadCases[0]?.loads.at(-1)?.forceYN).toBe(
      2_000,
    )
  })

  it('makes the first load case in the same edit', () => {
    const document = { ...twoHubs(), loadCases: [] }
    const hand = takeUp(loadTool, document, { loadCaseId: null })
    hand.down(70, 0)
    hand.up(70, 0)
    expect(commits(hand.effects).length).toBe(1)
    expect(after(document, commits(hand.effects)[0]?.operations).loadCases[0]?.loads.length).toBe(1)
  })

  it('refuses a place without a hub', () => {
    const hand = takeUp(loadTool, twoHubs())
    hand.down(100, 0)
    hand.up(100, 0)
    expect(commits(hand.effects)).toEqual([])
    expect(loadTool.display(hand.state()).cursor).toBe('not-allowed')
  })
})

describe('the reading tools', () => {
  it('measure between faces and keep the result on screen', () => {
    const hand = takeUp(measureTool, twoHubs())
    hand.down(39, 0)
    hand.move(100, 0)
    hand.up(108, 0)
    expect(measureTool.display(hand.state()).measure).toEqual({ fromMm: 40, toMm: 110 })
    expect(hand.effects).toEqual([])
  })

  it('pan by what the pointer travels', () => {
    const hand = takeUp(panTool, twoHubs())
    hand.down(10, 10)
    hand.move(15, 8)
    expect(hand.effects).toEqual([{ type: 'pan', dxPx: 10, dyPx: 4 }])
  })
})
