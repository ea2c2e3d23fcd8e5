/** The inputs of a seat as one short text: what a memoised result depends on, and nothing else. */
import type { Material } from '../engineering/materials/material'
import type { Seat } from './seat'

const materialKeys = new WeakMap<Material, string>()

/** Materials are shared objects; their values are spelled out once. */
function materialKey(material: Material): string {
  let key = materialKeys.get(material)
  if (key === undefined) {
    key = JSON.stringify(material)
    materialKeys.set(material, key)
  }
  return key
}

export function seatKey(seat: Seat): string {
  const { rings, joining, friction, criteria } = seat
  const { joint } = joining
  const inputs: unknown[] = [
    seat.id,
    seat.name,
    seat.role,
    seat.sectionId,
    rings.seatDiameter,
    rings.shaft.bore,
    rings.hub.outerDiameter,
    materialKey(rings.shaft.material),
    materialKey(rings.hub.material),
    seat.effectiveLength,
    seat.hubLength,
    seat.hubRoughness,
    seat.shaftRoughness,
    seat.fit,
    friction.circumferential,
    friction.axial,
    friction.pressing,
    joining.method,
    joining.side,
    joining.handlingAllowance,
    joining.hubLimit,
    joint.clearance,
    joint.ambient,
    joint.shaftTemperature,
    criteria,
  ]
  for (const one of seat.cases) {
    inputs.push(
      one.id,
      one.name,
      one.speed,
      one.applicationFactor,
      one.shaftTemperature,
      one.hubTemperature,
      one.nominalTorque,
      one.nominalAxialForce,
      one.criteria === criteria ? 0 : one.criteria,
    )
  }
  return JSON.stringify(inputs)
}
