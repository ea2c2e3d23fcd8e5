import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { spreadLabels } from '@shared/drawing/spread-labels'

const label = fc.record({
  centre: fc.double({ min: -20, max: 120, noNaN: true }),
  size: fc.double({ min: 0.5, max: 12, noNaN: true }),
})

describe('spreadLabels', () => {
  it('leaves labels that do not touch where they want to be', () => {
    const centres = spreadLabels(
      [
        { centre: 10, size: 4 },
        { centre: 30, size: 4 },
      ],
      { from: 0, to: 100 },
      1,
    )
    expect(centres).toEqual([10, 30])
  })

  it('moves two that touch apart by the same distance', () => {
    expect(
      spreadLabels(
        [
          { centre: 50, size: 4 },
          { centre: 52, size: 4 },
        ],
        { from: 0, to: 100 },
        1,
      ),
    ).toEqual([48.5, 53.5])
  })

  it('gives up when the line is too short', () => {
    expect(spreadLabels([{ centre: 5, size: 11 }], { from: 0, to: 10 }, 0)).toBeNull()
  })

  it('property: nothing overlaps, nothing leaves the line, nobody overtakes', () => {
    fc.assert(
      fc.property(fc.array(label, { maxLength: 12 }), (labels) => {
        const gap = 0.5
        const centres = spreadLabels(labels, { from: 0, to: 100 }, gap)
        const total = labels.reduce((sum, each) => sum + each.size, 0) + gap * Math.max(0, labels.length - 1)
        if (total > 100) {
          expect(centres).toBeNull()
          return
        }
        const placed = labels
          .map((each, index) => ({ ...each, at: centres?.[index] ?? Number.NaN, index }))
          .sort((one, other) => one.centre - other.centre || one.index - other.index)
        placed.forEach((each, index) => {
          expect(each.at - each.size / 2).toBeGreaterThanOrEqual(-1e-6)
          expect(each.at + each.size / 2).toBeLessThanOrEqual(100 + 1e-6)
          const next = placed[index + 1]
          if (next)
            expect(next.at - next.size / 2 - (each.at + each.size / 2)).toBeGreaterThanOrEqual(gap - 1e-6)
        })
      }),
    )
  })
})
