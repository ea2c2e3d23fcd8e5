/** How the numbers of a hub in one load case came about. */
import { toMm, toMPa, toUm } from '../../engineering/quantities/units'
import type { Derivation, HubCaseQuantity } from '../derivation'
import type { HubCalculation } from '../hub-result'
import type { HubLoadCaseResult } from '../layout-results'
import type { Seat } from '../seat'
import type { SeatCaseState } from '../seat-state'
import { cite, derivation, input, missing, opening, type DerivationBody } from './derivation-parts'
import {
  caseChanges,
  COMPLIANCE_FORMULA,
  demandInputs,
  diameter,
  effectiveLength,
  frictionInputs,
  interference,
  RING_MODEL,
  RING_VALIDITY,
  ringInputs,
  rotationInputs,
  temperatureInputs,
} from './seat-inputs'

type Body = Omit<DerivationBody, 'value'>

export function deriveHubCaseQuantity(
  hub: HubCalculation,
  loadCaseId: string,
  quantity: HubCaseQuantity,
): Derivation {
  const { seat, result } = hub
  const state = hub.states.find((one) => one.seatCase.id === loadCaseId)
  const numbers = result.loadCases.find((one) => one.loadCase === loadCaseId)
  if (!seat || !state || !numbers) {
    const reason = result.notComputable.join('; ') || 'This load case does not exist any more.'
    return missing('No result', '', reason)
  }
  return derivation({ ...bodyOf(seat, state, numbers, quantity), value: valueOf(numbers, quantity) })
}

function valueOf(numbers: HubLoadCaseResult, quantity: HubCaseQuantity): number | null {
  const values: Readonly<Record<HubCaseQuantity, number | null>> = {
    effectiveMin: numbers.effectiveMinUm,
    effectiveMax: numbers.effectiveMaxUm,
    thermalChange: numbers.thermalChangeUm,
    speedLoss: numbers.speedLossUm,
    pressureMin: numbers.pressureMinMPa,
    pressureMax: numbers.pressureMaxMPa,
    torqueCapacity: numbers.torqueCapacityNm,
    axialCapacity: numbers.axialCapacityN,
    torqueSafety: numbers.torqueSafety,
    axialSafety: numbers.axialSafety,
    slipSafety: numbers.slipSafety,
    hubHoopMax: numbers.hubHoopMaxMPa,
    hubEquivalentMax: numbers.hubEquivalentMaxMPa,
    hubYieldSafety: numbers.hubYieldSafety,
    shaftEquivalentMax: numbers.shaftEquivalentMaxMPa,
    shaftYieldSafety: numbers.shaftYieldSafety,
  }
  return values[quantity]
}

function bodyOf(
  seat: Seat,
  state: SeatCaseState,
  numbers: HubLoadCaseResult,
  quantity: HubCaseQuantity,
): Body {
  const inCase = `in ${state.seatCase.name}`
  const result = (symbol: string, name: string, opens: HubCaseQuantity, unit: string) =>
    opening(symbol, name, valueOf(numbers, opens), unit, {
      kind: 'hubCase',
      hub: seat.id,
      loadCase: state.seatCase.id,
      quantity: opens,
    })
  const { hub, shaft } = seat.rings
  const hubMaterial = hub.material
  switch (quantity) {
    case 'effectiveMin':
    case 'effectiveMax': {
      const which = quantity === 'effectiveMin' ? 'min' : 'max'
      return {
        title: `${which === 'min' ? 'Least' : 'Most'} effective interference ${inCase}`,
        formula: [`d_eff = d_${which} − Δd_e + Δd_T − Δd_ω`],
        inputs: [interference(seat, which), ...caseChanges(seat, state)],
        symbol: 'd_eff',
        unit: 'µm',
        model: 'As-made interference less what embedding and rotation take, with the change by temperature.',
        validity: 'Uniform temperature in each part.',
        sources: [cite('din-7190-1', 'effective interference'), cite('shigley-9', 'Eq. 3-60')],
      }
    }
    case 'thermalChange':
      return {
        title: `Change of interference by temperature ${inCase}`,
        formula: ['Δd_T = D (α_I (t_I − 20 °C) − α_A (t_A − 20 °C))'],
        inputs: temperatureInputs(seat, state),
        symbol: 'Δd_T',
        unit: 'µm',
        model: 'Uniform temperature in each part, mean expansion from 20 °C.',
        validity: 'Aluminium above 100 to 120 °C also creeps; that is not covered.',
        sources: [cite('shigley-9', 'Eq. 3-60')],
      }
    case 'speedLoss':
      return {
        title: `Interference lost to rotation ${inCase}`,
        formula: [
          'Δd_ω = 2 (u_A − u_I),  ω = 2π n',
          'u_A = ρ_A ω^2 a/(4 E_A) ((3 + ν_A) b^2 + (1 − ν_A) a^2)',
          'u_I = ρ_I ω^2 a/(4 E_I) ((1 − ν_I) a^2 + (3 + ν_I) i^2)',
          'a = D/2,  b = D_a/2,  i = D_i/2',
        ],
        inputs: rotationInputs(seat, state),
        symbol: 'Δd_ω',
        unit: 'µm',
        model: 'Uniform rotating disks in plane stress.',
        validity: 'Hubs short against their diameter; teeth and bolts outside D_a are not included.',
        sources: [cite('brown-marks', 'Eqs. 3.41 to 3.47'), cite('timoshenko-2', 'rotating disks')],
      }
    case 'pressureMin':
    case 'pressureMax': {
      const which = quantity === 'pressureMin' ? 'effectiveMin' : 'effectiveMax'
      return {
        title: `${quantity === 'pressureMin' ? 'Least' : 'Most'} pressure ${inCase}`,
        formula: ['p = d_eff / (D (K_A + K_I)), 0 when nothing is left', ...COMPLIANCE_FORMULA],
        inputs: [result('d_eff', 'effective interference', which, 'µm'), ...ringInputs(seat)],
        symbol: 'p',
        unit: 'MPa',
        model: RING_MODEL,
        validity: RING_VALIDITY,
        sources: [cite('shigley-9', 'Eqs. 3-56, 7-39'), cite('brown-marks', 'Eqs. 3.11 to 3.15')],
      }
    }
    case 'torqueCapacity':
      return {
        title: `Torque capacity ${inCase}`,
        formula: ['T_slip = μ_c p π D^2 L / 2'],
        inputs: [
          input('μ_c', 'friction round the shaft', seat.friction.circumferential, '', 'entered'),
          result('p', 'least pressure', 'pressureMin', 'MPa'),
          diameter(seat),
          effectiveLength(seat),
        ],
        symbol: 'T_slip',
        unit: 'N·m',
        model: 'Friction of a uniform pressure at the lower end of the tolerance.',
        validity: 'No more than 1.5 D of length should be credited.',
        sources: [cite('shigley-9', 'Eq. 7-49')],
      }
    case 'axialCapacity':
      return {
        title: `Axial capacity ${inCase}`,
        formula: ['F_slip = μ_a p π D L'],
        inputs: [
          input('μ_a', 'friction along the shaft', seat.friction.axial, '', 'entered'),
          result('p', 'least pressure', 'pressureMin', 'MPa'),
          diameter(seat),
          effectiveLength(seat),
        ],
        symbol: 'F_slip',
        unit: 'N',
        model: 'Friction of a uniform pressure at the lower end of the tolerance.',
        validity: 'No more than 1.5 D of length should be credited.',
        sources: [cite('shigley-9', 'Eq. 7-48')],
      }
    case 'torqueSafety':
    case 'axialSafety':
    case 'slipSafety':
      return safetyBody(seat, state, quantity, inCase, [
        result('T_slip', 'torque capacity', 'torqueCapacity', 'N·m'),
        result('F_slip', 'axial capacity', 'axialCapacity', 'N'),
      ])
    case 'hubHoopMax':
      return {
        title: `Hoop tension at the hub bore ${inCase}`,
        formula: [
          'σ_t = p (1 + Q_A^2)/(1 − Q_A^2) + σ_ω,  Q_A = D/D_a',
          'σ_ω = ρ_A ω^2/4 ((3 + ν_A) b^2 + (1 − ν_A) a^2)',
        ],
        inputs: [
          result('p', 'most pressure', 'pressureMax', 'MPa'),
          diameter(seat),
          input('D_a', 'hub outer diameter', toMm(hub.outerDiameter), 'mm', 'entered'),
          input('σ_ω', 'hoop stress of rotation', toMPa(state.rotationHoop), 'MPa', 'calculated'),
        ],
        symbol: 'σ_t',
        unit: 'MPa',
        model: 'Thick ring in plane stress, with the stress of a rotating disk.',
        validity: 'Away from the hub ends; short hubs see up to 20 % more.',
        sources: [cite('shigley-9', 'Eqs. 3-58, 7-44'), cite('brown-marks', 'Eq. 3.43')],
      }
    case 'hubEquivalentMax':
      return {
        title: `Equivalent stress of the hub ${inCase}`,
        formula: ['σ_v = √(σ_t^2 + σ_t p + p^2)'],
        inputs: [
          result('σ_t', 'hoop tension at the bore', 'hubHoopMax', 'MPa'),
          result('p', 'most pressure', 'pressureMax', 'MPa'),
        ],
        symbol: 'σ_v',
        unit: 'MPa',
        model: 'Von Mises in plane stress at the bore, where the radial stress is −p.',
        validity: 'Away from the hub ends; short hubs see up to 20 % more.',
        sources: [cite('shigley-9', 'chapter 5, Eq. 7-44'), cite('fe-press-fit')],
      }
    case 'hubYieldSafety':
      return {
        title: `Safety of the hub ${inCase}`,
        formula: [hubMaterial.isBrittle ? 'S = R_m / σ_t' : 'S = R_e / σ_v'],
        inputs: hubMaterial.isBrittle
          ? [
              input('R_m', 'tensile strength', toMPa(hubMaterial.tensileStrength), 'MPa', hubMaterial.name),
              result('σ_t', 'hoop tension at the bore', 'hubHoopMax', 'MPa'),
            ]
          : [
              input('R_e', 'yield strength', toMPa(hubMaterial.yieldStrength), 'MPa', hubMaterial.name),
              result('σ_v', 'equivalent stress', 'hubEquivalentMax', 'MPa'),
            ],
        symbol: 'S',
        unit: '',
        model: hubMaterial.isBrittle
          ? 'Brittle hub: hoop tension against tensile strength.'
          : 'Ductile hub: von Mises stress against yield strength.',
        validity: 'Usual limits 1.0 to 1.3 against yield, 2 to 3 for brittle hubs (from memory).',
        sources: [cite('shigley-9', 'chapter 5'), cite('din-7190-1', 'strength of the outer part')],
      }
    case 'shaftEquivalentMax':
      return {
        title: `Stress of the shaft from the fit ${inCase}`,
        formula: [shaft.bore > 0 ? 'σ_v = 2 p/(1 − Q_I^2),  Q_I = D_i/D' : 'σ_v = p'],
        inputs: [
          result('p', 'most pressure', 'pressureMax', 'MPa'),
          diameter(seat),
          input('D_i', 'shaft bore', toMm(shaft.bore), 'mm', 'entered'),
        ],
        symbol: 'σ_v',
        unit: 'MPa',
        model: 'Von Mises stress of the fit alone: at the bore of a hollow shaft, everywhere in a solid one.',
        validity: 'Bending and torque come on top; the shaft results combine them.',
        sources: [cite('shigley-9', 'Eqs. 3-58, 7-46'), cite('lame')],
      }
    case 'shaftYieldSafety':
      return {
        title: `Safety of the shaft against the fit ${inCase}`,
        formula: ['S = R_e / σ_v'],
        inputs: [
          input('R_e', 'yield strength', toMPa(shaft.material.yieldStrength), 'MPa', shaft.material.name),
          result('σ_v', 'stress of the fit', 'shaftEquivalentMax', 'MPa'),
        ],
        symbol: 'S',
        unit: '',
        model: 'Von Mises stress of the fit alone against yield strength.',
        validity: 'Bending and torque come on top; the shaft results combine them.',
        sources: [cite('shigley-9', 'chapter 5')],
      }
  }
}

function safetyBody(
  seat: Seat,
  state: SeatCaseState,
  quantity: 'torqueSafety' | 'axialSafety' | 'slipSafety',
  inCase: string,
  capacities: DerivationBody['inputs'],
): Body {
  const titles = {
    torqueSafety: ['Slip safety by torque alone', 'S = T_slip/(K T)'],
    axialSafety: ['Slip safety by axial force alone', 'S = F_slip/(K F)'],
    slipSafety: ['Slip safety', 'S = 1/√((K F/F_slip)^2 + (K T/T_slip)^2)'],
  } as const
  return {
    title: `${titles[quantity][0]} ${inCase}`,
    formula: [titles[quantity][1]],
    inputs: [...capacities, ...demandInputs(state), ...frictionInputs(seat)],
    symbol: 'S',
    unit: '',
    model:
      'Capacity at the least interference over demand with the application factor; friction adds as a vector.',
    validity: `Asked here: ${state.seatCase.criteria.slipSafety}. Usual limits 1.2 to 1.5 steady, 1.5 to 2.5 alternating or shock (from memory).`,
    sources: [cite('din-7190-1', 'combined load'), cite('shigley-9', 'Eqs. 7-48, 7-49')],
    notComputable:
      toUm(state.effectiveMin) <= 0
        ? 'Nothing is left of the interference.'
        : 'This hub has no such load in this load case.',
  }
}
