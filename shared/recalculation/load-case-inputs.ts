/** What a load case means to one hub: speed, temperatures, demand and the criteria it must meet. */
import type { SlipDemand } from '../engineering/interference-fit/holding-capacity'
import type { AngularSpeed, Force, Moment, Temperature } from '../engineering/quantities/quantity'
import { celsius, newton, newtonMetre, rpm } from '../engineering/quantities/units'
import type { Criteria, Hub, LayoutDocument, LoadCase } from '../layout/layout-document'

export interface SeatCase {
  id: string
  name: string
  speed: AngularSpeed
  applicationFactor: number
  shaftTemperature: Temperature
  hubTemperature: Temperature
  /** Sum of the torques on this hub, without application factor, signed. */
  nominalTorque: Moment
  nominalAxialForce: Force
  /** Magnitudes with the application factor. */
  demand: SlipDemand
  criteria: Criteria
}

/** Criteria of a load case: its own where given, else those of the layout. */
export function criteriaOf(document: LayoutDocument, loadCase: LoadCase): Criteria {
  const own = Object.entries(loadCase.criteria ?? {}).filter(([, value]) => value !== undefined)
  return own.length === 0 ? document.criteria : { ...document.criteria, ...Object.fromEntries(own) }
}

export function seatCases(document: LayoutDocument, hub: Hub): SeatCase[] {
  return document.loadCases.map((loadCase) => {
    let torque = 0
    let axial = 0
    for (const load of loadCase.loads) {
      if (load.hub !== hub.id) continue
      torque += load.torqueNm
      axial += load.axialN
    }
    const factor = loadCase.applicationFactor
    return {
      id: loadCase.id,
      name: loadCase.name,
      speed: rpm(loadCase.speedRpm),
      applicationFactor: factor,
      shaftTemperature: celsius(loadCase.shaftC),
      hubTemperature: celsius(loadCase.hubTemperaturesC?.[hub.id] ?? loadCase.hubC),
      nominalTorque: newtonMetre(torque),
      nominalAxialForce: newton(axial),
      demand: {
        torque: newtonMetre(factor * Math.abs(torque)),
        axialForce: newton(factor * Math.abs(axial)),
      },
      criteria: criteriaOf(document, loadCase),
    }
  })
}
