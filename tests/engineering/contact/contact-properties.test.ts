import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { COARSE_MESH, FINE_MESH } from '@shared/engineering/contact/contact-mesh'
import type { ContactModel } from '@shared/engineering/contact/contact-model'
import { contactHubResults, shaftSurfaceResult } from '@shared/engineering/contact/contact-results'
import { contactBasis, solveContact, type ContactState } from '@shared/engineering/contact/contact-solution'
import { prepareContact, unitLoadCount } from '@shared/engineering/contact/contact-system'
import { elementStresses } from '@shared/engineering/contact/element-stress'
import { EngineeringInputError } from '@shared/engineering/engineering-input-error'
import { mm, rpm, um } from '@shared/engineering/quantities/units'
import { contactModel, contactState, feCase } from './contact-cases'

function run(model: ContactModel, state: ContactState, quality = COARSE_MESH) {
  const system = prepareContact(model, quality)
  const solution = solveContact(contactBasis(system), state)
  return { system, solution, hubs: contactHubResults(system, solution) }
}

/** Two unequal hubs on a stepped hollow shaft. */
function twoHubs(firstLength: number, gap: number, bore: number): ContactModel {
  const steel = contactModel(feCase('A')).shaftMaterial
  const end = 40 + firstLength + gap + 20 + 30
  return {
    sections: [
      { start: mm(0), end: mm(30), outerDiameter: mm(45), boreDiameter: mm(bore) },
      { start: mm(30), end: mm(end), outerDiameter: mm(50), boreDiameter: mm(bore) },
    ],
    shaftMaterial: steel,
    hubs: [
      {
        id: 'A',
        start: mm(40),
        end: mm(40 + firstLength),
        seatDiameter: mm(50),
        rings: [{ start: mm(0), end: mm(firstLength), outerDiameter: mm(90) }],
        material: steel,
      },
      {
        id: 'B',
        start: mm(40 + firstLength + gap),
        end: mm(60 + firstLength + gap),
        seatDiameter: mm(50),
        rings: [{ start: mm(0), end: mm(20), outerDiameter: mm(75) }],
        material: steel,
      },
    ],
  }
}

function mirrored(model: ContactModel): ContactModel {
  const total = model.sections[model.sections.length - 1]!.end
  const flip = <T extends { start: number; end: number }>(part: T): T => ({
    ...part,
    start: total - part.end,
    end: total - part.start,
  })
  return { ...model, sections: model.sections.map(flip).reverse(), hubs: model.hubs.map(flip).reverse() }
}

const geometry = fc.record({
  length: fc.double({ min: 12, max: 80, noNaN: true }),
  gap: fc.double({ min: 0.5, max: 40, noNaN: true }),
  bore: fc.constantFrom(0, 10, 25, 35),
})

describe('contact solution', () => {
  it('does not change when the shaft is mirrored', () => {
    fc.assert(
      fc.property(geometry, ({ length, gap, bore }) => {
        const model = twoHubs(length, gap, bore)
        const there = run(model, {
          interference: [um(50), um(40)],
          temperatureRise: [0, 30, 10],
          speed: rpm(3000),
        })
        const back = run(mirrored(model), {
          interference: [um(40), um(50)],
          temperatureRise: [0, 10, 30],
          speed: rpm(3000),
        })
        expect(back.hubs[1]!.meanPressure / there.hubs[0]!.meanPressure).toBeCloseTo(1, 8)
        expect(back.hubs[0]!.boreHoopMiddle / there.hubs[1]!.boreHoopMiddle).toBeCloseTo(1, 6)
      }),
      { numRuns: 25 },
    )
  })

  it('is a superposition of interferences while all seats stay closed', () => {
    fc.assert(
      fc.property(geometry, ({ length, gap, bore }) => {
        const model = twoHubs(length, gap, bore)
        const at = (a: number, b: number) => {
          const state = { interference: [um(a), um(b)], temperatureRise: [0, 0, 0], speed: rpm(0) }
          const { hubs, solution } = run(model, state)
          fc.pre(solution.open.size === 0) // close unequal hubs may lift each other's edge
          return hubs[0]!.meanPressure
        }
        expect(at(60, 45) / (at(35, 30) + at(25, 15))).toBeCloseTo(1, 8)
      }),
      { numRuns: 15 },
    )
  })

  it('never loses pressure when its own interference grows', () => {
    fc.assert(
      fc.property(geometry, fc.double({ min: 1, max: 60, noNaN: true }), ({ length, gap, bore }, more) => {
        const model = twoHubs(length, gap, bore)
        const at = (a: number) =>
          run(model, { interference: [um(a), um(20)], temperatureRise: [0, 0, 0], speed: rpm(0) }).hubs[0]!
            .meanPressure
        expect(at(10 + more)).toBeGreaterThan(at(10))
      }),
      { numRuns: 15 },
    )
  })

  it('has a symmetric compliance: what A does to B, B does to A (Maxwell-Betti)', () => {
    const model = twoHubs(30, 4, 20)
    const system = prepareContact(model, COARSE_MESH)
    const basis = contactBasis(system)
    const work = (own: number, other: number) => {
      const interference = [um(0), um(0)]
      interference[own] = um(50)
      // A common interference keeps both seats closed; the reciprocal part is the difference.
      const loaded = solveContact(basis, {
        interference: [um(50), um(50)],
        temperatureRise: [0, 0, 0],
        speed: rpm(0),
      })
      const without = solveContact(basis, {
        interference: [um(own === 0 ? 20 : 50), um(own === 1 ? 20 : 50)],
        temperatureRise: [0, 0, 0],
        speed: rpm(0),
      })
      return system.mesh.seats[other]!.reduce(
        (sum, { hubNode }) => sum + loaded.seatForce[hubNode]! - without.seatForce[hubNode]!,
        0,
      )
    }
    expect(work(0, 1) / work(1, 0)).toBeCloseTo(1, 6)
  })

  it('stores as much energy as the interference puts in', () => {
    const { system, solution } = run(twoHubs(40, 6, 20), {
      interference: [um(50), um(35)],
      temperatureRise: [0, 0, 0],
      speed: rpm(0),
    })
    const { mesh, stiffness } = system
    let stored = 0
    for (let e = 0; e < mesh.part.length; e++)
      for (let i = 0; i < 8; i++)
        for (let j = 0; j < 8; j++) {
          const u = (n: number) => solution.displacement[2 * mesh.quads[4 * e + (n >> 1)]! + (n & 1)]!
          stored += 0.5 * u(i) * stiffness[64 * e + 8 * i + j]! * u(j)
        }
    const put = mesh.seats
      .flatMap((seat, k) =>
        seat.map((pair) => 0.25 * solution.state.interference[k]! * solution.seatForce[pair.hubNode]!),
      )
      .reduce((a, b) => a + b, 0)
    expect(stored / put).toBeCloseTo(1, 8)
  })

  it('leaves a hub and a shaft of one material without stress when all is warmed evenly', () => {
    const { system, solution } = run(twoHubs(40, 6, 0), {
      interference: [um(0), um(0)],
      temperatureRise: [80, 80, 80],
      speed: rpm(0),
    })
    for (const value of elementStresses(system, solution).equivalent)
      expect(Math.abs(value)).toBeLessThan(1e3)
  })

  it('gives a solid shaft in a flush hub minus the pressure everywhere (Lamé)', () => {
    const flush = feCase('G-both0')
    const { system, solution, hubs } = run(contactModel(flush), contactState(flush), FINE_MESH)
    const stresses = elementStresses(system, solution)
    system.mesh.part.forEach((part, e) => {
      if (part !== 0) return
      expect(stresses.radial[e]! / -hubs[0]!.meanPressure).toBeCloseTo(1, 2)
      expect(stresses.hoop[e]! / -hubs[0]!.meanPressure).toBeCloseTo(1, 2)
    })
  })

  it('friction holds the seat along the shaft: a higher middle, no more shear than friction allows', () => {
    const model = contactModel(feCase('B'))
    const free = run(model, contactState(feCase('B')))
    const rough = run(model, { ...contactState(feCase('B')), friction: [0.15] })
    expect(rough.solution.hasSettled).toBe(true)
    expect(rough.hubs[0]!.middlePressure).toBeGreaterThan(1.02 * free.hubs[0]!.middlePressure)
    for (const { hubNode } of rough.system.mesh.seats[0]!)
      expect(Math.abs(rough.solution.seatShear[hubNode]!)).toBeLessThanOrEqual(
        0.15 * rough.solution.seatForce[hubNode]! * 1.001 + 1e-6,
      )
  })

  it('doubles the axial tension of the shaft between close cams, as the finite-element report says', () => {
    const stack = feCase('F')
    const { system, solution } = run(contactModel(stack), contactState(stack), FINE_MESH)
    const surface = shaftSurfaceResult(system, solution)
    const largest = (from: number, to: number) =>
      Math.max(
        ...Array.from(surface.station, (z, i) =>
          surface.isFree[i] && z > from && z < to ? surface.axial[i]! : -Infinity,
        ),
      ) / 1e6
    // 40 MPa outside the end cam, 79 MPa between two cams (project reference data, within 8 %).
    expect(Math.abs(largest(0.0, 0.04) / 40 - 1)).toBeLessThan(0.08)
    expect(Math.abs(largest(0.076, 0.084) / 79 - 1)).toBeLessThan(0.08)
  })

  it('gives finite numbers for any geometry it accepts', () => {
    fc.assert(
      fc.property(
        geometry,
        fc.double({ min: -50, max: 80, noNaN: true }),
        fc.double({ min: 0, max: 20_000, noNaN: true }),
        ({ length, gap, bore }, interference, speed) => {
          const { hubs, solution } = run(twoHubs(length, gap, bore), {
            interference: [um(interference), um(20)],
            temperatureRise: [0, 100, -50],
            speed: rpm(speed),
          })
          expect(solution.displacement.every(Number.isFinite)).toBe(true)
          for (const hub of hubs)
            expect(hub.profile.pressure.every((p) => Number.isFinite(p) && p > -1)).toBe(true)
        },
      ),
      { numRuns: 25 },
    )
  })

  it.each([
    [
      'a hub over a step',
      (m: ContactModel) => ({ ...m, hubs: [{ ...m.hubs[0]!, start: mm(20) }] }),
      'hubs.0.seatDiameter',
    ],
    [
      'a hub beyond the end',
      (m: ContactModel) => ({ ...m, hubs: [{ ...m.hubs[0]!, end: mm(900) }] }),
      'hubs.0.seatDiameter',
    ],
    [
      'overlapping hubs',
      (m: ContactModel) => ({ ...m, hubs: [m.hubs[0]!, { ...m.hubs[1]!, start: mm(50) }] }),
      'hubs.1.rings.0',
    ],
    ['no hubs', (m: ContactModel) => ({ ...m, hubs: [] }), 'sections'],
    [
      'a hub as thin as foil',
      (m: ContactModel) => ({
        ...m,
        hubs: [{ ...m.hubs[0]!, rings: [{ ...m.hubs[0]!.rings[0]!, outerDiameter: mm(50.1) }] }],
      }),
      'hubs.0.rings.0.outerDiameter',
    ],
    [
      'a bore as large as the shaft',
      (m: ContactModel) => ({ ...m, sections: m.sections.map((s) => ({ ...s, boreDiameter: mm(50) })) }),
      'sections.0.boreDiameter',
    ],
  ])('refuses %s and names the field', (_name, change, path) => {
    const model = change(twoHubs(30, 10, 0))
    try {
      prepareContact(model, COARSE_MESH)
      expect.unreachable('must be refused')
    } catch (error) {
      expect(error).toBeInstanceOf(EngineeringInputError)
      expect((error as EngineeringInputError).path).toBe(path)
    }
  })

  it('numbers one unit load for each interference, each part and the speed', () => {
    expect(unitLoadCount(prepareContact(twoHubs(30, 10, 0), COARSE_MESH))).toBe(6)
  })
})
