/**
 * Independent check of the thick-ring formulas: the equilibrium equation of a rotating ring in plane stress,
 * r u″ + u′ − u/r = −(1 − ν²) ρ ω² r²/E, integrated here by fourth-order Runge-Kutta from the free surface, two solutions
 * combined by shooting. No closed form is used. Tolerance 1e-8, the error of 2000 steps.
 */
import { describe, expect, it } from 'vitest'
import { hubStress } from '@shared/engineering/interference-fit/hub-stress'
import { seatCompliance } from '@shared/engineering/interference-fit/interface-pressure'
import { rotationHoopStress, speedLoss } from '@shared/engineering/interference-fit/speed-loss'
import { gPa, metre, mPa, pascal, rpm } from '@shared/engineering/quantities/units'
import { elastic } from '../support/test-material'

interface Ring {
  inner: number
  outer: number
  modulus: number
  poisson: number
  density: number
  speed: number
}
type State = [displacement: number, radialStress: number]

const STEPS = 2000

/** du/dr and dσ_r/dr from Hooke's law and equilibrium; hoop stress follows from u and σ_r. */
function rates(ring: Ring, r: number, [u, radial]: State): State {
  const strainHoop = u / r
  const strainRadial = ((1 - ring.poisson ** 2) * radial) / ring.modulus - ring.poisson * strainHoop
  const hoop = ring.modulus * strainHoop + ring.poisson * radial
  return [strainRadial, (hoop - radial) / r - ring.density * ring.speed ** 2 * r]
}

function integrate(ring: Ring, from: number, to: number, start: State): State {
  const h = (to - from) / STEPS
  let state = start
  const moved = (rate: State, by: number): State => [state[0] + rate[0] * by, state[1] + rate[1] * by]
  for (let step = 0; step < STEPS; step += 1) {
    const r = from + step * h
    const k1 = rates(ring, r, state)
    const k2 = rates(ring, r + h / 2, moved(k1, h / 2))
    const k3 = rates(ring, r + h / 2, moved(k2, h / 2))
    const k4 = rates(ring, r + h, moved(k3, h))
    state = [
      state[0] + (h / 6) * (k1[0] + 2 * k2[0] + 2 * k3[0] + k4[0]),
      state[1] + (h / 6) * (k1[1] + 2 * k2[1] + 2 * k3[1] + k4[1]),
    ]
  }
  return state
}

/** Displacement at `to` for a given radial stress there and a free surface at `from`. */
function displacementAt(ring: Ring, from: number, to: number, radialStress: number): number {
  const one = integrate(ring, from, to, [1e-6, 0])
  const other = integrate(ring, from, to, [2e-6, 0])
  const share = (radialStress - one[1]) / (other[1] - one[1])
  return one[0] + share * (other[0] - one[0])
}

const hubRing: Ring = { inner: 0.03, outer: 0.055, modulus: 70e9, poisson: 0.33, density: 2700, speed: 0 }
const shaftRing: Ring = { inner: 0.0125, outer: 0.03, modulus: 206e9, poisson: 0.3, density: 7850, speed: 0 }
const rings = {
  seatDiameter: metre(0.06),
  shaft: { bore: metre(0.025), material: elastic(gPa(206), 0.3, 7850) },
  hub: { outerDiameter: metre(0.11), material: elastic(gPa(70), 0.33, 2700) },
}

describe('rings under pressure', () => {
  const pressure = 50e6
  it('needs the same interference for 50 MPa', () => {
    const hub = displacementAt(hubRing, hubRing.outer, hubRing.inner, -pressure)
    const shaft = displacementAt(shaftRing, shaftRing.inner, shaftRing.outer, -pressure)
    const closed = seatCompliance(rings).interferencePerPressure * pressure
    expect(closed / (2 * (hub - shaft))).toBeCloseTo(1, 8)
  })
  it('has the same hoop stress at the hub bore', () => {
    const u = displacementAt(hubRing, hubRing.outer, hubRing.inner, -pressure)
    const hoop = (hubRing.modulus * u) / hubRing.inner - hubRing.poisson * pressure
    const closed = hubStress(mPa(50), rings.seatDiameter, rings.hub, pascal(0)).hoopAtBore
    expect(closed / hoop).toBeCloseTo(1, 8)
  })
})

describe('rings under rotation', () => {
  const speed = rpm(9000)
  it('widens by the same amount', () => {
    const hub = displacementAt({ ...hubRing, speed }, hubRing.outer, hubRing.inner, 0)
    const shaft = displacementAt({ ...shaftRing, speed }, shaftRing.inner, shaftRing.outer, 0)
    expect(speedLoss(rings, speed) / (2 * (hub - shaft))).toBeCloseTo(1, 8)
  })
  it('has the same hoop stress at the free bore', () => {
    const u = displacementAt({ ...hubRing, speed }, hubRing.outer, hubRing.inner, 0)
    expect(rotationHoopStress(rings, speed) / ((hubRing.modulus * u) / hubRing.inner)).toBeCloseTo(1, 8)
  })
})
