/** Lowest eigenvalues of K x = λ M x for banded symmetric K and M, by counting and bisection. */
import { factorBand, type BandMatrix } from './band-matrix'

/** Halves the logarithm of the bracket: 16 to the power 2⁻²⁸ leaves eight digits. */
const BISECTIONS = 28
const FIRST_GUESS = 1
const BRACKET_RATIO = 16
const LARGEST = 1e24

/**
 * The count of negative pivots of K − λM is the number of eigenvalues below λ (Sturm), so no
 * eigenvalue can be missed. `skip` leaves out rigid-body modes at the bottom.
 */
export function lowestEigenvalues(
  stiffness: BandMatrix,
  mass: BandMatrix,
  count: number,
  skip = 0,
): number[] {
  const shifted = { ...stiffness, entries: new Float64Array(stiffness.entries.length) }
  const below = (lambda: number) => {
    shift(shifted.entries, stiffness.entries, mass.entries, lambda)
    return factorBand(shifted)
  }
  const found: number[] = []
  let high = FIRST_GUESS
  let countAtHigh = below(high)
  // heavy, soft systems may lie below the first guess
  while (countAtHigh > skip && high > 1 / LARGEST) countAtHigh = below((high /= BRACKET_RATIO))
  let low = high
  for (let index = skip; index < skip + count; index += 1) {
    while (countAtHigh <= index && high < LARGEST) {
      low = high
      countAtHigh = below((high *= BRACKET_RATIO))
    }
    if (countAtHigh <= index) return found
    let lower = low
    let upper = high
    for (let step = 0; step < BISECTIONS; step += 1) {
      const middle = Math.sqrt(lower * upper)
      if (below(middle) > index) upper = middle
      else lower = middle
    }
    found.push(Math.sqrt(lower * upper))
    low = lower
  }
  return found
}

/** K − λM, entry by entry. */
function shift(target: Float64Array, stiffness: Float64Array, mass: Float64Array, lambda: number): void {
  for (let index = 0; index < target.length; index += 1)
    target[index] = (stiffness[index] as number) - lambda * (mass[index] as number)
}
