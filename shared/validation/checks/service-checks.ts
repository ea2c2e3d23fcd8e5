import { joiningTemperature } from '../../engineering/interference-fit/joining-temperature'
import {
  interfacePressure,
  seatCompliance,
  type SeatRings,
} from '../../engineering/interference-fit/interface-pressure'
import { looseningSpeed, rotationHoopStress, speedLoss } from '../../engineering/interference-fit/speed-loss'
import { hubStress } from '../../engineering/interference-fit/hub-stress'
import {
  celsius,
  kelvin,
  kilogram,
  metre,
  mm,
  pascal,
  rpm,
  squareMetre,
  toCelsius,
  toMPa,
  toRpm,
  um,
} from '../../engineering/quantities/units'
import { temperatureInAir, heatLoss } from '../../engineering/assembly/cooling-on-the-way'
import { elasticMaterial } from '../validation-materials'
import type { ValidationCheck } from '../validation-check'

const disk: SeatRings = {
  seatDiameter: mm(100),
  shaft: { bore: mm(0), material: elasticMaterial(200e3, 0.3, 7800) },
  hub: { outerDiameter: mm(500), material: elasticMaterial(200e3, 0.3, 7800) },
}
const twoMaterials: SeatRings = {
  seatDiameter: mm(80),
  shaft: { bore: mm(30), material: elasticMaterial(210e3, 0.3, 7850) },
  hub: { outerDiameter: mm(200), material: elasticMaterial(110e3, 0.26, 7200) },
}
const pressureOf = (seat: SeatRings, interference: number) =>
  interfacePressure(metre(interference), seatCompliance(seat))
const lost = () => speedLoss(disk, rpm(6900))
const bearing = {
  mass: kilogram(3),
  specificHeat: 480,
  surface: squareMetre(0.05),
  convection: 10,
  emissivity: 0,
}

function heatingRise(interferenceUm: number, seatMm: number): number {
  const steel = elasticMaterial(210e3, 0.3, 7850, 12e-6)
  const joint = {
    seatDiameter: mm(seatMm),
    clearance: mm(0),
    ambient: celsius(20),
    shaftTemperature: celsius(20),
    hub: steel,
    shaft: steel,
  }
  return toCelsius(joiningTemperature(um(interferenceUm), joint)) - 20
}

export const ROTATION_CHECKS: readonly ValidationCheck[] = [
  {
    id: 'ugural-fenster-loss',
    topic: 'rotation',
    title: 'Radial interference that a 0.5 m disk on a 0.1 m shaft loses at 6900 rpm',
    source: 'ugural-fenster',
    place: 'problem on a disk shrunk on a shaft',
    evidence: 'published',
    isFromMemory: false,
    unit: '10⁻⁵ m',
    reference: [5.26],
    ours: () => [(lost() / 2) * 1e5],
    tolerance: { kind: 'absolute', value: 0.015 },
    reason: 'the printed last digit is one off the exact value; stresses agree',
  },
  {
    id: 'ugural-fenster-rest',
    topic: 'rotation',
    title: 'Largest hoop stress of that disk at rest',
    source: 'ugural-fenster',
    place: 'problem on a disk shrunk on a shaft',
    evidence: 'published',
    isFromMemory: false,
    unit: 'MPa',
    reference: [109.2],
    ours: () => [
      toMPa(hubStress(pressureOf(disk, lost()), disk.seatDiameter, disk.hub, pascal(0)).hoopAtBore),
    ],
    tolerance: { kind: 'absolute', value: 0.05 },
    reason: 'half a unit of the last printed digit',
  },
  {
    id: 'ugural-fenster-speed',
    topic: 'rotation',
    title: 'Largest hoop stress of that disk at 6900 rpm',
    source: 'ugural-fenster',
    place: 'problem on a disk shrunk on a shaft',
    evidence: 'published',
    isFromMemory: false,
    unit: 'MPa',
    reference: [212],
    ours: () => [toMPa(rotationHoopStress(disk, rpm(6900)))],
    tolerance: { kind: 'absolute', value: 0.5 },
    reason: 'half a unit of the last printed digit',
  },
  {
    id: 'two-material-speed',
    topic: 'rotation',
    title: 'Pressure of an iron hub 200/80 mm on a hollow steel shaft at 6000 rpm, 80 µm',
    source: 'finite-elements',
    place: 'plane-stress finite-element model of 4000 rings, computed outside this code',
    evidence: 'solver',
    isFromMemory: false,
    unit: 'MPa',
    reference: [39.81031],
    ours: () => [toMPa(pressureOf(twoMaterials, 80e-6 - speedLoss(twoMaterials, rpm(6000))))],
    tolerance: { kind: 'relative', value: 1e-6 },
    reason: 'mesh error of the reference is below 1e-7',
  },
  {
    id: 'two-material-loosening',
    topic: 'rotation',
    title: 'Loosening speed of that hub',
    source: 'finite-elements',
    place: 'p(ω) of the finite-element model extrapolated with ω²',
    evidence: 'solver',
    isFromMemory: false,
    unit: '1/min',
    reference: [6000 / Math.sqrt(1 - 39.810308472915935 / 50.48076923076925)],
    ours: () => [toRpm(looseningSpeed(twoMaterials, um(80)) ?? rpm(0))],
    tolerance: { kind: 'relative', value: 1e-6 },
    reason: 'mesh error of the reference is below 1e-7',
  },
]

export const TEMPERATURE_CHECKS: readonly ValidationCheck[] = [
  {
    id: 'singer-267-heating',
    topic: 'temperature',
    title: 'Temperature at which 1.287 mm on 2 m just disappears, α = 11.7 · 10⁻⁶/K, from 25 °C',
    source: 'singer-pytel',
    place: 'Problem 267 read backwards',
    evidence: 'published',
    isFromMemory: false,
    unit: '°C',
    reference: [80],
    ours: () => {
      const tire = elasticMaterial(200e3, 0.3, 7850, 11.7e-6)
      return [
        toCelsius(
          joiningTemperature(mm(1.287), {
            seatDiameter: mm(2000),
            clearance: mm(0),
            ambient: celsius(25),
            shaftTemperature: celsius(25),
            hub: tire,
            shaft: tire,
          }),
        ),
      ]
    },
    tolerance: { kind: 'absolute', value: 0.01 },
    reason: 'exact inputs',
  },
  ...(
    [
      ['60 m6', 30 + 15, 60],
      ['100 n6', 45 + 20, 100],
      ['160 p6', 68 + 25, 160],
    ] as const
  ).map(([fit, interference, size]): ValidationCheck => ({
    id: `bearing-heating-${size}`,
    topic: 'temperature',
    title: `Rise that opens a rolling bearing on ${fit}: the maker says 80 to 90 K is enough`,
    source: 'skf-mounting',
    place: 'mounting instructions; fit tables',
    evidence: 'published',
    isFromMemory: false,
    unit: 'K',
    reference: [65],
    ours: () => [heatingRise(interference, size)],
    tolerance: { kind: 'absolute', value: 20 },
    reason: 'between 45 and 85 K leaves the clearance that mounting needs within 80 to 90 K',
  })),
  {
    id: 'newton-cooling',
    topic: 'temperature',
    title: 'Hub cooling in air without radiation after one time constant, from 220 to 20 °C',
    source: 'heat-transfer',
    place: 'exponential decay',
    evidence: 'closedForm',
    isFromMemory: true,
    unit: '°C',
    reference: [20 + 200 / Math.E],
    ours: () => [toCelsius(temperatureInAir(bearing, celsius(220), celsius(20), (3 * 480) / (10 * 0.05)))],
    tolerance: { kind: 'absolute', value: 1e-3 },
    reason: 'truncation error of the integration',
  },
  {
    id: 'stefan-boltzmann',
    topic: 'temperature',
    title: 'Radiation of a black square metre at 500 K into 300 K',
    source: 'heat-transfer',
    place: 'σ(T⁴ − T_a⁴) with σ = 5.67 · 10⁻⁸',
    evidence: 'closedForm',
    isFromMemory: true,
    unit: 'W',
    reference: [5.67e-8 * (500 ** 4 - 300 ** 4)],
    ours: () => [
      heatLoss(
        { ...bearing, surface: squareMetre(1), convection: 0, emissivity: 1 },
        kelvin(500),
        kelvin(300),
      ),
    ],
    tolerance: { kind: 'relative', value: 1e-4 },
    reason: 'the reference uses σ to three digits',
  },
]
