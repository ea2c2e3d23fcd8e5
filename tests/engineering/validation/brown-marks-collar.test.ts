/**
 * Source: T. H. Brown Jr., Marks' Calculations for Machine Design, McGraw-Hill 2005, section 3.2, Example 6 (p. 136):
 * solid steel shaft in a steel collar. Printed 2.1 kpsi (US case) and 12.6 MPa (SI case), one decimal each.
 */
import { expect, it } from 'vitest'
import { interfacePressure, seatCompliance } from '@shared/engineering/interference-fit/interface-pressure'
import { gPa, inch, metre, mm, psi, toMPa, toPsi } from '@shared/engineering/quantities/units'
import { elastic } from '../support/test-material'

it('gives 2.1 kpsi for 0.0005 in on a radius of 2 in in a collar of 3 in', () => {
  const steel = elastic(psi(30e6), 0.3)
  const compliance = seatCompliance({
    seatDiameter: inch(4),
    shaft: { bore: inch(0), material: steel },
    hub: { outerDiameter: inch(6), material: steel },
  })
  expect(toPsi(interfacePressure(inch(0.001), compliance)) / 1000).toBeCloseTo(2.1, 1)
})

it('gives 12.6 MPa for 0.01 mm on a radius of 50 mm in a collar of 80 mm', () => {
  const steel = elastic(gPa(207), 0.3)
  const compliance = seatCompliance({
    seatDiameter: mm(100),
    shaft: { bore: mm(0), material: steel },
    hub: { outerDiameter: mm(160), material: steel },
  })
  expect(toMPa(interfacePressure(metre(2e-5), compliance))).toBeCloseTo(12.6, 1)
})
