import { selectTool } from '@/features/editor/tools/select-tool'
import { describe, expect, it } from 'vitest'
import { twoHubs } from './layouts'
import { after, commits, previews, takeUp } from './tool-driver-steps'

const hubOf = (document: ReturnType<typeof twoHubs>, id: string) =>
  document.hubs.find((hub) => hub.id === id)!
const stationOfLoad = (document: ReturnType<typeof twoHubs>, caseId: string, loadId: string) =>
  document.loadCases.find(({ id }) => id === caseId)!.loads.find(({ id }) => id === loadId)!.stationMm

describe('selecting', () => {
  it('selects the hub under the pointer, and nothing on empty paper', () => {
    const hand = takeUp(selectTool, twoHubs())
    hand.down(60, 35)
    hand.up(60, 35)
    expect(hand.context.selectedIds).toEqual(['A'])
    hand.down(60, 200)
    hand.up(60, 200)
    expect(hand.context.selectedIds).toEqual([])
  })

  it('selects the shaft section inside the hub', () => {
    const hand = takeUp(selectTool, twoHubs())
    hand.down(60, 10)
    hand.up(60, 10)
    expect(hand.context.selectedIds).toEqual(['s2'])
  })

  it('adds with Shift on release', () => {
    const hand = takeUp(selectTool, twoHubs(), { selectedIds: ['A'] })
    hand.down(130, 35, { shift: true })
    expect(hand.effects).toEqual([])
    hand.up(130, 35, { shift: true })
    expect(hand.effects).toEqual([{ type: 'toggle', id: 'B' }])
  })

  it('reduces several to the one that is clicked', () => {
    const hand = takeUp(selectTool, twoHubs(), { selectedIds: ['A', 'B'] })
    hand.down(130, 35)
    hand.up(130, 35)
    expect(hand.context.selectedIds).toEqual(['B'])
  })

  it('selects what lies whole in a rectangle drawn from empty paper', () => {
    const hand = takeUp(selectTool, twoHubs())
    hand.down(45, 80)
    hand.move(120, 20)
    hand.up(155, 20)
    expect(hand.context.selectedIds).toEqual(['A', 'B'])
  })
})

describe('moving along the shaft', () => {
  it('previews on every move and commits once on release', () => {
    const document = twoHubs()
    const hand = takeUp(selectTool, document)
    hand.down(60, 35)
    hand.move(62, 35)
    hand.move(64, 35)
    hand.move(66, 35)
    hand.up(66, 35)
    expect(previews(hand.effects).length).toBe(3)
    const [commit, ...more] = commits(hand.effects)
    expect(more).toEqual([])
    expect(commit?.label).toBe('Move A')
    expect(hubOf(after(document, commit?.operations), 'A').stationMm).toBe(56)
  })

  it('takes the loads of the hub along in every load case, and leaves those of others', () => {
    const document = twoHubs()
    const hand = takeUp(selectTool, document)
    hand.down(60, 35)
    hand.move(66, 35)
    hand.up(66, 35)
    const moved = after(document, commits(hand.effects)[0]?.operations)
    expect(stationOfLoad(moved, 'run', 'run-A')).toBe(76)
    expect(stationOfLoad(moved, 'start', 'start-A')).toBe(76)
    expect(stationOfLoad(moved, 'run', 'run-B')).toBe(130)
  })

  it('leaves the abutment with its shoulder', () => {
    const document = twoHubs()
    const hand = takeUp(selectTool, document)
    hand.down(60, 35)
    hand.move(66, 35)
    hand.up(66, 35)
    expect(hubOf(after(document, commits(hand.effects)[0]?.operations), 'A').abutmentStationMm).toBe(40)
  })

  it('rests on whole millimetres', () => {
    const document = twoHubs()
    const hand = takeUp(selectTool, document)
    hand.down(60, 35)
    hand.move(65.4, 35)
    hand.up(65.4, 35)
    expect(hubOf(after(document, commits(hand.effects)[0]?.operations), 'A').stationMm).toBe(55)
  })

  it('is pulled to the step of the shaft and says so', () => {
    const document = twoHubs()
    const hand = takeUp(selectTool, document)
    hand.down(60, 35)
    hand.move(52.5, 35)
    expect(selectTool.display(hand.state()).guides).toEqual([{ stationMm: 40, kind: 'section step' }])
    hand.up(52.5, 35)
    expect(hubOf(after(document, commits(hand.effects)[0]?.operations), 'A').stationMm).toBe(40)
  })

  it('gives the free value under Alt, without guides', () => {
    const document = twoHubs()
    const hand = takeUp(selectTool, document)
    hand.down(60, 35)
    hand.move(52.37, 35, { alt: true })
    expect(selectTool.display(hand.state()).guides).toEqual([])
    hand.up(52.37, 35, { alt: true })
    expect(hubOf(after(document, commits(hand.effects)[0]?.operations), 'A').stationMm).toBe(42.37)
  })

  it('acts on Alt pressed in the middle of a drag', () => {
    const hand = takeUp(selectTool, twoHubs())
    hand.down(60, 35)
    hand.move(65.4, 35)
    hand.move(65.4, 35, { alt: true })
    const values = previews(hand.effects).map(({ operations }) => operations[0])
    expect(values[0]).toMatchObject({ field: 'stationMm', value: 55 })
    expect(values[1]).toMatchObject({ field: 'stationMm', value: 55.4 })
  })

  it('puts everything back on Escape and does not commit on the release after it', () => {
    const hand = takeUp(selectTool, twoHubs())
    hand.down(60, 35)
    hand.move(70, 35)
    expect(hand.cancel()).toEqual([{ type: 'dropPreview' }])
    hand.up(70, 35)
    expect(commits(hand.effects)).toEqual([])
  })

  it('commits nothing when the part comes back to where it was', () => {
    const hand = takeUp(selectTool, twoHubs())
    hand.down(60, 35)
    hand.move(70, 35)
    hand.move(60.2, 35)
    expect(hand.up(60.2, 35)).toEqual([{ type: 'dropPreview' }])
  })

  it('counts a shake below the threshold as a click', () => {
    const hand = takeUp(selectTool, twoHubs())
    hand.down(60, 35)
    hand.move(61, 35)
    hand.up(61, 35)
    expect(previews(hand.effects)).toEqual([])
    expect(commits(hand.effects)).toEqual([])
  })

  it('moves all selected parts by one shift, in one edit', () => {
    const document = twoHubs()
    const hand = takeUp(selectTool, document, { selectedIds: ['A', 'B', 's2'] })
    hand.down(60, 35)
    hand.move(65, 35)
    hand.up(65, 35)
    const [commit] = commits(hand.effects)
    const moved = after(document, commit?.operations)
    expect(commit?.label).toBe('Move 2 parts')
    expect(moved.hubs.map((hub) => hub.stationMm)).toEqual([55, 115])
    expect(moved.shaft).toBe(document.shaft)
  })

  it('only looks when the person may not edit', () => {
    const hand = takeUp(selectTool, twoHubs(), { canEdit: false })
    hand.down(60, 35)
    hand.move(80, 35)
    hand.up(80, 35)
    expect(previews(hand.effects)).toEqual([])
    expect(commits(hand.effects)).toEqual([])
  })
})

describe('a finger', () => {
  it('scrolls the drawing from a part that is not selected', () => {
    const hand = takeUp(selectTool, twoHubs(), { isTouch: true })
    hand.down(60, 35)
    hand.move(80, 35)
    expect(hand.effects.at(-1)).toEqual({ type: 'pan', dxPx: 40, dyPx: 0 })
    hand.up(80, 35)
    expect(commits(hand.effects)).toEqual([])
  })

  it('moves a part that is selected', () => {
    const hand = takeUp(selectTool, twoHubs(), { isTouch: true, selectedIds: ['A'] })
    hand.down(60, 35)
    hand.move(66, 35)
    hand.up(66, 35)
    expect(commits(hand.effects).length).toBe(1)
  })
})

describe('a load', () => {
  it('moves along its hub and is pulled to the middle', () => {
    const document = twoHubs()
    const hand = takeUp(selectTool, document)
    // Hub A has radius 45, its load stands below it.
    hand.down(70, -48)
    hand.move(78, -48)
    hand.move(71, -48)
    expect(hand.effects.at(-1)).toEqual({ type: 'dropPreview' })
    hand.move(78, -48)
    hand.up(78, -48)
    const moved = after(document, commits(hand.effects)[0]?.operations)
    expect(stationOfLoad(moved, 'run', 'run-A')).toBe(78)
    expect(stationOfLoad(moved, 'start', 'start-A')).toBe(70)
  })
})
