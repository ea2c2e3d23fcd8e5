/**
 * Source: S. Timoshenko, Strength of Materials, Part II, shrink-fit stresses: compound cylinder of radii 4, 6 and 8 in,
 * radial interference 0.005 in. Printed pressure 4050 psi, recalled from memory, printed to the nearest 10 psi.
 */
import { expect, it } from 'vitest'
import { interfacePressure, seatCompliance } from '@shared/engineering/interference-fit/interface-pressure'
import { inch, psi, toPsi } from '@shared/engineering/quantities/units'
import { elastic } from '../support/test-material'

it('gives 4050 psi between the cylinders', () => {
  const steel = elastic(psi(30e6), 0.3)
  const compliance = seatCompliance({
    seatDiameter: inch(12),
    shaft: { bore: inch(8), material: steel },
    hub: { outerDiameter: inch(16), material: steel },
  })
  expect(Math.abs(toPsi(interfacePressure(inch(0.01), compliance)) - 4050)).toBeLessThan(5)
})
