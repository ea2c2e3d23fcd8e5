/** Inputs that many derivations of a seat share. */
import type { HeatedJoint } from '../../engineering/interference-fit/joining-temperature'
import { toCelsius, toMm, toMPa, toRpm, toUm } from '../../engineering/quantities/units'
import type { DerivationInput } from '../derivation'
import type { Seat } from '../seat'
import type { SeatCaseState } from '../seat-state'
import { input, opening } from './derivation-parts'

/** How the two rings yield under pressure. */
export const COMPLIANCE_FORMULA = [
  'K_A = ((1 + Q_A^2)/(1 − Q_A^2) + ν_A) / E_A',
  'K_I = ((1 + Q_I^2)/(1 − Q_I^2) − ν_I) / E_I',
  'Q_A = D/D_a,  Q_I = D_i/D',
]

export const RING_MODEL =
  'Two thick concentric rings (Lamé) in plane stress, linear elastic, equal lengths, uniform pressure.'
export const RING_VALIDITY =
  'Within the elastic limit; mean pressure within 5 % from length/diameter 0.5 upward, short hubs hold more. A gear counts as a ring of its root diameter.'

export const diameter = (seat: Seat) =>
  input('D', 'seat diameter', toMm(seat.rings.seatDiameter), 'mm', 'entered')

export function ringInputs(seat: Seat): DerivationInput[] {
  const { hub, shaft } = seat.rings
  return [
    diameter(seat),
    input('D_a', 'hub outer diameter', toMm(hub.outerDiameter), 'mm', 'entered'),
    input('D_i', 'shaft bore', toMm(shaft.bore), 'mm', 'entered'),
    input('E_A', 'Young’s modulus of the hub', toMPa(hub.material.youngsModulus), 'MPa', hub.material.name),
    input('ν_A', 'Poisson’s ratio of the hub', hub.material.poissonRatio, '', hub.material.name),
    input(
      'E_I',
      'Young’s modulus of the shaft',
      toMPa(shaft.material.youngsModulus),
      'MPa',
      shaft.material.name,
    ),
    input('ν_I', 'Poisson’s ratio of the shaft', shaft.material.poissonRatio, '', shaft.material.name),
  ]
}

export const effectiveLength = (seat: Seat) =>
  opening('L', 'length that carries', toMm(seat.effectiveLength), 'mm', {
    kind: 'hub',
    hub: seat.id,
    quantity: 'effectiveLength',
  })

export const interference = (seat: Seat, which: 'min' | 'max') =>
  opening(
    which === 'min' ? 'd_min' : 'd_max',
    which === 'min' ? 'least interference' : 'most interference',
    toUm(seat.interference[which]),
    'µm',
    { kind: 'hub', hub: seat.id, quantity: which === 'min' ? 'interferenceMin' : 'interferenceMax' },
  )

export const embedding = (seat: Seat) =>
  opening('Δd_e', 'lost to embedding', toUm(seat.embedding), 'µm', {
    kind: 'hub',
    hub: seat.id,
    quantity: 'embeddingLoss',
  })

export function caseChanges(seat: Seat, state: SeatCaseState): DerivationInput[] {
  const reference = { kind: 'hubCase', hub: seat.id, loadCase: state.seatCase.id } as const
  return [
    embedding(seat),
    opening('Δd_T', 'change by temperature', toUm(state.thermalChange), 'µm', {
      ...reference,
      quantity: 'thermalChange',
    }),
    opening('Δd_ω', 'lost to rotation', toUm(state.speedLoss), 'µm', { ...reference, quantity: 'speedLoss' }),
  ]
}

export function demandInputs(state: SeatCaseState): DerivationInput[] {
  const { seatCase } = state
  return [
    input('T', 'torque on the hub', Math.abs(seatCase.nominalTorque), 'N·m', `loads of ${seatCase.name}`),
    input(
      'F',
      'axial force on the hub',
      Math.abs(seatCase.nominalAxialForce),
      'N',
      `loads of ${seatCase.name}`,
    ),
    input('K', 'application factor', seatCase.applicationFactor, '', seatCase.name),
  ]
}

export function frictionInputs(seat: Seat): DerivationInput[] {
  return [
    input('μ_c', 'friction round the shaft', seat.friction.circumferential, '', 'entered'),
    input('μ_a', 'friction along the shaft', seat.friction.axial, '', 'entered'),
  ]
}

export function temperatureInputs(seat: Seat, state: SeatCaseState): DerivationInput[] {
  const { hub, shaft } = seat.rings
  return [
    diameter(seat),
    input('α_I', 'expansion of the shaft', shaft.material.expansion, '1/K', shaft.material.name),
    input('t_I', 'shaft temperature', toCelsius(state.seatCase.shaftTemperature), '°C', state.seatCase.name),
    input('α_A', 'expansion of the hub', hub.material.expansion, '1/K', hub.material.name),
    input('t_A', 'hub temperature', toCelsius(state.seatCase.hubTemperature), '°C', state.seatCase.name),
  ]
}

export function rotationInputs(seat: Seat, state: SeatCaseState): DerivationInput[] {
  const { hub, shaft } = seat.rings
  return [
    input('n', 'speed', toRpm(state.seatCase.speed), '1/min', state.seatCase.name),
    input('ρ_A', 'density of the hub', hub.material.density, 'kg/m³', hub.material.name),
    input('ρ_I', 'density of the shaft', shaft.material.density, 'kg/m³', shaft.material.name),
    ...ringInputs(seat),
  ]
}

/** What cooling the shaft adds to the inputs of a joining temperature. */
export function cooledShaftInputs(joint: HeatedJoint): DerivationInput[] {
  return [
    input('α_I', 'contraction of the shaft', joint.shaft.coolingExpansion, '1/K', joint.shaft.name),
    input('t_I', 'temperature of the cooled shaft', toCelsius(joint.shaftTemperature), '°C', 'entered'),
  ]
}
