/**
 * DIN 743-2, tested fatigue notch factors of interference-fit seats at 40 mm (from memory, one decimal): tensile strength
 * in MPa, factor in bending, factor in torsion.
 */
export const SEAT_EDGE_FACTORS = [
  [400, 1.8, 1.2],
  [500, 2.0, 1.3],
  [600, 2.2, 1.4],
  [700, 2.3, 1.5],
  [800, 2.5, 1.6],
  [900, 2.6, 1.7],
  [1000, 2.7, 1.8],
  [1100, 2.8, 1.8],
  [1200, 2.9, 1.9],
] as const
