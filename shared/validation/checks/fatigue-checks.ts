import { inch, mm, mPa, pascal, toMPa } from '../../engineering/quantities/units'
import { enduranceLimit, sizeFactor, surfaceFactor } from '../../engineering/shaft/endurance-limit'
import { fatigueSafety, type FatigueCriterion } from '../../engineering/shaft/fatigue-safety'
import {
  fatigueNotchFactors,
  seatEdgeNotchFactors,
  shoulderConcentration,
} from '../../engineering/shaft/notch-factors'
import { SEAT_EDGE_FACTORS } from '../data/seat-edge-factors'
import type { ValidationCheck } from '../validation-check'

const KPSI = 6.894757293168361

/** Shigley Example 7-1: 1.1 in shoulder, 1260 lbf·in alternating bending, 1100 lbf·in steady torque. */
function example71(criterion: FatigueCriterion): number {
  const diameter = 1.1
  const bending = (32 * 1260) / (Math.PI * diameter ** 3)
  const torsion = (16 * 1100) / (Math.PI * diameter ** 3)
  const psiToPa = KPSI * 1e3
  return (
    fatigueSafety(
      {
        bendingAmplitude: pascal(bending * psiToPa),
        torsionAmplitude: pascal(0),
        bendingMean: pascal(0),
        torsionMean: pascal(torsion * psiToPa),
        bendingFactor: 1.58,
        torsionFactor: 1.37,
        bendingMeanFactor: 1.58,
        torsionMeanFactor: 1.37,
      },
      { endurance: mPa(29.3 * KPSI), tensile: mPa(105 * KPSI), yield: mPa(82 * KPSI) },
      criterion,
    ) ?? NaN
  )
}

function shigley71(
  id: string,
  title: string,
  unit: string,
  reference: number,
  tolerance: number,
  isFromMemory: boolean,
  ours: () => number,
): ValidationCheck {
  return {
    id,
    topic: 'fatigue',
    title,
    source: 'shigley-9',
    place: 'Example 7-1',
    evidence: 'published',
    isFromMemory,
    unit,
    reference: [reference],
    ours: () => [ours()],
    tolerance: { kind: 'absolute', value: tolerance },
    reason:
      'half a unit of the last printed digit; one where the book rounds on the way or in its metric coefficients',
  }
}

export const FATIGUE_CHECKS: readonly ValidationCheck[] = [
  ...SEAT_EDGE_FACTORS.map(([tensile, bending, torsion]): ValidationCheck => ({
    id: `seat-edge-${tensile}`,
    topic: 'fatigue',
    title: `Fatigue notch factors at the edge of a press-fit seat, Rm = ${tensile} MPa (bending, torsion)`,
    source: 'din-743',
    place: 'part 2, table of tested seats, 40 mm',
    evidence: 'published',
    isFromMemory: true,
    unit: '',
    reference: [bending, torsion],
    ours: () => {
      const factors = seatEdgeNotchFactors(mPa(tensile))
      return [factors.bending, factors.torsion]
    },
    tolerance: { kind: 'absolute', value: 0.05 },
    reason: 'half a unit of the last printed digit',
  })),
  {
    id: 'horger-maulbetsch',
    topic: 'fatigue',
    title: 'Seat-edge factor of 2 in axles of 600 MPa: tests say the strength falls to one half to one third',
    source: 'horger-maulbetsch',
    place: 'press-fitted members in reversed bending',
    evidence: 'published',
    isFromMemory: false,
    unit: '',
    reference: [2.5],
    ours: () => [seatEdgeNotchFactors(mPa(600)).bending],
    tolerance: { kind: 'absolute', value: 0.5 },
    reason: 'the tests bracket it between 2 and 3',
  },
  shigley71('surface-factor', 'Surface factor, machined, 105 kpsi', '', 0.787, 1e-3, false, () =>
    surfaceFactor(mPa(105 * KPSI), 'machined'),
  ),
  shigley71('size-factor', 'Size factor, 1.1 in', '', 0.87, 5e-4, false, () => sizeFactor(inch(1.1))),
  shigley71(
    'endurance-limit',
    'Endurance limit at 99 %',
    'kpsi',
    29.3,
    0.05,
    true,
    () => toMPa(enduranceLimit(mPa(105 * KPSI), inch(1.1), 'machined', 0.814).value) / KPSI,
  ),
  shigley71('goodman', 'Safety by the Goodman line', '', 1.62, 0.01, true, () => example71('goodman')),
  shigley71('soderberg', 'Safety by the Soderberg line', '', 1.56, 0.005, true, () => example71('soderberg')),
  {
    id: 'shigley-6-6',
    topic: 'fatigue',
    title: 'Fatigue notch factor from Kt 1.65, r 3 mm, 690 MPa',
    source: 'shigley-9',
    place: 'Example 6-6',
    evidence: 'published',
    isFromMemory: true,
    unit: '',
    reference: [1.55],
    ours: () => [fatigueNotchFactors({ bending: 1.65, torsion: 1.65 }, mm(3), mPa(690)).bending],
    tolerance: { kind: 'absolute', value: 0.005 },
    reason: 'half a unit of the last printed digit',
  },
  {
    id: 'fillet-kt',
    topic: 'fatigue',
    title: 'Shoulder fillet D/d = 1.5, r/d = 0.1 (bending, torsion)',
    source: 'shigley-9',
    place: 'Figs. A-15-8 and A-15-9 as read in Example 7-1',
    evidence: 'published',
    isFromMemory: false,
    unit: '',
    reference: [1.68, 1.42],
    ours: () => {
      const factors = shoulderConcentration(mm(45), mm(30), mm(3))
      return [factors.bending, factors.torsion]
    },
    tolerance: { kind: 'relative', value: 0.04 },
    reason: 'chart reading; published curve fits differ by up to 4 %',
  },
]
