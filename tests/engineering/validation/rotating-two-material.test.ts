/**
 * Source: independent 4000-element axisymmetric plane-stress finite-element model of a cast-iron disk (E 110 GPa, nu 0.26,
 * 7200 kg/m³, 200 mm) on a hollow steel shaft (E 210 GPa, nu 0.3, 7850 kg/m³, 80/30 mm), 80 µm effective, 6000 rpm:
 * 39.810308 MPa interface pressure. Tolerance 1e-6, the discretisation of the model.
 */
import { expect, it } from 'vitest'
import { interfacePressure, seatCompliance } from '@shared/engineering/interference-fit/interface-pressure'
import { speedLoss } from '@shared/engineering/interference-fit/speed-loss'
import { gPa, metre, mm, rpm, toMPa, um } from '@shared/engineering/quantities/units'
import { elastic } from '../support/test-material'

it('leaves 39.8103 MPa at 6000 rpm', () => {
  const rings = {
    seatDiameter: mm(80),
    shaft: { bore: mm(30), material: elastic(gPa(210), 0.3, 7850) },
    hub: { outerDiameter: mm(200), material: elastic(gPa(110), 0.26, 7200) },
  }
  const effective = metre(um(80) - speedLoss(rings, rpm(6000)))
  const pressure = toMPa(interfacePressure(effective, seatCompliance(rings)))
  expect(Math.abs(pressure / 39.810308 - 1)).toBeLessThan(1e-6)
})
