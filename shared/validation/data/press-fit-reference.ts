import cases from './fe-press-fit-cases.json'

/**
 * Axisymmetric finite-element models of press fits with contact (CalculiX 2.20, a general-purpose solver; each case
 * repeated by a second solver). Project reference data; values at sharp edges depend on the mesh and are not held.
 */
export interface FePressFitCase {
  id: string
  title: string
  shaft: { lengthMm: number; diameterMm: number; boreMm: number; riseK: number; material: FeMaterial }
  hubs: {
    id: string
    startMm: number
    lengthMm: number
    interferenceMm: number
    riseK: number
    /** From, to and outside diameter of each ring, mm from the hub's left face. */
    rings: [number, number, number][]
    material: FeMaterial
  }[]
  speedRpm: number
  results: { meanMPa: number; middleMPa: number; boreHoopMPa: number; openMm: number }[]
}

export interface FeMaterial {
  youngsModulusMPa: number
  poissonRatio: number
  expansionPerK: number
  densityKgM3: number
}

export const FE_PRESS_FIT_CASES = cases as unknown as readonly FePressFitCase[]
