/**
 * Source: R. G. Budynas, J. K. Nisbett, Shigley's Mechanical Engineering Design, Examples 13-7 (spur), 13-8 (straight
 * bevel) and 13-9 (helical). The printed figures are from memory; tolerances are half a unit of their last digit, or
 * one unit where the book calculates on with rounded figures.
 */
import { describe, expect, it } from 'vitest'
import {
  bevelToothForces,
  gearMeshLoad,
  helicalToothForces,
  pitchDiameter,
} from '@shared/engineering/load-sources/gear-mesh'
import { degree, inch, mm, newtonMetre, rpm } from '@shared/engineering/quantities/units'

const WATT_PER_HP = 745.6998715822702
const NEWTON_PER_LBF = 4.4482216152605

describe('Shigley Example 13-7, spur gears', () => {
  const diameter = pitchDiameter(20, mm(2.5), degree(0))
  const forces = helicalToothForces({
    torque: newtonMetre(2500 / rpm(1750)),
    pitchDiameter: diameter,
    normalPressureAngle: degree(20),
    helixAngle: degree(0),
    hand: 'right',
  })
  it('gives 0.546 kN tangential, 0.199 kN radial, 0.581 kN together', () => {
    expect(forces.tangential / 1e3).toBeCloseTo(0.546, 3)
    expect(forces.radial / 1e3).toBeCloseTo(0.199, 3)
    expect(Math.hypot(forces.tangential, forces.radial) / 1e3).toBeCloseTo(0.581, 3)
    expect(Math.abs(forces.axial)).toBe(0)
  })
  it('pushes the gear away from its mate and turns it with its own torque', () => {
    const load = gearMeshLoad(forces, diameter, degree(0))
    expect(load.forceY / 1e3).toBeCloseTo(-0.199, 3)
    expect(load.forceZ / 1e3).toBeCloseTo(0.546, 3)
    expect(load.torque).toBeCloseTo(2500 / rpm(1750), 9)
  })
})

describe('Shigley Example 13-9, helical gears', () => {
  const diameter = pitchDiameter(18, inch(1 / 12), degree(30))
  const forces = helicalToothForces({
    torque: newtonMetre(WATT_PER_HP / rpm(1800)),
    pitchDiameter: diameter,
    normalPressureAngle: degree(20),
    helixAngle: degree(30),
    hand: 'right',
  })
  it('gives a pitch diameter of 1.732 in', () => {
    expect(diameter / 0.0254).toBeCloseTo(1.732, 3)
  })
  it('gives 40.4, 17.0 and 23.3 lbf', () => {
    expect(forces.tangential / NEWTON_PER_LBF).toBeCloseTo(40.4, 1)
    expect(forces.radial / NEWTON_PER_LBF).toBeCloseTo(17.0, 1)
    expect(Math.abs(forces.axial) / NEWTON_PER_LBF).toBeCloseTo(23.3, 1)
  })
})

describe('Shigley Example 13-8, straight bevel gears', () => {
  const forces = bevelToothForces({
    torque: newtonMetre((5 * WATT_PER_HP) / rpm(600)),
    meanDiameter: inch(2 * 1.293),
    pressureAngle: degree(20),
    pitchConeAngle: degree((Math.atan(1 / 3) * 180) / Math.PI),
    largeEnd: 'right',
  })
  it('gives 406 lbf tangential; the pinion carries as axial what the gear carries as radial and the other way round', () => {
    expect(forces.tangential / NEWTON_PER_LBF).toBeCloseTo(406, 0)
    // Printed for the gear: 46.6 (with a cone angle rounded to 71.6°) and 140 lbf.
    expect(Math.abs(forces.axial / NEWTON_PER_LBF - 46.6)).toBeLessThan(0.5)
    expect(Math.abs(forces.radial / NEWTON_PER_LBF - 140)).toBeLessThan(0.5)
  })
})
