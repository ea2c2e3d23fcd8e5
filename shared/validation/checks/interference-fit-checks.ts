import {
  interferenceAtPlasticRatio,
  pressureAtPlasticRatio,
} from '../../engineering/interference-fit/elastic-plastic-seat'
import { axialCapacity, torqueCapacity } from '../../engineering/interference-fit/holding-capacity'
import { hubStress, permissibleHubPressure } from '../../engineering/interference-fit/hub-stress'
import {
  interfacePressure,
  seatCompliance,
  type SeatRings,
} from '../../engineering/interference-fit/interface-pressure'
import type { Length } from '../../engineering/quantities/quantity'
import {
  inch,
  metre,
  mm,
  mPa,
  pascal,
  psi,
  toKN,
  toMm,
  toMPa,
  toPsi,
} from '../../engineering/quantities/units'
import { elasticMaterial } from '../validation-materials'
import type { ValidationCheck } from '../validation-check'

const PSI = 6894.757293168361 / 1e6

function rings(
  seat: Length,
  bore: Length,
  outside: Length,
  hubPsi: number,
  shaftPsi: number,
  nu: number,
): SeatRings {
  return {
    seatDiameter: seat,
    shaft: { bore, material: elasticMaterial(shaftPsi * PSI, nu) },
    hub: { outerDiameter: outside, material: elasticMaterial(hubPsi * PSI, nu) },
  }
}

const pressureOf = (seat: SeatRings, interference: Length) =>
  interfacePressure(interference, seatCompliance(seat))

const timoshenko = rings(inch(12), inch(8), inch(16), 30e6, 30e6, 0.3)
const mott = rings(inch(2.5), inch(2), inch(3.5), 30e6, 17e6, 0.27)
const ugural: SeatRings = {
  seatDiameter: mm(100),
  shaft: { bore: mm(0), material: elasticMaterial(210e3, 0.3) },
  hub: {
    outerDiameter: mm(250),
    // Brittle with a limit of 25 MPa hoop tension, as the example sets it.
    material: { ...elasticMaterial(100e3, 0.25), isBrittle: true, tensileStrength: mPa(25) },
  },
}
const uguralPressure = () => permissibleHubPressure(1, ugural.seatDiameter, ugural.hub, pascal(0))
const yielding: SeatRings = {
  seatDiameter: mm(100),
  shaft: { bore: mm(0), material: elasticMaterial(210e3, 0.3) },
  hub: { outerDiameter: mm(200), material: { ...elasticMaterial(210e3, 0.3), yieldStrength: mPa(300) } },
}

export const INTERFERENCE_FIT_CHECKS: readonly ValidationCheck[] = [
  {
    id: 'timoshenko-compound',
    topic: 'interferenceFit',
    title: 'Pressure in a compound cylinder 8/12/16 in, 0.010 in on the diameter',
    source: 'timoshenko-2',
    place: 'article on shrink-fit stresses',
    evidence: 'published',
    isFromMemory: true,
    unit: 'psi',
    reference: [4050],
    ours: () => [toPsi(pressureOf(timoshenko, inch(0.01)))],
    tolerance: { kind: 'absolute', value: 5 },
    reason: 'printed to the nearest 10 psi',
  },
  {
    id: 'brown-6-si',
    topic: 'interferenceFit',
    title: 'Pressure of a 160 mm steel collar on a 100 mm shaft, 0.02 mm',
    source: 'brown-marks',
    place: 'Example 6, metric',
    evidence: 'published',
    isFromMemory: false,
    unit: 'MPa',
    reference: [12.6],
    ours: () => [toMPa(pressureOf(rings(mm(100), mm(0), mm(160), 207e3 / PSI, 207e3 / PSI, 0.3), mm(0.02)))],
    tolerance: { kind: 'absolute', value: 0.05 },
    reason: 'half a unit of the last printed digit',
  },
  {
    id: 'brown-6-us',
    topic: 'interferenceFit',
    title: 'Pressure of a 6 in steel collar on a 4 in shaft, 0.001 in',
    source: 'brown-marks',
    place: 'Example 6, inch',
    evidence: 'published',
    isFromMemory: false,
    unit: 'psi',
    reference: [2100],
    ours: () => [toPsi(pressureOf(rings(inch(4), inch(0), inch(6), 30e6, 30e6, 0.3), inch(0.001)))],
    tolerance: { kind: 'absolute', value: 50 },
    reason: 'the book rounds 1 − 0.44 on the way; printed to 100 psi',
  },
  {
    id: 'mott-bushing',
    topic: 'interferenceFit',
    title: 'Pressure of a bronze bushing in a steel sleeve, 0.0032 in',
    source: 'mott',
    place: 'example on stresses for force fits',
    evidence: 'published',
    isFromMemory: true,
    unit: 'psi',
    reference: [3518],
    ours: () => [toPsi(pressureOf(mott, inch(0.0032)))],
    tolerance: { kind: 'absolute', value: 0.5 },
    reason: 'half a unit of the last printed digit',
  },
  {
    id: 'ugural-pressure',
    topic: 'interferenceFit',
    title: 'Pressure that brings a 250 mm hub to 25 MPa hoop tension',
    source: 'ugural',
    place: 'example on designing a press fit',
    evidence: 'published',
    isFromMemory: true,
    unit: 'MPa',
    reference: [18.1],
    ours: () => [toMPa(uguralPressure())],
    tolerance: { kind: 'absolute', value: 0.05 },
    reason: 'half a unit of the last printed digit',
  },
  {
    id: 'ugural-force',
    topic: 'interferenceFit',
    title: 'Force along the shaft at that pressure, friction 0.15',
    source: 'ugural',
    place: 'example on designing a press fit',
    evidence: 'published',
    isFromMemory: true,
    unit: 'kN',
    reference: [85.3],
    ours: () => [toKN(axialCapacity(uguralPressure(), mm(100), mm(100), 0.15))],
    tolerance: { kind: 'absolute', value: 0.05 },
    reason: 'half a unit of the last printed digit',
  },
  {
    id: 'ugural-torque',
    topic: 'interferenceFit',
    title: 'Torque at that pressure, friction 0.15',
    source: 'ugural',
    place: 'example on designing a press fit',
    evidence: 'published',
    isFromMemory: true,
    unit: 'kN·m',
    reference: [4.27],
    ours: () => [torqueCapacity(uguralPressure(), mm(100), mm(100), 0.15) / 1e3],
    tolerance: { kind: 'absolute', value: 0.005 },
    reason: 'half a unit of the last printed digit',
  },
  {
    id: 'singer-267',
    topic: 'interferenceFit',
    title: 'Pressure of a thin tire 12 mm thick on a rigid 2 m wheel, 1.287 mm',
    source: 'singer-pytel',
    place: 'Problem 267',
    evidence: 'published',
    isFromMemory: false,
    unit: 'MPa',
    reference: [1.5444],
    ours: () => {
      // A rigid wheel: a shaft a million times stiffer.
      const tire: SeatRings = {
        seatDiameter: mm(2000),
        shaft: { bore: mm(0), material: elasticMaterial(2e11, 0.3) },
        hub: { outerDiameter: mm(2024), material: elasticMaterial(2e5, 0.3) },
      }
      return [toMPa(pressureOf(tire, mm(1.287)))]
    },
    tolerance: { kind: 'relative', value: 0.015 },
    reason: 'the source takes a thin ring at the inner radius; t/r = 0.012',
  },
  {
    id: 'lame-numerical',
    topic: 'interferenceFit',
    title: 'Hoop stress at the bore of a 100/200 mm ring under 80 MPa',
    source: 'lame',
    place: 'equilibrium and compatibility integrated by Runge-Kutta, 2000 steps',
    evidence: 'solver',
    isFromMemory: false,
    unit: 'MPa',
    reference: [hoopByIntegration(0.05, 0.1, 80)],
    ours: () => [
      toMPa(
        hubStress(
          mPa(80),
          mm(100),
          { outerDiameter: mm(200), material: elasticMaterial(210e3, 0.3) },
          pascal(0),
        ).hoopAtBore,
      ),
    ],
    tolerance: { kind: 'relative', value: 1e-6 },
    reason: 'truncation error of the integration',
  },
  {
    id: 'elastic-plastic-pressure',
    topic: 'interferenceFit',
    title: 'Pressure of a 100/200 mm hub of 300 MPa yielded to 125 mm',
    source: 'din-7190-1',
    place: 'yielded ring integrated by Runge-Kutta outside this code',
    evidence: 'solver',
    isFromMemory: false,
    unit: 'MPa',
    reference: [182.846],
    ours: () => [toMPa(pressureAtPlasticRatio(yielding, 1.25))],
    tolerance: { kind: 'absolute', value: 0.0005 },
    reason: 'half a unit of the last digit given',
  },
  {
    id: 'elastic-plastic-interference',
    topic: 'interferenceFit',
    title: 'Interference that makes it yield to 125 mm on a solid shaft',
    source: 'din-7190-1',
    place: 'yielded ring integrated by Runge-Kutta outside this code',
    evidence: 'solver',
    isFromMemory: false,
    unit: 'mm',
    reference: [0.257746],
    ours: () => [toMm(interferenceAtPlasticRatio(yielding, 1.25))],
    tolerance: { kind: 'absolute', value: 5e-7 },
    reason: 'half a unit of the last digit given',
  },
  {
    id: 'handbook-press-factor',
    topic: 'interferenceFit',
    title: 'Friction that a handbook’s pressure factor of 2 in cast-iron hubs implies',
    source: 'machinerys-handbook',
    place: 'pressure factors for forced fits, F = 240 at 2 in: P = A a F / 2 tons',
    evidence: 'published',
    isFromMemory: false,
    unit: '',
    reference: [0.07],
    ours: () => {
      // 1 in of length, 0.001 in of allowance, hub twice the bore; E and ν of cast iron as commonly assumed.
      const seat: SeatRings = {
        seatDiameter: inch(2),
        shaft: { bore: metre(0), material: elasticMaterial(30e6 * PSI, 0.3) },
        hub: { outerDiameter: inch(4), material: elasticMaterial(15e6 * PSI, 0.25) },
      }
      const area = Math.PI * 2
      const pounds = ((area * 0.001 * 240) / 2) * 2000
      return [pounds / (toPsi(pressureOf(seat, inch(0.001))) * area)]
    },
    tolerance: { kind: 'absolute', value: 0.01 },
    reason: 'oiled steel on iron is given as about 0.07; the factors are rounded',
  },
  {
    id: 'psi-conversion',
    topic: 'interferenceFit',
    title: 'One thousand pounds per square inch in megapascals',
    source: 'nist-sp-811',
    place: 'Appendix B: 1 psi = 6.894757 kPa',
    evidence: 'published',
    isFromMemory: true,
    unit: 'MPa',
    reference: [6.894757],
    ours: () => [toMPa(psi(1000))],
    tolerance: { kind: 'absolute', value: 5e-7 },
    reason: 'half a unit of the last printed digit',
  },
]

/** Hoop stress at the bore from dσ_r/dr = (σ_t − σ_r)/r and the constant sum of both, without Lamé's solution. */
function hoopByIntegration(inner: number, outer: number, pressure: number): number {
  const radialAtOutside = (sum: number) => {
    const steps = 2000
    const h = (outer - inner) / steps
    const slope = (r: number, s: number) => (sum - 2 * s) / r
    let s = -pressure
    for (let i = 0; i < steps; i++) {
      const r = inner + i * h
      const k1 = slope(r, s)
      const k2 = slope(r + h / 2, s + (h / 2) * k1)
      const k3 = slope(r + h / 2, s + (h / 2) * k2)
      const k4 = slope(r + h, s + h * k3)
      s += (h / 6) * (k1 + 2 * k2 + 2 * k3 + k4)
    }
    return s
  }
  // The end value is linear in the sum of the stresses: two shots give the free outside.
  const [atZero, atOne] = [radialAtOutside(0), radialAtOutside(1)]
  return -atZero / (atOne - atZero) + pressure
}
