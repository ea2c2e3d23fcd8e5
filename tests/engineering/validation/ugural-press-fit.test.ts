/**
 * Source: A. C. Ugural, Mechanical Design of Machine Components, example "Designing a press fit": steel shaft of radius
 * 50 mm in a cast-iron hub of radius 125 mm, 100 mm long, hoop stress limited to 25 MPa, friction 0.15. Printed 18.1 MPa,
 * 85.3 kN and 4.27 kN·m; recalled from memory. Tolerance: half a unit of the last printed digit.
 */
import { expect, it } from 'vitest'
import {
  axialCapacity,
  pressureForSafety,
  torqueCapacity,
} from '@shared/engineering/interference-fit/holding-capacity'
import { hubStress, permissibleHubPressure } from '@shared/engineering/interference-fit/hub-stress'
import { pressForce } from '@shared/engineering/interference-fit/press-force'
import { gPa, mm, mPa, newton, newtonMetre, pascal, toKN, toMPa } from '@shared/engineering/quantities/units'
import { elastic } from '../support/test-material'

const iron = { ...elastic(gPa(100), 0.25), isBrittle: true, tensileStrength: mPa(25) }
const hub = { outerDiameter: mm(250), material: iron }
const pressure = permissibleHubPressure(1, mm(100), hub, pascal(0))

it('permits 18.1 MPa, at which the bore carries 25 MPa', () => {
  expect(toMPa(pressure)).toBeCloseTo(18.1, 1)
  expect(toMPa(hubStress(pressure, mm(100), hub, pascal(0)).hoopAtBore)).toBeCloseTo(25, 6)
})

it('needs 85.3 kN to press and holds as much', () => {
  expect(toKN(pressForce(pressure, mm(100), mm(100), 0.15))).toBeCloseTo(85.3, 1)
  expect(toKN(axialCapacity(pressure, mm(100), mm(100), 0.15))).toBeCloseTo(85.3, 1)
})

it('holds 4.27 kN·m, and needs that pressure for that torque', () => {
  const torque = torqueCapacity(pressure, mm(100), mm(100), 0.15)
  expect(torque / 1000).toBeCloseTo(4.27, 2)
  const demand = { torque: newtonMetre(torque), axialForce: newton(0) }
  const back = pressureForSafety(demand, 1, mm(100), mm(100), { circumferential: 0.15, axial: 0.15 })
  expect(toMPa(back)).toBeCloseTo(18.1, 1)
})
