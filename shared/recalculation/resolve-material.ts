/** Material references of the document become SI values of the core. */
import { EngineeringInputError } from '../engineering/engineering-input-error'
import type { Material } from '../engineering/materials/material'
import { libraryMaterial } from '../engineering/materials/material-library'
import { celsius, kilogramPerCubicMetre, mPa, perKelvin } from '../engineering/quantities/units'
import type { InlineMaterial, MaterialReference } from '../layout/layout-document'

/**
 * A file gives one expansion coefficient. Contraction per kelvin is smaller (steel 8.5 against
 * 11.1e-6, aluminium 18.2 against 23.1e-6); the smaller share asks for more cooling and is safe.
 */
const COOLING_SHARE_OF_EXPANSION = 0.75

export type ResolvedMaterial = { material: Material; reason: null } | { material: null; reason: string }

const inlineMaterials = new WeakMap<InlineMaterial, Material>()

export function resolveMaterial(reference: MaterialReference): ResolvedMaterial {
  if (typeof reference === 'string') {
    try {
      return { material: libraryMaterial(reference), reason: null }
    } catch (error) {
      if (error instanceof EngineeringInputError) return { material: null, reason: error.message }
      throw error
    }
  }
  let material = inlineMaterials.get(reference)
  if (!material) {
    material = fromInline(reference)
    inlineMaterials.set(reference, material)
  }
  return { material, reason: null }
}

function fromInline(inline: InlineMaterial): Material {
  return {
    name: inline.name ?? 'given values',
    youngsModulus: mPa(inline.youngsModulusMPa),
    poissonRatio: inline.poissonRatio,
    expansion: perKelvin(inline.expansionPerK),
    coolingExpansion: perKelvin(inline.expansionPerK * COOLING_SHARE_OF_EXPANSION),
    density: kilogramPerCubicMetre(inline.densityKgM3),
    yieldStrength: mPa(inline.yieldMPa),
    tensileStrength: mPa(inline.tensileMPa),
    isBrittle: inline.brittle,
    maxJoiningTemperature:
      inline.maxJoiningC === null || inline.maxJoiningC === undefined ? null : celsius(inline.maxJoiningC),
  }
}
