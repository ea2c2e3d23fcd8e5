/** Findings of one seat. `fails` breaks a criterion of the layout; `warns` is for judgement; `notes` informs. */
import { metre, toMPa, toUm } from '../engineering/quantities/units'
import { outerDiameterGrowth } from '../engineering/interference-fit/hub-stress'
import { looseningSpeed } from '../engineering/interference-fit/speed-loss'
import type { JoiningFigures } from './hub-assembly'
import type { Finding } from './layout-results'
import { nextFit, slipSafetyWith } from './next-fit'
import type { Seat } from './seat'
import type { SeatCaseState, TightState } from './seat-state'
import type { SeatWindow } from './seat-window'
import { windowRemedies } from './window-remedies'
import {
  capitalised,
  forceText,
  micrometreText,
  safetyText,
  stressText,
  temperatureText,
  torqueText,
} from './wording'

export interface SeatFacts {
  seat: Seat
  rest: TightState
  states: SeatCaseState[]
  window: SeatWindow
  joining: JoiningFigures
}

/** Losing more than this share of the least interference to temperature is worth a word, and a warning. */
const TEMPERATURE_NOTE_SHARE = 0.3
const TEMPERATURE_WARN_SHARE = 0.5
/** Common practice: stay below 0.6 of the loosening speed. */
const LOOSENING_SPEED_SHARE = 0.6
/** Growth that a gear or bearing neighbour notices. */
const GROWTH_NOTE_UM = 50
const ROOT_TENSION_NOTE_MPA = 100
/** Longer seats slip progressively from the loaded end. */
const CREDITED_LENGTH_SHARE = 1.5

export function hubFindings(facts: SeatFacts): Finding[] {
  return [
    ...facts.states.flatMap((state) => gripFindings(facts, state)),
    ...stressFindings(facts),
    ...windowFindings(facts),
    ...joiningFindings(facts),
    ...shapeFindings(facts),
    ...informationFindings(facts),
  ]
}

function gripFindings(facts: SeatFacts, state: SeatCaseState): Finding[] {
  const { seat } = facts
  const name = capitalised(seat.name)
  const base = { part: seat.id, loadCase: state.seatCase.id }
  const found: Finding[] = []
  if (state.effectiveMin <= 0) {
    found.push({
      ...base,
      code: 'no-interference',
      severity: 'fails',
      value: toUm(state.effectiveMin),
      limit: 0,
      unit: 'µm',
      message: `${name} is loose at the lower end of its tolerance: of ${micrometreText(toUm(seat.interference.min))} interference, ${micrometreText(toUm(state.totalLoss))} are lost to embedding, temperature and speed.`,
      remedy: gripRemedy(facts, state),
    })
    return found
  }
  const safety = state.slipSafety
  const limit = state.seatCase.criteria.slipSafety
  if (safety !== null && safety < limit) {
    found.push({
      ...base,
      code: 'slip',
      severity: 'fails',
      value: safety,
      limit,
      unit: '',
      message: slipMessage(name, state, safety, limit),
      remedy: gripRemedy(facts, state),
    })
  }
  found.push(...lossFindings(facts, state))
  return found
}

function slipMessage(name: string, state: SeatCaseState, safety: number, limit: number): string {
  const { torque, axialForce } = state.seatCase.demand
  const heldTogether = state.requiredResultant * safety
  // the torque alone tells the story when it is what exceeds the grip, or all there is
  const byTorque = (state.torqueSafety !== null && state.torqueSafety < 1) || axialForce === 0
  const figures =
    byTorque && torque > 0
      ? `capacity ${torqueText(state.torqueCapacity)}, required ${torqueText(torque)}`
      : `capacity ${forceText(heldTogether)}, required ${forceText(state.requiredResultant)} of circumferential and axial force together`
  return safety < 1
    ? `${name} slips at the lower end of its tolerance: ${figures}.`
    : `${name} has too little grip at the lower end of its tolerance: ${figures}, a safety of ${safetyText(safety)} where ${safetyText(limit)} is asked.`
}

function gripRemedy({ seat, window }: SeatFacts, state: SeatCaseState): string {
  const fit = nextFit(seat, window)
  if (fit) {
    const safety = slipSafetyWith(seat, fit.interference, state.seatCase.id)
    return safety === null
      ? `${fit.label} on the same seat holds.`
      : `${fit.label} on the same seat gives ${safetyText(safety)}.`
  }
  const needed = window.required
  return (
    windowRemedies(seat, window)[0] ??
    (needed
      ? `At least ${micrometreText(toUm(needed.interference))} of interference is needed.`
      : 'Choose a tighter fit.')
  )
}

function lossFindings({ seat }: SeatFacts, state: SeatCaseState): Finding[] {
  const found: Finding[] = []
  const base = { part: seat.id, loadCase: state.seatCase.id }
  const name = capitalised(seat.name)
  const atRest = seat.interference.min - seat.embedding
  const lost = -state.thermalChange
  if (atRest > 0 && lost > TEMPERATURE_NOTE_SHARE * atRest) {
    found.push({
      ...base,
      code: 'temperature-loss',
      severity: lost > TEMPERATURE_WARN_SHARE * atRest ? 'warns' : 'notes',
      value: toUm(metre(lost)),
      limit: toUm(metre(TEMPERATURE_WARN_SHARE * atRest)),
      unit: 'µm',
      message: `${name} loses ${micrometreText(toUm(metre(lost)))} of its least ${micrometreText(toUm(metre(atRest)))} interference to temperature.`,
      remedy: 'A hub material that expands like the shaft, or a tighter fit, keeps more of it.',
    })
  }
  const loosening = looseningSpeed(seat.rings, metre(state.effectiveMin + state.speedLoss))
  const { speed } = state.seatCase
  if (loosening !== null && speed > LOOSENING_SPEED_SHARE * loosening) {
    found.push({
      ...base,
      code: 'speed-loss',
      severity: 'warns',
      value: toUm(state.speedLoss),
      limit: toUm(metre(LOOSENING_SPEED_SHARE ** 2 * (state.effectiveMin + state.speedLoss))),
      unit: 'µm',
      message: `${name} runs at ${safetyText(speed / loosening)} of the speed that would loosen it; rotation takes ${micrometreText(toUm(state.speedLoss))} of interference.`,
      remedy: 'A tighter fit, a smaller or lighter hub, or a lower speed keeps the grip.',
    })
  }
  return found
}

function stressFindings(facts: SeatFacts): Finding[] {
  const { seat, rest, states } = facts
  const hubFails = (state: TightState, limit: number) => state.hubSafety !== null && state.hubSafety < limit
  const { isBrittle } = seat.rings.hub.material
  const hubLimit = isBrittle ? seat.criteria.brittleSafety : seat.criteria.hubYieldSafety
  const found: Finding[] = []
  // a seat that fails at rest fails in every case; say it once, and the cases only where they are worse off
  if (hubFails(rest, hubLimit)) found.push(hubStressFinding(facts, rest, null, hubLimit))
  else {
    for (const state of states) {
      const { criteria, id } = state.seatCase
      const limit = isBrittle ? criteria.brittleSafety : criteria.hubYieldSafety
      if (hubFails(state, limit)) found.push(hubStressFinding(facts, state, id, limit))
    }
  }
  const shaftLimit = seat.criteria.shaftYieldSafety
  if (rest.shaftSafety !== null && rest.shaftSafety < shaftLimit) {
    const place = seat.rings.shaft.bore > 0 ? 'at its bore' : 'under the seat'
    found.push({
      code: 'shaft-yield',
      severity: 'fails',
      part: seat.id,
      loadCase: null,
      value: rest.shaftSafety,
      limit: shaftLimit,
      unit: '',
      message: `The shaft yields ${place} under ${seat.name} at the upper end of the tolerance: ${stressText(toMPa(rest.shaft.equivalent))} of ${stressText(toMPa(seat.rings.shaft.material.yieldStrength))} yield strength.`,
      remedy: tightRemedy(facts, 'A smaller shaft bore or a stronger shaft material stands more.'),
    })
  }
  return found
}

function hubStressFinding(
  facts: SeatFacts,
  state: TightState,
  loadCase: string | null,
  limit: number,
): Finding {
  const { seat } = facts
  const { isBrittle, tensileStrength, yieldStrength } = seat.rings.hub.material
  const name = capitalised(seat.name)
  const figures = isBrittle
    ? `hoop tension ${stressText(toMPa(state.hub.hoopAtBore))} of ${stressText(toMPa(tensileStrength))} tensile strength`
    : `${stressText(toMPa(state.hub.equivalent))} of ${stressText(toMPa(yieldStrength))} yield strength`
  return {
    code: isBrittle ? 'hub-brittle' : 'hub-yield',
    severity: 'fails',
    part: seat.id,
    loadCase,
    value: state.hubSafety,
    limit,
    unit: '',
    message: isBrittle
      ? `${name} is brittle and may crack at the upper end of its tolerance: ${figures}.`
      : `${name} is stressed too high at its bore at the upper end of its tolerance: ${figures}.`,
    remedy: tightRemedy(facts, 'A larger outer diameter or a stronger hub material stands more.'),
  }
}

/** What to do when the tight end fails: a looser fit that still holds, else change the part. */
function tightRemedy({ seat, window }: SeatFacts, otherwise: string): string {
  const fit = nextFit(seat, window)
  if (fit) return `${fit.label} on the same seat stays inside the window.`
  return windowRemedies(seat, window)[0] ?? otherwise
}

function windowFindings({ seat, window }: SeatFacts): Finding[] {
  const { required, permissible, isEmpty } = window
  if (!isEmpty || !required || !permissible) return []
  return [
    {
      code: 'window-empty',
      severity: 'fails',
      part: seat.id,
      loadCase: required.cause.loadCase,
      value: toUm(required.interference),
      limit: toUm(permissible.interference),
      unit: 'µm',
      message: `${capitalised(seat.name)} has no interference that is right: ${micrometreText(toUm(required.interference))} are needed to hold, ${micrometreText(toUm(permissible.interference))} are permitted (${permissible.cause.text}).`,
      remedy: windowRemedies(seat, window).join(' '),
    },
  ]
}

function joiningFindings(facts: SeatFacts): Finding[] {
  const { seat, joining } = facts
  if (!joining.isBeyondLimit || joining.limitC === null) return []
  const needed = joining.ovenC ?? joining.joiningC
  if (needed === null) return []
  const name = capitalised(seat.name)
  const isCooling = seat.joining.method === 'cool-shaft'
  return [
    {
      code: 'heat-limit',
      severity: 'fails',
      part: seat.id,
      loadCase: null,
      value: needed,
      limit: joining.limitC,
      unit: '°C',
      message: isCooling
        ? `The shaft would have to be cooled to ${temperatureText(needed)} to join ${seat.name}; ${temperatureText(joining.limitC)} is the coldest it gets.`
        : `${name} would have to leave the oven at ${temperatureText(needed)}; it stands ${temperatureText(joining.limitC)}.`,
      remedy: isCooling
        ? 'Heat the hub as well, or choose a looser fit.'
        : tightRemedy(facts, 'Cool the shaft as well, or choose a looser fit.'),
    },
  ]
}

function shapeFindings({ seat }: SeatFacts): Finding[] {
  const ratio = seat.hubLength / seat.rings.seatDiameter
  const base = { part: seat.id, loadCase: null, value: ratio, unit: '' }
  const name = capitalised(seat.name)
  if (ratio < seat.criteria.minLengthToDiameter)
    return [
      {
        ...base,
        code: 'short-hub',
        severity: 'warns',
        limit: seat.criteria.minLengthToDiameter,
        message: `${name} is short for its seat: length ${safetyText(ratio)} of the diameter; short hubs tilt.`,
        remedy: 'A longer hub or a smaller seat sits more truly.',
      },
    ]
  if (ratio > CREDITED_LENGTH_SHARE)
    return [
      {
        ...base,
        code: 'outside-validity',
        severity: 'warns',
        limit: CREDITED_LENGTH_SHARE,
        message: `${name} is long for its seat: length ${safetyText(ratio)} of the diameter; long seats slip from the loaded end and hold less than calculated.`,
        remedy: 'Judge the grip with a length of 1.5 diameters.',
      },
    ]
  return []
}

function informationFindings({ seat, rest }: SeatFacts): Finding[] {
  const found: Finding[] = []
  const name = capitalised(seat.name)
  const base = { part: seat.id, loadCase: null, severity: 'notes' as const }
  const growth = toUm(outerDiameterGrowth(rest.pressureMax, seat.rings.seatDiameter, seat.rings.hub))
  if (growth >= GROWTH_NOTE_UM)
    found.push({
      ...base,
      code: 'outer-diameter-growth',
      value: growth,
      limit: GROWTH_NOTE_UM,
      unit: 'µm',
      message: `${name} grows by ${micrometreText(growth)} on its outer diameter at the most interference.`,
      remedy: 'Finish teeth or running surface after joining, or allow for the growth.',
    })
  const tension = toMPa(rest.hub.hoopAtOutside)
  if (seat.role === 'gear' && tension >= ROOT_TENSION_NOTE_MPA)
    found.push({
      ...base,
      code: 'root-tension',
      value: tension,
      limit: ROOT_TENSION_NOTE_MPA,
      unit: 'MPa',
      message: `${name} carries ${stressText(tension)} of hoop tension at its root circle at the most interference.`,
      remedy: 'Reduce the tooth-root rating by this tension.',
    })
  return found
}
