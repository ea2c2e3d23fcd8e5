/**
 * Source: R. L. Mott, Machine Elements in Mechanical Design, example on stresses for force fits: bronze bushing
 * 2.000/2.500 in in a 3.500 in steel sleeve, interference 0.0032 in (class FN3). Printed 3518 psi, recalled from memory.
 */
import { expect, it } from 'vitest'
import { interfacePressure, seatCompliance } from '@shared/engineering/interference-fit/interface-pressure'
import { inch, psi, toPsi } from '@shared/engineering/quantities/units'
import { elastic } from '../support/test-material'

it('gives 3518 psi between two materials, hollow inside', () => {
  const compliance = seatCompliance({
    seatDiameter: inch(2.5),
    shaft: { bore: inch(2), material: elastic(psi(17e6), 0.27) },
    hub: { outerDiameter: inch(3.5), material: elastic(psi(30e6), 0.27) },
  })
  expect(toPsi(interfacePressure(inch(0.0032), compliance))).toBeCloseTo(3518, 0)
})
