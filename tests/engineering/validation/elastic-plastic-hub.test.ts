/**
 * Source: independent numerical integration of equilibrium and compatibility in the yielded ring (fourth-order
 * Runge-Kutta, written here), and the reference case of the project's data computed outside this code: 100 mm in
 * 200 mm, Re = 300 MPa, E = 210 GPa, ζ = 1.25.
 */
import { describe, expect, it } from 'vitest'
import {
  elasticPlasticSeat,
  interferenceAtPlasticRatio,
  pressureAtPlasticRatio,
} from '@shared/engineering/interference-fit/elastic-plastic-seat'
import type { SeatRings } from '@shared/engineering/interference-fit/interface-pressure'
import type { Material } from '@shared/engineering/materials/material'
import {
  celsius,
  gPa,
  kilogramPerCubicMetre,
  mm,
  mPa,
  perKelvin,
  toMm,
  toMPa,
} from '@shared/engineering/quantities/units'

const steel = (yieldMPa: number): Material => ({
  name: 'steel',
  youngsModulus: gPa(210),
  poissonRatio: 0.3,
  expansion: perKelvin(11e-6),
  coolingExpansion: perKelvin(8.5e-6),
  density: kilogramPerCubicMetre(7850),
  yieldStrength: mPa(yieldMPa),
  tensileStrength: mPa(600),
  isBrittle: false,
  maxJoiningTemperature: celsius(300),
})
const rings: SeatRings = {
  seatDiameter: mm(100),
  shaft: { bore: mm(0), material: steel(900) },
  hub: { outerDiameter: mm(200), material: steel(300) },
}

describe('elastic-plastic hub', () => {
  it('has 182.846 MPa and needs 0.257746 mm at ζ = 1.25; first yield at 129.904, full yield at 240.113 MPa', () => {
    expect(toMPa(pressureAtPlasticRatio(rings, 1.25))).toBeCloseTo(182.8460397377413, 6)
    expect(toMm(interferenceAtPlasticRatio(rings, 1.25))).toBeCloseTo(0.25774565588822584, 9)
    expect(toMPa(pressureAtPlasticRatio(rings, 1))).toBeCloseTo(129.9038105676658, 6)
    expect(toMPa(pressureAtPlasticRatio(rings, 2))).toBeCloseTo(240.11322677058877, 6)
  })

  it('agrees with Runge-Kutta integration from the elastic-plastic border to the bore', () => {
    const k = 300e6 / Math.sqrt(3)
    const [E, nu] = [210e9, 0.3]
    const border = 1.25 * 0.05
    const outer = 0.1
    // Elastic ring outside the border: at first yield there.
    const q2 = (border / outer) ** 2
    let radial = -k * (1 - q2)
    const hoopAtBorder = k * (1 + q2)
    let displacement = (border / E) * (hoopAtBorder - nu * radial)
    // In the yielded ring: dσ_r/dr = 2k/r; elastic volume change gives du/dr = −u/r + (1−ν)(σ_r+σ_t)/E.
    const slope = (r: number, s: number, u: number) =>
      [(2 * k) / r, -u / r + ((1 - nu) * (s + s + 2 * k)) / E] as const
    const n = 2000
    const h = (0.05 - border) / n
    let r = border
    for (let i = 0; i < n; i++) {
      const [a1, b1] = slope(r, radial, displacement)
      const [a2, b2] = slope(r + h / 2, radial + (h / 2) * a1, displacement + (h / 2) * b1)
      const [a3, b3] = slope(r + h / 2, radial + (h / 2) * a2, displacement + (h / 2) * b2)
      const [a4, b4] = slope(r + h, radial + h * a3, displacement + h * b3)
      radial += (h / 6) * (a1 + 2 * a2 + 2 * a3 + a4)
      displacement += (h / 6) * (b1 + 2 * b2 + 2 * b3 + b4)
      r += h
    }
    expect(toMPa(pressureAtPlasticRatio(rings, 1.25))).toBeCloseTo(-radial / 1e6, 6)
    const shaft = (0.7 * -radial * 0.05) / E
    expect(toMm(interferenceAtPlasticRatio(rings, 1.25))).toBeCloseTo(2e3 * (displacement + shaft), 7)
  })

  it('finds diameter and share from the interference', () => {
    const seat = elasticPlasticSeat(rings, mm(0.25774565588822584))
    expect(toMm(seat.plasticDiameter)).toBeCloseTo(125, 6)
    expect(seat.plasticShare).toBeCloseTo(0.1875, 6)
    expect(seat.isValid).toBe(true)
  })

  it('is the elastic ring below first yield (E d (1 − Q²)/(2 D))', () => {
    const seat = elasticPlasticSeat(rings, mm(0.05))
    expect(toMPa(seat.pressure)).toBeCloseTo((210e3 * 0.05 * 0.75) / 200, 6)
    expect(seat.plasticShare).toBe(0)
  })

  it('says why it does not hold: too much yielded, all yielded, brittle, shaft yields', () => {
    expect(elasticPlasticSeat(rings, mm(0.4)).reasons).toContain('plasticShare')
    expect(elasticPlasticSeat(rings, mm(2)).reasons).toContain('fullyPlastic')
    const brittle = { ...rings, hub: { ...rings.hub, material: { ...rings.hub.material, isBrittle: true } } }
    expect(elasticPlasticSeat(brittle, mm(0.25)).reasons).toContain('brittleHub')
    const hollow = { ...rings, shaft: { bore: mm(70), material: steel(300) } }
    expect(elasticPlasticSeat(hollow, mm(0.3)).reasons).toContain('shaftYields')
  })
})
