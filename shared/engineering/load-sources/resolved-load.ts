import type { Angle, Force, Length, Moment } from '../quantities/quantity'
import { newton, newtonMetre } from '../quantities/units'

/**
 * What a mesh, belt or cam does to the shaft at its station. x along the shaft, y up, z completing a
 * right-handed system; torque positive when it drives the shaft in its sense of rotation (about +x).
 */
export interface ResolvedLoad {
  torque: Moment
  forceY: Force
  forceZ: Force
  axial: Force
  momentY: Moment
  momentZ: Moment
}

/**
 * Force at a point on a circle round the shaft, moved to the shaft's centre line.
 *
 * Model: equilibrium; M = r × F with r from the centre line to the point of contact.
 * @param radius [m] distance of the contact from the centre line, ≥ 0
 * @param position [rad] angle of the contact from +y, positive in the sense of rotation
 * @param outward [N] radial component, positive away from the centre line
 * @param tangential [N] component in the sense of rotation
 * @param axial [N] component towards +x
 * @returns [N, N·m] forces and moments at the centre line
 * @throws nothing
 *
 * Validity: exact for a rigid part.
 * Source: statics
 * Example: statics, 100 N tangential at 0.1 m on top: 10 N·m of torque and 100 N along +z
 */
export function loadAtContact(
  radius: Length,
  position: Angle,
  outward: Force,
  tangential: Force,
  axial: Force,
): ResolvedLoad {
  const cosine = Math.cos(position)
  const sine = Math.sin(position)
  return {
    torque: newtonMetre(radius * tangential),
    forceY: newton(outward * cosine - tangential * sine),
    forceZ: newton(outward * sine + tangential * cosine),
    axial,
    momentY: newtonMetre(radius * sine * axial),
    momentZ: newtonMetre(-radius * cosine * axial),
  }
}
