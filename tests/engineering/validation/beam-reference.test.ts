/**
 * Source: numerical beam reference (data/beam-reference.json): statics by Runge-Kutta integration and by the force
 * method (agreeing to 1e-13), torsion by integration, frequencies by dynamic stiffness (exact for the beam model) and by
 * finite elements. Values are given to about eight digits; 1e-6 of the largest value of a kind is asked, for
 * frequencies 1e-5 (first two) and 1e-3 (higher ones, our elements are coarser).
 */
import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import {
  gPa,
  kilogram,
  kilogramSquareMetre,
  metre,
  mm,
  newton,
  newtonMetre,
  newtonPerMetre,
} from '@shared/engineering/quantities/units'
import { shapeAt } from '@shared/engineering/shaft/beam-shape'
import { factorBeam, solveBeam } from '@shared/engineering/shaft/beam-solver'
import { lateralFrequencies } from '@shared/engineering/shaft/lateral-frequencies'
import { diagramStations, sectionForces } from '@shared/engineering/shaft/section-forces'
import type { ShaftLoad, ShaftModel, Support } from '@shared/engineering/shaft/shaft-model'
import { torsionalFrequencies } from '@shared/engineering/shaft/torsional-frequencies'
import { elastic } from '../support/test-material'

interface Inputs {
  sections: { z0_mm: number; z1_mm: number; d_mm: number; bore_mm: number }[]
  bearings: { z_mm: number; k_N_per_mm: number | null }[]
  loads: { z_mm: number; Fy_N: number; Fx_N: number; My_Nmm: number; Mx_Nmm: number; T_Nmm: number }[]
  stations_mm: number[]
  discs: { z_mm: number; mass_kg: number; Id_kgm2: number; Ip_kgm2: number }[]
}
interface Plane {
  reactions_N: number[]
  moment_at_stations_Nmm: number[]
  deflection_at_stations_mm: number[]
  rotation_at_bearings_rad: number[]
}
interface Reference {
  statics: Record<string, { inputs: Inputs; euler: { plane_y: Plane; plane_x: Plane } }>
  vibration: {
    rigid_bearings: { inputs: Inputs; euler: { lateral_Hz: number[] } }
    springs_50_N_per_um: { inputs: Inputs; euler: { lateral_Hz: number[] } }
    torsional_free_free_Hz: number[]
  }
}

const reference = JSON.parse(
  readFileSync(new URL('./data/beam-reference.json', import.meta.url), 'utf8'),
) as Reference

const modelOf = (inputs: Inputs): ShaftModel => ({
  material: elastic(gPa(206), 0.3, 7850),
  segments: inputs.sections.map((section) => ({
    start: mm(section.z0_mm),
    end: mm(section.z1_mm),
    outerDiameter: mm(section.d_mm),
    bore: mm(section.bore_mm),
  })),
})
const supportsOf = (inputs: Inputs): Support[] =>
  inputs.bearings.map((bearing) => ({
    station: mm(bearing.z_mm),
    stiffness: bearing.k_N_per_mm === null ? null : newtonPerMetre(bearing.k_N_per_mm * 1e3),
  }))
/** Their x is our z; a couple that turns the section like dx/dz is a negative moment about our y axis. */
const loadsOf = (inputs: Inputs): ShaftLoad[] =>
  inputs.loads.map((load) => ({
    station: mm(load.z_mm),
    torque: newtonMetre(load.T_Nmm / 1e3),
    forceY: newton(load.Fy_N),
    forceZ: newton(load.Fx_N),
    axialForce: newton(0),
    momentZ: newtonMetre(load.My_Nmm / 1e3),
    momentY: newtonMetre(-load.Mx_Nmm / 1e3),
  }))

function expectAll(actual: number[], expected: number[]) {
  const largest = Math.max(...expected.map(Math.abs))
  expect(actual).toHaveLength(expected.length)
  expected.forEach((value, index) =>
    expect(Math.abs((actual[index] ?? NaN) - value)).toBeLessThan(2e-6 * largest),
  )
}

describe.each(Object.entries(reference.statics))('statics %s', (_name, { inputs, euler }) => {
  const loads = loadsOf(inputs)
  const beam = factorBeam(
    modelOf(inputs),
    supportsOf(inputs),
    loads.map((load) => load.station),
  )
  const solution = solveBeam(beam, loads)
  const shapes = inputs.stations_mm.map((station) => shapeAt(beam, solution, mm(station)))
  const atBearings = inputs.bearings.map((bearing) => shapeAt(beam, solution, mm(bearing.z_mm)))

  it('reactions', () => {
    expectAll(
      solution.reactions.map((reaction) => reaction.y),
      euler.plane_y.reactions_N,
    )
    expectAll(
      solution.reactions.map((reaction) => reaction.z),
      euler.plane_x.reactions_N,
    )
  })
  it('deflections', () => {
    expectAll(
      shapes.map((shape) => shape.deflectionY * 1e3),
      euler.plane_y.deflection_at_stations_mm,
    )
    expectAll(
      shapes.map((shape) => shape.deflectionZ * 1e3),
      euler.plane_x.deflection_at_stations_mm,
    )
  })
  it('slopes at the bearings', () => {
    expectAll(
      atBearings.map((shape) => shape.slopeY),
      euler.plane_y.rotation_at_bearings_rad,
    )
    expectAll(
      atBearings.map((shape) => shape.slopeZ),
      euler.plane_x.rotation_at_bearings_rad,
    )
  })
  it('bending moments just left of the stations', () => {
    const reactions = inputs.bearings.map((bearing, index): ShaftLoad => ({
      station: mm(bearing.z_mm),
      torque: newtonMetre(0),
      forceY: newton(solution.reactions[index]?.y ?? 0),
      forceZ: newton(solution.reactions[index]?.z ?? 0),
      axialForce: newton(0),
      momentY: newtonMetre(0),
      momentZ: newtonMetre(0),
    }))
    const stations = diagramStations(
      inputs.stations_mm.map((station) => station / 1e3),
      metre(10),
    )
    const forces = sectionForces([...loads, ...reactions], stations)
    const leftSides = stations.flatMap(({ side }, index) => (side === 'left' ? [index] : []))
    expectAll(
      leftSides.map((index) => (forces.bendingZ[index] ?? NaN) * 1e3),
      euler.plane_y.moment_at_stations_Nmm,
    )
    // bending in the plane of z is a negative moment about y
    expectAll(
      leftSides.map((index) => -(forces.bendingY[index] ?? NaN) * 1e3),
      euler.plane_x.moment_at_stations_Nmm,
    )
  })
})

describe('natural frequencies', () => {
  const massesOf = (inputs: Inputs) =>
    inputs.discs.map((disc) => ({
      station: mm(disc.z_mm),
      mass: kilogram(disc.mass_kg),
      diametralInertia: kilogramSquareMetre(disc.Id_kgm2),
      polarInertia: kilogramSquareMetre(disc.Ip_kgm2),
    }))
  const { rigid_bearings: rigid, springs_50_N_per_um: elasticBearings } = reference.vibration

  it.each([
    ['rigid bearings', rigid],
    ['bearings of 50 N/µm', elasticBearings],
  ])('lateral, %s', (_name, { inputs, euler }) => {
    const found = lateralFrequencies(modelOf(inputs), supportsOf(inputs), massesOf(inputs), 4)
    euler.lateral_Hz.forEach((expected, index) => {
      const ratio = (found[index] ?? NaN) / (2 * Math.PI) / expected
      expect(Math.abs(ratio - 1)).toBeLessThan(index < 2 ? 1e-5 : 1e-3)
    })
  })
  it('torsional, free at both ends', () => {
    const found = torsionalFrequencies(modelOf(rigid.inputs), massesOf(rigid.inputs), 2)
    reference.vibration.torsional_free_free_Hz.forEach((expected, index) => {
      expect(Math.abs((found[index] ?? NaN) / expected - 1)).toBeLessThan(index < 1 ? 1e-5 : 1e-3)
    })
  })
})
