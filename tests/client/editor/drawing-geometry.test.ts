import { hatchPath } from '@/features/editor/canvas/draw-hatching'
import { shaftContour } from '@/features/editor/canvas/draw-shaft'
import { type LabelWish, placeLabels } from '@/features/editor/canvas/label-layout'
import { neighbourDimensions } from '@/features/editor/canvas/neighbour-dimensions'
import { rulerTicks } from '@/features/editor/canvas/ruler-ticks'
import { hitTest } from '@/features/editor/tools/hit-test'
import { heightToPx, pxToStation, stationToPx, zoomAt, zoomToBounds } from '@/lib/view-transform'
import { sectionSpans } from '@shared/layout/shaft-geometry'
import { describe, expect, it } from 'vitest'
import { hub, twoHubs } from './layouts'

describe('the view', () => {
  const margins = { left: 100, right: 20, top: 80, bottom: 60 }

  it('has one scale for both axes and keeps the bounds inside the margins', () => {
    const view = zoomToBounds({ leftMm: 0, rightMm: 400, radiusMm: 50 }, 920, 640, margins)
    expect(view.pxPerMm).toBe(2)
    expect(stationToPx(view, 0)).toBe(100)
    expect(stationToPx(view, 400)).toBe(900)
    expect(heightToPx(view, 50)).toBeGreaterThanOrEqual(80)
    expect(heightToPx(view, -50)).toBeLessThanOrEqual(580)
  })

  it('zooms about the pointer', () => {
    const view = zoomToBounds({ leftMm: 0, rightMm: 400, radiusMm: 50 }, 920, 640, margins)
    const closer = zoomAt(view, 333, 200, 3)
    expect(closer.pxPerMm).toBe(6)
    expect(pxToStation(closer, 333)).toBeCloseTo(pxToStation(view, 333), 9)
  })

  it('stops zooming instead of running to zero or infinity', () => {
    let view = zoomToBounds({ leftMm: 0, rightMm: 400, radiusMm: 50 }, 920, 640, margins)
    for (let step = 0; step < 200; step += 1) view = zoomAt(view, 10, 10, 3)
    expect(Number.isFinite(view.pxPerMm) && Number.isFinite(view.originXPx)).toBe(true)
  })
})

describe('the ruler', () => {
  const view = { pxPerMm: 2, originXPx: 100, originYPx: 0 }

  it('labels whole steps that have room', () => {
    const labels = rulerTicks(view, 500, false).flatMap(({ label }) => label ?? [])
    expect(labels).toEqual(['−50', '0', '50', '100', '150', '200'])
  })

  it('counts in inches where inches are chosen', () => {
    const labelled = rulerTicks(view, 500, true).filter(({ label }) => label !== null)
    expect(labelled.map(({ label }) => label)).toEqual(['0', '2', '4', '6'])
    expect(labelled[1]?.stationMm).toBeCloseTo(50.8, 9)
  })
})

describe('names above the hubs', () => {
  const frame = { topPx: 30, leftPx: 0, rightPx: 800 }
  const wish = (id: string, leftPx: number, topPx: number, more: Partial<LabelWish> = {}): LabelWish => ({
    id,
    centrePx: leftPx + 20,
    leftPx,
    rightPx: leftPx + 40,
    topPx,
    lineWidthsPx: [100, 70],
    isImportant: false,
    ...more,
  })
  const boxes = (wishes: LabelWish[]) =>
    placeLabels(wishes, frame).map((label) => {
      const half =
        Math.max(...(wishes.find(({ id }) => id === label.id)?.lineWidthsPx.slice(0, label.lines) ?? [])) / 2
      return {
        left: label.centrePx - half,
        right: label.centrePx + half,
        top: label.bottomPx - label.lines * 14,
        bottom: label.bottomPx,
      }
    })

  it('stand right over a hub that has room', () => {
    expect(placeLabels([wish('A', 300, 200)], frame)).toEqual([
      { id: 'A', centrePx: 320, bottomPx: 195, lines: 2, isRaised: false },
    ])
  })

  it('never touch each other or the ruler, thirty hubs in a row', () => {
    const wishes = Array.from({ length: 30 }, (_, index) =>
      wish(`H${index}`, index * 26, 190 + (index % 3) * 20),
    )
    const placed = boxes(wishes)
    expect(placed.length).toBeGreaterThan(8)
    placed.forEach((box, index) => {
      expect(box.top).toBeGreaterThanOrEqual(frame.topPx)
      for (const other of placed.slice(index + 1)) {
        const touch =
          box.left < other.right && other.left < box.right && box.top < other.bottom && other.top < box.bottom
        expect(touch).toBe(false)
      }
    })
  })

  it('keep a failing hub named when there is room for one', () => {
    const wishes = [wish('A', 300, 60), wish('B', 320, 60, { isImportant: true })]
    expect(placeLabels(wishes, frame).map(({ id }) => id)).toContain('B')
  })

  it('keep off the bodies they are given', () => {
    const bearing = { left: 345, right: 420, top: 150, bottom: Infinity }
    const [label] = placeLabels([wish('A', 300, 200)], frame, [bearing])
    const right = (label?.centrePx ?? 0) + 50
    expect(right <= 345 || (label?.bottomPx ?? 999) <= 150).toBe(true)
  })
})

describe('hatching', () => {
  const lines = (leansRight: boolean) => {
    const points: [number, number][] = []
    const pen = {
      beginPath: () => undefined,
      moveTo: (x: number, y: number) => void points.push([x, y]),
      lineTo: (x: number, y: number) => void points.push([x, y]),
    }
    hatchPath(pen, { left: 10, right: 50, top: -30, bottom: -10 }, 7, leansRight)
    return points
  }

  it.each([true, false])('stays inside the cut face and runs at 45° (leaning right: %s)', (leansRight) => {
    const points = lines(leansRight)
    expect(points.length).toBeGreaterThan(8)
    for (const [x, y] of points) {
      expect(x).toBeGreaterThanOrEqual(10)
      expect(x).toBeLessThanOrEqual(50)
      expect(y).toBeGreaterThanOrEqual(-30 - 1e-9)
      expect(y).toBeLessThanOrEqual(-10 + 1e-9)
    }
    for (let index = 0; index < points.length; index += 2) {
      const [x1, y1] = points[index]!
      const [x2, y2] = points[index + 1]!
      // y runs down: leaning right means rising to the right.
      expect((y2 - y1) / (x2 - x1)).toBeCloseTo(leansRight ? -1 : 1, 9)
    }
  })
})

describe('the contour of the shaft', () => {
  it('rounds the inner corner of a step with its fillet', () => {
    const document = twoHubs()
    document.shaft.sections[0] = { ...document.shaft.sections[0]!, rightFilletMm: 2 }
    expect(shaftContour(sectionSpans(document)).slice(0, 4)).toEqual([
      { x: 0, radius: 20 },
      { x: 38, radius: 20 },
      { x: 40, radius: 22, corner: { x: 40, radius: 20 } },
      { x: 40, radius: 25 },
    ])
  })

  it('does not round more than the step is high', () => {
    const document = twoHubs()
    document.shaft.sections[0] = { ...document.shaft.sections[0]!, rightFilletMm: 50 }
    expect(shaftContour(sectionSpans(document))[1]).toEqual({ x: 35, radius: 20 })
  })
})

describe('live dimensions', () => {
  it('give the own length and the gaps to both neighbours', () => {
    expect(neighbourDimensions(twoHubs(), ['A'])?.dimensions).toEqual([
      { fromMm: 50, toMm: 90, kind: 'own' },
      { fromMm: 25, toMm: 50, kind: 'gap' },
      { fromMm: 90, toMm: 110, kind: 'gap' },
    ])
  })

  it('say by how much two parts overlap', () => {
    const document = twoHubs()
    document.hubs[0] = hub('A', 75, 40)
    expect(neighbourDimensions(document, ['A'])?.dimensions).toContainEqual({
      fromMm: 110,
      toMm: 115,
      kind: 'overlap',
    })
  })
})

describe('what lies under the pointer', () => {
  const query = {
    document: twoHubs(),
    mmPerPx: 0.5,
    selectedIds: [] as string[],
    loadCaseId: 'run',
    canEdit: true,
    isTouch: false,
  }
  const at = (stationMm: number, heightMm: number, more: Partial<typeof query> = {}) =>
    hitTest({ ...query, ...more, stationMm, heightMm })

  it('is the hub above and below the shaft, the section within', () => {
    expect(at(70, 35)).toEqual({ kind: 'part', part: { kind: 'hub', id: 'A' } })
    expect(at(70, -35)).toEqual({ kind: 'part', part: { kind: 'hub', id: 'A' } })
    expect(at(70, 5)).toEqual({ kind: 'part', part: { kind: 'section', id: 's2' } })
    expect(at(70, 100)).toBeNull()
  })

  it('is a handle only for a lone selection of somebody who may edit', () => {
    const handle = { kind: 'handle', part: { kind: 'hub', id: 'A' }, face: 'right' }
    expect(at(91, 1, { selectedIds: ['A'] })).toEqual(handle)
    expect(at(91, 1, { selectedIds: ['A', 'B'] })).not.toEqual(handle)
    expect(at(91, 1, { selectedIds: ['A'], canEdit: false })).not.toEqual(handle)
  })

  it('reaches further for a finger', () => {
    expect(at(98, 1, { selectedIds: ['A'] })).toMatchObject({ kind: 'part' })
    expect(at(98, 1, { selectedIds: ['A'], isTouch: true })).toMatchObject({ kind: 'handle' })
  })

  it('is the part, not the handle of its outside, for a finger on a small part', () => {
    expect(at(70, 40, { selectedIds: ['A'], isTouch: true })).toMatchObject({ kind: 'part' })
    expect(at(70, 48, { selectedIds: ['A'], isTouch: true })).toMatchObject({
      kind: 'handle',
      face: 'outside',
    })
  })

  it('is the load under its hub', () => {
    expect(at(70, -50)).toEqual({ kind: 'load', loadCaseId: 'run', loadId: 'run-A', hubId: 'A' })
  })

  it('gives the first section no left handle: the datum stays', () => {
    expect(at(0, 0, { selectedIds: ['s1'] })).toMatchObject({ kind: 'part' })
  })
})
