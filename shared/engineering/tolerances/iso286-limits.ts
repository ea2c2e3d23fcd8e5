/** Limits of ISO 286 tolerance classes, from the table to 500 mm. */
import { EngineeringInputError, requirePositive } from '../engineering-input-error'
import type { Length } from '../quantities/quantity'
import { toMm, um } from '../quantities/units'
import {
  DELTA_UM,
  DEVIATION_STEPS_UP_TO_MM,
  GRADE_STEPS_UP_TO_MM,
  GRADE_STEP_OF_DEVIATION_STEP,
  HOLE_J_UPPER_DEVIATION_UM,
  HOLE_KMN_UM,
  HOLE_M6_250_TO_315_UM,
  SHAFT_J_LOWER_DEVIATION_UM,
  SHAFT_K_IT4_TO_IT7_UM,
  SHAFT_LOWER_DEVIATION_UM,
  SHAFT_UPPER_DEVIATION_UM,
  TOLERANCE_UM,
} from './iso286-table'

/** Deviations from the nominal size, positive when larger than nominal. */
export interface LimitDeviations {
  upperDeviation: Length
  lowerDeviation: Length
}

const CLASS_PATTERN = /^([A-Za-z]{1,2})(01|\d{1,2})$/
const CLEARANCE_LETTERS = Object.keys(SHAFT_UPPER_DEVIATION_UM)
const INTERFERENCE_LETTERS = Object.keys(SHAFT_LOWER_DEVIATION_UM)

/** Every letter with a deviation in the table, in the order of the standard. */
export const SHAFT_LETTERS: readonly string[] = [
  ...CLEARANCE_LETTERS,
  'js',
  'j',
  'k',
  ...INTERFERENCE_LETTERS,
]
export const HOLE_LETTERS: readonly string[] = SHAFT_LETTERS.map((letter) => letter.toUpperCase())
export const GRADES: readonly string[] = Object.keys(TOLERANCE_UM).sort(
  (one, other) => gradeNumber(one) - gradeNumber(other),
)

/** IT01 comes before IT0. */
function gradeNumber(grade: string): number {
  return grade === '01' ? -1 : Number(grade)
}

function stepOf(sizeMm: number, stepsUpToMm: readonly number[]): number {
  return sizeMm > 0 ? stepsUpToMm.findIndex((upTo) => sizeMm <= upTo) : -1
}

interface Lookup {
  sizeMm: number
  grade: string
  gradeStep: number
  deviationStep: number
  toleranceUm: number
}

function shaftLimitsUm(letter: string, at: Lookup): [upper: number, lower: number] | null {
  const upperDeviation = SHAFT_UPPER_DEVIATION_UM[letter]?.[at.deviationStep]
  if (typeof upperDeviation === 'number') return [upperDeviation, upperDeviation - at.toleranceUm]
  let lowerDeviation: number | null | undefined
  if (letter === 'j') lowerDeviation = SHAFT_J_LOWER_DEVIATION_UM[at.grade]?.[at.deviationStep]
  else if (letter === 'k') {
    const number = gradeNumber(at.grade)
    lowerDeviation = number >= 4 && number <= 7 ? SHAFT_K_IT4_TO_IT7_UM[at.deviationStep] : 0
  } else lowerDeviation = SHAFT_LOWER_DEVIATION_UM[letter]?.[at.deviationStep]
  if (typeof lowerDeviation !== 'number') return null
  return [lowerDeviation + at.toleranceUm, lowerDeviation]
}

/** Upper deviation of holes J to ZC, with the delta rule. */
function holeUpperDeviationUm(letter: string, at: Lookup): number | null | undefined {
  const number = gradeNumber(at.grade)
  if (letter === 'J') return HOLE_J_UPPER_DEVIATION_UM[at.grade]?.[at.deviationStep]
  const closeToZero = HOLE_KMN_UM[letter]
  if (closeToZero && number > 8) {
    // N above IT8 is not used up to 1 mm
    if (letter === 'N' && at.sizeMm <= 1) return null
    return closeToZero.aboveIt8[at.deviationStep]
  }
  const mirrored = SHAFT_LOWER_DEVIATION_UM[letter.toLowerCase()]?.[at.deviationStep]
  const base = closeToZero
    ? closeToZero.upToIt8[at.deviationStep]
    : typeof mirrored === 'number'
      ? -mirrored
      : null
  if (typeof base !== 'number') return null
  if (!closeToZero && number > 7) return base
  if (at.sizeMm <= 3) return base
  if (letter === 'M' && at.grade === '6' && at.sizeMm > 250 && at.sizeMm <= 315) return HOLE_M6_250_TO_315_UM
  // delta is tabulated for IT3 to IT8 only
  const delta = DELTA_UM[at.grade]?.[at.gradeStep]
  return delta === undefined ? null : base + delta
}

function holeLimitsUm(letter: string, at: Lookup): [upper: number, lower: number] | null {
  const mirrored = SHAFT_UPPER_DEVIATION_UM[letter.toLowerCase()]?.[at.deviationStep]
  if (typeof mirrored === 'number') return [-mirrored + at.toleranceUm, -mirrored]
  const upper = holeUpperDeviationUm(letter, at)
  return typeof upper === 'number' ? [upper, upper - at.toleranceUm] : null
}

function limitsUm(sizeMm: number, letter: string, grade: string): [upper: number, lower: number] | null {
  const gradeStep = stepOf(sizeMm, GRADE_STEPS_UP_TO_MM)
  const deviationStep = stepOf(sizeMm, DEVIATION_STEPS_UP_TO_MM)
  const toleranceUm = TOLERANCE_UM[grade]?.[gradeStep]
  if (toleranceUm === undefined || GRADE_STEP_OF_DEVIATION_STEP[deviationStep] !== gradeStep) return null
  const isShaft = letter === letter.toLowerCase()
  if (!(isShaft ? SHAFT_LETTERS : HOLE_LETTERS).includes(letter)) return null
  // the standard does not use IT14 and coarser, nor a and b, up to 1 mm
  if (sizeMm <= 1 && (gradeNumber(grade) >= 14 || /^[ab]$/i.test(letter))) return null
  if (letter === 'js' || letter === 'JS') return [toleranceUm / 2, -toleranceUm / 2]
  const at: Lookup = { sizeMm, grade, gradeStep, deviationStep, toleranceUm }
  return isShaft ? shaftLimitsUm(letter, at) : holeLimitsUm(letter, at)
}

/**
 * Upper and lower deviation of a tolerance class at a nominal size.
 *
 * Model: table look-up; holes J to ZC by the delta rule; js and JS are half the tolerance, not rounded.
 * @param size [m] nominal size, > 0, up to 500 mm
 * @param toleranceClass [-] letters and grade such as `H7` (hole) or `u6` (shaft)
 * @returns [m] deviations from nominal, positive when larger
 * @throws EngineeringInputError `notPositive`, `sizeOutOfRange`, `unknownToleranceClass` (says which are known)
 *
 * Validity: nominal sizes over 0 up to 500 mm at 20 °C.
 * Source: iso-286-1 tables 1 to 5; narayana Tables 15.1 to 15.3; jis-b-0401
 * Example: 65 mm, u6 gives +106/+87 µm (jis-b-0401, step 50 to 65 mm)
 */
export function limitsOfClass(size: Length, toleranceClass: string): LimitDeviations {
  requirePositive(size, 'size')
  const sizeMm = roundedMm(size)
  if (sizeMm > 500 || sizeMm <= 0)
    throw new EngineeringInputError(
      'sizeOutOfRange',
      'size',
      `ISO 286 is held here for sizes up to 500 mm; this seat is ${sizeMm} mm`,
    )
  const match = CLASS_PATTERN.exec(toleranceClass)
  const letter = match?.[1] ?? ''
  const grade = match?.[2] ?? ''
  const limits = match ? limitsUm(sizeMm, letter, grade) : null
  if (!limits) {
    throw new EngineeringInputError(
      'unknownToleranceClass',
      'toleranceClass',
      unknownClassMessage(sizeMm, toleranceClass, letter),
    )
  }
  return { upperDeviation: um(limits[0]), lowerDeviation: um(limits[1]) }
}

/** Table steps end on whole micrometres; the round trip through metres must not move 50 mm to 50.000…01. */
function roundedMm(size: Length): number {
  return Math.round(toMm(size) * 1e6) / 1e6
}

function unknownClassMessage(sizeMm: number, toleranceClass: string, letter: string): string {
  const isShaft = letter !== '' && letter === letter.toLowerCase()
  const letters = isShaft ? SHAFT_LETTERS : HOLE_LETTERS
  const grades = GRADES.filter((grade) => limitsUm(sizeMm, letter, grade) !== null)
  if (grades.length > 0)
    return `${toleranceClass} does not exist at ${sizeMm} mm; ${letter} is known in grades ${grades.join(', ')}`
  const grade = CLASS_PATTERN.exec(toleranceClass)?.[2] ?? '7'
  const known = letters.filter((other) => limitsUm(sizeMm, other, grade) !== null)
  return known.length > 0
    ? `${toleranceClass} does not exist at ${sizeMm} mm; known in grade ${grade}: ${known.join(', ')}`
    : `${toleranceClass} does not exist at ${sizeMm} mm; known grades: ${GRADES.join(', ')}`
}

/**
 * Every tolerance class that exists at a nominal size.
 *
 * Model: table look-up of each letter and grade.
 * @param size [m] nominal size, > 0, up to 500 mm
 * @param kind [-] `shaft` (small letters) or `hole` (capital letters)
 * @returns [-] classes in the order of the standard, such as `m6`, `n6`, …; empty beyond 500 mm
 * @throws EngineeringInputError `notPositive`
 *
 * Validity: nominal sizes over 0 up to 500 mm.
 * Source: iso-286-1 tables 1 to 5
 * Example: at 10 mm t6 is not among the shafts (narayana p. 216: t starts above 24 mm)
 */
export function knownToleranceClasses(size: Length, kind: 'shaft' | 'hole'): string[] {
  requirePositive(size, 'size')
  const sizeMm = roundedMm(size)
  const letters = kind === 'shaft' ? SHAFT_LETTERS : HOLE_LETTERS
  return letters.flatMap((letter) =>
    GRADES.filter((grade) => limitsUm(sizeMm, letter, grade) !== null).map((grade) => letter + grade),
  )
}
