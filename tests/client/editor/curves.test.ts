import { areaPath, curvePath, peakOf, valueAt, valueRange } from '@/features/editor/diagrams/diagram-series'
import {
  angleBetween,
  direction,
  forceAngleDeg,
  forceMarks,
  labelRows,
  phaseMarks,
} from '@/features/editor/end-view/end-view-geometry'
import { describe, expect, it } from 'vitest'
import { twoHubs } from './layouts'

describe('a curve with a jump', () => {
  const stationMm = [0, 70, 70, 130, 130, 200]
  const torqueNm = [0, 0, 100, 100, 0, 0]

  it('reads both sides of the jump and is linear between', () => {
    expect(valueAt(stationMm, torqueNm, 69.9)).toBeCloseTo(0, 9)
    expect(valueAt(stationMm, torqueNm, 70)).toBe(100)
    expect(valueAt(stationMm, torqueNm, 130)).toBe(0)
    expect(valueAt([0, 100], [0, 50], 30)).toBe(15)
  })

  it('has no value beyond the shaft', () => {
    expect(valueAt(stationMm, torqueNm, -0.1)).toBeNull()
    expect(valueAt(stationMm, torqueNm, 200.1)).toBeNull()
    expect(valueAt(stationMm, torqueNm, 200)).toBe(0)
    expect(valueAt([], [], 0)).toBeNull()
  })

  it('is drawn as a vertical stroke', () => {
    const path = curvePath(
      stationMm,
      torqueNm,
      (x) => x,
      (y) => -y,
    )
    expect(path).toContain('L70.00 0.00L70.00 -100.00')
  })

  it('is filled down to zero', () => {
    expect(
      areaPath(
        [0, 10],
        [5, 5],
        (x) => x,
        (y) => -y,
      ),
    ).toBe('M0.00 0.00L0.00 -5.00L10.00 -5.00L10.00 0.00Z')
  })

  it('has its peak where it is largest in size, sign kept', () => {
    expect(peakOf([0, 1, 2], [10, -30, 20])).toEqual({ stationMm: 1, value: -30 })
    expect(peakOf([0, 1], [0, 0])).toBeNull()
  })

  it('always shows zero and never divides by it', () => {
    expect(valueRange([{ name: '', values: [5, 9] }])).toEqual({ least: 0, most: 9 })
    expect(valueRange([{ name: '', values: [0, 0] }])).toEqual({ least: 0, most: 1 })
  })
})

describe('the end view', () => {
  it('turns clockwise from the left and anticlockwise from the right', () => {
    // A quarter turn from +y in the sense of rotation is +z, which is right seen from the left end.
    expect(direction(90, 'left').x).toBeCloseTo(1, 9)
    expect(direction(90, 'right').x).toBeCloseTo(-1, 9)
    expect(direction(0, 'left').y).toBeCloseTo(-1, 9)
    expect(direction(0, 'right').y).toBeCloseTo(-1, 9)
  })

  it('gives forces their angle from +y towards +z', () => {
    expect(forceAngleDeg(1, 0)).toBe(0)
    expect(forceAngleDeg(0, 1)).toBe(90)
    expect(forceAngleDeg(-1, 0)).toBe(180)
    expect(forceAngleDeg(0, -1)).toBe(270)
  })

  it('lists the forces of the case on screen', () => {
    expect(
      forceMarks(twoHubs(), 'run').map(({ hubId, angleDeg, forceN }) => [hubId, angleDeg, forceN]),
    ).toEqual([
      ['A', 180, 1_000],
      ['B', 180, 1_000],
    ])
    expect(forceMarks(twoHubs(), null)).toEqual([])
  })

  it('marks a lobe that is off its timing chart, across the full turn', () => {
    const document = twoHubs()
    document.hubs[0] = { ...document.hubs[0]!, role: 'cam', phaseDeg: 165 }
    document.timing = [{ hub: 'A', phaseDeg: 195, toleranceDeg: 1 }]
    expect(phaseMarks(document)[0]).toMatchObject({ phaseDeg: 165, requiredDeg: 195, isOff: true })
    document.timing = [{ hub: 'A', phaseDeg: 525, toleranceDeg: 1 }]
    expect(phaseMarks(document)[0]?.isOff).toBe(false)
  })

  it('turns the short way round', () => {
    expect(angleBetween(350, 10)).toBe(20)
    expect(angleBetween(10, 350)).toBe(-20)
  })

  it('moves the words of near angles outward, also across the top', () => {
    expect(labelRows([355, 5, 180], 24)).toEqual([0, 1, 0])
  })
})
