/** What a calculation needs to know about a material, in SI units. */
import type { Density, ExpansionCoefficient, Pressure, Temperature } from '../quantities/quantity'

export interface Material {
  name: string
  youngsModulus: Pressure
  poissonRatio: number
  /** Mean thermal expansion from 20 °C upward. */
  expansion: ExpansionCoefficient
  /** Mean contraction from 20 °C down to about −196 °C; smaller than the expansion. */
  coolingExpansion: ExpansionCoefficient
  density: Density
  yieldStrength: Pressure
  tensileStrength: Pressure
  /** Brittle hubs are judged by hoop tension against tensile strength, without credit for plastic flow. */
  isBrittle: boolean
  /** Short-time limit for joining; null when not known. */
  maxJoiningTemperature: Temperature | null
}

/** How far a library value can be trusted; the text is in `PROVENANCE`. */
export type ProvenanceCode = keyof typeof PROVENANCE

/** `isFromMemory` values are shown as unconfirmed wherever provenance is printed. */
export const PROVENANCE = {
  M: { text: 'typical engineering value', isFromMemory: true },
  MS: { text: 'recalled from the standard named with the material', isFromMemory: true },
  MD: {
    text: 'recalled from the DIN 7190 family (expansion coefficients, heating limits)',
    isFromMemory: true,
  },
  MN: { text: 'recalled from published cryogenic contraction tables', isFromMemory: true },
  L1: { text: 'technical card C45E to EN 10083-2:2006', isFromMemory: false },
  L2: { text: 'specification sheet 42CrMo4 to EN 10083', isFromMemory: false },
  L3: { text: 'specification sheet 16MnCr5 to EN 10084', isFromMemory: false },
  L4: { text: 'technical card 16MnCr5 to ISO 683-3:2018, 30 mm blank', isFromMemory: false },
  L5: { text: 'EN 10305-1 strength table for E235 and E355', isFromMemory: false },
  L6: { text: 'EN 1563:1997 spheroidal graphite irons', isFromMemory: false },
  L7: { text: 'EN 1561 tables for grey iron', isFromMemory: false },
  L8: { text: 'ASM Handbook vol. 7, MPIF Standard 35 diffusion-alloyed steels', isFromMemory: false },
  L9: { text: 'Aluminum Association typical values for 6061-T6', isFromMemory: false },
  L10: { text: 'materials database page for 7075-T6', isFromMemory: false },
  L11: { text: 'NOAO design note SDN0013.02, mean contraction 293 to 80 K', isFromMemory: false },
  L12: { text: 'EN 13480-3 expansion polynomials at 100 °C', isFromMemory: false },
  L13: { text: 'SKF mounting instructions', isFromMemory: false },
  L14: { text: 'stainless bar data to EN 10088-3', isFromMemory: false },
  L15: { text: 'EN 1982 casting alloy data', isFromMemory: false },
} as const

/** A library value with where it came from. */
export interface Documented<Value> {
  value: Value
  provenance: ProvenanceCode
  note: string
}

export interface LibraryMaterial {
  id: string
  name: string
  /** Other designations of the same material, for search only. */
  otherNames: string[]
  /** Shorter ids that mean this entry in a layout file. */
  aliases: string[]
  standard: string
  condition: string
  /** Section the strength values hold for. */
  section: string
  behaviour: string
  isBrittle: boolean
  youngsModulus: Documented<Pressure>
  poissonRatio: Documented<number>
  expansion: Documented<ExpansionCoefficient>
  coolingExpansion: Documented<ExpansionCoefficient>
  density: Documented<Density>
  yieldStrength: Documented<Pressure>
  tensileStrength: Documented<Pressure>
  maxJoiningTemperature: Documented<Temperature>
}
