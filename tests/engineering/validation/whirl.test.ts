/**
 * Source: closed forms of single-disk rotors (de Laval rotor, overhung disk), as in any text on rotor dynamics, and the
 * numerical beam reference of the project's data (dynamic stiffness by matrix exponentials, scipy): two discs on rigid
 * and elastic bearings at rest.
 */
import { describe, expect, it } from 'vitest'
import type { Material } from '@shared/engineering/materials/material'
import {
  celsius,
  gPa,
  kilogram,
  kilogramPerCubicMetre,
  kilogramSquareMetre,
  metre,
  mm,
  mPa,
  newtonPerMicrometre,
  perKelvin,
  radianPerSecond,
} from '@shared/engineering/quantities/units'
import type { CarriedMass, ShaftModel } from '@shared/engineering/shaft/shaft-model'
import {
  criticalSpeeds,
  unbalanceResponse,
  whirlFrequencies,
  whirlModel,
} from '@shared/engineering/shaft/whirl'

const steel = (density: number): Material => ({
  name: 'steel',
  youngsModulus: gPa(206),
  poissonRatio: 0.3,
  expansion: perKelvin(11.5e-6),
  coolingExpansion: perKelvin(8.5e-6),
  density: kilogramPerCubicMetre(density),
  yieldStrength: mPa(400),
  tensileStrength: mPa(600),
  isBrittle: false,
  maxJoiningTemperature: celsius(300),
})

const uniform = (length: number, diameter: number, density: number): ShaftModel => ({
  segments: [{ start: mm(0), end: mm(length), outerDiameter: mm(diameter), bore: mm(0) }],
  material: steel(density),
})
const rigid = (station: number) => ({ station: mm(station), stiffness: null })
const disk = (station: number, mass: number, diametral: number, polar: number): CarriedMass => ({
  station: mm(station),
  mass: kilogram(mass),
  diametralInertia: kilogramSquareMetre(diametral),
  polarInertia: kilogramSquareMetre(polar),
})
const hertz = (omega: number) => omega / (2 * Math.PI)
/** So light that the shaft's own mass is below the tolerance. */
const NO_MASS = 1e-3

describe('two discs at rest against the beam reference', () => {
  const model: ShaftModel = {
    segments: [
      { start: mm(0), end: mm(150), outerDiameter: mm(40), bore: mm(0) },
      { start: mm(150), end: mm(450), outerDiameter: mm(60), bore: mm(0) },
      { start: mm(450), end: mm(600), outerDiameter: mm(45), bore: mm(0) },
    ],
    material: steel(7850),
  }
  const discs = [disk(200, 12, 0.06, 0.12), disk(400, 18, 0.11, 0.22)]
  it.each([
    ['rigid bearings', null, [164.07597, 499.67999, 842.76512]],
    ['springs of 50 N/µm', newtonPerMicrometre(50), [138.60586, 367.12421, 715.54316]],
  ])('%s', (_name, stiffness, expected) => {
    const whirl = whirlModel(
      model,
      [30, 570].map((z) => ({ station: mm(z), stiffness })),
      discs,
    )
    const { forward, backward } = whirlFrequencies(whirl!, radianPerSecond(0), 3)
    forward.forEach((omega, i) => {
      // The reference's Euler-Bernoulli model leaves the shaft's own rotary inertia out: ours is a little lower.
      expect(hertz(omega) / expected[i]!).toBeGreaterThan(0.995)
      expect(hertz(omega) / expected[i]!).toBeLessThan(1.0001)
      expect(omega / backward[i]!).toBeCloseTo(1, 8)
    })
  })
})

describe('overhung disk on a massless shaft (closed form)', () => {
  // Two close bearings act as a clamp at the left end of a long overhang.
  const [length, diameter, mass] = [0.3, 0.03, 8]
  const [diametral, polar] = [0.05, 0.1]
  const EI = (206e9 * Math.PI * diameter ** 4) / 64
  // Stiffness of the free end of a cantilever.
  const k11 = (12 * EI) / length ** 3
  const k12 = (-6 * EI) / length ** 2
  const k22 = (4 * EI) / length
  const whirl = whirlModel(
    uniform(320, 30, NO_MASS),
    [rigid(0), rigid(10), rigid(20)],
    [disk(320, mass, diametral, polar)],
  )

  /** det of [k11 − mω², k12; k12, k22 + ωΩJp − Jdω²] */
  const determinant = (omega: number, speed: number) =>
    (k11 - mass * omega ** 2) * (k22 + omega * speed * polar - diametral * omega ** 2) - k12 ** 2

  it.each([0, 200, 600, 1500])(
    'forward and backward frequencies at %s rad/s solve its quadratic',
    (speed) => {
      const { forward, backward } = whirlFrequencies(whirl!, radianPerSecond(speed), 2)
      const scale = k11 * k22
      // The bearings at 10 and 20 mm hold the shaft a little less than a clamp: within 1.5 % in frequency.
      for (const omega of forward) {
        const [below, above] = [determinant(omega * 1.015, speed), determinant(omega * 0.985, speed)]
        expect(below * above, `forward ${omega}, scale ${scale}`).toBeLessThan(0)
      }
      for (const omega of backward)
        expect(determinant(-omega * 1.015, speed) * determinant(-omega * 0.985, speed)).toBeLessThan(0)
    },
  )

  it('stiffens forward and softens backward whirl the faster it turns', () => {
    const at = (speed: number) => whirlFrequencies(whirl!, radianPerSecond(speed), 1)
    expect(at(1500).forward[0]!).toBeGreaterThan(at(0).forward[0]! * 1.02)
    expect(at(1500).backward[0]!).toBeLessThan(at(0).backward[0]! * 0.98)
  })

  it('has a critical speed where the forward branch meets the speed', () => {
    const [first] = criticalSpeeds(whirl!, 1)
    expect(whirlFrequencies(whirl!, first!, 1).forward[0]! / first!).toBeCloseTo(1, 6)
  })

  it('has no second one: a thin disk (polar inertia twice the diametral) outruns it', () => {
    expect(criticalSpeeds(whirl!, 2).filter((omega) => omega < 1e5)).toHaveLength(1)
  })
})

describe('de Laval rotor', () => {
  const [mass, eccentricity] = [10, 50e-6]
  const whirl = whirlModel(uniform(600, 30, NO_MASS), [rigid(0), rigid(600)], [disk(300, mass, 0, 0)])
  const omega = Math.sqrt((48 * 206e9 * Math.PI * 0.03 ** 4) / 64 / (0.6 ** 3 * mass))

  it('is critical at √(48EI/(l³m))', () => {
    expect(criticalSpeeds(whirl!, 1)[0]! / omega).toBeCloseTo(1, 5)
  })

  it.each([0.3, 0.8, 1.3, 2.5])('deflects e r²/(1 − r²) at r = %s', (r) => {
    const [deflection] = unbalanceResponse(
      whirl!,
      [{ station: mm(300), amount: mass * eccentricity }],
      radianPerSecond(r * omega),
      [metre(0.3)],
    )
    expect(deflection! / Math.abs((eccentricity * r * r) / (1 - r * r))).toBeCloseTo(1, 3)
  })
})

it('needs two bearings', () => {
  expect(whirlModel(uniform(300, 30, 7850), [rigid(10)], [])).toBeNull()
})
