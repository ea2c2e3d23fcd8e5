/** Above the half section: item numbers of the hubs and the stations of their faces. */
import type { DrawnHub, HalfSection } from '@shared/drawing/half-section-geometry'
import { spreadLabels } from '@shared/drawing/spread-labels'
import { type DrawingFrame, paperX, paperY } from './drawing-frame'
import {
  type DimensionNote,
  JOG_MM,
  LEADER,
  NUMBER_GAP_MM,
  NUMBER_PITCH_MM,
  numberZone,
  THIN,
  uprightNumber,
} from './drawing-marks'
import { millimetres } from './sheet-format'
import type { TextStyle } from './sheet-style'
import type { SheetWriter } from './sheet-writer'

const ITEM: TextStyle = { sizePt: 7.5, weight: 'strong', align: 'centre' }
const LEADER_PITCH_MM = 1.2
const BALLOON_RADIUS_MM = 2.9
const BALLOON_GAP_MM = 0.8

export function topBandHeight(writer: SheetWriter, section: HalfSection): number {
  if (section.hubs.length === 0) return 4
  const numbers = numberZone(
    writer,
    section.hubs.flatMap((hub) => [hub.fromMm, hub.toMm]),
  )
  return 2 + JOG_MM + numbers + JOG_MM + 2 * BALLOON_RADIUS_MM + 1
}

/**
 * Faces of the hubs as running dimensions and, between the two of each hub, the leader to its item
 * number. All three share one row of places, so that neither crosses a number.
 */
export function drawTopBand(writer: SheetWriter, frame: DrawingFrame, section: HalfSection): DimensionNote {
  const hubs = [...section.hubs].sort((a, b) => a.fromMm + a.toMm - (b.fromMm + b.toMm))
  if (hubs.length === 0) return { omitted: [] }
  const line = { from: frame.left, to: frame.right }
  const topY = paperY(frame, section.largestRadiusMm) - 2
  const places = hubs.flatMap((hub) => [
    { hub, kind: 'from' as const, centre: paperX(frame, hub.fromMm), size: NUMBER_PITCH_MM },
    { hub, kind: 'leader' as const, centre: paperX(frame, middle(hub)), size: LEADER_PITCH_MM },
    { hub, kind: 'to' as const, centre: paperX(frame, hub.toMm), size: NUMBER_PITCH_MM },
  ])
  // Overlapping hubs would interleave; keep the order in which they are listed.
  places.forEach((place, index) => {
    const before = places[index - 1]
    if (before && place.centre < before.centre) place.centre = before.centre
  })
  const spread = spreadLabels(places, line, 0.2)
  const balloons = spreadLabels(
    hubs.map((hub) => ({ centre: paperX(frame, middle(hub)), size: 2 * BALLOON_RADIUS_MM })),
    line,
    BALLOON_GAP_MM,
  )
  const zone = numberZone(
    writer,
    hubs.flatMap((hub) => [hub.fromMm, hub.toMm]),
  )
  const omitted: string[] = []
  const jogTop = topY - JOG_MM
  const zoneTop = jogTop - zone
  if (spread)
    places.forEach((place, index) => {
      if (place.kind === 'leader') return
      const station = place.kind === 'from' ? place.hub.fromMm : place.hub.toMm
      const x = paperX(frame, station)
      const at = spread[index] ?? x
      const outer = paperY(frame, place.hub.outerRadiusMm) - 0.8
      writer.polyline(
        [
          { x, y: outer },
          { x, y: topY },
          { x: at, y: jogTop },
          { x: at, y: jogTop - NUMBER_GAP_MM / 2 },
        ],
        THIN,
      )
      uprightNumber(writer, millimetres(station), at, jogTop - NUMBER_GAP_MM, 'up')
    })
  else omitted.push('positions of the hubs')
  if (!balloons) return { omitted: [...omitted, 'item numbers'] }
  hubs.forEach((hub, index) => {
    const leaderX = spread?.[index * 3 + 1] ?? paperX(frame, middle(hub))
    const balloonX = balloons[index] ?? leaderX
    const target = { x: paperX(frame, middle(hub)), y: hubTarget(frame, hub) }
    const balloonY = zoneTop - JOG_MM - BALLOON_RADIUS_MM
    writer.polyline(
      [
        target,
        { x: target.x, y: topY },
        { x: leaderX, y: jogTop },
        { x: leaderX, y: zoneTop },
        { x: balloonX, y: balloonY + BALLOON_RADIUS_MM },
      ],
      LEADER,
    )
    writer.circle(target, 0.5, { fill: '#1F242C' })
    writer.circle({ x: balloonX, y: balloonY }, BALLOON_RADIUS_MM, { fill: '#FFFFFF', stroke: LEADER })
    writer.text(String(hub.item), balloonX, balloonY + writer.capHeight(ITEM) / 2, ITEM)
  })
  return { omitted }
}

const middle = (hub: DrawnHub) => (hub.fromMm + hub.toMm) / 2
const hubTarget = (frame: DrawingFrame, hub: DrawnHub) =>
  paperY(frame, hub.boreRadiusMm + (hub.outerRadiusMm - hub.boreRadiusMm) * 0.7)
