/**
 * Fits of ISO 286 for one seat: what each shaft class gives with a hole class, and which of them lie
 * inside the interference window, best first.
 */
import { EngineeringInputError } from '../engineering/engineering-input-error'
import { interferenceOfClasses } from '../engineering/interference-fit/interference-limits'
import { mm, toUm } from '../engineering/quantities/units'
import { knownToleranceClasses, limitsOfClass } from '../engineering/tolerances/iso286-limits'

export interface FitOfClass {
  hole: string
  shaft: string
  minUm: number
  maxUm: number
}

export type ClassLimits =
  { isKnown: true; upperUm: number; lowerUm: number } | { isKnown: false; message: string }

const roundedUm = (um: number) => Math.round(um * 10) / 10

/** Deviations of one class at a size, or why there are none. */
export function classLimits(sizeMm: number, toleranceClass: string): ClassLimits {
  try {
    const { upperDeviation, lowerDeviation } = limitsOfClass(mm(sizeMm), toleranceClass)
    return {
      isKnown: true,
      upperUm: roundedUm(toUm(upperDeviation)),
      lowerUm: roundedUm(toUm(lowerDeviation)),
    }
  } catch (error) {
    if (error instanceof EngineeringInputError) return { isKnown: false, message: error.message }
    throw error
  }
}

/** Grades in which interference seats are made. */
const SEAT_GRADES = /[a-zA-Z](?:5|6|7|8|9)$/

export function holeClasses(sizeMm: number): string[] {
  return sizeMm > 0 ? knownToleranceClasses(mm(sizeMm), 'hole').filter((name) => SEAT_GRADES.test(name)) : []
}

/** Every shaft class in a usual grade that gives some interference with the hole class. */
export function interferenceFits(sizeMm: number, hole: string): FitOfClass[] {
  if (!(sizeMm > 0) || !classLimits(sizeMm, hole).isKnown) return []
  return knownToleranceClasses(mm(sizeMm), 'shaft')
    .filter((name) => SEAT_GRADES.test(name))
    .map((shaft) => {
      const { min, max } = interferenceOfClasses(mm(sizeMm), hole, shaft)
      return { hole, shaft, minUm: roundedUm(toUm(min)), maxUm: roundedUm(toUm(max)) }
    })
    .filter(({ maxUm }) => maxUm > 0)
}

/** How far the band keeps from the nearer mark; negative outside the window. */
export function windowMargin(
  { minUm, maxUm }: Pick<FitOfClass, 'minUm' | 'maxUm'>,
  window: { requiredUm: number | null; permissibleUm: number | null },
): number {
  const below = window.requiredUm === null ? Infinity : minUm - window.requiredUm
  const above = window.permissibleUm === null ? Infinity : window.permissibleUm - maxUm
  return Math.min(below, above)
}

/** Coarser grades first among fits inside the window: they cost less; then the larger margin. */
export function fitsInsideWindow(
  fits: readonly FitOfClass[],
  window: { requiredUm: number | null; permissibleUm: number | null },
): FitOfClass[] {
  const gradeOf = ({ shaft }: FitOfClass) => Number(shaft.replace(/^\D+/, ''))
  return fits
    .filter((fit) => windowMargin(fit, window) >= 0)
    .sort(
      (one, other) =>
        gradeOf(other) - gradeOf(one) || windowMargin(other, window) - windowMargin(one, window),
    )
}
