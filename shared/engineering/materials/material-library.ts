/** The built-in materials. Workspace entries come from outside the core and are not kept here. */
import { EngineeringInputError } from '../engineering-input-error'
import { CAST_IRONS_AND_COPPER } from './cast-irons-and-copper'
import { LIGHT_METALS_AND_SINTERED } from './light-metals-and-sintered'
import type { LibraryMaterial, Material } from './material'
import { STEELS } from './steels'
import { TUBES_AND_STAINLESS } from './tubes-and-stainless'

export const MATERIAL_LIBRARY: readonly LibraryMaterial[] = [
  ...STEELS,
  ...TUBES_AND_STAINLESS,
  ...CAST_IRONS_AND_COPPER,
  ...LIGHT_METALS_AND_SINTERED,
]

const byId: ReadonlyMap<string, LibraryMaterial> = new Map(
  MATERIAL_LIBRARY.flatMap((entry) => [entry.id, ...entry.aliases].map((id) => [id, entry] as const)),
)

const calculationValues: ReadonlyMap<LibraryMaterial, Material> = new Map(
  MATERIAL_LIBRARY.map((entry) => [
    entry,
    {
      name: `${entry.name} ${entry.condition}`,
      youngsModulus: entry.youngsModulus.value,
      poissonRatio: entry.poissonRatio.value,
      expansion: entry.expansion.value,
      coolingExpansion: entry.coolingExpansion.value,
      density: entry.density.value,
      yieldStrength: entry.yieldStrength.value,
      tensileStrength: entry.tensileStrength.value,
      isBrittle: entry.isBrittle,
      maxJoiningTemperature: entry.maxJoiningTemperature.value,
    },
  ]),
)

/**
 * The library entry behind an id or a shorter alias.
 *
 * Model: look-up in the built-in library.
 * @param id [-] library id such as `42CrMo4-QT-100`, or an alias such as `42CrMo4-QT`
 * @returns [-] the entry with provenance of each value, or undefined when the library has none
 *
 * Validity: strengths hold for the section named in the entry; replace them by the certificate for release.
 * Source: din-7190-1 expansion and heating limits
 * Example: `42CrMo4-QT` has a yield strength of 650 MPa over 40 to 100 mm (EN 10083)
 */
export function findLibraryMaterial(id: string): LibraryMaterial | undefined {
  return byId.get(id)
}

/**
 * The values of a library material that calculations use.
 *
 * Model: look-up in the built-in library.
 * @param id [-] library id or alias
 * @returns [-] SI values without provenance
 * @throws EngineeringInputError `unknownMaterial`
 *
 * Validity: strengths hold for the section named in the entry; replace them by the certificate for release.
 * Source: din-7190-1 expansion and heating limits
 * Example: `C45E-N` may be heated to 350 °C for joining (from memory)
 */
export function libraryMaterial(id: string): Material {
  const entry = byId.get(id)
  const values = entry && calculationValues.get(entry)
  if (!values) {
    const likely = MATERIAL_LIBRARY.filter((other) => other.id.slice(0, 4) === id.slice(0, 4)).map(
      (other) => other.id,
    )
    const hint = likely.length > 0 ? `; near to it: ${likely.join(', ')}` : ''
    throw new EngineeringInputError('unknownMaterial', 'material', `The library has no material ${id}${hint}`)
  }
  return values
}
