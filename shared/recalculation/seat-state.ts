/** The state of one seat at rest and in each load case: interference, pressure, stress, capacity. */
import { axialCapacity, slipSafety, torqueCapacity } from '../engineering/interference-fit/holding-capacity'
import { hubSafety, hubStress, type HubStress } from '../engineering/interference-fit/hub-stress'
import { interfacePressure } from '../engineering/interference-fit/interface-pressure'
import { shaftSeatStress, type ShaftSeatStress } from '../engineering/interference-fit/shaft-seat-stress'
import { rotationHoopStress, speedLoss } from '../engineering/interference-fit/speed-loss'
import { temperatureChange } from '../engineering/interference-fit/temperature-change'
import type { Force, Length, Moment, Pressure } from '../engineering/quantities/quantity'
import { metre, newton, newtonMetre, pascal } from '../engineering/quantities/units'
import type { SeatCase } from './load-case-inputs'
import type { Seat } from './seat'

/** Stress side of a state: what must not yield, at the most interference. */
export interface TightState {
  pressureMax: Pressure
  hub: HubStress
  hubSafety: number | null
  shaft: ShaftSeatStress
  shaftSafety: number | null
}

export interface SeatCaseState extends TightState {
  seatCase: SeatCase
  thermalChange: Length
  speedLoss: Length
  /** As-made interference less this is effective: embedding − temperature + speed. */
  totalLoss: Length
  rotationHoop: Pressure
  effectiveMin: Length
  effectiveMax: Length
  pressureMin: Pressure
  /** Circumferential and axial demand at the seat surface as one force. */
  requiredResultant: Force
  torqueCapacity: Moment
  axialCapacity: Force
  torqueSafety: number | null
  axialSafety: number | null
  slipSafety: number | null
}

const NO_FORCE = newton(0)
const NO_TORQUE = newtonMetre(0)

/** Stresses for an interference that is effective at its most. */
export function tightState(seat: Seat, effectiveMax: Length, rotationHoop: Pressure): TightState {
  const { seatDiameter, hub, shaft } = seat.rings
  const pressureMax = interfacePressure(effectiveMax, seat.compliance)
  const stress = hubStress(pressureMax, seatDiameter, hub, rotationHoop)
  const ofShaft = shaftSeatStress(pressureMax, seatDiameter, shaft)
  return {
    pressureMax,
    hub: stress,
    hubSafety: hubSafety(stress, hub),
    shaft: ofShaft,
    shaftSafety: ofShaft.equivalent > 0 ? shaft.material.yieldStrength / ofShaft.equivalent : null,
  }
}

export function restState(seat: Seat): TightState {
  return tightState(seat, metre(seat.interference.max - seat.embedding), pascal(0))
}

export function caseState(seat: Seat, seatCase: SeatCase): SeatCaseState {
  const { seatDiameter, hub, shaft } = seat.rings
  const thermal = temperatureChange(
    seatDiameter,
    shaft.material.expansion,
    seatCase.shaftTemperature,
    hub.material.expansion,
    seatCase.hubTemperature,
  )
  const loss = speedLoss(seat.rings, seatCase.speed)
  const totalLoss = metre(seat.embedding - thermal + loss)
  const rotationHoop = rotationHoopStress(seat.rings, seatCase.speed)
  const effectiveMin = metre(seat.interference.min - totalLoss)
  const effectiveMax = metre(seat.interference.max - totalLoss)
  const pressureMin = interfacePressure(effectiveMin, seat.compliance)
  const torqueHeld = torqueCapacity(
    pressureMin,
    seatDiameter,
    seat.effectiveLength,
    seat.friction.circumferential,
  )
  const axialHeld = axialCapacity(pressureMin, seatDiameter, seat.effectiveLength, seat.friction.axial)
  const { torque, axialForce } = seatCase.demand
  return {
    seatCase,
    thermalChange: thermal,
    speedLoss: loss,
    totalLoss,
    rotationHoop,
    effectiveMin,
    effectiveMax,
    pressureMin,
    ...tightState(seat, effectiveMax, rotationHoop),
    requiredResultant: newton(Math.hypot((2 * torque) / seatDiameter, axialForce)),
    torqueCapacity: torqueHeld,
    axialCapacity: axialHeld,
    torqueSafety: slipSafety({ torque, axialForce: NO_FORCE }, torqueHeld, axialHeld),
    axialSafety: slipSafety({ torque: NO_TORQUE, axialForce }, torqueHeld, axialHeld),
    slipSafety: slipSafety(seatCase.demand, torqueHeld, axialHeld),
  }
}
