import { describe, expect, it } from 'vitest'
import {
  faceStations,
  seatUnder,
  sectionAt,
  shoulderStations,
  totalLengthMm,
} from '@shared/layout/shaft-geometry'
import { sampleLayout } from '../sync/support/sample-layout'

const document = sampleLayout() // sections end at 60, 140 and 180 mm

describe('shaft geometry', () => {
  it('adds up', () => {
    expect(totalLengthMm(document)).toBe(180)
    expect(shoulderStations(document)).toEqual([60, 140])
  })

  it.each([
    [-0.1, null],
    [0, 's1'],
    [59.9, 's1'],
    [60, 's2'],
    [140, 's3'],
    [180, 's3'],
    [180.1, null],
  ])('finds the section at %s mm', (stationMm, id) => {
    expect(sectionAt(document, stationMm)?.section.id ?? null).toBe(id)
  })

  it.each([
    [10, 45, 's1', true],
    [30, 60, 's1', false], // 30 mm on each: the left one carries it
    [35, 60, 's2', false],
    [-20, 30, 's1', false],
    [140, 40, 's3', true],
    [200, 20, null, false],
  ])('seats a hub at %s mm of %s mm length', (stationMm, lengthMm, id, isWholeHub) => {
    const seat = seatUnder(document, { stationMm, lengthMm })
    expect(seat?.span.section.id ?? null).toBe(id)
    if (seat) expect(seat.isWholeHub).toBe(isWholeHub)
  })

  it('takes sums of lengths for what they mean', () => {
    const sections = [0.1, 0.2, 0.3].map((lengthMm, at) => ({
      ...document.shaft.sections[0]!,
      id: `t${at}`,
      lengthMm,
    }))
    const fine = { ...document, shaft: { ...document.shaft, sections } }
    expect(sectionAt(fine, 0.6)?.section.id).toBe('t2')
    expect(seatUnder(fine, { stationMm: 0.3, lengthMm: 0.3 })).toMatchObject({ isWholeHub: true })
  })

  it('lists the faces a part may snap to, without its own', () => {
    expect(faceStations(document, 'A')).toEqual([0, 8, 60, 80, 120, 140, 166, 174, 180])
    expect(faceStations(document)).toContain(55)
  })
})
