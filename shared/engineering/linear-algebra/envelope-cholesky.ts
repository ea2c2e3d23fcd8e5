import { EngineeringInputError } from '../engineering-input-error'

/**
 * Symmetric positive definite matrix kept as an envelope: of row i the entries from its first non-zero
 * column to the diagonal stand one behind the other, so that the inner products run over plain memory.
 */
export interface EnvelopeMatrix {
  size: number
  first: Int32Array
  /** Index of row i's first entry in `values`. */
  start: Int32Array
  values: Float64Array
}

export function emptyEnvelope(first: Int32Array): EnvelopeMatrix {
  const size = first.length
  const start = new Int32Array(size + 1)
  for (let i = 0; i < size; i++) start[i + 1] = start[i]! + i - first[i]! + 1
  return { size, first, start, values: new Float64Array(start[size]!) }
}

export function addToEnvelope(matrix: EnvelopeMatrix, row: number, column: number, value: number): void {
  const i = row > column ? row : column
  const j = row > column ? column : row
  matrix.values[matrix.start[i]! + j - matrix.first[i]!]! += value
}

/**
 * Cholesky factor of an envelope matrix, in place.
 *
 * Model: A = L Lᵀ row by row; the factor keeps the envelope.
 * @param matrix [any] symmetric positive definite, lower half
 * @returns nothing; `matrix` holds L
 * @throws EngineeringInputError `numericallySingular` when a pivot is not positive
 *
 * Validity: source gives none; cost grows with the sum of squared row lengths.
 * Source: george-liu-envelope
 * Example: george-liu-envelope, the matrix 4 2 / 2 5 has the factor 2 0 / 1 2
 */
export function factoriseEnvelope({ size, first, start, values: L }: EnvelopeMatrix): void {
  for (let i = 0; i < size; i++) {
    const from = first[i]!
    const rowI = start[i]! - from
    let pivot = L[rowI + i]!
    for (let j = from; j < i; j++) {
      const fromJ = first[j]!
      const rowJ = start[j]! - fromJ
      let k = from > fromJ ? from : fromJ
      let sum = L[rowI + j]!
      for (; k + 3 < j; k += 4)
        sum -=
          L[rowI + k]! * L[rowJ + k]! +
          L[rowI + k + 1]! * L[rowJ + k + 1]! +
          L[rowI + k + 2]! * L[rowJ + k + 2]! +
          L[rowI + k + 3]! * L[rowJ + k + 3]!
      for (; k < j; k++) sum -= L[rowI + k]! * L[rowJ + k]!
      sum /= L[rowJ + j]!
      L[rowI + j] = sum
      pivot -= sum * sum
    }
    if (!(pivot > 0))
      throw new EngineeringInputError(
        'numericallySingular',
        'sections',
        'The stiffness matrix is not positive definite',
      )
    L[rowI + i] = Math.sqrt(pivot)
  }
}

/**
 * Solves for several right-hand sides at once, in place.
 *
 * Model: forward and backward substitution; the sides are interleaved so that one pass over L serves all.
 * @param factor [any] from `factoriseEnvelope`
 * @param sides [any] entry i of side c at index i · count + c
 * @param count [1] number of sides, ≥ 1
 * @returns nothing; `sides` holds the solutions
 * @throws nothing
 *
 * Validity: as the factor.
 * Source: george-liu-envelope
 * Example: george-liu-envelope, the matrix 4 2 / 2 5 and the side 6, 7 give 1, 1
 */
export function solveEnvelope(factor: EnvelopeMatrix, sides: Float64Array, count: number): void {
  const { size, first, start, values: L } = factor
  for (let i = 0; i < size; i++) {
    const row = start[i]! - first[i]!
    const at = i * count
    for (let j = first[i]!; j < i; j++) {
      const l = L[row + j]!
      if (l === 0) continue
      const other = j * count
      for (let c = 0; c < count; c++) sides[at + c]! -= l * sides[other + c]!
    }
    const inverse = 1 / L[row + i]!
    for (let c = at; c < at + count; c++) sides[c]! *= inverse
  }
  for (let i = size - 1; i >= 0; i--) {
    const row = start[i]! - first[i]!
    const at = i * count
    const inverse = 1 / L[row + i]!
    for (let c = at; c < at + count; c++) sides[c]! *= inverse
    for (let j = first[i]!; j < i; j++) {
      const l = L[row + j]!
      if (l === 0) continue
      const other = j * count
      for (let c = 0; c < count; c++) sides[other + c]! -= l * sides[at + c]!
    }
  }
}
