import type { Length } from '../../engineering/quantities/quantity'
import {
  hertz,
  inch,
  kilogram,
  kilogramSquareMetre,
  metre,
  mm,
  newtonPerMicrometre,
  radianPerSecond,
} from '../../engineering/quantities/units'
import { lateralFrequencies } from '../../engineering/shaft/lateral-frequencies'
import type { CarriedMass, ShaftModel } from '../../engineering/shaft/shaft-model'
import { torsionalFrequencies } from '../../engineering/shaft/torsional-frequencies'
import { criticalSpeeds, unbalanceResponse, whirlModel } from '../../engineering/shaft/whirl'
import { elasticMaterial } from '../validation-materials'
import type { ValidationCheck } from '../validation-check'

const PSI_IN_MPA = 6.894757293168361e-3
const LBF_IN_KG = 0.45359237
/** So light that its own mass does not show. */
const NO_MASS = 1e-3

const rigid = (station: Length) => ({ station, stiffness: null })
const mass = (station: Length, kg: number, diametral = 0, polar = 0): CarriedMass => ({
  station,
  mass: kilogram(kg),
  diametralInertia: kilogramSquareMetre(diametral),
  polarInertia: kilogramSquareMetre(polar),
})
const plain = (length: Length, diameter: Length, modulusMPa: number, density: number): ShaftModel => ({
  segments: [{ start: metre(0), end: length, outerDiameter: diameter, bore: metre(0) }],
  material: elasticMaterial(modulusMPa, 0.3, density),
})

const twoDiscs: ShaftModel = {
  segments: [
    { start: mm(0), end: mm(150), outerDiameter: mm(40), bore: mm(0) },
    { start: mm(150), end: mm(450), outerDiameter: mm(60), bore: mm(0) },
    { start: mm(450), end: mm(600), outerDiameter: mm(45), bore: mm(0) },
  ],
  material: elasticMaterial(206e3, 0.3),
}
const discs = [mass(mm(200), 12, 0.06, 0.12), mass(mm(400), 18, 0.11, 0.22)]

const shigleyShaft = (density: number) => plain(inch(31), inch(1), 30e6 * PSI_IN_MPA, density)

const deLaval = () =>
  whirlModel(plain(mm(600), mm(30), 206e3, NO_MASS), [rigid(mm(0)), rigid(mm(600))], [mass(mm(300), 10)])
const deLavalSpeed = Math.sqrt((48 * 206e9 * Math.PI * 0.03 ** 4) / 64 / (0.6 ** 3 * 10))

export const VIBRATION_CHECKS: readonly ValidationCheck[] = [
  ...(
    [
      ['rigid bearings', null, [164.07597, 499.67999, 842.76512]],
      ['bearings of 50 N/µm', newtonPerMicrometre(50), [138.60586, 367.12421, 715.54316]],
    ] as const
  ).map(([name, stiffness, reference]): ValidationCheck => ({
    id: `two-discs-${stiffness === null ? 'rigid' : 'elastic'}`,
    topic: 'vibration',
    title: `First three lateral frequencies of two discs on a stepped shaft, ${name}`,
    source: 'beam-reference',
    place: 'dynamic stiffness by matrix exponentials (scipy), Euler-Bernoulli',
    evidence: 'solver',
    isFromMemory: false,
    unit: 'Hz',
    reference,
    ours: () =>
      lateralFrequencies(
        twoDiscs,
        [30, 570].map((z) => ({ station: mm(z), stiffness })),
        discs,
        3,
      ).map((omega) => omega / (2 * Math.PI)),
    tolerance: { kind: 'relative', value: 0.002 },
    reason: 'discretisation by sixteen elements',
  })),
  {
    id: 'torsional-discs',
    topic: 'vibration',
    title: 'First two torsional frequencies of that shaft, free at both ends',
    source: 'beam-reference',
    place: 'torsional, free-free',
    evidence: 'solver',
    isFromMemory: false,
    unit: 'Hz',
    reference: [403.77578, 4762.76661],
    ours: () => torsionalFrequencies(twoDiscs, discs, 2).map((f) => f / hertz(1)),
    tolerance: { kind: 'relative', value: 0.002 },
    reason: 'discretisation by sixty elements',
  },
  {
    id: 'shigley-7-5-shaft',
    topic: 'vibration',
    title: 'First critical speed of a plain 1 in shaft on 31 in',
    source: 'shigley-9',
    place: 'Example 7-5',
    evidence: 'published',
    isFromMemory: false,
    unit: 'rad/s',
    reference: [520.4],
    ours: () => {
      const density = (0.282 * LBF_IN_KG) / 0.0254 ** 3
      return lateralFrequencies(shigleyShaft(density), [rigid(metre(0)), rigid(inch(31))], [], 1)
    },
    tolerance: { kind: 'absolute', value: 0.6 },
    reason: 'the book takes g as 386.1 in/s² and rounds I; printed 520.3 to 520.4',
  },
  {
    id: 'shigley-7-5-weights',
    topic: 'vibration',
    title: 'First critical speed with 35 and 55 lbf: between Dunkerley 120.4 and Rayleigh 124.8',
    source: 'shigley-9',
    place: 'Example 7-5',
    evidence: 'published',
    isFromMemory: true,
    unit: 'rad/s',
    reference: [122.6],
    ours: () =>
      lateralFrequencies(
        shigleyShaft(NO_MASS),
        [rigid(metre(0)), rigid(inch(31))],
        [mass(inch(7), 35 * LBF_IN_KG), mass(inch(20), 55 * LBF_IN_KG)],
        1,
      ),
    tolerance: { kind: 'absolute', value: 2.2 },
    reason: 'lower and upper bound of the source',
  },
  {
    id: 'three-mass-cubic',
    topic: 'vibration',
    title: 'Three critical speeds of three masses on a uniform shaft',
    source: 'vibration-theory',
    place: 'roots of the cubic frequency equation, computed outside this code',
    evidence: 'closedForm',
    isFromMemory: false,
    unit: 'rad/s',
    reference: [294.42872, 1391.41003, 2455.03279],
    ours: () =>
      lateralFrequencies(
        plain(mm(800), mm(40), 206e3, NO_MASS),
        [rigid(mm(0)), rigid(mm(800))],
        [mass(mm(200), 12), mass(mm(420), 20), mass(mm(660), 9)],
        3,
      ),
    tolerance: { kind: 'relative', value: 1e-4 },
    reason: 'the reference leaves the shaft’s own mass out',
  },
  {
    id: 'de-laval-critical',
    topic: 'vibration',
    title: 'Critical speed of a disk at midspan, √(48 EI/(l³ m))',
    source: 'rotor-dynamics',
    place: 'de Laval rotor',
    evidence: 'closedForm',
    isFromMemory: true,
    unit: 'rad/s',
    reference: [deLavalSpeed],
    ours: () => {
      const model = deLaval()
      return model ? criticalSpeeds(model, 1) : []
    },
    tolerance: { kind: 'relative', value: 1e-5 },
    reason: 'bisection',
  },
  {
    id: 'de-laval-unbalance',
    topic: 'vibration',
    title: 'Its deflection at 0.8 of the critical speed, eccentricity 50 µm',
    source: 'rotor-dynamics',
    place: 'de Laval rotor: e r²/(1 − r²)',
    evidence: 'closedForm',
    isFromMemory: true,
    unit: 'µm',
    reference: [(50 * 0.64) / 0.36],
    ours: () => {
      const model = deLaval()
      if (!model) return []
      const unbalance = [{ station: mm(300), amount: 10 * 50e-6 }]
      return unbalanceResponse(model, unbalance, radianPerSecond(0.8 * deLavalSpeed), [mm(300)]).map(
        (y) => y * 1e6,
      )
    },
    tolerance: { kind: 'relative', value: 1e-3 },
    reason: 'the shaft’s own small mass',
  },
]
