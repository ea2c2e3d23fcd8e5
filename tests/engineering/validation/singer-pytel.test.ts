/**
 * Source: F. L. Singer, A. Pytel, Strength of Materials. Problem 267: steel tire 12 mm thick on a rigid wheel of 2 m,
 * joined at 80 °C, pressure at 25 °C printed 1.5444 MPa (thin ring; a thick ring gives 1 % less, hence 1.5 %).
 * Problem 302: 12 kN·m on a shaft of 113.98 mm, shear stress printed 41.27 MPa.
 */
import { expect, it } from 'vitest'
import { interfacePressure, seatCompliance } from '@shared/engineering/interference-fit/interface-pressure'
import {
  interferenceForHeatLimit,
  joiningTemperature,
  type HeatedJoint,
} from '@shared/engineering/interference-fit/joining-temperature'
import { temperatureChange } from '@shared/engineering/interference-fit/temperature-change'
import {
  celsius,
  gPa,
  mm,
  newton,
  newtonMetre,
  perKelvin,
  toCelsius,
  toMm,
  toMPa,
} from '@shared/engineering/quantities/units'
import { nominalStress } from '@shared/engineering/shaft/shaft-stress'
import { elastic } from '../support/test-material'

const tireSteel = { ...elastic(gPa(200), 0.3), expansion: perKelvin(11.7e-6) }
const rigid = elastic(gPa(1e9), 0.3)
const joint: HeatedJoint = {
  seatDiameter: mm(2000),
  clearance: mm(0),
  ambient: celsius(25),
  shaftTemperature: celsius(25),
  hub: tireSteel,
  shaft: rigid,
}

it('Problem 267: 55 K of shrinking press the tire on with 1.5444 MPa', () => {
  const interference = interferenceForHeatLimit(celsius(80), 0, joint)
  const compliance = seatCompliance({
    seatDiameter: mm(2000),
    shaft: { bore: mm(0), material: rigid },
    hub: { outerDiameter: mm(2024), material: tireSteel },
  })
  const pressure = toMPa(interfacePressure(interference, compliance))
  expect(Math.abs(pressure / 1.5444 - 1)).toBeLessThan(0.015)
})

it('Problem 267 backwards: 1.287 mm just slip on at 80 °C', () => {
  expect(toMm(interferenceForHeatLimit(celsius(80), 0, joint))).toBeCloseTo(1.287, 3)
  expect(toCelsius(joiningTemperature(mm(1.287), joint))).toBeCloseTo(80, 3)
  const change = temperatureChange(mm(2000), rigid.expansion, celsius(20), tireSteel.expansion, celsius(75))
  expect(toMm(change)).toBeCloseTo(-1.287, 3)
})

it('Problem 302: 41.27 MPa in torsion', () => {
  const stress = nominalStress(newtonMetre(0), newtonMetre(12_000), newton(0), mm(113.98), mm(0))
  expect(toMPa(stress.torsion)).toBeCloseTo(41.27, 2)
})
