import type { ContactSystem } from './contact-system'
import type { ContactSolution } from './contact-solution'

/** Stresses at the centre of each element, Pa, in the order of the mesh's elements. */
export interface ElementStresses {
  radial: Float64Array
  hoop: Float64Array
  axial: Float64Array
  shear: Float64Array
  equivalent: Float64Array
}

/**
 * Stresses over the half section, for the stress map.
 *
 * Model: strains at the centre of each element, where a four-node element is most accurate; von Mises.
 * @param system [SI] from `prepareContact`
 * @param solution [SI] from `solveContact`
 * @returns [Pa] one value an element
 * @throws nothing
 *
 * Validity: the elements next to a sharp edge show a value that depends on the mesh.
 * Source: finite-elements
 * Example: fe-press-fit, flush at both ends: radial and hoop stress of a solid shaft are minus the pressure everywhere
 */
export function elementStresses(system: ContactSystem, solution: ContactSolution): ElementStresses {
  const { mesh, model } = system
  const { displacement: u, state } = solution
  const count = mesh.part.length
  const out: ElementStresses = {
    radial: new Float64Array(count),
    hoop: new Float64Array(count),
    axial: new Float64Array(count),
    shear: new Float64Array(count),
    equivalent: new Float64Array(count),
  }
  for (let e = 0; e < count; e++) {
    const [a, b, c, d] = [0, 1, 2, 3].map((n) => mesh.quads[4 * e + n]!) as [number, number, number, number]
    const part = mesh.part[e]!
    const material = part === 0 ? model.shaftMaterial : model.hubs[part - 1]!.material
    const length = mesh.station[c]! - mesh.station[a]!
    const height = mesh.radius[c]! - mesh.radius[a]!
    const radius = (mesh.radius[c]! + mesh.radius[a]!) / 2
    const r = (node: number) => u[2 * node]!
    const z = (node: number) => u[2 * node + 1]!
    const free = material.expansion * state.temperatureRise[part]!
    const radialStrain = (r(d) + r(c) - r(a) - r(b)) / (2 * height) - free
    const hoopStrain = (r(a) + r(b) + r(c) + r(d)) / 4 / radius - free
    const axialStrain = (z(b) + z(c) - z(a) - z(d)) / (2 * length) - free
    const shearStrain =
      (r(b) + r(c) - r(a) - r(d)) / (2 * length) + (z(d) + z(c) - z(a) - z(b)) / (2 * height)
    const { youngsModulus: E, poissonRatio: nu } = material
    const shearModulus = E / (2 * (1 + nu))
    const mean = ((E * nu) / ((1 + nu) * (1 - 2 * nu))) * (radialStrain + hoopStrain + axialStrain)
    const radial = mean + 2 * shearModulus * radialStrain
    const hoop = mean + 2 * shearModulus * hoopStrain
    const axial = mean + 2 * shearModulus * axialStrain
    const shear = shearModulus * shearStrain
    out.radial[e] = radial
    out.hoop[e] = hoop
    out.axial[e] = axial
    out.shear[e] = shear
    out.equivalent[e] = Math.sqrt(
      ((radial - hoop) ** 2 + (hoop - axial) ** 2 + (axial - radial) ** 2) / 2 + 3 * shear * shear,
    )
  }
  return out
}
