/** Contact of the whole shaft with all its hubs, at rest and in each load case. Slow against the formulas: on request. */
import { FINE_MESH, type MeshQuality } from '../../engineering/contact/contact-mesh'
import { contactHubResults, type ContactHubResult } from '../../engineering/contact/contact-results'
import { contactBasis, solveContact, type ContactBasis } from '../../engineering/contact/contact-solution'
import { prepareContact } from '../../engineering/contact/contact-system'
import { slipSafety } from '../../engineering/interference-fit/holding-capacity'
import type { AngularSpeed, Length } from '../../engineering/quantities/quantity'
import {
  metre,
  newton,
  newtonMetre,
  radianPerSecond,
  toMm,
  toMPa,
  toUm,
} from '../../engineering/quantities/units'
import { REFERENCE_TEMPERATURE } from '../../engineering/interference-fit/temperature-change'
import type { LayoutDocument } from '../../layout/layout-document'
import { attempt } from '../attempt'
import type { Seat } from '../seat'
import type { SeatCase } from '../load-case-inputs'
import { contactInputs } from './contact-inputs'
import type {
  ContactCase,
  ContactHubBlock,
  ContactLayoutResults,
  ContactTight,
} from './contact-layout-results'

const METHOD =
  'Axisymmetric linear elastic contact of shaft and hubs together, without friction; chamfers shorten the seat, edges are sharp. ' +
  'Pressure and stress within 0.02 of the diameter from a seat edge depend on the mesh and are left out.'

/** One state of all hubs: which interference, temperatures and speed. */
interface State {
  interference: (seat: Seat) => Length
  seatCase: ((seat: Seat) => SeatCase | undefined) | null
}

function solveState(basis: ContactBasis, seats: readonly Seat[], { interference, seatCase }: State) {
  const cases = seats.map((seat) => seatCase?.(seat))
  const shaftRise = (cases[0]?.shaftTemperature ?? REFERENCE_TEMPERATURE) - REFERENCE_TEMPERATURE
  const speed: AngularSpeed = cases[0]?.speed ?? radianPerSecond(0)
  const solution = solveContact(basis, {
    interference: seats.map((seat) => metre(interference(seat) - seat.embedding)),
    temperatureRise: [
      shaftRise,
      ...cases.map((c) => (c?.hubTemperature ?? REFERENCE_TEMPERATURE) - REFERENCE_TEMPERATURE),
    ],
    speed,
  })
  return { hubs: contactHubResults(basis.system, solution), hasSettled: solution.hasSettled }
}

const tightOf = (hub: ContactHubResult): ContactTight => ({
  meanPressureMPa: toMPa(hub.meanPressure),
  middlePressureMPa: toMPa(hub.middlePressure),
  largestPressureMPa: toMPa(hub.largestPressure),
  boreHoopMaxMPa: toMPa(hub.boreHoopLargest),
  boreEquivalentMaxMPa: toMPa(hub.boreEquivalentLargest),
  openLengthMm: toMm(hub.openLength),
})

function caseOf(
  seat: Seat,
  seatCase: SeatCase,
  loose: ContactHubResult,
  tight: ContactHubResult,
  hasSettled: boolean,
): ContactCase {
  const axial = newton(seat.friction.axial * loose.normalForce)
  const torque = newtonMetre(
    (seat.friction.circumferential * loose.normalForce * seat.rings.seatDiameter) / 2,
  )
  return {
    loadCase: seatCase.id,
    meanPressureMinMPa: toMPa(loose.meanPressure),
    smallestPressureMPa: toMPa(loose.smallestPressure),
    openLengthMm: toMm(loose.openLength),
    openZonesMm: loose.openZones.map(({ from, to }) => ({ fromMm: toMm(from), toMm: toMm(to) })),
    torqueCapacityNm: torque,
    axialCapacityN: axial,
    slipSafety: slipSafety(seatCase.demand, torque, axial),
    tight: tightOf(tight),
    hasSettled,
  }
}

function refusal(reason: string | null, leftOut: ContactLayoutResults['leftOut']): ContactLayoutResults {
  return { notComputable: reason, mesh: null, hubs: [], leftOut, method: METHOD }
}

/**
 * The contact block of a layout. Never throws on a document that satisfies the schema: what cannot be
 * meshed is said in words.
 */
export function calculateContact(
  document: LayoutDocument,
  quality: MeshQuality = FINE_MESH,
): ContactLayoutResults {
  const inputs = contactInputs(document)
  if (!inputs) return refusal('No hub of this layout can be calculated', [])
  const { model, seats, leftOut } = inputs
  const prepared = attempt(() => contactBasis(prepareContact(model, quality)))
  if (prepared.reason !== null) return refusal(prepared.reason, leftOut)
  const basis = prepared.value
  const rest = solveState(basis, seats, { interference: (seat) => seat.interference.max, seatCase: null })
  const states = document.loadCases.map(({ id }) => {
    const seatCase = (seat: Seat) => seat.cases.find((c) => c.id === id)
    return {
      seatCase,
      loose: solveState(basis, seats, { interference: (seat) => seat.interference.min, seatCase }),
      tight: solveState(basis, seats, { interference: (seat) => seat.interference.max, seatCase }),
    }
  })
  const hubs = seats.flatMap((seat, k): ContactHubBlock[] => {
    const atRest = rest.hubs[k]
    if (!atRest) return []
    const outerDiameterGrowthMaxUm = toUm(atRest.outsideGrowth.largest)
    const loadCases = states.flatMap(({ seatCase, loose, tight }): ContactCase[] => {
      const ofSeat = seatCase(seat)
      const looseHub = loose.hubs[k]
      const tightHub = tight.hubs[k]
      if (!ofSeat || !looseHub || !tightHub) return []
      return [caseOf(seat, ofSeat, looseHub, tightHub, loose.hasSettled && tight.hasSettled)]
    })
    return [{ id: seat.id, atRest: { ...tightOf(atRest), outerDiameterGrowthMaxUm }, loadCases }]
  })
  return {
    notComputable: null,
    mesh: { freedoms: basis.closed.factor.size, edgeSizeShare: quality.edge },
    hubs,
    leftOut,
    method: METHOD,
  }
}
