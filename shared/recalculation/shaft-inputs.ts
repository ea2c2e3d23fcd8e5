/** The document's shaft, bearings, loads and carried masses as the beam sees them, in SI units. */
import type { Material } from '../engineering/materials/material'
import {
  kilogram,
  kilogramSquareMetre,
  mm,
  newton,
  newtonMetre,
  newtonPerMicrometre,
} from '../engineering/quantities/units'
import type { CarriedMass, ShaftLoad, ShaftModel, Support } from '../engineering/shaft/shaft-model'
import type { Bearing, Hub, LayoutDocument, Load, LoadCase } from '../layout/layout-document'
import { sectionSpans, type SectionSpan } from '../layout/shaft-geometry'
import { resolveMaterial } from './resolve-material'

export interface SupportingBearing {
  bearing: Bearing
  support: Support
}

export interface ShaftInputs {
  spans: SectionSpan[]
  lengthMm: number
  material: Material | null
  model: ShaftModel | null
  /** Bearings that stand on the shaft. */
  supporting: SupportingBearing[]
  /** Takes the axial force; the first one when several claim it. */
  locatingId: string | null
  masses: CarriedMass[]
  /** Ids of sections without a wall. */
  hollowedOut: string[]
}

export function shaftInputs(document: LayoutDocument): ShaftInputs {
  const spans = sectionSpans(document)
  const lengthMm = spans.at(-1)?.endMm ?? 0
  const material = resolveMaterial(document.shaft.material).material
  const hollowedOut = spans
    .filter(({ section }) => section.boreDiameterMm >= section.outerDiameterMm)
    .map(({ section }) => section.id)
  const canCalculate = material !== null && spans.length > 0 && hollowedOut.length === 0
  const supporting = document.bearings
    .filter((bearing) => bearing.stationMm >= 0 && bearing.stationMm <= lengthMm)
    .map((bearing) => ({ bearing, support: supportOf(bearing) }))
  return {
    spans,
    lengthMm,
    material,
    model: canCalculate ? { material, segments: segmentsOf(spans) } : null,
    supporting,
    locatingId: supporting.find(({ bearing }) => bearing.kind === 'locating')?.bearing.id ?? null,
    masses: document.hubs.flatMap((hub) => carriedMass(document, hub, lengthMm)),
    hollowedOut,
  }
}

const segmentsOf = (spans: readonly SectionSpan[]) =>
  spans.map(({ section, startMm, endMm }) => ({
    start: mm(startMm),
    end: mm(endMm),
    outerDiameter: mm(section.outerDiameterMm),
    bore: mm(section.boreDiameterMm),
  }))

const supportOf = (bearing: Bearing): Support => ({
  station: mm(bearing.stationMm),
  stiffness:
    bearing.radialStiffnessNPerUm === null || bearing.radialStiffnessNPerUm === undefined
      ? null
      : newtonPerMicrometre(bearing.radialStiffnessNPerUm),
})

/** A hub without a given mass weighs what its ring weighs. Inertias are those of a plain ring of that mass. */
function carriedMass(document: LayoutDocument, hub: Hub, lengthMm: number): CarriedMass[] {
  const centreMm = hub.stationMm + hub.lengthMm / 2
  if (centreMm < 0 || centreMm > lengthMm) return []
  const material = resolveMaterial(hub.material).material
  const outer = hub.outerDiameterMm / 2e3
  const section = sectionSpans(document).find((span) => centreMm <= span.endMm)?.section
  const inner = Math.min(outer, (hub.boreDiameterMm ?? section?.outerDiameterMm ?? 0) / 2e3)
  const length = hub.lengthMm / 1e3
  const ringMass = (material?.density ?? 0) * Math.PI * (outer * outer - inner * inner) * length
  const mass = hub.massKg ?? ringMass
  const polar = (mass * (outer * outer + inner * inner)) / 2
  return [
    {
      station: mm(centreMm),
      mass: kilogram(mass),
      polarInertia: kilogramSquareMetre(polar),
      diametralInertia: kilogramSquareMetre(polar / 2 + (mass * length * length) / 12),
    },
  ]
}

/** Loads of hubs that exist. One that acts beyond an end is carried to the end with its moment. */
export function shaftLoads(document: LayoutDocument, loadCase: LoadCase, lengthMm: number): ShaftLoad[] {
  const hubIds = new Set(document.hubs.map((hub) => hub.id))
  return loadCase.loads.filter((load) => hubIds.has(load.hub)).map((load) => onShaft(load, lengthMm))
}

function onShaft(load: Load, lengthMm: number): ShaftLoad {
  const stationMm = Math.min(lengthMm, Math.max(0, load.stationMm))
  const arm = (load.stationMm - stationMm) / 1e3
  return {
    station: mm(stationMm),
    torque: newtonMetre(load.torqueNm),
    forceY: newton(load.forceYN),
    forceZ: newton(load.forceZN),
    axialForce: newton(load.axialN),
    momentY: newtonMetre(load.momentYNm - load.forceZN * arm),
    momentZ: newtonMetre(load.momentZNm + load.forceYN * arm),
  }
}
