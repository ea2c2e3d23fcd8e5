/** Joining temperatures and press force, step by step. */
import { toCelsius, toMm, toMPa, toUm } from '../../engineering/quantities/units'
import type { Derivation } from '../derivation'
import type { HubCalculation } from '../hub-result'
import type { Seat } from '../seat'
import type { TightState } from '../seat-state'
import { cite, derivation, input, missing, opening } from './derivation-parts'
import { cooledShaftInputs, diameter, effectiveLength, interference } from './seat-inputs'

export function joiningDerivation(hub: HubCalculation, seat: Seat, which: 'joining' | 'oven'): Derivation {
  const { method, joint, handlingAllowance } = seat.joining
  const title = which === 'joining' ? 'Joining temperature' : 'Oven temperature'
  if (method === 'press') return missing(title, '°C', 'This hub is pressed on cold.')
  if (method === 'cool-shaft')
    return which === 'joining'
      ? coolingDerivation(hub, seat)
      : missing(title, '°C', 'Only the shaft is cooled.')
  const { joiningC, ovenC } = hub.result.assembly
  if (which === 'oven')
    return derivation({
      title,
      formula: ['t_oven = t_A + Δt_h'],
      inputs: [
        opening('t_A', 'joining temperature', joiningC, '°C', {
          kind: 'hub',
          hub: seat.id,
          quantity: 'joiningTemperature',
        }),
        input('Δt_h', 'lost between oven and seat', handlingAllowance, 'K', 'entered'),
      ],
      symbol: 't_oven',
      value: ovenC,
      unit: '°C',
      model: 'The hub cools on its way from the oven to its seat.',
      validity: 'Allowance from experience with the weight of the hub and the way of handling.',
      sources: [cite('assembly-practice')],
    })
  const isCooled = joint.shaftTemperature < joint.ambient
  return derivation({
    title,
    formula: [
      isCooled ? 't_A = t_0 + (d_max + s)/(α_A D) + (α_I/α_A)(t_I − t_0)' : 't_A = t_0 + (d_max + s)/(α_A D)',
    ],
    inputs: [
      interference(seat, 'max'),
      input('s', 'clearance while travelling', toUm(joint.clearance), 'µm', 'entered, else D/1000'),
      diameter(seat),
      input('α_A', 'expansion of the hub', joint.hub.expansion, '1/K', joint.hub.name),
      input('t_0', 'room temperature', toCelsius(joint.ambient), '°C', 'entered, else 20 °C'),
      ...(isCooled ? cooledShaftInputs(joint) : []),
    ],
    symbol: 't_A',
    value: joiningC,
    unit: '°C',
    model: 'The bore grows by the most interference and the travel clearance; interference before embedding.',
    validity: 'Mean expansion from 20 °C upward; hub evenly heated.',
    sources: [cite('din-7190-1', 'joining temperature'), cite('singer-pytel', 'Problem 267 read backwards')],
  })
}

function coolingDerivation(hub: HubCalculation, seat: Seat): Derivation {
  const { joint } = seat.joining
  return derivation({
    title: 'Shaft temperature for joining',
    formula: ['t_I = t_0 − (d_max + s)/(α_I D)'],
    inputs: [
      interference(seat, 'max'),
      input('s', 'clearance while travelling', toUm(joint.clearance), 'µm', 'entered, else D/1000'),
      diameter(seat),
      input('α_I', 'contraction of the shaft', joint.shaft.coolingExpansion, '1/K', joint.shaft.name),
      input('t_0', 'room temperature', toCelsius(joint.ambient), '°C', 'entered, else 20 °C'),
    ],
    symbol: 't_I',
    value: hub.result.assembly.joiningC,
    unit: '°C',
    model:
      'The shaft shrinks by the most interference and the travel clearance; the hub stays at room temperature.',
    validity: 'Mean contraction from 20 to −196 °C; a material given by values takes 0.75 of its expansion.',
    sources: [cite('din-7190-1', 'joining temperature')],
  })
}

export function pressForceDerivation(hub: HubCalculation, seat: Seat, rest: TightState): Derivation {
  return derivation({
    title: 'Press force',
    formula: ['F_in = μ_in p π D L'],
    inputs: [
      input('μ_in', 'friction while pressing', seat.friction.pressing, '', 'entered'),
      opening('p', 'pressure at rest', toMPa(rest.pressureMax), 'MPa', {
        kind: 'hub',
        hub: seat.id,
        quantity: 'pressureMaxAtRest',
      }),
      input('D', 'seat diameter', toMm(seat.rings.seatDiameter), 'mm', 'entered'),
      effectiveLength(seat),
    ],
    symbol: 'F_in',
    value: hub.result.assembly.pressForceMaxN,
    unit: 'N',
    model: 'Friction over the whole seat at the end of travel, most interference.',
    validity:
      'Oiled parts with a lead-in, slow travel; choose a press 1.5 to 2 times stronger (from memory).',
    sources: [cite('din-7190-1', 'press-in force'), cite('ugural')],
  })
}
