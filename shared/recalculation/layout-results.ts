/**
 * What a recalculation gives. Key names of the calculation file format are a contract; the keys
 * marked "beyond the file contract" are ours. Every number is finite: what cannot be computed is
 * `null` and a finding or a `notComputable` reason says why. A safety without demand is `null`.
 */

export type Severity = 'fails' | 'warns' | 'notes'

/** Stable finding codes. A new one goes here first, then into DEVELOPERS.md. */
export const FINDING_CODES = [
  'slip', // slip safety below the criterion at least interference
  'no-interference', // nothing left of the interference in this load case
  'window-empty', // needs more interference to hold than the parts stand
  'hub-yield', // hub bore equivalent stress too high at most interference
  'hub-brittle', // brittle hub: hoop tension too high
  'shaft-yield', // shaft stress (fit and loads) too high
  'heat-limit', // joining temperature above what a part stands
  'passage-blocked', // the part reaches its seat from neither end
  'passage-side', // it cannot come from the side planned, but from the other
  'passage-tight', // it travels over another interference seat
  'assembly-order', // no order of assembly exists
  'abutment-missing', // no shoulder face where the part is said to be pushed
  'no-seat', // no shaft under the hub, or the hub hangs over the end
  'seat-step', // the hub lies over a step of diameter
  'bore-mismatch', // hub bore and seat differ by more than a fit
  'overlap', // two parts occupy one place
  'gap-small', // gap to the neighbour below the criterion
  'phase', // angle differs from the timing chart or its group
  'short-hub', // length to diameter below the criterion
  'temperature-loss', // temperature removes interference
  'speed-loss', // speed removes a large share of the interference
  'mesh-slope',
  'mesh-deflection',
  'bearing-slope',
  'fatigue',
  'critical-speed', // running near or above the first lateral critical speed
  'torque-balance', // the torques of a load case do not add to zero
  'axial-support', // no or several locating bearings
  'unsupported', // too few bearings to carry the shaft
  'unknown-tolerance', // a class ISO 286 does not have at this size
  'unknown-material',
  'not-computable', // a value is missing or contradictory
  'outside-validity', // a formula was used outside its range
  'outer-diameter-growth', // note: tip or outer diameter grows on fitting
  'root-tension', // note: hoop tension at a gear's outside (root circle)
] as const
export type FindingCode = (typeof FINDING_CODES)[number]

export interface Finding {
  code: FindingCode
  severity: Severity
  /** Id of the hub, bearing or section; '' for the whole layout. */
  part: string
  /** Load case id, or null when it holds for all. */
  loadCase: string | null
  value: number | null
  limit: number | null
  unit: string
  /** One sentence on the cause. */
  message: string
  /** One sentence on what would mend it. */
  remedy: string
  /** Beyond the file contract: place on the shaft, where one exists. */
  stationMm?: number
}

export interface HubLoadCaseResult {
  loadCase: string
  effectiveMinUm: number | null
  effectiveMaxUm: number | null
  thermalChangeUm: number | null
  speedLossUm: number | null
  pressureMinMPa: number | null
  pressureMaxMPa: number | null
  torqueCapacityNm: number | null
  axialCapacityN: number | null
  torqueSafety: number | null
  axialSafety: number | null
  slipSafety: number | null
  hubHoopMaxMPa: number | null
  hubEquivalentMaxMPa: number | null
  hubYieldSafety: number | null
  shaftEquivalentMaxMPa: number | null
  shaftYieldSafety: number | null
  // beyond the file contract
  requiredTorqueNm: number
  requiredAxialN: number
  requiredResultantN: number
  slipSafetyLimit: number
}

export interface HubResult {
  id: string
  interference: { minUm: number | null; maxUm: number | null; embeddingLossUm: number | null }
  /** As-made diametral interference. `isEmpty` when required exceeds permissible. */
  window: {
    requiredUm: number | null
    requiredCause: string
    permissibleUm: number | null
    permissibleCause: string
    // beyond the file contract
    requiredLoadCase: string | null
    permissibleLoadCase: string | null
    isEmpty: boolean
    /** What would open the window, when it is empty or the band lies outside. */
    remedies: string[]
  }
  loadCases: HubLoadCaseResult[]
  atRest: {
    pressureMaxMPa: number | null
    hubHoopMaxMPa: number | null
    hubEquivalentMaxMPa: number | null
    hubYieldSafety: number | null
    // beyond the file contract
    shaftYieldSafety: number | null
  }
  outerDiameterGrowthUm: { min: number | null; max: number | null }
  assembly: {
    joiningC: number | null
    ovenC: number | null
    limitC: number | null
    pressForceMaxN: number | null
    side: 'left' | 'right'
    /** 1-based place in the order, null when the part cannot be mounted. */
    order: number | null
  }
  // beyond the file contract
  seat: { sectionId: string | null; diameterMm: number | null; effectiveLengthMm: number | null }
  /** Judged by hoop tension against tensile strength; false while the material is unknown. */
  isBrittle: boolean
  /** The load case with the least slip safety against its own limit. */
  governingLoadCase: string | null
  verdict: 'passes' | 'fails' | 'notComputable'
  notComputable: string[]
}

export interface StationValue {
  value: number
  stationMm: number
}

/** Curves are station-ordered; at a jump both sides are given with the same station. */
export interface ShaftDiagrams {
  stationMm: number[]
  torqueNm: number[]
  bendingYNm: number[]
  bendingZNm: number[]
  deflectionUm: number[]
  equivalentMPa: number[]
  // beyond the file contract
  bendingNm: number[]
  shearYN: number[]
  shearZN: number[]
  deflectionYUm: number[]
  deflectionZUm: number[]
  slopeMrad: number[]
}

/** One critical section: seat edge, shoulder or end of a load. */
export interface NotchResult {
  stationMm: number
  kind: 'seatEdge' | 'shoulder'
  part: string
  diameterMm: number
  bendingNm: number
  torqueNm: number
  fatigueNotchFactor: number
  fatigueNotchFactorTorsion: number
  equivalentMPa: number
  yieldSafety: number | null
  fatigueSafety: number | null
}

export interface ShaftLoadCaseResult {
  loadCase: string
  reactions: { bearing: string; yN: number; zN: number; axialN: number }[]
  torqueMaxNm: number | null
  bendingMaxNm: StationValue | null
  deflectionMaxUm: StationValue | null
  slopes: { part: string; stationMm: number; mrad: number }[]
  equivalentMaxMPa: StationValue | null
  yieldSafety: number | null
  fatigueSafety: StationValue | null
  diagrams: ShaftDiagrams
  // beyond the file contract
  torqueResidualNm: number
  deflections: { part: string; stationMm: number; um: number }[]
  notches: NotchResult[]
}

export interface LayoutResults {
  engineVersion: string
  inputHash: string
  verdict: 'passes' | 'fails'
  findings: Finding[]
  hubs: HubResult[]
  shaft: { loadCases: ShaftLoadCaseResult[]; lateralCriticalRpm: number[]; torsionalHz: number[] }
  assembly: {
    feasible: boolean
    order: { part: string; side: 'left' | 'right' }[]
    // beyond the file contract
    blocked: { part: string; reason: string }[]
  }
  /** The cautions every results page, sheet and export prints. */
  cautions: string[]
}
