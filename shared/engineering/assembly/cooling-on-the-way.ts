/** How long a hot hub stays open: lumped cooling in air while it travels, then through the contact. */
import { requireFinite, requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Area, Mass, Temperature } from '../quantities/quantity'
import { kelvin } from '../quantities/units'

/** Boltzmann's constant of radiation, W/(m² K⁴) (CODATA 2018, exact to the digits given). */
const STEFAN_BOLTZMANN = 5.670374419e-8

export interface HotPart {
  mass: Mass
  /** Specific heat, J/(kg K); about 460 to 500 for steel. */
  specificHeat: number
  /** Surface in air. */
  surface: Area
  /** Convection, W/(m² K); 5 to 15 in still air. */
  convection: number
  /** Emissivity of the surface, 0 to 1; 0.3 bright to 0.9 oxidised. */
  emissivity: number
}

/**
 * Heat that a hot part loses to still air and by radiation.
 *
 * Model: Q = A (h (T − T_a) + ε σ (T⁴ − T_a⁴)).
 * @param part [SI] surface, convection and emissivity
 * @param temperature [K] of the part
 * @param ambient [K] of the room
 * @returns [W] heat flow out of the part
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: small part in a large room.
 * Source: heat-transfer
 * Example: heat-transfer, a black square metre at 500 K in a room of 300 K without convection: 3085 W
 */
export function heatLoss(part: HotPart, temperature: Temperature, ambient: Temperature): number {
  requireFinite(temperature, 'temperature')
  requireFinite(ambient, 'ambient')
  return (
    part.surface *
    (part.convection * (temperature - ambient) +
      part.emissivity * STEFAN_BOLTZMANN * (temperature ** 4 - ambient ** 4))
  )
}

/**
 * Temperature of a hot part after a while in air.
 *
 * Model: m c dT/dt = −Q(T), one temperature for the whole part, fourth-order Runge-Kutta.
 * @param part [SI] mass, specific heat, surface, convection, emissivity
 * @param start [K] temperature out of the oven
 * @param ambient [K] of the room
 * @param seconds [s] ≥ 0
 * @returns [K] temperature, between start and ambient
 * @throws EngineeringInputError `notPositive`, `negative`, `notFinite`
 *
 * Validity: Biot number below 0.1, which holds for steel hubs in air.
 * Source: heat-transfer
 * Example: heat-transfer, without radiation the exponential decay with m c/(h A)
 */
export function temperatureInAir(
  part: HotPart,
  start: Temperature,
  ambient: Temperature,
  seconds: number,
): Temperature {
  requirePositive(part.mass, 'mass')
  requirePositive(part.specificHeat, 'specificHeat')
  requirePositive(part.surface, 'surface')
  requireNonNegative(part.convection, 'convection')
  requireNonNegative(part.emissivity, 'emissivity')
  requireFinite(start, 'start')
  requireNonNegative(seconds, 'seconds')
  const capacity = part.mass * part.specificHeat
  const rate = (t: number) => -heatLoss(part, kelvin(t), ambient) / capacity
  const steps = Math.min(2_000, Math.max(20, Math.ceil(seconds)))
  const h = seconds / steps
  let t: number = start
  for (let i = 0; i < steps; i++) {
    const k1 = rate(t)
    const k2 = rate(t + (h / 2) * k1)
    const k3 = rate(t + (h / 2) * k2)
    const k4 = rate(t + h * k3)
    t += (h / 6) * (k1 + 2 * k2 + 2 * k3 + k4)
  }
  return kelvin(t)
}

/**
 * Time until a part has cooled in air to a temperature.
 *
 * Model: `temperatureInAir` solved for the time.
 * @param part [SI] as `temperatureInAir`
 * @param start [K] temperature out of the oven
 * @param ambient [K] of the room
 * @param end [K] temperature asked about
 * @returns [s] time; 0 when it is already that cold, null when it never gets there
 * @throws EngineeringInputError `notPositive`, `negative`, `notFinite`
 *
 * Validity: as `temperatureInAir`.
 * Source: heat-transfer
 * Example: heat-transfer, halfway to ambient without radiation after ln 2 times m c/(h A)
 */
export function secondsInAir(
  part: HotPart,
  start: Temperature,
  ambient: Temperature,
  end: Temperature,
): number | null {
  requireFinite(end, 'end')
  if (end >= start) return 0
  if (end <= ambient || heatLoss(part, start, ambient) <= 0) return null
  let high = 1
  while (temperatureInAir(part, start, ambient, high) > end) {
    high *= 2
    if (high > 1e7) return null
  }
  let low = high / 2
  if (high === 1) low = 0
  for (let i = 0; i < 40; i++) {
    const middle = (low + high) / 2
    if (temperatureInAir(part, start, ambient, middle) > end) low = middle
    else high = middle
  }
  return (low + high) / 2
}

export interface SeatHeatFlow {
  /** Conductance of the narrow gap or light contact between hub and shaft, W/(m² K). */
  gapConductance: number
  seatArea: Area
  shaftMass: Mass
  shaftSpecificHeat: number
}

/**
 * Time from placing a hot hub until it grips.
 *
 * Model: two bodies of one temperature each, the hub and the stretch of shaft under it, exchanging heat through
 * the gap; m_A c_A dT_A/dt = −k A (T_A − T_I) − loss to air. It grips when hub and shaft differ by what the
 * interference needs.
 * @param part [SI] the hub in air
 * @param seat [SI] gap conductance > 0, seat area > 0, mass > 0 and specific heat > 0 of the shaft under the hub
 * @param start [K] hub temperature when placed
 * @param ambient [K] room and shaft
 * @param gripDifference [K] hub minus shaft temperature at which the clearance is gone, ≥ 0
 * @returns [s] time until grip; 0 when it grips at once, null when it never does within three hours
 * @throws EngineeringInputError `notPositive`, `negative`, `notFinite`
 *
 * Validity: an estimate within a factor of two: gap conductance is uncertain (air gap of 50 µm about 500, light
 * contact 2000 to 5000 W/(m² K), common practice).
 * Source: heat-transfer
 * Example: heat-transfer, equal bodies without loss: the difference decays with 2 k A/(m c)
 */
export function secondsUntilGrip(
  part: HotPart,
  seat: SeatHeatFlow,
  start: Temperature,
  ambient: Temperature,
  gripDifference: number,
): number | null {
  requirePositive(part.mass, 'mass')
  requirePositive(part.specificHeat, 'specificHeat')
  requirePositive(seat.gapConductance, 'gapConductance')
  requirePositive(seat.seatArea, 'seatArea')
  requirePositive(seat.shaftMass, 'shaftMass')
  requirePositive(seat.shaftSpecificHeat, 'shaftSpecificHeat')
  requireFinite(start, 'start')
  requireNonNegative(gripDifference, 'gripDifference')
  const hubCapacity = part.mass * part.specificHeat
  const shaftCapacity = seat.shaftMass * seat.shaftSpecificHeat
  const exchange = seat.gapConductance * seat.seatArea
  // A step well below the faster time constant keeps the explicit step stable and the answer smooth.
  const step = 0.02 / (exchange / hubCapacity + exchange / shaftCapacity)
  let hub: number = start
  let shaft: number = ambient
  let previous = hub - shaft
  if (previous <= gripDifference) return 0
  for (let time = 0; time < 10_800; time += step) {
    const flow = exchange * (hub - shaft)
    hub -= (step * (flow + heatLoss(part, kelvin(hub), ambient))) / hubCapacity
    shaft += (step * flow) / shaftCapacity
    const difference = hub - shaft
    if (difference <= gripDifference)
      return time + (step * (previous - gripDifference)) / (previous - difference)
    previous = difference
  }
  return null
}
