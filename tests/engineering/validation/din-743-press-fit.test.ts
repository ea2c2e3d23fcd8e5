/**
 * Source: DIN 743-2, tested notch factors of interference-fit seats at 40 mm (table from memory, one decimal), and
 * O. J. Horger, J. L. Maulbetsch, J. Appl. Mech. 3 (1936) A91: press-fitted members cut the bending fatigue strength of
 * 2 in axles to between one half and one third, so the factor lies between 2 and 3.
 */
import { describe, expect, it } from 'vitest'
import { mPa } from '@shared/engineering/quantities/units'
import { seatEdgeNotchFactors } from '@shared/engineering/shaft/notch-factors'
import { SEAT_EDGE_FACTORS } from '@shared/validation/data/seat-edge-factors'

describe('seat edge in bending and torsion', () => {
  it.each(SEAT_EDGE_FACTORS)('%i MPa: %f and %f', (tensile, bending, torsion) => {
    const factors = seatEdgeNotchFactors(mPa(tensile))
    // the table is rounded to one decimal
    expect(Math.abs(factors.bending - bending)).toBeLessThanOrEqual(0.0501)
    expect(Math.abs(factors.torsion - torsion)).toBeLessThanOrEqual(0.0501)
  })
})

it('lies between the 2 and 3 of the 1936 axle tests', () => {
  for (const tensile of [500, 700, 900]) {
    const { bending } = seatEdgeNotchFactors(mPa(tensile))
    expect(bending).toBeGreaterThanOrEqual(2)
    expect(bending).toBeLessThanOrEqual(3)
  }
})
