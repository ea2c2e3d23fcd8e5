/** The interference window of a seat over all its load cases, with a named cause on each mark. */
import { pressureForSafety } from '../engineering/interference-fit/holding-capacity'
import { permissibleHubPressure } from '../engineering/interference-fit/hub-stress'
import { interferenceForPressure } from '../engineering/interference-fit/interface-pressure'
import {
  interferenceWindow,
  type InterferenceWindow,
  type WindowMark,
} from '../engineering/interference-fit/interference-window'
import {
  interferenceForColdLimit,
  interferenceForHeatLimit,
  LIQUID_NITROGEN_TEMPERATURE,
} from '../engineering/interference-fit/joining-temperature'
import { permissibleShaftPressure } from '../engineering/interference-fit/shaft-seat-stress'
import type { Length, Pressure } from '../engineering/quantities/quantity'
import { metre, pascal, toCelsius } from '../engineering/quantities/units'
import type { Criteria } from '../layout/layout-document'
import type { Seat } from './seat'
import type { SeatCaseState } from './seat-state'
import { safetyText, temperatureText } from './wording'

export type WindowCauseKind =
  'slip' | 'contact' | 'hub-yield' | 'hub-brittle' | 'shaft-yield' | 'heat-limit' | 'cold-limit'

export interface WindowCause {
  kind: WindowCauseKind
  /** Load case id; null at rest or when joining. */
  loadCase: string | null
  text: string
}

export type SeatWindow = InterferenceWindow<WindowCause>
type Mark = WindowMark<WindowCause>

export function seatWindow(seat: Seat, states: readonly SeatCaseState[]): SeatWindow {
  const lower: Mark[] = [
    mark(seat.embedding, 'contact', null, 'less than this is lost when the surfaces embed'),
    ...states.map((state) => holdingMark(seat, state)),
  ]
  const upper: Mark[] = [
    ...stressMarks(seat, seat.criteria, seat.embedding, pascal(0), null, 'at rest'),
    ...states.flatMap((state) =>
      stressMarks(
        seat,
        state.seatCase.criteria,
        state.totalLoss,
        state.rotationHoop,
        state.seatCase.id,
        `in ${state.seatCase.name}`,
      ),
    ),
    ...joiningMarks(seat),
  ]
  return interferenceWindow(lower, upper)
}

const mark = (interference: Length, kind: WindowCauseKind, loadCase: string | null, text: string): Mark => ({
  interference,
  cause: { kind, loadCase, text },
})

/** Least as-made interference that holds in one load case, or that just keeps the parts together. */
function holdingMark(seat: Seat, state: SeatCaseState): Mark {
  const { seatCase } = state
  const pressure = pressureForSafety(
    seatCase.demand,
    seatCase.criteria.slipSafety,
    seat.rings.seatDiameter,
    seat.effectiveLength,
    seat.friction,
  )
  const asMade = metre(interferenceForPressure(pressure, seat.compliance) + state.totalLoss)
  return pressure > 0
    ? mark(
        asMade,
        'slip',
        seatCase.id,
        `slips below in ${seatCase.name} (safety ${safetyText(seatCase.criteria.slipSafety)} asked)`,
      )
    : mark(asMade, 'contact', seatCase.id, `comes loose below in ${seatCase.name}`)
}

function stressMarks(
  seat: Seat,
  criteria: Criteria,
  loss: Length,
  rotationHoop: Pressure,
  loadCase: string | null,
  when: string,
): Mark[] {
  const { seatDiameter, hub, shaft } = seat.rings
  const isBrittle = hub.material.isBrittle
  const hubLimit = isBrittle ? criteria.brittleSafety : criteria.hubYieldSafety
  const asMade = (pressure: Pressure) => metre(interferenceForPressure(pressure, seat.compliance) + loss)
  return [
    mark(
      asMade(permissibleHubPressure(hubLimit, seatDiameter, hub, rotationHoop)),
      isBrittle ? 'hub-brittle' : 'hub-yield',
      loadCase,
      `hub ${isBrittle ? 'cracks' : 'yields'} above ${when} (safety ${safetyText(hubLimit)} asked)`,
    ),
    mark(
      asMade(permissibleShaftPressure(criteria.shaftYieldSafety, seatDiameter, shaft)),
      'shaft-yield',
      loadCase,
      `shaft yields above ${when} (safety ${safetyText(criteria.shaftYieldSafety)} asked)`,
    ),
  ]
}

function joiningMarks(seat: Seat): Mark[] {
  const { method, joint, handlingAllowance, hubLimit } = seat.joining
  if (method === 'press') return []
  if (method === 'cool-shaft') {
    return [
      mark(
        interferenceForColdLimit(coldestShaft(seat), joint),
        'cold-limit',
        null,
        `cannot be joined above: the shaft would have to be colder than ${temperatureText(toCelsius(coldestShaft(seat)))}`,
      ),
    ]
  }
  if (!hubLimit) return []
  return [
    mark(
      interferenceForHeatLimit(hubLimit, handlingAllowance, joint),
      'heat-limit',
      null,
      `overheats above: the oven would have to be hotter than ${temperatureText(toCelsius(hubLimit))}`,
    ),
  ]
}

/** A shaft temperature given for cooling is what the shop reaches; otherwise liquid nitrogen. */
export function coldestShaft(seat: Seat) {
  const { joint } = seat.joining
  return joint.shaftTemperature < joint.ambient ? joint.shaftTemperature : LIQUID_NITROGEN_TEMPERATURE
}
