import { createNudger, nudgeStepMm } from '@/features/editor/actions/nudge'
import { useLayoutStore } from '@/stores/layout-store'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { openFakeLayout } from './fake-session'
import { twoHubs } from './layouts'

const visible = () => useLayoutStore.getState().visible!
const stationOfA = () => visible().hubs[0]?.stationMm

beforeEach(() => void vi.useFakeTimers())
afterEach(() => void vi.useRealTimers())

describe('arrow keys', () => {
  it('make one edit of quick presses, shown at once', () => {
    const session = openFakeLayout(twoHubs())
    const nudger = createNudger(session)
    for (let press = 1; press <= 10; press += 1) {
      nudger.nudge(visible(), ['A'], 1)
      expect(stationOfA()).toBe(50 + press)
    }
    expect(session.committed).toEqual([])
    vi.advanceTimersByTime(1_000)
    expect(session.committed).toEqual(['Move A'])
    expect(stationOfA()).toBe(60)
  })

  it('add tenths without dust', () => {
    const nudger = createNudger(openFakeLayout(twoHubs()))
    for (let press = 0; press < 3; press += 1) nudger.nudge(visible(), ['A'], 0.1)
    nudger.settle()
    expect(stationOfA()).toBe(50.3)
  })

  it('start a new edit for another selection', () => {
    const session = openFakeLayout(twoHubs())
    const nudger = createNudger(session)
    nudger.nudge(visible(), ['A'], 1)
    nudger.nudge(visible(), ['B'], 1)
    nudger.settle()
    expect(session.committed).toEqual(['Move A', 'Move B'])
    expect(visible().hubs.map(({ stationMm }) => stationMm)).toEqual([51, 111])
  })

  it('are put back by Escape', () => {
    const session = openFakeLayout(twoHubs())
    const nudger = createNudger(session)
    nudger.nudge(visible(), ['A'], 1)
    expect(nudger.cancel()).toBe(true)
    vi.advanceTimersByTime(1_000)
    expect(stationOfA()).toBe(50)
    expect(session.committed).toEqual([])
    expect(nudger.cancel()).toBe(false)
  })

  it('move the right step of a lone section', () => {
    const nudger = createNudger(openFakeLayout(twoHubs()))
    nudger.nudge(visible(), ['s1'], 1)
    nudger.settle()
    expect(visible().shaft.sections.map(({ lengthMm }) => lengthMm)).toEqual([41, 119, 40])
  })

  it('commit nothing when left and right cancel out', () => {
    const session = openFakeLayout(twoHubs())
    const nudger = createNudger(session)
    nudger.nudge(visible(), ['A'], 1)
    nudger.nudge(visible(), ['A'], -1)
    nudger.settle()
    expect(session.committed).toEqual([])
    expect(useLayoutStore.getState().preview).toBeNull()
  })

  it('go by 1 mm, 10 mm with Shift, 0.1 mm with Alt, and the grid when zoomed far out', () => {
    expect(nudgeStepMm({ shift: false, alt: false }, 0.5)).toBe(1)
    expect(nudgeStepMm({ shift: true, alt: false }, 0.5)).toBe(10)
    expect(nudgeStepMm({ shift: false, alt: true }, 0.5)).toBe(0.1)
    expect(nudgeStepMm({ shift: false, alt: false }, 3)).toBe(5)
  })
})
