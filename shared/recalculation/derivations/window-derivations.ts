/** The two marks of the interference window, each by the cause that sets it. */
import { pressureForSafety } from '../../engineering/interference-fit/holding-capacity'
import { permissibleHubPressure } from '../../engineering/interference-fit/hub-stress'
import { permissibleShaftPressure } from '../../engineering/interference-fit/shaft-seat-stress'
import { pascal, toCelsius, toMPa, toUm } from '../../engineering/quantities/units'
import type { Derivation, DerivationInput } from '../derivation'
import type { HubCalculation } from '../hub-result'
import type { Seat } from '../seat'
import type { SeatCaseState } from '../seat-state'
import { coldestShaft, seatWindow, type WindowCauseKind } from '../seat-window'
import { cite, derivation, input, type DerivationBody } from './derivation-parts'
import {
  caseChanges,
  COMPLIANCE_FORMULA,
  cooledShaftInputs,
  demandInputs,
  diameter,
  effectiveLength,
  embedding,
  frictionInputs,
  RING_MODEL,
  RING_VALIDITY,
  ringInputs,
} from './seat-inputs'

export function windowDerivation(
  hub: HubCalculation,
  seat: Seat,
  which: 'required' | 'permissible',
): Derivation {
  const { cause } = seatWindow(seat, hub.states)[which] ?? { cause: null }
  const state = hub.states.find((one) => one.seatCase.id === cause?.loadCase) ?? null
  const body = bodyOf(seat, cause?.kind ?? 'contact', state)
  const { window } = hub.result
  return derivation({
    ...body,
    title: which === 'required' ? 'Least interference that holds' : 'Most interference that is permitted',
    symbol: which === 'required' ? 'd_req' : 'd_perm',
    value: which === 'required' ? window.requiredUm : window.permissibleUm,
    unit: 'µm',
    model: `${body.model} Governing: ${which === 'required' ? window.requiredCause : window.permissibleCause}.`,
  })
}

type Body = Pick<DerivationBody, 'formula' | 'inputs' | 'model' | 'validity' | 'sources'>

/** What stands between effective and as-made interference. */
const lossInputs = (seat: Seat, state: SeatCaseState | null): DerivationInput[] =>
  state ? caseChanges(seat, state) : [embedding(seat)]
const lossTerm = (state: SeatCaseState | null) => (state ? 'Δd_e − Δd_T + Δd_ω' : 'Δd_e')

function bodyOf(seat: Seat, kind: WindowCauseKind, state: SeatCaseState | null): Body {
  switch (kind) {
    case 'slip':
      return slipBody(seat, state)
    case 'contact':
      return {
        formula: [`d_req = ${lossTerm(state)}`],
        inputs: lossInputs(seat, state),
        model: 'The parts just keep touching; nothing has to be held.',
        validity: RING_VALIDITY,
        sources: [cite('din-7190-1', 'effective interference')],
      }
    case 'hub-yield':
    case 'hub-brittle':
    case 'shaft-yield':
      return stressBody(seat, kind, state)
    case 'heat-limit':
      return heatBody(seat)
    case 'cold-limit':
      return coldBody(seat)
  }
}

function slipBody(seat: Seat, state: SeatCaseState | null): Body {
  const pressure = state
    ? pressureForSafety(
        state.seatCase.demand,
        state.seatCase.criteria.slipSafety,
        seat.rings.seatDiameter,
        seat.effectiveLength,
        seat.friction,
      )
    : pascal(0)
  return {
    formula: [
      `d_req = p_req D (K_A + K_I) + ${lossTerm(state)}`,
      'p_req = S √((K F/μ_a)^2 + (2 K T/(D μ_c))^2) / (π D L)',
      ...COMPLIANCE_FORMULA,
    ],
    inputs: [
      input('p_req', 'pressure needed', toMPa(pressure), 'MPa', 'calculated'),
      input(
        'S',
        'slip safety asked',
        state?.seatCase.criteria.slipSafety ?? seat.criteria.slipSafety,
        '',
        'criteria',
      ),
      ...(state ? demandInputs(state) : []),
      ...frictionInputs(seat),
      effectiveLength(seat),
      ...ringInputs(seat),
      ...lossInputs(seat, state),
    ],
    model: `${RING_MODEL} Friction adds as a vector.`,
    validity: RING_VALIDITY,
    sources: [cite('shigley-9', 'Eqs. 3-56, 7-48, 7-49'), cite('din-7190-1', 'required pressure')],
  }
}

function stressBody(
  seat: Seat,
  kind: 'hub-yield' | 'hub-brittle' | 'shaft-yield',
  state: SeatCaseState | null,
): Body {
  const criteria = state?.seatCase.criteria ?? seat.criteria
  const { seatDiameter, hub, shaft } = seat.rings
  const safety =
    kind === 'hub-yield'
      ? criteria.hubYieldSafety
      : kind === 'hub-brittle'
        ? criteria.brittleSafety
        : criteria.shaftYieldSafety
  const rotation = state?.rotationHoop ?? pascal(0)
  const pressure =
    kind === 'shaft-yield'
      ? permissibleShaftPressure(safety, seatDiameter, shaft)
      : permissibleHubPressure(safety, seatDiameter, hub, rotation)
  return {
    formula: [
      `d_perm = p_perm D (K_A + K_I) + ${lossTerm(state)}`,
      ...limitFormula(kind, seat),
      ...COMPLIANCE_FORMULA,
    ],
    inputs: [
      input('p_perm', 'pressure permitted', toMPa(pressure), 'MPa', 'calculated'),
      input('S', 'safety asked', safety, '', 'criteria'),
      strengthInput(seat, kind),
      ...(kind === 'shaft-yield' || rotation === 0
        ? []
        : [input('σ_ω', 'hoop stress of rotation', toMPa(rotation), 'MPa', 'calculated')]),
      ...ringInputs(seat),
      ...lossInputs(seat, state),
    ],
    model: RING_MODEL,
    validity: RING_VALIDITY,
    sources: [cite('shigley-9', 'Eqs. 3-56, 3-58, chapter 5'), cite('lame')],
  }
}

function limitFormula(kind: 'hub-yield' | 'hub-brittle' | 'shaft-yield', seat: Seat): string[] {
  switch (kind) {
    case 'hub-yield':
      return [
        '(c^2 + c + 1) p_perm^2 + (2c + 1) σ_ω p_perm + σ_ω^2 = (R_e/S)^2',
        'c = (1 + Q_A^2)/(1 − Q_A^2)',
      ]
    case 'hub-brittle':
      return ['p_perm = (R_m/S − σ_ω) (1 − Q_A^2)/(1 + Q_A^2)']
    case 'shaft-yield':
      return [seat.rings.shaft.bore > 0 ? 'p_perm = R_e (1 − Q_I^2)/(2 S)' : 'p_perm = R_e/S']
  }
}

function strengthInput(seat: Seat, kind: 'hub-yield' | 'hub-brittle' | 'shaft-yield'): DerivationInput {
  const { hub, shaft } = seat.rings
  switch (kind) {
    case 'hub-yield':
      return input(
        'R_e',
        'yield strength of the hub',
        toMPa(hub.material.yieldStrength),
        'MPa',
        hub.material.name,
      )
    case 'hub-brittle':
      return input(
        'R_m',
        'tensile strength of the hub',
        toMPa(hub.material.tensileStrength),
        'MPa',
        hub.material.name,
      )
    case 'shaft-yield':
      return input(
        'R_e',
        'yield strength of the shaft',
        toMPa(shaft.material.yieldStrength),
        'MPa',
        shaft.material.name,
      )
  }
}

function heatBody(seat: Seat): Body {
  const { joint, handlingAllowance, hubLimit } = seat.joining
  const isCooled = joint.shaftTemperature < joint.ambient
  return {
    formula: [
      isCooled
        ? 'd_perm = D (α_A (t_lim − Δt_h − t_0) − α_I (t_I − t_0)) − s'
        : 'd_perm = D α_A (t_lim − Δt_h − t_0) − s',
    ],
    inputs: [
      diameter(seat),
      input('α_A', 'expansion of the hub', joint.hub.expansion, '1/K', joint.hub.name),
      input(
        't_lim',
        'hottest the hub may get',
        hubLimit === null ? 'not known' : toCelsius(hubLimit),
        '°C',
        'material or entered',
      ),
      input('Δt_h', 'lost between oven and seat', handlingAllowance, 'K', 'entered'),
      input('t_0', 'room temperature', toCelsius(joint.ambient), '°C', 'entered, else 20 °C'),
      input('s', 'clearance while travelling', toUm(joint.clearance), 'µm', 'entered, else D/1000'),
      ...(isCooled ? cooledShaftInputs(joint) : []),
    ],
    model: 'The bore grows by as much as the oven may heat it, less the clearance it travels with.',
    validity: 'Mean expansion from 20 °C upward; hub evenly heated.',
    sources: [cite('din-7190-1', 'joining temperature')],
  }
}

function coldBody(seat: Seat): Body {
  const { joint } = seat.joining
  return {
    formula: ['d_perm = D α_I (t_0 − t_I) − s'],
    inputs: [
      diameter(seat),
      input('α_I', 'contraction of the shaft', joint.shaft.coolingExpansion, '1/K', joint.shaft.name),
      input('t_0', 'room temperature', toCelsius(joint.ambient), '°C', 'entered, else 20 °C'),
      input(
        't_I',
        'coldest the shaft gets',
        toCelsius(coldestShaft(seat)),
        '°C',
        'entered, else liquid nitrogen',
      ),
      input('s', 'clearance while travelling', toUm(joint.clearance), 'µm', 'entered, else D/1000'),
    ],
    model: 'The shaft shrinks by as much as it can be cooled, less the clearance it travels with.',
    validity: 'Mean contraction from 20 to −196 °C.',
    sources: [cite('din-7190-1', 'joining temperature')],
  }
}
