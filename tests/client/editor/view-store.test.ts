import { useViewStore } from '@/features/editor/view-store'
import { heightToPx, stationToPx } from '@/lib/view-transform'
import { beforeEach, describe, expect, it } from 'vitest'

const store = () => useViewStore.getState()
const right = () => stationToPx(store().view, store().bounds?.rightMm ?? 0)

beforeEach(() => {
  useViewStore.setState({ isWhole: true, bounds: null, widthPx: 0, heightPx: 0 })
  store().resize(1_000, 400)
  store().setBounds({ leftMm: 0, rightMm: 400, radiusMm: 40 })
})

describe('the part of the layout on screen', () => {
  it('is the whole shaft at first, whichever of size and shaft comes first', () => {
    const view = store().view
    useViewStore.setState({ isWhole: true, bounds: null, widthPx: 0, heightPx: 0 })
    store().setBounds({ leftMm: 0, rightMm: 400, radiusMm: 40 })
    store().resize(1_000, 400)
    expect(store().view).toEqual(view)
    expect(right()).toBeLessThanOrEqual(1_000)
  })

  it('stays the whole shaft when the region is resized', () => {
    store().resize(700, 300)
    expect(right()).toBeLessThanOrEqual(700)
    expect(heightToPx(store().view, -40)).toBeLessThanOrEqual(300)
  })

  it('does not move under the hand while the shaft still fits', () => {
    const view = store().view
    store().setBounds({ leftMm: 0, rightMm: 402, radiusMm: 40 })
    expect(store().view).toBe(view)
  })

  it('grows with a shaft that leaves it', () => {
    store().setBounds({ leftMm: 0, rightMm: 900, radiusMm: 40 })
    expect(right()).toBeLessThanOrEqual(1_000)
  })

  it("is a person's own once they zoomed, until they ask for the whole", () => {
    store().zoom(3, 200, 200)
    const view = store().view
    store().setBounds({ leftMm: 0, rightMm: 900, radiusMm: 40 })
    expect(store().view).toBe(view)
    store().showWhole()
    expect(right()).toBeLessThanOrEqual(1_000)
  })

  it('moves just enough to show a part that is out of sight', () => {
    store().zoom(4, 0, 200)
    store().reveal(380, 400)
    expect(right()).toBeLessThanOrEqual(1_000)
    const { view } = store()
    store().reveal(390, 400)
    expect(store().view).toEqual(view)
    store().reveal(0, 20)
    expect(stationToPx(store().view, 0)).toBeGreaterThanOrEqual(0)
  })
})
