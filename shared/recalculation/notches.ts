/** The sections of the shaft where fatigue may start: seat edges and shoulders. */
import type { Material } from '../engineering/materials/material'
import type { Pressure } from '../engineering/quantities/quantity'
import { mm } from '../engineering/quantities/units'
import { enduranceLimit } from '../engineering/shaft/endurance-limit'
import {
  fatigueNotchFactors,
  seatEdgeNotchFactors,
  SHARP_RADIUS_SHARE,
  shoulderConcentration,
  type NotchFactors,
} from '../engineering/shaft/notch-factors'
import type { Bearing, Hub, LayoutDocument } from '../layout/layout-document'
import { seatUnder, type Seat } from '../layout/shaft-geometry'
import type { NotchResult } from './layout-results'
import type { ShaftInputs } from './shaft-inputs'

export interface Notch {
  stationMm: number
  kind: NotchResult['kind']
  /** Hub or bearing whose seat ends here; section to the left of a shoulder. */
  part: string
  diameterMm: number
  boreMm: number
  factors: NotchFactors
  endurance: Pressure
}

/** Seats and the sections beside them are ground. */
const SURFACE = 'ground'
/** Half of the shafts survive; the safety asked carries the scatter. */
const RELIABILITY_FACTOR = 1

const enduranceAt = (diameterMm: number, material: Material) =>
  enduranceLimit(material.tensileStrength, mm(diameterMm), SURFACE, RELIABILITY_FACTOR).value

export function notchesOf(document: LayoutDocument, inputs: ShaftInputs): Notch[] {
  const { material } = inputs
  if (!material) return []
  return [...seatEdges(document, material), ...shoulders(inputs, material)].sort(
    (one, other) => one.stationMm - other.stationMm,
  )
}

/** Hubs, and bearings that slide on as rings, sit with interference; split housings leave no edge. */
function seatEdges(document: LayoutDocument, material: Material): Notch[] {
  const factors = seatEdgeNotchFactors(material.tensileStrength)
  const rings = document.bearings.filter((bearing) => bearing.housing === 'ring').map(bearingExtent)
  return [...document.hubs, ...rings].flatMap((part) => {
    const seat = seatUnder(document, part)
    return seat ? edgesOf(part.id, seat, factors, material) : []
  })
}

function bearingExtent(bearing: Bearing): Pick<Hub, 'id' | 'stationMm' | 'lengthMm'> {
  return {
    id: bearing.id,
    stationMm: bearing.stationMm - bearing.widthMm / 2,
    lengthMm: bearing.widthMm,
  }
}

function edgesOf(part: string, seat: Seat, factors: NotchFactors, material: Material): Notch[] {
  const { section } = seat.span
  const endurance = enduranceAt(section.outerDiameterMm, material)
  return [seat.startMm, seat.endMm].map((stationMm) => ({
    stationMm,
    kind: 'seatEdge',
    part,
    diameterMm: section.outerDiameterMm,
    boreMm: section.boreDiameterMm,
    factors,
    endurance,
  }))
}

function shoulders({ spans }: ShaftInputs, material: Material): Notch[] {
  return spans.slice(1).flatMap((right, index) => {
    const left = spans[index]
    if (!left || left.section.outerDiameterMm === right.section.outerDiameterMm) return []
    const [large, small] =
      left.section.outerDiameterMm > right.section.outerDiameterMm
        ? [left.section, right.section]
        : [right.section, left.section]
    const radiusMm = left.section.rightFilletMm || SHARP_RADIUS_SHARE * small.outerDiameterMm
    const concentration = shoulderConcentration(
      mm(large.outerDiameterMm),
      mm(small.outerDiameterMm),
      mm(radiusMm),
    )
    return [
      {
        stationMm: right.startMm,
        kind: 'shoulder' as const,
        part: left.section.id,
        diameterMm: small.outerDiameterMm,
        boreMm: Math.max(left.section.boreDiameterMm, right.section.boreDiameterMm),
        factors: fatigueNotchFactors(concentration, mm(radiusMm), material.tensileStrength),
        endurance: enduranceAt(small.outerDiameterMm, material),
      },
    ]
  })
}
