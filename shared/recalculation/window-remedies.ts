/** What would bring the band inside the window: another fit, or a change of the seat with its amount. */
import { seatCompliance } from '../engineering/interference-fit/interface-pressure'
import { metre, pascal, toCelsius, toMm, toMPa, toUm } from '../engineering/quantities/units'
import { nextFit } from './next-fit'
import type { Seat } from './seat'
import { caseState } from './seat-state'
import { seatWindow, type SeatWindow } from './seat-window'
import { millimetreText, significant, stressText, temperatureText } from './wording'

/** Beyond these factors a change is another design, not a remedy. */
const LONGEST = 3
const LARGEST = 3
const STRONGEST = 3
const HIGHEST_FRICTION = 0.3

const windowOf = (seat: Seat) =>
  seatWindow(
    seat,
    seat.cases.map((one) => caseState(seat, one)),
  )

export function windowRemedies(seat: Seat, window: SeatWindow): string[] {
  const { required, permissible } = window
  if (!required || !permissible) return []
  if (window.isEmpty) return openers(seat, window)
  const isInside =
    seat.interference.min >= required.interference && seat.interference.max <= permissible.interference
  if (isInside) return []
  const fit = nextFit(seat, window)
  if (fit) return [`${fit.label} on the same seat lies inside the window.`]
  const band = toUm(metre(seat.interference.max - seat.interference.min))
  const width = toUm(metre(permissible.interference - required.interference))
  return [
    `Limits of ${significant(toUm(required.interference), 3)} to ${significant(toUm(permissible.interference), 3)} µm lie inside the window; no class at these grades does.`,
    ...(band > width
      ? [
          `Finer grades are needed: the band is ${significant(band, 3)} µm wide, the window ${significant(width, 3)} µm.`,
        ]
      : []),
  ]
}

/** Single changes that open an empty window, each with the amount needed. */
function openers(seat: Seat, window: SeatWindow): string[] {
  const found = [
    lengthOpener(seat),
    outerDiameterOpener(seat),
    frictionOpener(seat),
    strengthOpener(seat, window),
    heatOpener(seat, window),
  ].filter((text) => text !== null)
  return found.length > 0
    ? found
    : ['No single change opens it: lengthen the seat and enlarge the hub together, or lower the load.']
}

/** Smallest factor above 1 for which the changed seat has a window, to 1 %. */
function leastFactor(largest: number, change: (factor: number) => Seat): number | null {
  if (largest <= 1 || windowOf(change(largest)).isEmpty) return null
  let closed = 1
  let open = largest
  while (open - closed > 0.01) {
    const middle = (open + closed) / 2
    if (windowOf(change(middle)).isEmpty) closed = middle
    else open = middle
  }
  return open
}

function lengthOpener(seat: Seat): string | null {
  const factor = leastFactor(LONGEST, (by) => ({
    ...seat,
    effectiveLength: metre(seat.effectiveLength * by),
  }))
  if (factor === null) return null
  const extra = Math.ceil(toMm(metre(seat.effectiveLength * (factor - 1))))
  return `A seat ${millimetreText(extra)} longer opens it.`
}

function outerDiameterOpener(seat: Seat): string | null {
  const factor = leastFactor(LARGEST, (by) => withOuterDiameter(seat, by))
  if (factor === null) return null
  const diameter = Math.ceil(toMm(metre(seat.rings.hub.outerDiameter * factor)))
  return `A hub of ${millimetreText(diameter)} outer diameter opens it.`
}

function withOuterDiameter(seat: Seat, factor: number): Seat {
  const hub = { ...seat.rings.hub, outerDiameter: metre(seat.rings.hub.outerDiameter * factor) }
  const rings = { ...seat.rings, hub }
  return { ...seat, rings, compliance: seatCompliance(rings) }
}

function frictionOpener(seat: Seat): string | null {
  const present = Math.max(seat.friction.circumferential, seat.friction.axial)
  const factor = leastFactor(HIGHEST_FRICTION / present, (by) => ({
    ...seat,
    friction: {
      ...seat.friction,
      circumferential: seat.friction.circumferential * by,
      axial: seat.friction.axial * by,
    },
  }))
  if (factor === null) return null
  return `A friction coefficient of ${significant(seat.friction.circumferential * factor, 2)} opens it (another joining method or surface state).`
}

function strengthOpener(seat: Seat, window: SeatWindow): string | null {
  const kind = window.permissible?.cause.kind
  if (kind !== 'hub-yield' && kind !== 'hub-brittle') return null
  const material = seat.rings.hub.material
  const factor = leastFactor(STRONGEST, (by) => {
    const stronger = {
      ...material,
      yieldStrength: pascal(material.yieldStrength * by),
      tensileStrength: pascal(material.tensileStrength * by),
    }
    return { ...seat, rings: { ...seat.rings, hub: { ...seat.rings.hub, material: stronger } } }
  })
  if (factor === null) return null
  const strength = kind === 'hub-brittle' ? material.tensileStrength : material.yieldStrength
  const name = kind === 'hub-brittle' ? 'tensile strength' : 'yield strength'
  return `A hub material with a ${name} of ${stressText(toMPa(pascal(strength * factor)))} opens it.`
}

function heatOpener(seat: Seat, window: SeatWindow): string | null {
  const limit = seat.joining.hubLimit
  if (window.permissible?.cause.kind !== 'heat-limit' || !limit || !window.required) return null
  const missing = window.required.interference - window.permissible.interference
  const rise = missing / (seat.rings.seatDiameter * seat.rings.hub.material.expansion)
  const needed = toCelsius(limit) + rise
  return Number.isFinite(needed)
    ? `Joining with a cooled shaft, or a hub that stands ${temperatureText(Math.ceil(needed))}, opens it.`
    : null
}
