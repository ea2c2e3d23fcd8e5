/** How the numbers of a hub that hold for all load cases came about. */
import { toMm, toMPa, toUm } from '../../engineering/quantities/units'
import { limitsOfClass } from '../../engineering/tolerances/iso286-limits'
import type { Derivation, DerivationInput, HubQuantity } from '../derivation'
import type { HubCalculation } from '../hub-result'
import type { Seat } from '../seat'
import type { TightState } from '../seat-state'
import { cite, derivation, input, missing, opening } from './derivation-parts'
import { joiningDerivation, pressForceDerivation } from './joining-derivations'
import {
  COMPLIANCE_FORMULA,
  diameter,
  embedding,
  interference,
  RING_MODEL,
  RING_VALIDITY,
  ringInputs,
} from './seat-inputs'
import { windowDerivation } from './window-derivations'

export function deriveHubQuantity(hub: HubCalculation, quantity: HubQuantity): Derivation {
  const { seat, rest, result } = hub
  if (!seat || !rest) return missing(TITLES[quantity], '', result.notComputable.join('; '))
  switch (quantity) {
    case 'interferenceMin':
      return interferenceDerivation(hub, seat, 'min')
    case 'interferenceMax':
      return interferenceDerivation(hub, seat, 'max')
    case 'embeddingLoss':
      return embeddingDerivation(hub, seat)
    case 'windowRequired':
      return windowDerivation(hub, seat, 'required')
    case 'windowPermissible':
      return windowDerivation(hub, seat, 'permissible')
    case 'pressureMaxAtRest':
      return restPressureDerivation(seat, rest)
    case 'hubEquivalentAtRest':
      return hubEquivalentDerivation(seat, rest)
    case 'hubYieldSafetyAtRest':
      return hubSafetyDerivation(seat, rest)
    case 'outerDiameterGrowth':
      return growthDerivation(hub, seat, rest)
    case 'joiningTemperature':
      return joiningDerivation(hub, seat, 'joining')
    case 'ovenTemperature':
      return joiningDerivation(hub, seat, 'oven')
    case 'pressForce':
      return pressForceDerivation(hub, seat, rest)
    case 'effectiveLength':
      return lengthDerivation(seat)
  }
}

const TITLES: Readonly<Record<HubQuantity, string>> = {
  interferenceMin: 'Least interference as made',
  interferenceMax: 'Most interference as made',
  embeddingLoss: 'Interference lost to embedding',
  windowRequired: 'Least interference that holds',
  windowPermissible: 'Most interference that is permitted',
  pressureMaxAtRest: 'Pressure at rest, most interference',
  hubEquivalentAtRest: 'Equivalent stress of the hub at rest',
  hubYieldSafetyAtRest: 'Safety of the hub at rest',
  outerDiameterGrowth: 'Growth of the outer diameter',
  joiningTemperature: 'Joining temperature',
  ovenTemperature: 'Oven temperature',
  pressForce: 'Press force',
  effectiveLength: 'Length that carries',
}

function interferenceDerivation(hub: HubCalculation, seat: Seat, which: 'min' | 'max'): Derivation {
  const { minUm, maxUm } = hub.result.interference
  const value = which === 'min' ? minUm : maxUm
  const common = {
    title: which === 'min' ? TITLES.interferenceMin : TITLES.interferenceMax,
    symbol: which === 'min' ? 'd_min' : 'd_max',
    value,
    unit: 'µm',
    model: 'Seat diameter minus hub bore, both at 20 °C, at the limits of their tolerances.',
  }
  if (seat.fit.kind === 'limits')
    return derivation({
      ...common,
      formula: [which === 'min' ? 'd_min = given' : 'd_max = given'],
      inputs: [input(common.symbol, 'limit of the interference', value ?? 'not given', 'µm', 'entered')],
      validity: 'As entered.',
      sources: [],
    })
  const size = seat.rings.seatDiameter
  const hole = limitsOfClass(size, seat.fit.hole)
  const shaft = limitsOfClass(size, seat.fit.shaft)
  const origin = (toleranceClass: string) => `ISO 286 table, ${toleranceClass} at ${toMm(size)} mm`
  const inputs =
    which === 'min'
      ? [
          input(
            'ei',
            'lower deviation of the seat',
            toUm(shaft.lowerDeviation),
            'µm',
            origin(seat.fit.shaft),
          ),
          input('ES', 'upper deviation of the bore', toUm(hole.upperDeviation), 'µm', origin(seat.fit.hole)),
        ]
      : [
          input(
            'es',
            'upper deviation of the seat',
            toUm(shaft.upperDeviation),
            'µm',
            origin(seat.fit.shaft),
          ),
          input('EI', 'lower deviation of the bore', toUm(hole.lowerDeviation), 'µm', origin(seat.fit.hole)),
        ]
  return derivation({
    ...common,
    formula: [which === 'min' ? 'd_min = ei − ES' : 'd_max = es − EI'],
    inputs,
    validity: 'Nominal sizes up to 500 mm.',
    sources: [cite('iso-286-1'), cite('narayana', 'Tables 15.1 to 15.3')],
  })
}

function embeddingDerivation(hub: HubCalculation, seat: Seat): Derivation {
  return derivation({
    title: TITLES.embeddingLoss,
    formula: ['Δd_e = 0.8 (Rz_A + Rz_I)'],
    inputs: [
      input('Rz_A', 'roughness of the bore', toUm(seat.hubRoughness), 'µm', 'entered'),
      input('Rz_I', 'roughness of the seat', toUm(seat.shaftRoughness), 'µm', 'entered'),
    ],
    symbol: 'Δd_e',
    value: hub.result.interference.embeddingLossUm,
    unit: 'µm',
    model: 'The peaks of each surface are flattened by 0.4 Rz on both sides of the diameter.',
    validity: 'Ground, turned or reamed metal, Rz below about 20 µm; less is lost when the hub is heated.',
    sources: [cite('din-7190-1', 'smoothing of surfaces')],
  })
}

const restReference = (seat: Seat, quantity: HubQuantity) =>
  ({ kind: 'hub', hub: seat.id, quantity }) as const

export const restPressureInput = (seat: Seat, rest: TightState): DerivationInput =>
  opening('p', 'pressure at rest', toMPa(rest.pressureMax), 'MPa', restReference(seat, 'pressureMaxAtRest'))

function restPressureDerivation(seat: Seat, rest: TightState): Derivation {
  return derivation({
    title: TITLES.pressureMaxAtRest,
    formula: ['p = (d_max − Δd_e) / (D (K_A + K_I))', ...COMPLIANCE_FORMULA],
    inputs: [interference(seat, 'max'), embedding(seat), ...ringInputs(seat)],
    symbol: 'p',
    value: toMPa(rest.pressureMax),
    unit: 'MPa',
    model: RING_MODEL,
    validity: RING_VALIDITY,
    sources: [cite('shigley-9', 'Eqs. 3-56, 7-39'), cite('brown-marks', 'Eqs. 3.11 to 3.15')],
  })
}

function hubEquivalentDerivation(seat: Seat, rest: TightState): Derivation {
  return derivation({
    title: TITLES.hubEquivalentAtRest,
    formula: ['σ_v = p √(3 + Q_A^4) / (1 − Q_A^2)', 'Q_A = D/D_a'],
    inputs: [
      restPressureInput(seat, rest),
      diameter(seat),
      input('D_a', 'hub outer diameter', toMm(seat.rings.hub.outerDiameter), 'mm', 'entered'),
    ],
    symbol: 'σ_v',
    value: toMPa(rest.hub.equivalent),
    unit: 'MPa',
    model: 'Von Mises stress at the bore of a thick ring in plane stress.',
    validity: 'Away from the hub ends; short hubs and thin hollow shafts see up to 20 % more at the bore.',
    sources: [cite('shigley-9', 'Eqs. 3-58, 7-44'), cite('fe-press-fit')],
  })
}

function hubSafetyDerivation(seat: Seat, rest: TightState): Derivation {
  const { material } = seat.rings.hub
  return derivation({
    title: TITLES.hubYieldSafetyAtRest,
    formula: material.isBrittle ? ['S = R_m / σ_t', 'σ_t = p (1 + Q_A^2)/(1 − Q_A^2)'] : ['S = R_e / σ_v'],
    inputs: material.isBrittle
      ? [
          input('R_m', 'tensile strength of the hub', toMPa(material.tensileStrength), 'MPa', material.name),
          input('σ_t', 'hoop tension at the bore', toMPa(rest.hub.hoopAtBore), 'MPa', 'calculated'),
          restPressureInput(seat, rest),
        ]
      : [
          input('R_e', 'yield strength of the hub', toMPa(material.yieldStrength), 'MPa', material.name),
          opening(
            'σ_v',
            'equivalent stress at the bore',
            toMPa(rest.hub.equivalent),
            'MPa',
            restReference(seat, 'hubEquivalentAtRest'),
          ),
        ],
    symbol: 'S',
    value: rest.hubSafety,
    unit: '',
    model: material.isBrittle
      ? 'Brittle hub: hoop tension against tensile strength, no credit for plastic flow.'
      : 'Ductile hub: von Mises stress against yield strength.',
    validity: 'Usual limits 1.0 to 1.3 against yield, 2 to 3 for brittle hubs (from memory).',
    sources: [cite('shigley-9', 'chapter 5'), cite('din-7190-1', 'strength of the outer part')],
  })
}

function growthDerivation(hub: HubCalculation, seat: Seat, rest: TightState): Derivation {
  const { outerDiameter, material } = seat.rings.hub
  return derivation({
    title: TITLES.outerDiameterGrowth,
    formula: ['ΔD_a = D_a · 2 p Q_A^2 / (E_A (1 − Q_A^2))', 'Q_A = D/D_a'],
    inputs: [
      restPressureInput(seat, rest),
      diameter(seat),
      input('D_a', 'hub outer diameter', toMm(outerDiameter), 'mm', 'entered'),
      input('E_A', 'Young’s modulus of the hub', toMPa(material.youngsModulus), 'MPa', material.name),
    ],
    symbol: 'ΔD_a',
    value: hub.result.outerDiameterGrowthUm.max,
    unit: 'µm',
    model: 'Outer surface of a thick ring under internal pressure, most interference.',
    validity: 'Plain rings; a webbed wheel grows unevenly.',
    sources: [cite('shigley-9', 'Eq. 3-59'), cite('lame')],
  })
}

function lengthDerivation(seat: Seat): Derivation {
  return derivation({
    title: TITLES.effectiveLength,
    formula: ['L = L_hub on the seat − chamfers of the bore'],
    inputs: [input('L_hub', 'length of the hub', toMm(seat.hubLength), 'mm', 'entered')],
    symbol: 'L',
    value: toMm(seat.effectiveLength),
    unit: 'mm',
    model: 'The stretch of the seat under the hub, without the chamfers at both ends of its bore.',
    validity: 'Lengths over 1.5 diameters hold less than proportionally.',
    sources: [cite('din-7190-1', 'chamfers do not count as seat length')],
  })
}
