import {
  EngineeringInputError,
  requireFinite,
  requireNonNegative,
  requirePositive,
} from '../engineering-input-error'
import type { Density, ExpansionCoefficient, Length, Pressure } from '../quantities/quantity'

/** What the contact solution needs to know of a material: linear elastic, isotropic. */
export interface ContactMaterial {
  youngsModulus: Pressure
  poissonRatio: number
  expansion: ExpansionCoefficient
  density: Density
}

export interface ContactSection {
  start: Length
  end: Length
  outerDiameter: Length
  boreDiameter: Length
}

/**
 * One ring of a hub. Rings stand on each other: the first from the seat to its outer diameter, the
 * next (a web, a rim) from there to its own, each over its own length measured from the hub's left face.
 */
export interface ContactRing {
  start: Length
  end: Length
  outerDiameter: Length
}

export interface ContactHub {
  id: string
  start: Length
  end: Length
  seatDiameter: Length
  rings: ContactRing[]
  material: ContactMaterial
}

export interface ContactModel {
  sections: ContactSection[]
  shaftMaterial: ContactMaterial
  hubs: ContactHub[]
}

/** Above this a model is refused instead of filling the memory of a browser tab. */
export const MAX_CONTACT_HUBS = 60
export const MAX_CONTACT_SECTIONS = 200

function requireMaterial(material: ContactMaterial, path: string): void {
  requirePositive(material.youngsModulus, `${path}.youngsModulus`)
  requireNonNegative(material.poissonRatio, `${path}.poissonRatio`)
  if (material.poissonRatio > 0.49)
    throw new EngineeringInputError(
      'outOfRange',
      `${path}.poissonRatio`,
      'Poisson ratio must be at most 0.49',
    )
  requireNonNegative(material.expansion, `${path}.expansion`)
  requirePositive(material.density, `${path}.density`)
}

function requireHub(hub: ContactHub, model: ContactModel, path: string): void {
  const length = hub.end - hub.start
  requirePositive(length, `${path}.end`)
  requireMaterial(hub.material, `${path}.material`)
  const tolerance = hub.seatDiameter * 1e-6
  const under = model.sections.filter((s) => s.end > hub.start + tolerance && s.start < hub.end - tolerance)
  const isCarried =
    under.length > 0 &&
    under.every((s) => Math.abs(s.outerDiameter - hub.seatDiameter) <= tolerance) &&
    Math.min(...under.map((s) => s.start)) <= hub.start + tolerance &&
    Math.max(...under.map((s) => s.end)) >= hub.end - tolerance
  if (!isCarried)
    throw new EngineeringInputError(
      'outOfRange',
      `${path}.seatDiameter`,
      `${hub.id} has no even seat under its whole length`,
    )
  if (hub.rings.length === 0)
    throw new EngineeringInputError('outOfRange', `${path}.rings`, `${hub.id} has no ring`)
  let inner: number = hub.seatDiameter
  hub.rings.forEach((ring, index) => {
    const at = `${path}.rings.${index}`
    requireFinite(ring.start, `${at}.start`)
    if (ring.start < -tolerance || ring.end > length + tolerance || ring.end - ring.start <= tolerance)
      throw new EngineeringInputError(
        'outOfRange',
        at,
        `Ring ${index + 1} of ${hub.id} does not lie within the hub`,
      )
    if (ring.outerDiameter - inner <= hub.seatDiameter * 0.005)
      throw new EngineeringInputError(
        'boreNotInside',
        `${at}.outerDiameter`,
        `Ring ${index + 1} of ${hub.id} is too thin to mesh`,
      )
    inner = ring.outerDiameter
  })
  const boss = hub.rings[0]!
  if (Math.abs(boss.start) > tolerance || Math.abs(boss.end - length) > tolerance)
    throw new EngineeringInputError(
      'outOfRange',
      `${path}.rings.0`,
      `The first ring of ${hub.id} must cover its seat`,
    )
}

/**
 * Refuses what cannot be meshed, with the path of what is wrong.
 *
 * Model: the shaft is an unbroken row of sections; each hub lies on one diameter; hubs do not overlap.
 * @param model [SI] sections left to right, hubs in any order
 * @returns nothing; a model that comes back is meshable
 * @throws EngineeringInputError `emptyShaft`, `notPositive`, `negative`, `notFinite`, `outOfRange`, `boreNotInside`
 *
 * Validity: up to 60 hubs and 200 sections, Poisson ratio up to 0.49.
 * Source: finite-elements
 * Example: finite-elements, case A of fe-press-fit, one ring of 100 mm on a 50 mm shaft: accepted
 */
export function requireMeshable(model: ContactModel): void {
  if (model.sections.length === 0 || model.hubs.length === 0)
    throw new EngineeringInputError('emptyShaft', 'sections', 'There is no shaft or no hub to solve')
  if (model.hubs.length > MAX_CONTACT_HUBS)
    throw new EngineeringInputError(
      'outOfRange',
      'hubs',
      `At most ${MAX_CONTACT_HUBS} hubs can be solved together`,
    )
  if (model.sections.length > MAX_CONTACT_SECTIONS)
    throw new EngineeringInputError(
      'outOfRange',
      'sections',
      `At most ${MAX_CONTACT_SECTIONS} sections can be solved`,
    )
  requireMaterial(model.shaftMaterial, 'shaftMaterial')
  model.sections.forEach((section, index) => {
    const path = `sections.${index}`
    requireFinite(section.start, `${path}.start`)
    requirePositive(section.end - section.start, `${path}.end`)
    requirePositive(section.outerDiameter, `${path}.outerDiameter`)
    requireNonNegative(section.boreDiameter, `${path}.boreDiameter`)
    if (section.boreDiameter > 0.98 * section.outerDiameter)
      throw new EngineeringInputError(
        'boreNotInside',
        `${path}.boreDiameter`,
        'The wall of this section is too thin to mesh',
      )
  })
  model.hubs.forEach((hub, index) => requireHub(hub, model, `hubs.${index}`))
  const inOrder = [...model.hubs].sort((a, b) => a.start - b.start)
  for (let i = 1; i < inOrder.length; i++) {
    const hub = inOrder[i]!
    if (hub.start < inOrder[i - 1]!.end - hub.seatDiameter * 1e-6)
      throw new EngineeringInputError(
        'outOfRange',
        `hubs.${model.hubs.indexOf(hub)}.start`,
        `${hub.id} overlaps ${inOrder[i - 1]!.id}`,
      )
  }
}
