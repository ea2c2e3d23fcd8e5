import type { ContactMaterial } from './contact-model'

/** Matrices of one element, per radian. Freedoms: radial and axial displacement of its four nodes in turn. */
export interface RingElement {
  /** 8 × 8, N/m. */
  stiffness: Float64Array
  /** Nodal forces of a free temperature rise of 1 K, N. */
  thermal: Float64Array
  /** Nodal forces of turning at 1 rad/s, N. */
  spin: Float64Array
}

/** Zeroed matrices of one element, to be filled by `ringElement`. */
export function emptyRingElement(): RingElement {
  return { stiffness: new Float64Array(64), thermal: new Float64Array(8), spin: new Float64Array(8) }
}

const GAUSS = 1 / Math.sqrt(3)
const POINTS: readonly (readonly [number, number])[] = [
  [-GAUSS, -GAUSS],
  [GAUSS, -GAUSS],
  [GAUSS, GAUSS],
  [-GAUSS, GAUSS],
]
const AXIAL_SIGN = [-1, 1, 1, -1] as const
const RADIAL_SIGN = [-1, -1, 1, 1] as const

// Work space of `ringElement`: a mesh has thousands of elements and the function never calls itself.
const shape = new Float64Array(16)
const byRadius = new Float64Array(16)
const byStation = new Float64Array(16)
const weight = new Float64Array(4)
const meanVolumetric = new Float64Array(8)
const strain = new Float64Array(32)

/**
 * Axisymmetric four-node rectangle with a mean volumetric strain (B-bar).
 *
 * Model: linear elasticity in r and z, full 2 × 2 integration of the deviatoric strain, the volumetric strain
 * averaged over the element, so that bending and near-incompressible pressure do not lock.
 * @param left [m] smaller station
 * @param right [m] larger station
 * @param inner [m] smaller radius, ≥ 0
 * @param outer [m] larger radius
 * @param material [SI] elastic constants, expansion, density
 * @param out [N/m, N] filled in place
 * @returns nothing
 * @throws nothing; the mesh builder gives only proper rectangles
 *
 * Validity: small displacements; Poisson ratio up to 0.49.
 * Source: hughes-b-bar; finite-elements
 * Example: finite-elements, a uniform temperature rise of a free ring strains it by α ΔT and leaves no stress
 */
export function ringElement(
  left: number,
  right: number,
  inner: number,
  outer: number,
  material: ContactMaterial,
  out: RingElement,
): void {
  const { stiffness, thermal, spin } = out
  stiffness.fill(0)
  thermal.fill(0)
  spin.fill(0)
  const a = (right - left) / 2
  const b = (outer - inner) / 2
  const centre = (inner + outer) / 2
  const { youngsModulus: E, poissonRatio: nu } = material
  const lambda = (E * nu) / ((1 + nu) * (1 - 2 * nu))
  const shear = E / (2 * (1 + nu))

  let volume = 0
  for (let p = 0; p < 4; p++) {
    const [x, y] = POINTS[p]!
    weight[p] = a * b * (centre + b * y)
    volume += weight[p]!
    for (let n = 0; n < 4; n++) {
      const alongX = 1 + AXIAL_SIGN[n]! * x
      const alongY = 1 + RADIAL_SIGN[n]! * y
      shape[4 * p + n] = 0.25 * alongX * alongY
      byStation[4 * p + n] = (0.25 * AXIAL_SIGN[n]! * alongY) / a
      byRadius[4 * p + n] = (0.25 * alongX * RADIAL_SIGN[n]!) / b
    }
  }
  meanVolumetric.fill(0)
  for (let p = 0; p < 4; p++) {
    const share = weight[p]! / volume
    const r = centre + b * POINTS[p]![1]
    for (let n = 0; n < 4; n++) {
      meanVolumetric[2 * n]! += share * (byRadius[4 * p + n]! + shape[4 * p + n]! / r)
      meanVolumetric[2 * n + 1]! += share * byStation[4 * p + n]!
    }
  }
  for (let p = 0; p < 4; p++) {
    const r = centre + b * POINTS[p]![1]
    const w = weight[p]!
    for (let n = 0; n < 4; n++) {
      const radial = byRadius[4 * p + n]!
      const hoop = shape[4 * p + n]! / r
      const axial = byStation[4 * p + n]!
      const shiftR = (meanVolumetric[2 * n]! - radial - hoop) / 3
      const shiftZ = (meanVolumetric[2 * n + 1]! - axial) / 3
      // rows: radial, hoop, axial, shear strain
      strain[2 * n] = radial + shiftR
      strain[8 + 2 * n] = hoop + shiftR
      strain[16 + 2 * n] = shiftR
      strain[24 + 2 * n] = axial
      strain[2 * n + 1] = shiftZ
      strain[8 + 2 * n + 1] = shiftZ
      strain[16 + 2 * n + 1] = axial + shiftZ
      strain[24 + 2 * n + 1] = radial
      spin[2 * n]! += material.density * shape[4 * p + n]! * r * w
    }
    for (let i = 0; i < 8; i++) {
      const e0 = strain[i]!
      const e1 = strain[8 + i]!
      const e2 = strain[16 + i]!
      const mean = lambda * (e0 + e1 + e2)
      const s0 = (mean + 2 * shear * e0) * w
      const s1 = (mean + 2 * shear * e1) * w
      const s2 = (mean + 2 * shear * e2) * w
      const s3 = shear * strain[24 + i]! * w
      thermal[i]! += material.expansion * (s0 + s1 + s2)
      for (let j = i; j < 8; j++)
        stiffness[8 * i + j]! +=
          s0 * strain[j]! + s1 * strain[8 + j]! + s2 * strain[16 + j]! + s3 * strain[24 + j]!
    }
  }
  for (let i = 0; i < 8; i++) for (let j = 0; j < i; j++) stiffness[8 * i + j] = stiffness[8 * j + i]!
}
