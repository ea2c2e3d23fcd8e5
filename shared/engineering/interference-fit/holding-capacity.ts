/** What a seat holds by friction, and how safe it is against slipping. */
import { requireFinite, requireNonNegative, requirePositive } from '../engineering-input-error'
import type { Force, Length, Moment, Pressure } from '../quantities/quantity'
import { newton, newtonMetre, pascal } from '../quantities/units'

export interface SeatFriction {
  circumferential: number
  axial: number
}

export interface SlipDemand {
  /** Magnitude with the application factor, ≥ 0. */
  torque: Moment
  /** Magnitude with the application factor, ≥ 0. */
  axialForce: Force
}

/**
 * Axial force at which the seat slips along the shaft.
 *
 * Model: uniform pressure, F = μ_a p π D L.
 * @param pressure [Pa] interface pressure, ≥ 0
 * @param seatDiameter [m] joint diameter D, > 0
 * @param effectiveLength [m] seat length that carries, > 0
 * @param axialFriction [-] coefficient along the shaft, > 0
 * @returns [N] axial capacity, ≥ 0
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: do not credit more than 1.5 D of length, long joints slip from the loaded end (din-7190-1, from memory).
 * Source: shigley-9 Eq. 7-48
 * Example: ugural press fit, 18.1 MPa on 100 mm by 100 mm at 0.15: 85.3 kN
 */
export function axialCapacity(
  pressure: Pressure,
  seatDiameter: Length,
  effectiveLength: Length,
  axialFriction: number,
): Force {
  requireNonNegative(pressure, 'pressure')
  requirePositive(seatDiameter, 'seatDiameter')
  requirePositive(effectiveLength, 'effectiveLength')
  requirePositive(axialFriction, 'friction.axial')
  return newton(axialFriction * pressure * Math.PI * seatDiameter * effectiveLength) // Eq. 7-48
}

/**
 * Torque at which the seat slips round the shaft.
 *
 * Model: uniform pressure, T = μ_c p π D² L / 2.
 * @param pressure [Pa] interface pressure, ≥ 0
 * @param seatDiameter [m] joint diameter D, > 0
 * @param effectiveLength [m] seat length that carries, > 0
 * @param circumferentialFriction [-] coefficient round the shaft, > 0
 * @returns [N·m] torque capacity, ≥ 0
 * @throws EngineeringInputError `notPositive`, `negative`
 *
 * Validity: as `axialCapacity`.
 * Source: shigley-9 Eq. 7-49
 * Example: ugural press fit, 18.1 MPa on 100 mm by 100 mm at 0.15: 4.27 kN·m
 */
export function torqueCapacity(
  pressure: Pressure,
  seatDiameter: Length,
  effectiveLength: Length,
  circumferentialFriction: number,
): Moment {
  requireNonNegative(pressure, 'pressure')
  requirePositive(seatDiameter, 'seatDiameter')
  requirePositive(effectiveLength, 'effectiveLength')
  requirePositive(circumferentialFriction, 'friction.circumferential')
  return newtonMetre(
    (circumferentialFriction * pressure * Math.PI * seatDiameter * seatDiameter * effectiveLength) / 2,
  ) // Eq. 7-49
}

/**
 * Safety against slipping under torque and axial force together.
 *
 * Model: friction adds as a vector, S = 1/√((F/F_slip)² + (T/T_slip)²); torque or axial force alone with the other 0.
 * @param demand.torque [N·m] magnitude with the application factor, ≥ 0
 * @param demand.axialForce [N] magnitude with the application factor, ≥ 0
 * @param torqueHeld [N·m] torque capacity, ≥ 0
 * @param axialHeld [N] axial capacity, ≥ 0
 * @returns [-] capacity over demand; 0 when nothing is held, null without demand
 * @throws EngineeringInputError `negative`, `notFinite`
 *
 * Validity: usual limits 1.2 to 1.5 steady, 1.5 to 2.5 alternating or shock (from memory).
 * Source: din-7190-1 (from memory)
 * Example: no published number; 3 and 4 parts in 5 of either capacity give exactly 1
 */
export function slipSafety(demand: SlipDemand, torqueHeld: Moment, axialHeld: Force): number | null {
  requireNonNegative(demand.torque, 'demand.torque')
  requireNonNegative(demand.axialForce, 'demand.axialForce')
  if (demand.torque === 0 && demand.axialForce === 0) return null
  if (demand.torque > 0 && torqueHeld <= 0) return 0
  if (demand.axialForce > 0 && axialHeld <= 0) return 0
  const torqueUse = demand.torque > 0 ? demand.torque / torqueHeld : 0
  const axialUse = demand.axialForce > 0 ? demand.axialForce / axialHeld : 0
  return 1 / Math.hypot(torqueUse, axialUse)
}

/**
 * Interface pressure that holds a demand with a given slip safety.
 *
 * Model: p = S √((F/μ_a)² + (2T/(D μ_c))²) / (π D L).
 * @param demand.torque [N·m] magnitude with the application factor, ≥ 0
 * @param demand.axialForce [N] magnitude with the application factor, ≥ 0
 * @param safety [-] slip safety asked, > 0
 * @param seatDiameter [m] joint diameter D, > 0
 * @param effectiveLength [m] seat length that carries, > 0
 * @param friction [-] coefficients round and along the shaft, > 0
 * @returns [Pa] pressure needed, ≥ 0
 * @throws EngineeringInputError `notPositive`, `notFinite`
 *
 * Validity: as `axialCapacity`.
 * Source: din-7190-1 (from memory); shigley-9 Eqs. 7-48 and 7-49 solved for p
 * Example: ugural press fit backwards, 4.27 kN·m at safety 1: 18.1 MPa
 */
export function pressureForSafety(
  demand: SlipDemand,
  safety: number,
  seatDiameter: Length,
  effectiveLength: Length,
  friction: SeatFriction,
): Pressure {
  requirePositive(safety, 'safety')
  requirePositive(seatDiameter, 'seatDiameter')
  requirePositive(effectiveLength, 'effectiveLength')
  requirePositive(friction.axial, 'friction.axial')
  requirePositive(friction.circumferential, 'friction.circumferential')
  requireFinite(demand.torque, 'demand.torque')
  const axial = demand.axialForce / friction.axial
  const circumferential = (2 * demand.torque) / (seatDiameter * friction.circumferential)
  return pascal((safety * Math.hypot(axial, circumferential)) / (Math.PI * seatDiameter * effectiveLength))
}
