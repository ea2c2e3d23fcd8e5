import { addEntry, bandMatrix } from '../linear-algebra/band-matrix'
import { lowestEigenvalues } from '../linear-algebra/lowest-eigenvalues'
import type { Frequency } from '../quantities/quantity'
import { hertz } from '../quantities/units'
import { beamMesh, nearestNode } from './beam-mesh'
import { requireShaft, shaftLength, type CarriedMass, type ShaftModel } from './shaft-model'

/** Linear elements no longer than this share of the shaft keep the second mode within 0.1 %. */
const ELEMENT_SHARE = 1 / 60
/** The shaft turns freely in its bearings: one mode has no frequency. */
const RIGID_MODES = 1

/**
 * Lowest torsional natural frequencies of the free shaft with its hubs.
 *
 * Model: linear torsion elements with consistent inertia, hubs as rigid inertias, free at both ends; what drives or is
 * driven beyond the shaft is not included.
 * @param model [m, Pa, kg/m³] segments and material; density 0 leaves the inertia of the shaft out
 * @param masses [m, kg·m²] carried polar inertias on the shaft
 * @param count [-] how many, ≥ 1
 * @returns [Hz] rising, without the rigid mode
 * @throws EngineeringInputError `emptyShaft`, `boreNotInside`, `notPositive`
 *
 * Validity: a shaft alone; connected machines shift the frequencies.
 * Source: vibration-theory; beam-reference torsional
 * Example: beam-reference, two disks on a stepped shaft: 403.8 Hz
 */
export function torsionalFrequencies(
  model: ShaftModel,
  masses: readonly CarriedMass[],
  count: number,
): Frequency[] {
  requireShaft(model)
  const stations = masses.map((carried) => carried.station)
  const mesh = beamMesh(model, stations, shaftLength(model) * ELEMENT_SHARE)
  const stiffness = bandMatrix(mesh.nodes.length, 1)
  const inertia = bandMatrix(mesh.nodes.length, 1)
  for (let element = 0; element < mesh.torsionalStiffness.length; element += 1) {
    const h = (mesh.nodes[element + 1] as number) - (mesh.nodes[element] as number)
    const k = (mesh.torsionalStiffness[element] as number) / h
    // ρ I_p per length is twice ρ I
    const j = (2 * (mesh.rotaryPerLength[element] as number) * h) / 6
    addEntry(stiffness, element, element, k)
    addEntry(stiffness, element, element + 1, -k)
    addEntry(stiffness, element + 1, element + 1, k)
    addEntry(inertia, element, element, 2 * j)
    addEntry(inertia, element, element + 1, j)
    addEntry(inertia, element + 1, element + 1, 2 * j)
  }
  for (const carried of masses) {
    const node = nearestNode(mesh, carried.station)
    addEntry(inertia, node, node, carried.polarInertia)
  }
  return lowestEigenvalues(stiffness, inertia, count, RIGID_MODES).map((square) =>
    hertz(Math.sqrt(square) / (2 * Math.PI)),
  )
}
