/**
 * Source: axisymmetric finite-element study of press fits with contact (CalculiX 2.20, checked by a second solver), project
 * reference data. Where the two-cylinder formula should hold: mid-plane of hubs six diameters long (agreement 3e-4) and
 * hubs flush at both ends (exact but for 2e-4 of faceting); and the mean pressure from L/d about 0.5 upward, which the
 * study finds up to 5 % above the formula, never below.
 */
import { describe, expect, it } from 'vitest'
import { interfacePressure, seatCompliance } from '@shared/engineering/interference-fit/interface-pressure'
import { gPa, mm, toMPa } from '@shared/engineering/quantities/units'
import { elastic } from '../support/test-material'

const steel = elastic(gPa(206), 0.3)
const aluminium = elastic(gPa(70), 0.33)
const pressure = (seat: number, bore: number, outside: number, hub: typeof steel, interference: number) =>
  toMPa(
    interfacePressure(
      mm(interference),
      seatCompliance({
        seatDiameter: mm(seat),
        shaft: { bore: mm(bore), material: steel },
        hub: { outerDiameter: mm(outside), material: hub },
      }),
    ),
  )
const steelOnSolid = pressure(50, 0, 100, steel, 0.05)

describe('where the formula is right', () => {
  it.each([
    ['steel on solid, L/d 6, mid-plane', steelOnSolid, 77.2649],
    ['aluminium on hollow, L/d 6, mid-plane', pressure(60, 30, 110, aluminium, 0.08), 35.3433],
    ['steel on solid, flush at both ends, mean', steelOnSolid, 77.27],
  ])('%s', (_name, formula, finiteElements) => {
    expect(Math.abs(formula / finiteElements - 1)).toBeLessThan(5e-4)
  })
})

describe('where the formula is on the safe side for grip', () => {
  it.each([
    ['L/d 0.5', 81.1],
    ['L/d 1', 79.1],
    ['L/d 1.2', 78.766],
    ['L/d 2', 78.2],
  ])('steel on solid, %s: mean pressure 0 to 5 %% above', (_name, mean) => {
    expect(mean / steelOnSolid).toBeGreaterThan(1)
    expect(mean / steelOnSolid).toBeLessThan(1.051)
  })
})
