/** Static and fatigue safety at the notches of one load case. */
import { mm, newton, newtonMetre, pascal, toMPa } from '../engineering/quantities/units'
import { fatigueSafety } from '../engineering/shaft/fatigue-safety'
import type { DiagramStation, SectionForces } from '../engineering/shaft/section-forces'
import { equivalentStress, nominalStress } from '../engineering/shaft/shaft-stress'
import type { NotchResult } from './layout-results'
import type { Notch } from './notches'
import type { ShaftCaseInputs } from './shaft-case-inputs'

export function notchResults(inputs: ShaftCaseInputs, forces: SectionForces): NotchResult[] {
  return inputs.notches.map((notch) => notchResult(inputs, forces, notch))
}

function notchResult(inputs: ShaftCaseInputs, forces: SectionForces, notch: Notch): NotchResult {
  const { applicationFactor, model } = inputs
  const { bending, torque, axial } = worstBeside(inputs.stations, forces, notch.stationMm / 1e3)
  const diameter = mm(notch.diameterMm)
  const stress = nominalStress(
    newtonMetre(bending * applicationFactor),
    newtonMetre(torque * applicationFactor),
    newton(axial * applicationFactor),
    diameter,
    mm(notch.boreMm),
  )
  const { yieldStrength, tensileStrength } = model.material
  const equivalent = equivalentStress(stress)
  // tested seat factors go on both; at a fillet of a ductile shaft the mean stays nominal, as in DIN 743
  const meanFactors = notch.kind === 'seatEdge' ? notch.factors : { bending: 1, torsion: 1 }
  const safety = fatigueSafety(
    {
      // the shaft turns under loads that stand still; the torque is steady
      bendingAmplitude: stress.bending,
      torsionAmplitude: pascal(0),
      bendingMean: pascal(Math.abs(stress.axial)),
      torsionMean: stress.torsion,
      bendingFactor: notch.factors.bending,
      torsionFactor: notch.factors.torsion,
      bendingMeanFactor: meanFactors.bending,
      torsionMeanFactor: meanFactors.torsion,
    },
    {
      endurance: notch.endurance,
      tensile: tensileStrength,
      yield: yieldStrength,
    },
    'goodman',
  )
  return {
    stationMm: notch.stationMm,
    kind: notch.kind,
    part: notch.part,
    diameterMm: notch.diameterMm,
    bendingNm: bending,
    torqueNm: torque,
    fatigueNotchFactor: notch.factors.bending,
    fatigueNotchFactorTorsion: notch.factors.torsion,
    equivalentMPa: toMPa(equivalent),
    yieldSafety: finitePositive(yieldStrength / equivalent),
    fatigueSafety: safety === null ? null : finitePositive(safety),
  }
}

const finitePositive = (value: number) => (Number.isFinite(value) ? value : null)

/** Largest forces on either side of a station. */
function worstBeside(stations: readonly DiagramStation[], forces: SectionForces, station: number) {
  let bendingSquare = 0
  let torque = 0
  let axial = 0
  for (let index = firstAtOrAfter(stations, station - 1e-8); index < stations.length; index += 1) {
    if ((stations[index]?.station ?? 0) > station + 1e-8) break
    const aboutY = forces.bendingY[index] as number
    const aboutZ = forces.bendingZ[index] as number
    bendingSquare = Math.max(bendingSquare, aboutY * aboutY + aboutZ * aboutZ)
    torque = Math.max(torque, Math.abs(forces.torque[index] as number))
    if (Math.abs(forces.axialForce[index] as number) > Math.abs(axial))
      axial = forces.axialForce[index] as number
  }
  return { bending: Math.sqrt(bendingSquare), torque, axial }
}

function firstAtOrAfter(stations: readonly DiagramStation[], station: number): number {
  let low = 0
  let high = stations.length
  while (low < high) {
    const middle = (low + high) >> 1
    if ((stations[middle]?.station ?? 0) < station) low = middle + 1
    else high = middle
  }
  return low
}
