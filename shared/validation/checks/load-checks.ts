import { beltStrandForces } from '../../engineering/load-sources/belt-pull'
import { bevelToothForces, helicalToothForces, pitchDiameter } from '../../engineering/load-sources/gear-mesh'
import { weightLoad } from '../../engineering/load-sources/weight-and-unbalance'
import {
  degree,
  inch,
  kilogram,
  mm,
  newtonMetre,
  radian,
  rpm,
  toInch,
} from '../../engineering/quantities/units'
import type { ValidationCheck } from '../validation-check'

const WATT_PER_HP = 745.6998715822702
const NEWTON_PER_LBF = 4.4482216152605

const spur = () =>
  helicalToothForces({
    torque: newtonMetre(2500 / rpm(1750)),
    pitchDiameter: pitchDiameter(20, mm(2.5), degree(0)),
    normalPressureAngle: degree(20),
    helixAngle: degree(0),
    hand: 'right',
  })
const helicalDiameter = () => pitchDiameter(18, inch(1 / 12), degree(30))
const helical = () =>
  helicalToothForces({
    torque: newtonMetre(WATT_PER_HP / rpm(1800)),
    pitchDiameter: helicalDiameter(),
    normalPressureAngle: degree(20),
    helixAngle: degree(30),
    hand: 'left',
  })
const bevelPinion = () =>
  bevelToothForces({
    torque: newtonMetre((5 * WATT_PER_HP) / rpm(600)),
    meanDiameter: inch(2 * 1.293),
    pressureAngle: degree(20),
    pitchConeAngle: radian(Math.atan(1 / 3)),
    largeEnd: 'right',
  })

function check(
  id: string,
  title: string,
  place: string,
  unit: string,
  reference: number,
  tolerance: number,
  ours: () => number,
): ValidationCheck {
  return {
    id,
    topic: 'loads',
    title,
    source: 'shigley-9',
    place,
    evidence: 'published',
    isFromMemory: true,
    unit,
    reference: [reference],
    ours: () => [ours()],
    tolerance: { kind: 'absolute', value: tolerance },
    reason: 'half a unit of the last printed digit, or what the book loses by rounding on the way',
  }
}

export const LOAD_CHECKS: readonly ValidationCheck[] = [
  check(
    'spur-tangential',
    'Tangential force of a spur pinion, 2.5 kW',
    'Example 13-7',
    'kN',
    0.546,
    5e-4,
    () => spur().tangential / 1e3,
  ),
  check(
    'spur-radial',
    'Radial force of a spur pinion',
    'Example 13-7',
    'kN',
    0.199,
    5e-4,
    () => spur().radial / 1e3,
  ),
  check('helical-diameter', 'Pitch diameter of a helical pinion', 'Example 13-9', 'in', 1.732, 5e-4, () =>
    toInch(helicalDiameter()),
  ),
  check(
    'helical-tangential',
    'Tangential force of a helical pinion, 1 hp',
    'Example 13-9',
    'lbf',
    40.4,
    0.05,
    () => helical().tangential / NEWTON_PER_LBF,
  ),
  check(
    'helical-radial',
    'Radial force of a helical pinion',
    'Example 13-9',
    'lbf',
    17,
    0.05,
    () => helical().radial / NEWTON_PER_LBF,
  ),
  check(
    'helical-axial',
    'Axial force of a helical pinion',
    'Example 13-9',
    'lbf',
    23.3,
    0.05,
    () => helical().axial / NEWTON_PER_LBF,
  ),
  check(
    'bevel-tangential',
    'Tangential force of a bevel pinion, 5 hp',
    'Example 13-8',
    'lbf',
    406,
    0.5,
    () => bevelPinion().tangential / NEWTON_PER_LBF,
  ),
  check(
    'bevel-axial',
    'Radial force on the bevel gear, which is the pinion’s axial force',
    'Example 13-8',
    'lbf',
    46.6,
    0.5,
    () => bevelPinion().axial / NEWTON_PER_LBF,
  ),
  check(
    'bevel-radial',
    'Axial force on the bevel gear, which is the pinion’s radial force',
    'Example 13-8',
    'lbf',
    140,
    0.5,
    () => bevelPinion().radial / NEWTON_PER_LBF,
  ),
  {
    id: 'rope-friction',
    topic: 'loads',
    title: 'Tight over slack strand, friction 0.3 over half a turn',
    source: 'belt-friction',
    place: 'exp(0.3 π)',
    evidence: 'closedForm',
    isFromMemory: true,
    unit: '',
    reference: [2.566],
    ours: () => {
      const { tight, slack } = beltStrandForces({
        torque: newtonMetre(50),
        pitchDiameter: mm(200),
        effectiveFriction: 0.3,
        wrapAngle: degree(180),
        reserve: 1,
      })
      return [tight / slack]
    },
    tolerance: { kind: 'absolute', value: 5e-4 },
    reason: 'half a unit of the last digit given',
  },
  {
    id: 'standard-gravity',
    topic: 'loads',
    title: 'Weight of one kilogram',
    source: 'iso-80000-3',
    place: 'standard acceleration of free fall',
    evidence: 'published',
    isFromMemory: true,
    unit: 'N',
    reference: [9.80665],
    ours: () => [-weightLoad(kilogram(1), degree(180)).forceY],
    tolerance: { kind: 'absolute', value: 1e-9 },
    reason: 'exact by definition',
  },
]
