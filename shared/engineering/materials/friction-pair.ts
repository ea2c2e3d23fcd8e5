/**
 * Coefficients of friction of press and shrink fits (adhesion coefficients: slip force over the
 * calculated normal force, so they go with the calculated pressure). Holding uses the lower value
 * with the least interference, pressing the upper value with the most.
 */
export interface FrictionPair {
  id: string
  pairing: string
  surface: string
  assembly: string
  direction: string
  min: number
  max: number
  defaultDesign: number
  sources: FrictionSource[]
  status: string
  note: string
}

export type FrictionSource = keyof typeof FRICTION_SOURCES

export const FRICTION_SOURCES = {
  D1: {
    text: 'DIN 7190-1 (2017) clause 5.3, transverse interference fits; read in a reprint',
    isFromMemory: false,
  },
  D2: {
    text: 'DIN 7190-1 (2017) clause 5.2, axially pressed fits; first row read, the others recalled',
    isFromMemory: true,
  },
  D3: { text: 'DIN 7190:2001, recalled', isFromMemory: true },
  LI: {
    text: 'K. Lingaiah, Machine Design Data Handbook, as reprinted; attribution recalled',
    isFromMemory: true,
  },
  M: { text: 'recalled engineering practice', isFromMemory: true },
  MH: { text: "Machinery's Handbook pressure factors for forced fits; read", isFromMemory: false },
} as const
