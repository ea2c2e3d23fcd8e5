import { readFileSync } from 'node:fs'
import type { ContactModel } from '@shared/engineering/contact/contact-model'
import type { ContactState } from '@shared/engineering/contact/contact-solution'
import { gPa, kilogramPerCubicMetre, mm, perKelvin, rpm } from '@shared/engineering/quantities/units'

interface FePart {
  E_MPa: number
  nu: number
  alpha_per_K: number
  rho_kg_m3: number
  dT_K: number
}

export interface FeCase {
  id: string
  title: string
  inputs: {
    shaft: FePart & { sections: { z0_mm: number; z1_mm: number; d_mm: number }[]; bore_mm: number }
    hubs: (FePart & {
      name: string
      z0_mm: number
      L_mm: number
      seat_d_mm: number
      interference_mm: number
      profile: { z0_mm: number; z1_mm: number; od_mm: number }[]
    })[]
    speed_rpm: number
    friction: number
  }
  results: {
    hub: string
    mean_pressure_MPa: number
    midplane_pressure_MPa: number
    contact_open_length_mm: number
    hub_bore_hoop_midplane_MPa: number
    profile: { x_over_L: number[]; p_MPa: number[] }
    closed_form_lame: { pressure_MPa: number; hub_bore_hoop_MPa: number }
  }[]
}

const file = new URL('../validation/data/fe-press-fit-cases.json', import.meta.url)
export const FE_CASES = (JSON.parse(readFileSync(file, 'utf8')) as { cases: FeCase[] }).cases

export function feCase(id: string): FeCase {
  const found = FE_CASES.find((c) => c.id === id)
  if (!found) throw new Error(`There is no case ${id}`)
  return found
}

const materialOf = (part: FePart) => ({
  youngsModulus: gPa(part.E_MPa / 1e3),
  poissonRatio: part.nu,
  expansion: perKelvin(part.alpha_per_K),
  density: kilogramPerCubicMetre(part.rho_kg_m3),
})

export function contactModel({ inputs }: FeCase): ContactModel {
  return {
    sections: inputs.shaft.sections.map((s) => ({
      start: mm(s.z0_mm),
      end: mm(s.z1_mm),
      outerDiameter: mm(s.d_mm),
      boreDiameter: mm(inputs.shaft.bore_mm),
    })),
    shaftMaterial: materialOf(inputs.shaft),
    hubs: inputs.hubs.map((h) => ({
      id: h.name,
      start: mm(h.z0_mm),
      end: mm(h.z0_mm + h.L_mm),
      seatDiameter: mm(h.seat_d_mm),
      rings: h.profile.map((p) => ({ start: mm(p.z0_mm), end: mm(p.z1_mm), outerDiameter: mm(p.od_mm) })),
      material: materialOf(h),
    })),
  }
}

export function contactState({ inputs }: FeCase): ContactState {
  return {
    interference: inputs.hubs.map((h) => mm(h.interference_mm)),
    temperatureRise: [inputs.shaft.dT_K, ...inputs.hubs.map((h) => h.dT_K)],
    speed: rpm(inputs.speed_rpm),
  }
}

/** Piecewise linear value of a profile. */
export function valueAt(stations: ArrayLike<number>, values: ArrayLike<number>, at: number): number {
  let i = 0
  while (i + 2 < stations.length && stations[i + 1]! < at) i++
  return (
    values[i]! + ((at - stations[i]!) / (stations[i + 1]! - stations[i]!)) * (values[i + 1]! - values[i]!)
  )
}
