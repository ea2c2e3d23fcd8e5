/**
 * Source: Shigley's Mechanical Engineering Design, 9th ed., Example 7-5 (pp. 386-388): 35 and 55 lbf at 7 and 20 in on a
 * 1 in steel shaft of 31 in span. Printed influence coefficients 2.061e-4 and 3.534e-4 in/lbf, shaft alone 520.4 rad/s,
 * Dunkerley 120.4 rad/s (lower bound), Rayleigh 124.8 rad/s (upper bound, from memory).
 */
import { expect, it } from 'vitest'
import {
  inch,
  kilogram,
  kilogramPerCubicMetre,
  kilogramSquareMetre,
  newton,
  newtonMetre,
  poundForce,
  psi,
} from '@shared/engineering/quantities/units'
import { shapeAt } from '@shared/engineering/shaft/beam-shape'
import { factorBeam, solveBeam } from '@shared/engineering/shaft/beam-solver'
import { lateralFrequencies } from '@shared/engineering/shaft/lateral-frequencies'
import type { ShaftModel } from '@shared/engineering/shaft/shaft-model'
import { elastic } from '../support/test-material'

const GRAVITY = 386.1 * 0.0254
const massOf = (pounds: number) => kilogram(poundForce(pounds) / GRAVITY)
const shaftOfDensity = (density: number): ShaftModel => ({
  material: { ...elastic(psi(30e6), 0.3), density: kilogramPerCubicMetre(density) },
  segments: [{ start: inch(0), end: inch(31), outerDiameter: inch(1), bore: inch(0) }],
})
const supports = [
  { station: inch(0), stiffness: null },
  { station: inch(31), stiffness: null },
]
const carried = [
  {
    station: inch(7),
    mass: massOf(35),
    diametralInertia: kilogramSquareMetre(0),
    polarInertia: kilogramSquareMetre(0),
  },
  {
    station: inch(20),
    mass: massOf(55),
    diametralInertia: kilogramSquareMetre(0),
    polarInertia: kilogramSquareMetre(0),
  },
]

it('has influence coefficients of 2.061e-4 and 3.534e-4 in/lbf', () => {
  const beam = factorBeam(shaftOfDensity(0), supports, [inch(7), inch(20)])
  const coefficient = (station: number) => {
    const unit = {
      station: inch(station),
      torque: newtonMetre(0),
      forceY: poundForce(1),
      forceZ: newton(0),
      axialForce: newton(0),
      momentY: newtonMetre(0),
      momentZ: newtonMetre(0),
    }
    return shapeAt(beam, solveBeam(beam, [unit]), inch(station)).deflectionY / 0.0254
  }
  expect(coefficient(7) * 1e4).toBeCloseTo(2.061, 3)
  expect(coefficient(20) * 1e4).toBeCloseTo(3.534, 3)
})

it('has a first critical speed between Dunkerley 120.4 and Rayleigh 124.8 rad/s', () => {
  const [first] = lateralFrequencies(shaftOfDensity(0), supports, carried, 1)
  expect(first).toBeGreaterThan(120.4)
  expect(first).toBeLessThan(124.85)
})

it('has 520.4 rad/s without the weights', () => {
  // 0.282 lbf/in³ as mass density
  const density = (poundForce(0.282) / GRAVITY) * (1 / 0.0254) ** 3
  const [first] = lateralFrequencies(shaftOfDensity(density), supports, [], 1)
  expect(Math.abs((first ?? 0) - 520.4)).toBeLessThan(0.1)
})
