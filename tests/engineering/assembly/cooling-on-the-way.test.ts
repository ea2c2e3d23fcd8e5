import { describe, expect, it } from 'vitest'
import {
  heatLoss,
  secondsInAir,
  secondsUntilGrip,
  temperatureInAir,
  type HotPart,
} from '@shared/engineering/assembly/cooling-on-the-way'
import { celsius, kelvin, kilogram, squareMetre, toCelsius } from '@shared/engineering/quantities/units'

const hub: HotPart = {
  mass: kilogram(3),
  specificHeat: 480,
  surface: squareMetre(0.05),
  convection: 10,
  emissivity: 0,
}

describe('cooling of a hot hub', () => {
  it('decays exponentially with m c/(h A) when it does not radiate (Newton)', () => {
    const constant = (3 * 480) / (10 * 0.05)
    const after = temperatureInAir(hub, celsius(220), celsius(20), constant)
    expect(toCelsius(after)).toBeCloseTo(20 + 200 / Math.E, 3)
    expect(secondsInAir(hub, celsius(220), celsius(20), celsius(120))).toBeCloseTo(constant * Math.LN2, 0)
  })

  it('radiates 3085 W from a black square metre at 500 K into 300 K (Stefan-Boltzmann)', () => {
    const black = { ...hub, surface: squareMetre(1), convection: 0, emissivity: 1 }
    expect(heatLoss(black, kelvin(500), kelvin(300))).toBeCloseTo(3084.7, 0)
  })

  it('never falls below the room and says so', () => {
    expect(secondsInAir(hub, celsius(220), celsius(20), celsius(20))).toBeNull()
    expect(secondsInAir(hub, celsius(220), celsius(20), celsius(230))).toBe(0)
    expect(toCelsius(temperatureInAir(hub, celsius(220), celsius(20), 1e6))).toBeCloseTo(20, 3)
  })

  it('grips after the exponential decay of the difference between two equal bodies', () => {
    const part = { ...hub, convection: 0 }
    const seat = {
      gapConductance: 500,
      seatArea: squareMetre(0.01),
      shaftMass: kilogram(3),
      shaftSpecificHeat: 480,
    }
    // Difference 200 K decays with 2 k A/(m c); half of it is left after ln 2 of that.
    const seconds = secondsUntilGrip(part, seat, celsius(220), celsius(20), 100)
    expect(seconds! / ((3 * 480 * Math.LN2) / (2 * 500 * 0.01))).toBeCloseTo(1, 1)
  })

  it('grips at once when placed too cold', () => {
    const seat = {
      gapConductance: 500,
      seatArea: squareMetre(0.01),
      shaftMass: kilogram(1),
      shaftSpecificHeat: 480,
    }
    expect(secondsUntilGrip(hub, seat, celsius(120), celsius(20), 150)).toBe(0)
  })
})
