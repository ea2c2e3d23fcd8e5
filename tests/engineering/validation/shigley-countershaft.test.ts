/**
 * Source: Shigley's Mechanical Engineering Design, 9th ed., Example 7-2: gear countershaft in two planes. Loads, places
 * and printed reactions 115.0, 356.7, 1776.0 and 725.3 lbf and 3651 lbf·in are from memory; half a unit of the last
 * digit, and for the moment the rounding of its plane moments.
 */
import { expect, it } from 'vitest'
import { inch, newton, newtonMetre, poundForce, psi } from '@shared/engineering/quantities/units'
import { factorBeam, solveBeam } from '@shared/engineering/shaft/beam-solver'
import { diagramStations, sectionForces } from '@shared/engineering/shaft/section-forces'
import type { ShaftLoad } from '@shared/engineering/shaft/shaft-model'
import { elastic } from '../support/test-material'

const LBF = poundForce(1)
const LBF_INCH = LBF * 0.0254
const load = (stationInch: number, y: number, z: number): ShaftLoad => ({
  station: inch(stationInch),
  torque: newtonMetre(0),
  forceY: poundForce(y),
  forceZ: poundForce(z),
  axialForce: newton(0),
  momentY: newtonMetre(0),
  momentZ: newtonMetre(0),
})

// both gears push the shaft down; their tooth forces across the shaft oppose each other
const loads = [load(2.75, -197, 540), load(8.5, -885, -2431)]
const model = {
  material: elastic(psi(30e6), 0.3),
  segments: [{ start: inch(0), end: inch(11.5), outerDiameter: inch(1.6), bore: inch(0) }],
}
const supports = [
  { station: inch(0.75), stiffness: null },
  { station: inch(10.75), stiffness: null },
]
const beam = factorBeam(model, supports, [inch(2.75), inch(8.5)])
const solution = solveBeam(beam, loads)

it('gives reactions of 356.7 and 115.0 lbf at A, 725.3 and 1776.0 lbf at B', () => {
  const [a, b] = solution.reactions
  const inPounds = (force: number | undefined) => (force ?? 0) / LBF
  expect(inPounds(a?.y)).toBeCloseTo(356.7, 1)
  expect(inPounds(a?.z)).toBeCloseTo(115.0, 1)
  expect(inPounds(b?.y)).toBeCloseTo(725.3, 1)
  expect(inPounds(b?.z)).toBeCloseTo(1776.0, 1)
})

it('gives 3651 lbf·in of bending at 7.5 in', () => {
  const reactions = supports.map((support, index) => ({
    ...load(0, 0, 0),
    station: support.station,
    forceY: newton(solution.reactions[index]?.y ?? 0),
    forceZ: newton(solution.reactions[index]?.z ?? 0),
  }))
  const forces = sectionForces([...loads, ...reactions], diagramStations([inch(7.5)], 1))
  const bending = Math.hypot(forces.bendingY[0] ?? 0, forces.bendingZ[0] ?? 0) / LBF_INCH
  expect(Math.abs(bending - 3651)).toBeLessThan(1)
})
