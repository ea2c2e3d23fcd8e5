import { describe, expect, it } from 'vitest'
import {
  placeLabels,
  windowGeometry,
  windowScale,
  windowSentence,
  windowState,
  windowStateWords,
  type WindowValues,
} from '@shared/drawing/interference-window-geometry'

const VALUES: WindowValues = {
  minUm: 57,
  maxUm: 106,
  requiredUm: 40,
  requiredCause: 'slips below in Running (safety 1.5 asked)',
  permissibleUm: 130,
  permissibleCause: 'hub yields above at rest (safety 1.2 asked)',
  isEmpty: false,
}
const SCALE = { fromUm: 0, toUm: 200, ticksUm: [0, 50, 100, 150, 200] }
const of = (change: Partial<WindowValues>) => ({ ...VALUES, ...change })

describe('state of a window', () => {
  it.each<[string, Partial<WindowValues>, string]>([
    ['inside', {}, 'Inside window'],
    ['inside', { requiredUm: 57, permissibleUm: 106 }, 'Inside window'],
    ['slips', { requiredUm: 61 }, 'Slips'],
    ['slips', { requiredUm: 61, requiredCause: 'comes loose below in Running' }, 'Comes loose'],
    ['yields', { permissibleUm: 105 }, 'Yields'],
    [
      'yields',
      { permissibleUm: 105, permissibleCause: 'overheats above: the oven would have to be hotter' },
      'Overheats',
    ],
    ['yields', { permissibleUm: 105, permissibleCause: 'hub cracks above in Running' }, 'Cracks'],
    [
      'yields',
      { permissibleUm: 105, permissibleCause: 'cannot be joined above: the shaft' },
      'Cannot be joined',
    ],
    ['slipsAndYields', { requiredUm: 61, permissibleUm: 105 }, 'Slips and yields'],
    ['empty', { requiredUm: 150, isEmpty: true }, 'Window is empty'],
    ['unknown', { requiredUm: null, permissibleUm: null }, 'Not computed'],
    ['unknown', { minUm: null }, 'Not computed'],
  ])('%s with %o', (state, change, words) => {
    expect(windowState(of(change))).toBe(state)
    expect(windowStateWords(of(change))).toBe(words)
  })
})

describe('where things lie', () => {
  it('draws zones, window and bar to one scale', () => {
    expect(windowGeometry(VALUES, SCALE, 100)).toMatchObject({
      slipZone: { from: 0, to: 20 },
      window: { from: 20, to: 65 },
      yieldZone: { from: 65, to: 100 },
      bar: { from: 28.5, to: 53 },
      barBelow: null,
      barAbove: null,
      gap: null,
    })
  })

  it('tells the part of the bar outside on either side', () => {
    const { barBelow, barAbove } = windowGeometry(of({ requiredUm: 70, permissibleUm: 90 }), SCALE, 100)
    expect(barBelow).toEqual({ from: 28.5, to: 35 })
    expect(barAbove).toEqual({ from: 45, to: 53 })
  })

  it('keeps a bar wholly outside in one piece', () => {
    expect(windowGeometry(of({ requiredUm: 120 }), SCALE, 100).barBelow).toEqual({ from: 28.5, to: 53 })
  })

  it('draws an empty window as a gap between crossed marks and as no window', () => {
    const geometry = windowGeometry(of({ requiredUm: 150, permissibleUm: 110, isEmpty: true }), SCALE, 100)
    expect(geometry).toMatchObject({ state: 'empty', window: null, gap: { from: 55, to: 75 } })
  })

  it('keeps what lies beyond the scale on its edge, and marks zero when the scale begins below', () => {
    const below = { fromUm: -50, toUm: 50, ticksUm: [] }
    expect(windowGeometry(of({ minUm: -20, maxUm: 90 }), below, 100)).toMatchObject({
      bar: { from: 30, to: 100 },
      zeroMark: 50,
    })
  })
})

describe('scale', () => {
  it('holds every value with room, from zero, on round ticks', () => {
    const scale = windowScale([VALUES, of({ permissibleUm: 172 })])
    expect(scale).toEqual({ fromUm: 0, toUm: 200, ticksUm: [0, 50, 100, 150, 200] })
  })

  it('begins below zero when something lies there', () => {
    const scale = windowScale([of({ minUm: -18 })])
    expect(scale.fromUm).toBeLessThan(-18)
    expect(scale.ticksUm).toContain(0)
  })

  it('has round ticks in thousandths of an inch too', () => {
    const { ticksUm } = windowScale([VALUES], 25.4)
    expect(ticksUm).toEqual([0, 50.8, 101.6, 152.4])
  })

  it('survives having nothing to show', () => {
    const scale = windowScale([of({ minUm: null, maxUm: null, requiredUm: null, permissibleUm: null })])
    expect(scale.toUm).toBeGreaterThan(scale.fromUm)
  })
})

describe('labels and words', () => {
  it('keeps labels inside and puts those that would touch on the next row', () => {
    expect(
      placeLabels(
        [
          { at: 2, width: 20 },
          { at: 15, width: 20 },
          { at: 99, width: 30 },
        ],
        100,
      ),
    ).toEqual([
      { at: 10, row: 0 },
      { at: 15, row: 1 },
      { at: 85, row: 0 },
    ])
  })

  it('says the whole drawing in one sentence', () => {
    expect(windowSentence(of({ requiredUm: 61 }))).toBe(
      'Slips. Made with 57 to 106 µm of interference. It needs at least 61 µm – slips below in Running (safety 1.5 asked) – and may have at most 130 µm – hub yields above at rest (safety 1.2 asked) –.',
    )
  })
})
