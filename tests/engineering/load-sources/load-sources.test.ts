import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { EngineeringInputError } from '@shared/engineering/engineering-input-error'
import { beltLoad, beltStrandForces, pullByFactor } from '@shared/engineering/load-sources/belt-pull'
import { camLoad, followerForce } from '@shared/engineering/load-sources/cam-contact'
import { gearMeshLoad, helicalToothForces } from '@shared/engineering/load-sources/gear-mesh'
import { loadAtContact } from '@shared/engineering/load-sources/resolved-load'
import {
  STANDARD_GRAVITY,
  unbalanceLoad,
  weightLoad,
} from '@shared/engineering/load-sources/weight-and-unbalance'
import {
  degree,
  kilogram,
  metre,
  mm,
  newton,
  newtonMetre,
  radian,
  radianPerSecond,
} from '@shared/engineering/quantities/units'

const angle = fc.double({ min: -Math.PI, max: Math.PI, noNaN: true }).map(radian)
const force = fc.double({ min: -1e5, max: 1e5, noNaN: true }).map(newton)

describe('force moved to the centre line', () => {
  it('keeps its magnitude and has the moments of r × F', () => {
    fc.assert(
      fc.property(angle, force, force, force, (position, outward, tangential, axial) => {
        const load = loadAtContact(metre(0.1), position, outward, tangential, axial)
        expect(Math.hypot(load.forceY, load.forceZ)).toBeCloseTo(Math.hypot(outward, tangential), 4)
        const [ry, rz] = [0.1 * Math.cos(position), 0.1 * Math.sin(position)]
        expect(load.torque).toBeCloseTo(ry * load.forceZ - rz * load.forceY, 4)
        expect(load.momentY).toBeCloseTo(rz * axial, 6)
        expect(load.momentZ).toBeCloseTo(-ry * axial, 6)
      }),
    )
  })
})

describe('helical mesh', () => {
  it('gives two meshing gears equal and opposite forces', () => {
    fc.assert(
      fc.property(
        angle,
        fc.double({ min: 1, max: 1e4, noNaN: true }),
        fc.constantFrom('left', 'right'),
        (position, torque, hand) => {
          const common = { normalPressureAngle: degree(20), helixAngle: degree(15) }
          const one = helicalToothForces({
            ...common,
            torque: newtonMetre(torque),
            pitchDiameter: mm(100),
            hand,
          })
          // The mate turns the other way round: seen along +x its torque on its shaft acts in the same tangential sense.
          const other = helicalToothForces({
            ...common,
            torque: newtonMetre(2 * torque),
            pitchDiameter: mm(200),
            hand: hand === 'left' ? 'right' : 'left',
          })
          const a = gearMeshLoad(one, mm(100), position)
          const b = gearMeshLoad(other, mm(200), radian(position + Math.PI))
          expect(a.forceY + b.forceY).toBeCloseTo(0, 4)
          expect(a.forceZ + b.forceZ).toBeCloseTo(0, 4)
          expect(a.axial + b.axial).toBeCloseTo(0, 4)
        },
      ),
    )
  })

  it('cancels axial forces of one hand on an intermediate shaft that takes and gives torque', () => {
    const at = (torque: number) =>
      helicalToothForces({
        torque: newtonMetre(torque),
        pitchDiameter: mm(100),
        normalPressureAngle: degree(20),
        helixAngle: degree(12),
        hand: 'left',
      }).axial
    expect(at(500)).toBeGreaterThan(0)
    expect(at(500) + at(-500)).toBeCloseTo(0, 9)
  })
})

describe('belt', () => {
  const belt = {
    torque: newtonMetre(50),
    pitchDiameter: mm(200),
    effectiveFriction: 0.3,
    wrapAngle: degree(180),
    reserve: 1,
  }

  it('has tight over slack exp(μφ) at the slip limit (Euler-Eytelwein: 2.566 for 0.3 over half a turn)', () => {
    const { tight, slack } = beltStrandForces(belt)
    expect(tight / slack).toBeCloseTo(2.566, 3)
    expect(tight - slack).toBeCloseTo(500, 9)
  })

  it('pulls towards the other pulley, parallel strands with their sum', () => {
    const load = beltLoad(newtonMetre(50), { tight: newton(300), slack: newton(100) }, degree(90), degree(0))
    expect(load.forceY).toBeCloseTo(0, 9)
    expect(load.forceZ).toBeCloseTo(400, 9)
  })

  it('takes the effective pull times the factor', () => {
    expect(pullByFactor(newtonMetre(-100), mm(200), 2)).toBeCloseTo(2000, 9)
  })

  it('refuses a reserve below one and names the field', () => {
    expect(() => beltStrandForces({ ...belt, reserve: 0.8 })).toThrowError(
      expect.objectContaining({ code: 'outOfRange', path: 'reserve' }) as EngineeringInputError,
    )
  })
})

describe('cam', () => {
  const motion = { lift: mm(4), liftRate: mm(10), liftAcceleration: mm(20) }

  it('adds spring, process and inertia forces', () => {
    const follower = {
      motion,
      mass: kilogram(0.1),
      preload: newton(200),
      springRate: 20_000,
      otherForce: newton(50),
    }
    expect(followerForce(follower, radianPerSecond(100))).toBeCloseTo(200 + 80 + 50 + 20, 9)
  })

  it('brakes the shaft by force times lift rate, as work demands', () => {
    const load = camLoad(newton(1000), motion.liftRate, mm(30), degree(0))
    expect(load.torque).toBeCloseTo(-10, 9)
    expect(load.forceY).toBeCloseTo(-1000, 9)
  })

  it('refuses pressure angles above 45°', () => {
    expect(() => camLoad(newton(1), mm(31), mm(30), degree(0))).toThrow(EngineeringInputError)
  })
})

describe('weight and unbalance', () => {
  it('hangs a kilogram downwards with 9.80665 N (ISO 80000-3)', () => {
    expect(weightLoad(kilogram(1), degree(180)).forceY).toBeCloseTo(-STANDARD_GRAVITY, 9)
    expect(STANDARD_GRAVITY).toBe(9.80665)
  })

  it('grows with the square of the speed', () => {
    const at = (speed: number) =>
      unbalanceLoad(kilogram(10), mm(0.05), radianPerSecond(speed), degree(90)).forceZ
    expect(at(100)).toBeCloseTo(5, 9)
    expect(at(200) / at(100)).toBeCloseTo(4, 9)
  })
})
