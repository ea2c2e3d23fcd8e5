/**
 * Source: J. M. Gere, Mechanics of Materials, example on nonprismatic beams: span L on simple supports, I in the outer
 * quarters, 2I in the middle half, load P at midspan. Deflection 3PL³/(256EI), end slope 5PL²/(128EI); from memory, the
 * closed forms hold exactly.
 */
import { expect, it } from 'vitest'
import { metre, mm, newton, newtonMetre, pascal } from '@shared/engineering/quantities/units'
import { shapeAt } from '@shared/engineering/shaft/beam-shape'
import { factorBeam, solveBeam } from '@shared/engineering/shaft/beam-solver'
import { secondMomentOfArea } from '@shared/engineering/shaft/section-properties'
import { elastic } from '../support/test-material'

const youngsModulus = pascal(2e11)
const outer = mm(40)
const middle = metre(outer * 2 ** 0.25)
const bore = mm(0)
const load = {
  station: metre(0.5),
  torque: newtonMetre(0),
  forceY: newton(-1000),
  forceZ: newton(0),
  axialForce: newton(0),
  momentY: newtonMetre(0),
  momentZ: newtonMetre(0),
}
const beam = factorBeam(
  {
    material: elastic(youngsModulus, 0.3),
    segments: [
      { start: metre(0), end: metre(0.25), outerDiameter: outer, bore },
      { start: metre(0.25), end: metre(0.75), outerDiameter: middle, bore },
      { start: metre(0.75), end: metre(1), outerDiameter: outer, bore },
    ],
  },
  [
    { station: metre(0), stiffness: null },
    { station: metre(1), stiffness: null },
  ],
  [load.station],
)
const solution = solveBeam(beam, [load])
const stiffness = youngsModulus * secondMomentOfArea(outer, bore)

it('deflects by 3 PL³/(256 EI) at midspan', () => {
  const expected = (-1000 * 3) / (256 * stiffness)
  expect(shapeAt(beam, solution, metre(0.5)).deflectionY / expected).toBeCloseTo(1, 9)
})

it('tilts by 5 PL²/(128 EI) at its ends', () => {
  const expected = (-1000 * 5) / (128 * stiffness)
  expect(shapeAt(beam, solution, metre(0)).slopeY / expected).toBeCloseTo(1, 9)
  expect(shapeAt(beam, solution, metre(1)).slopeY / -expected).toBeCloseTo(1, 9)
})
