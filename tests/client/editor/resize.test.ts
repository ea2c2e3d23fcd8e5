import { selectTool } from '@/features/editor/tools/select-tool'
import { describe, expect, it } from 'vitest'
import { twoHubs } from './layouts'
import { after, commits, takeUp } from './tool-driver-steps'

type Keys = { shift?: boolean; alt?: boolean }

function dragged(
  selectedId: string,
  from: [stationMm: number, heightMm: number],
  to: [stationMm: number, heightMm: number],
  keys: Keys = {},
) {
  const document = twoHubs()
  const hand = takeUp(selectTool, document, { selectedIds: [selectedId] })
  hand.down(...from)
  hand.move(to[0], to[1], keys)
  hand.up(to[0], to[1], keys)
  return {
    document,
    result: after(document, commits(hand.effects)[0]?.operations),
    edits: commits(hand.effects),
  }
}

describe('the faces of a hub', () => {
  it('the right face changes the length', () => {
    const { result, edits } = dragged('A', [90, 0], [97, 0])
    expect(result.hubs[0]).toMatchObject({ stationMm: 50, lengthMm: 47 })
    expect(edits.map(({ label }) => label)).toEqual(['Change length of A'])
  })

  it('the left face changes station and length in one edit; the right face stays', () => {
    const { result, edits } = dragged('A', [50, 0], [56, 0])
    expect(result.hubs[0]).toMatchObject({ stationMm: 56, lengthMm: 34 })
    expect(edits.length).toBe(1)
  })

  it('never gets shorter than half a millimetre under the pointer', () => {
    const { result } = dragged('A', [90, 0], [20, 0], { alt: true })
    expect(result.hubs[0]).toMatchObject({ stationMm: 50, lengthMm: 0.5 })
  })

  it('the outside changes the diameter by whole millimetres', () => {
    const { result } = dragged('A', [70, 45], [70, 48.2])
    expect(result.hubs[0]?.outerDiameterMm).toBe(96)
  })
})

describe('the width of a bearing', () => {
  it('keeps the other edge where it is', () => {
    const { result } = dragged('L', [25, 0], [29, 0])
    expect(result.bearings[0]).toMatchObject({ stationMm: 17, widthMm: 24 })
  })
})

describe('the step of a shaft', () => {
  it('moves alone: the next section gives the length and every part keeps its place', () => {
    const { document, result } = dragged('s1', [40, 0], [46, 0])
    expect(result.shaft.sections.map((section) => section.lengthMm)).toEqual([46, 114, 40])
    expect(result.hubs).toBe(document.hubs)
    expect(result.bearings).toBe(document.bearings)
  })

  it('with Shift takes along everything that lies right of it: hubs, loads, abutments, bearings', () => {
    const { result } = dragged('s1', [40, 0], [46, 0], { shift: true })
    expect(result.shaft.sections.map((section) => section.lengthMm)).toEqual([46, 120, 40])
    expect(result.hubs.map((hub) => hub.stationMm)).toEqual([56, 116])
    expect(result.hubs.map((hub) => hub.abutmentStationMm)).toEqual([46, 166])
    expect(result.bearings.map((bearing) => bearing.stationMm)).toEqual([15, 191])
    expect(result.loadCases[1]?.loads.map((load) => load.stationMm)).toEqual([76, 136])
  })

  it('of the last section is the end of the shaft', () => {
    const { result } = dragged('s3', [200, 0], [210, 0])
    expect(result.shaft.sections.map((section) => section.lengthMm)).toEqual([40, 120, 50])
  })

  it('is the same step from the section on its right', () => {
    const { result } = dragged('s2', [40, 0], [46, 0])
    expect(result.shaft.sections.map((section) => section.lengthMm)).toEqual([46, 114, 40])
  })

  it('never swallows the next section', () => {
    const { result } = dragged('s1', [40, 0], [190, 0], { alt: true })
    expect(result.shaft.sections[1]?.lengthMm).toBe(0.5)
  })
})
