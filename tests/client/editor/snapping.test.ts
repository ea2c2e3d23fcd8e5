import { gridStepMm, snapShift, snapStation, snapTargets } from '@/features/editor/tools/snapping'
import { describe, expect, it } from 'vitest'
import { twoHubs } from './layouts'

const near = { mmPerPx: 0.5, isFree: false }

describe('what a face may rest on', () => {
  it('ends, steps, faces of other hubs, edges of bearings', () => {
    expect(snapTargets(twoHubs(), ['A'])).toEqual([
      { stationMm: 0, kind: 'shaft end' },
      { stationMm: 40, kind: 'section step' },
      { stationMm: 160, kind: 'section step' },
      { stationMm: 200, kind: 'shaft end' },
      { stationMm: 110, kind: 'hub face' },
      { stationMm: 150, kind: 'hub face' },
      { stationMm: 5, kind: 'bearing edge' },
      { stationMm: 25, kind: 'bearing edge' },
      { stationMm: 175, kind: 'bearing edge' },
      { stationMm: 195, kind: 'bearing edge' },
    ])
  })
})

describe('the pull', () => {
  const targets = snapTargets(twoHubs(), ['A'])

  it('takes the nearest of all faces that move: here the right face', () => {
    // From 50..90 by 18.6: left face 68.6, right face 108.6, which is 1.4 from hub B.
    expect(snapShift(targets, [50, 90], 18.6, near)).toEqual({
      deltaMm: 20,
      guides: [{ stationMm: 110, kind: 'hub face' }],
    })
  })

  it('shows every face that comes to rest at once', () => {
    const both = [
      { stationMm: 40, kind: 'section step' as const },
      { stationMm: 80, kind: 'hub face' as const },
    ]
    expect(snapShift(both, [50, 90], -9, near).guides).toEqual(both)
  })

  it('reaches as far on screen at every zoom', () => {
    expect(snapStation(targets, 43, { ...near, mmPerPx: 0.5 }).stationMm).toBe(40)
    expect(snapStation(targets, 43, { ...near, mmPerPx: 0.25 }).stationMm).toBe(43)
  })

  it('leaves no dust of decimals', () => {
    expect(snapStation([{ stationMm: 0.1 + 0.2, kind: 'hub face' }], 0.29, near).stationMm).toBe(0.3)
  })

  it('does nothing under a free hand', () => {
    expect(snapStation(targets, 40.123, { ...near, isFree: true })).toEqual({ stationMm: 40.123, guides: [] })
  })
})

describe('the grid', () => {
  it.each([
    [0.01, 0.1],
    [0.05, 0.5],
    [0.5, 1],
    [1.2, 1],
    [3, 5],
    [8, 10],
  ])('at %f mm a pixel is %f mm', (mmPerPx, stepMm) => {
    expect(gridStepMm(mmPerPx)).toBe(stepMm)
  })
})
