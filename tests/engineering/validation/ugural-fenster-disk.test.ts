/**
 * Source: A. C. Ugural, S. K. Fenster, Advanced Mechanics of Materials and Applied Elasticity: flat steel disk
 * 0.5 m / 0.1 m on a steel shaft, loose at 6900 rpm (E 200 GPa, nu 0.3; density 7800 kg/m³ from memory). Printed radial
 * interference 5.26e-5 m (recomputed 5.25; one unit of the last digit), 109.2 MPa at rest and 212 MPa at speed.
 */
import { expect, it } from 'vitest'
import { hubStress } from '@shared/engineering/interference-fit/hub-stress'
import { interfacePressure, seatCompliance } from '@shared/engineering/interference-fit/interface-pressure'
import {
  looseningSpeed,
  rotationHoopStress,
  speedLoss,
} from '@shared/engineering/interference-fit/speed-loss'
import { gPa, mm, pascal, rpm, toMPa, toRpm, toUm } from '@shared/engineering/quantities/units'
import { elastic } from '../support/test-material'

const steel = elastic(gPa(200), 0.3, 7800)
const rings = {
  seatDiameter: mm(100),
  shaft: { bore: mm(0), material: steel },
  hub: { outerDiameter: mm(500), material: steel },
}
const loss = speedLoss(rings, rpm(6900))

it('loses 52.6 µm of radial interference at 6900 rpm', () => {
  expect(Math.abs(toUm(loss) / 2 - 52.6)).toBeLessThan(0.15)
})

it('comes loose at 6900 rpm again', () => {
  expect(toRpm(looseningSpeed(rings, loss) ?? rpm(0))).toBeCloseTo(6900, 6)
})

it('carries 109.2 MPa at rest and 212 MPa when loose at speed', () => {
  const pressure = interfacePressure(loss, seatCompliance(rings))
  expect(toMPa(hubStress(pressure, rings.seatDiameter, rings.hub, pascal(0)).hoopAtBore)).toBeCloseTo(
    109.2,
    1,
  )
  expect(toMPa(rotationHoopStress(rings, rpm(6900)))).toBeCloseTo(212, 0)
})
