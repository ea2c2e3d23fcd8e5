import { describe, expect, it } from 'vitest'
import { gapingReserve, pressureShift } from '@shared/engineering/interference-fit/seat-gaping'
import { mm, mPa, newton, newtonMetre, pascal } from '@shared/engineering/quantities/units'

describe('radial force and tilting moment on a seat', () => {
  it('give themselves back when the shifted pressure is integrated over the seat (equilibrium)', () => {
    const [diameter, length] = [0.06, 0.045]
    const shift = pressureShift(newton(8000), newtonMetre(150), mm(60), mm(45))
    let force = 0
    let moment = 0
    const [rounds, slices] = [720, 400]
    for (let i = 0; i < rounds; i++) {
      const t = ((i + 0.5) / rounds) * 2 * Math.PI
      for (let j = 0; j < slices; j++) {
        const x = ((j + 0.5) / slices - 0.5) * length
        const pressure = (shift.fromForce + (shift.fromMoment * x) / (length / 2)) * Math.cos(t)
        const part = pressure * Math.cos(t) * (diameter / 2) * ((2 * Math.PI) / rounds) * (length / slices)
        force += part
        moment += part * x
      }
    }
    expect(force).toBeCloseTo(8000, 1)
    expect(moment).toBeCloseTo(150, 1)
  })

  it('leave a reserve of pressure over both shifts, and none to speak of without load', () => {
    expect(gapingReserve(mPa(30), { fromForce: mPa(10), fromMoment: mPa(5) })).toBeCloseTo(2, 9)
    expect(gapingReserve(mPa(30), { fromForce: pascal(0), fromMoment: pascal(0) })).toBeNull()
  })
})
