/** What the contact solution says of a layout: the `contact` block beside the results of the formulas. */
export interface ContactLayoutResults {
  /** Why there is no solution, in words; null when there is one. */
  notComputable: string | null
  mesh: { freedoms: number; edgeSizeShare: number } | null
  hubs: ContactHubBlock[]
  leftOut: { hub: string; reason: string }[]
  /** What the model covers and what its numbers do not say. */
  method: string
}

export interface ContactHubBlock {
  id: string
  /** At the most interference after embedding, cold and standing. */
  atRest: ContactTight & { outerDiameterGrowthMaxUm: number }
  loadCases: ContactCase[]
}

export interface ContactTight {
  meanPressureMPa: number
  middlePressureMPa: number
  /** Beyond 0.02 d of the seat edges; closer the value depends on the mesh. */
  largestPressureMPa: number
  boreHoopMaxMPa: number
  boreEquivalentMaxMPa: number
  openLengthMm: number
}

export interface ContactCase {
  loadCase: string
  /** At the least effective interference: what must hold. */
  meanPressureMinMPa: number
  smallestPressureMPa: number
  openLengthMm: number
  openZonesMm: { fromMm: number; toMm: number }[]
  torqueCapacityNm: number
  axialCapacityN: number
  slipSafety: number | null
  /** At the most effective interference: what must not yield. */
  tight: ContactTight
  /** False when the contact did not settle; the numbers of this case are then not to be used. */
  hasSettled: boolean
}
