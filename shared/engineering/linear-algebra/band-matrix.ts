/**
 * Symmetric matrices whose entries lie near the diagonal, as chains of beam elements give.
 * Row i keeps its entries i, i − 1, …, i − halfBandwidth one after another.
 */
export interface BandMatrix {
  readonly size: number
  readonly halfBandwidth: number
  readonly entries: Float64Array
}

export function bandMatrix(size: number, halfBandwidth: number): BandMatrix {
  return { size, halfBandwidth, entries: new Float64Array(size * (halfBandwidth + 1)) }
}

/** Adds to the entry of row and column; either order names the same entry. */
export function addEntry(matrix: BandMatrix, row: number, column: number, value: number): void {
  const lower = row > column ? row : column
  const position = lower * (matrix.halfBandwidth + 1) + Math.abs(row - column)
  matrix.entries[position] = (matrix.entries[position] as number) + value
}

/** Replaces a freedom by the equation "this one is zero" and keeps the matrix symmetric. */
export function fixFreedom(matrix: BandMatrix, freedom: number, diagonal: number): void {
  const { size, halfBandwidth, entries } = matrix
  const width = halfBandwidth + 1
  for (let offset = 0; offset < width; offset += 1) entries[freedom * width + offset] = 0
  for (let offset = 1; offset < width && freedom + offset < size; offset += 1)
    entries[(freedom + offset) * width + offset] = 0
  entries[freedom * width] = diagonal
}

/**
 * Factors in place into L D Lᵀ (the diagonal keeps D) and counts negative pivots. By Sylvester's law
 * of inertia the count is the number of negative eigenvalues.
 */
export function factorBand(matrix: BandMatrix): number {
  const { size, halfBandwidth, entries } = matrix
  const width = halfBandwidth + 1
  let negative = 0
  for (let row = 0; row < size; row += 1) {
    const first = row > halfBandwidth ? row - halfBandwidth : 0
    const rowBase = row * width + row
    let pivot = entries[row * width] as number
    for (let column = first; column < row; column += 1) {
      const columnBase = column * width + column
      const columnFirst = column > halfBandwidth ? column - halfBandwidth : 0
      let sum = entries[rowBase - column] as number
      for (let k = first > columnFirst ? first : columnFirst; k < column; k += 1)
        sum -= (entries[rowBase - k] as number) * (entries[columnBase - k] as number)
      // the row keeps L·D until it is finished, so that inner products need no division
      entries[rowBase - column] = sum
    }
    for (let column = first; column < row; column += 1) {
      const scaled = entries[rowBase - column] as number
      const factor = scaled / (entries[column * width] as number)
      pivot -= factor * scaled
      entries[rowBase - column] = factor
    }
    // an exact zero would only mean that the shift hit an eigenvalue
    if (pivot === 0) pivot = Number.MIN_VALUE * 1e16
    entries[row * width] = pivot
    if (pivot < 0) negative += 1
  }
  return negative
}

/** Solves in place with a matrix from `factorBand`. */
export function solveBand(factored: BandMatrix, right: Float64Array): void {
  const { size, halfBandwidth, entries } = factored
  const width = halfBandwidth + 1
  for (let row = 0; row < size; row += 1) {
    let sum = right[row] as number
    const reach = row < halfBandwidth ? row : halfBandwidth
    for (let offset = 1; offset <= reach; offset += 1)
      sum -= (entries[row * width + offset] as number) * (right[row - offset] as number)
    right[row] = sum
  }
  for (let row = 0; row < size; row += 1)
    right[row] = (right[row] as number) / (entries[row * width] as number)
  for (let row = size - 1; row >= 0; row -= 1) {
    const value = right[row] as number
    const reach = row < halfBandwidth ? row : halfBandwidth
    for (let offset = 1; offset <= reach; offset += 1)
      right[row - offset] =
        (right[row - offset] as number) - (entries[row * width + offset] as number) * value
  }
}

/** One row of the product of a (not factored) matrix with a vector. */
export function rowProduct(matrix: BandMatrix, row: number, vector: Float64Array): number {
  const { size, halfBandwidth, entries } = matrix
  const width = halfBandwidth + 1
  let sum = 0
  for (let offset = 0; offset < width && row - offset >= 0; offset += 1)
    sum += (entries[row * width + offset] as number) * (vector[row - offset] as number)
  for (let offset = 1; offset < width && row + offset < size; offset += 1)
    sum += (entries[(row + offset) * width + offset] as number) * (vector[row + offset] as number)
  return sum
}
