import { describe, expect, it } from 'vitest'
import { demoLayouts } from '@server/demo/layout-data'
import { halfSection } from '@shared/drawing/half-section-geometry'
import { standardScale } from '@shared/drawing/standard-scale'

describe('halfSection', () => {
  it('outlines the shaft from axis to axis, with each step at its station', () => {
    for (const { document } of demoLayouts()) {
      const section = halfSection(document)
      expect(section.outline[0]).toEqual({ x: 0, y: 0 })
      expect(section.outline.at(-1)).toEqual({ x: section.lengthMm, y: 0 })
      for (const part of section.sections) {
        const radii = section.outline
          .filter((point) => point.x > part.fromMm + 1e-9 && point.x < part.toMm - 1e-9)
          .map((point) => point.y)
        // Between its faces a section is at its radius, but for the fillets at its ends.
        for (const radius of radii) expect(radius).toBeGreaterThanOrEqual(part.outerRadiusMm - 1e-9)
      }
    }
  })

  it('hatches hubs that touch in opposite directions', () => {
    const document = demoLayouts()[0]?.document
    if (!document) throw new Error('no demo layout')
    const [first, second] = document.hubs
    if (!first || !second) throw new Error('no hubs')
    const touching = {
      ...document,
      hubs: [first, { ...second, stationMm: first.stationMm + first.lengthMm }],
    }
    const [one, other] = halfSection(touching).hubs
    expect(one?.hatch).not.toBe(other?.hatch)
  })

  it('survives a layout without a shaft', () => {
    const document = demoLayouts()[0]?.document
    if (!document) throw new Error('no demo layout')
    const bare = halfSection({ ...document, shaft: { ...document.shaft, sections: [] } })
    expect(bare.outline).toEqual([])
    expect(bare.hubs).toHaveLength(document.hubs.length)
  })
})

describe('standardScale (ISO 5455, from memory: 1, 2, 5 times a power of ten)', () => {
  it.each([
    [261, 105, '1:1'],
    [478, 60, '1:2'],
    [704, 110, '1:2'],
    [1580, 170, '1:5'],
    [60, 40, '5:1'],
    [5000, 300, '1:20'],
  ])('an object of %d by %d mm goes on 360 by 190 mm at %s', (widthMm, heightMm, label) => {
    expect(standardScale({ widthMm, heightMm }, { widthMm: 360, heightMm: 200 }).label).toBe(label)
  })
})
