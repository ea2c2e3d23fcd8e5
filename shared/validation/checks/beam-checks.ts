import { inch, metre, mm, newton, newtonMetre, toMPa } from '../../engineering/quantities/units'
import type { Length } from '../../engineering/quantities/quantity'
import { shapeAt } from '../../engineering/shaft/beam-shape'
import { factorBeam, solveBeam } from '../../engineering/shaft/beam-solver'
import type { ShaftLoad, ShaftModel } from '../../engineering/shaft/shaft-model'
import { nominalStress } from '../../engineering/shaft/shaft-stress'
import { elasticMaterial } from '../validation-materials'
import type { ValidationCheck } from '../validation-check'

const LBF = 4.4482216152605

const force = (station: Length, y: number, z: number): ShaftLoad => ({
  station,
  torque: newtonMetre(0),
  forceY: newton(y),
  forceZ: newton(z),
  axialForce: newton(0),
  momentY: newtonMetre(0),
  momentZ: newtonMetre(0),
})
const rigid = (station: Length) => ({ station, stiffness: null })
const shaft = (
  steps: readonly (readonly [fromMm: number, toMm: number, diameterMm: number])[],
): ShaftModel => ({
  segments: steps.map(([from, to, d]) => ({
    start: mm(from),
    end: mm(to),
    outerDiameter: mm(d),
    bore: mm(0),
  })),
  material: elasticMaterial(206e3, 0.3),
})

/** Shigley Example 7-2: loads in pounds at 2.75 and 8.5 in between bearings at 0.75 and 10.75 in. */
function countershaft() {
  const model: ShaftModel = {
    segments: [{ start: metre(0), end: inch(11.5), outerDiameter: inch(1.6), bore: metre(0) }],
    material: elasticMaterial(206e3, 0.3),
  }
  const beam = factorBeam(model, [rigid(inch(0.75)), rigid(inch(10.75))], [inch(2.75), inch(8.5)])
  return solveBeam(beam, [force(inch(2.75), 197 * LBF, -540 * LBF), force(inch(8.5), 885 * LBF, 2431 * LBF)])
}

/** P = 1 kN at midspan of 1 m, the middle half with twice the second moment of area. */
function stepped() {
  const thin = 0.03
  const thick = thin * 2 ** 0.25
  const model: ShaftModel = {
    segments: [
      { start: metre(0), end: metre(0.25), outerDiameter: metre(thin), bore: metre(0) },
      { start: metre(0.25), end: metre(0.75), outerDiameter: metre(thick), bore: metre(0) },
      { start: metre(0.75), end: metre(1), outerDiameter: metre(thin), bore: metre(0) },
    ],
    material: elasticMaterial(206e3, 0.3),
  }
  const beam = factorBeam(model, [rigid(metre(0)), rigid(metre(1))], [metre(0.5)])
  const solution = solveBeam(beam, [force(metre(0.5), -1000, 0)])
  const stiffness = (206e9 * Math.PI * thin ** 4) / 64
  return { beam, solution, stiffness }
}

/** Project reference: stepped shaft on two bearings, loads in two planes, integrated by Runge-Kutta (scipy). */
function referenceShaft() {
  const model = shaft([
    [0, 120, 40],
    [120, 300, 55],
    [300, 420, 45],
  ])
  const beam = factorBeam(model, [rigid(mm(20)), rigid(mm(400))], [mm(150), mm(290)])
  const solution = solveBeam(beam, [force(mm(150), -3200, 1150), force(mm(290), -1400, -2600)])
  return { beam, solution }
}

/** Project reference: three bearings, statically indeterminate. */
function threeBearings() {
  const model = shaft([
    [0, 200, 50],
    [200, 380, 60],
    [380, 600, 50],
  ])
  const beam = factorBeam(model, [rigid(mm(30)), rigid(mm(290)), rigid(mm(570))], [mm(150), mm(430)])
  return solveBeam(beam, [force(mm(150), -5000, 1200), force(mm(430), -3000, -2200)])
}

const pounds = (newtons: number) => Math.abs(newtons) / LBF

export const BEAM_CHECKS: readonly ValidationCheck[] = [
  {
    id: 'shigley-7-2-reactions',
    topic: 'beam',
    title: 'Bearing reactions of a gear countershaft in two planes (A_z, A_y, B_z, B_y)',
    source: 'shigley-9',
    place: 'Example 7-2',
    evidence: 'published',
    isFromMemory: true,
    unit: 'lbf',
    reference: [115, 356.7, 1776, 725.3],
    ours: () => {
      const [a, b] = countershaft().reactions
      return [pounds(a?.z ?? NaN), pounds(a?.y ?? NaN), pounds(b?.z ?? NaN), pounds(b?.y ?? NaN)]
    },
    tolerance: { kind: 'absolute', value: 0.05 },
    reason: 'half a unit of the last printed digit',
  },
  {
    id: 'gere-midspan',
    topic: 'beam',
    title: 'Midspan deflection with a middle half twice as stiff, in P L³/(EI)',
    source: 'gere',
    place: 'example on nonprismatic beams: 3/256',
    evidence: 'published',
    isFromMemory: true,
    unit: '',
    reference: [3 / 256],
    ours: () => {
      const { beam, solution, stiffness } = stepped()
      return [(-shapeAt(beam, solution, metre(0.5)).deflectionY * stiffness) / 1000]
    },
    tolerance: { kind: 'relative', value: 1e-6 },
    reason: 'both exact; rounding of the arithmetic',
  },
  {
    id: 'gere-slope',
    topic: 'beam',
    title: 'End slope of that beam, in P L²/(EI)',
    source: 'gere',
    place: 'example on nonprismatic beams: 5/128',
    evidence: 'published',
    isFromMemory: true,
    unit: '',
    reference: [5 / 128],
    ours: () => {
      const { beam, solution, stiffness } = stepped()
      return [(-shapeAt(beam, solution, metre(0)).slopeY * stiffness) / 1000]
    },
    tolerance: { kind: 'relative', value: 1e-6 },
    reason: 'both exact; rounding of the arithmetic',
  },
  {
    id: 'reference-reactions',
    topic: 'beam',
    title: 'Reactions of a stepped shaft in both planes',
    source: 'beam-reference',
    place: 'stepped, simply supported',
    evidence: 'solver',
    isFromMemory: false,
    unit: 'N',
    reference: [2510.5263, 2089.4737, -3.9474, 1453.9474],
    ours: () => {
      const [a, b] = referenceShaft().solution.reactions
      return [a?.y ?? NaN, b?.y ?? NaN, a?.z ?? NaN, b?.z ?? NaN]
    },
    tolerance: { kind: 'absolute', value: 1e-3 },
    reason: 'printed to 1e-4 N',
  },
  {
    id: 'reference-deflections',
    topic: 'beam',
    title: 'Deflection of that shaft at 70, 150 and 210 mm (without shear)',
    source: 'beam-reference',
    place: 'stepped, simply supported, Euler-Bernoulli',
    evidence: 'solver',
    isFromMemory: false,
    unit: 'mm',
    reference: [-0.033954948, -0.061482274, -0.063861542],
    ours: () => {
      const { beam, solution } = referenceShaft()
      return [70, 150, 210].map((z) => shapeAt(beam, solution, mm(z)).deflectionY * 1e3)
    },
    tolerance: { kind: 'absolute', value: 1e-8 },
    reason: 'printed to 1e-9 mm',
  },
  {
    id: 'reference-three-bearings',
    topic: 'beam',
    title: 'Reactions of a shaft on three bearings (statically indeterminate), plane of y',
    source: 'beam-reference',
    place: 'three bearings, Euler-Bernoulli',
    evidence: 'solver',
    isFromMemory: false,
    unit: 'N',
    reference: [1718.7997, 5685.172, 596.0283],
    ours: () => threeBearings().reactions.map((reaction) => reaction.y),
    tolerance: { kind: 'absolute', value: 1e-3 },
    reason: 'printed to 1e-4 N',
  },
  {
    id: 'singer-302',
    topic: 'beam',
    title: 'Torsional stress of 12 kN·m on 113.98 mm',
    source: 'singer-pytel',
    place: 'Problem 302',
    evidence: 'published',
    isFromMemory: false,
    unit: 'MPa',
    reference: [41.27],
    ours: () => [
      toMPa(nominalStress(newtonMetre(0), newtonMetre(12_000), newton(0), mm(113.98), mm(0)).torsion),
    ],
    tolerance: { kind: 'absolute', value: 0.005 },
    reason: 'half a unit of the last printed digit',
  },
]
