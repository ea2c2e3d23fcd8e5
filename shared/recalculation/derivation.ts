/** How one number came about: opened from any number on screen and printed in an appendix. */
export interface DerivationInput {
  symbol: string
  name: string
  value: number | string
  unit: string
  /** Where it came from: "entered", "ISO 286 table", or another quantity that can be opened. */
  origin?: string
  opens?: QuantityReference
}

export interface Derivation {
  title: string
  /** Symbols, one line each, such as `p = δ / (D (K_A + K_I))`. `_x` marks a subscript, `^x` a power. */
  formula: string[]
  inputs: DerivationInput[]
  result: { symbol: string; value: number | null; unit: string }
  /** Method and assumptions in one or two sentences. */
  model: string
  validity: string
  sources: { id: string; citation: string; clause: string; isFromMemory: boolean }[]
  /** Plain words when there is no result. */
  notComputable?: string
}

/** Names a number in the results. */
export type QuantityReference =
  | { kind: 'hub'; hub: string; quantity: HubQuantity }
  | { kind: 'hubCase'; hub: string; loadCase: string; quantity: HubCaseQuantity }
  | { kind: 'shaftCase'; loadCase: string; quantity: ShaftCaseQuantity; part?: string; stationMm?: number }
  | { kind: 'shaft'; quantity: 'lateralCriticalRpm' }

export type HubQuantity =
  | 'interferenceMin'
  | 'interferenceMax'
  | 'embeddingLoss'
  | 'windowRequired'
  | 'windowPermissible'
  | 'pressureMaxAtRest'
  | 'hubEquivalentAtRest'
  | 'hubYieldSafetyAtRest'
  | 'outerDiameterGrowth'
  | 'joiningTemperature'
  | 'ovenTemperature'
  | 'pressForce'
  | 'effectiveLength'

export type HubCaseQuantity =
  | 'effectiveMin'
  | 'effectiveMax'
  | 'thermalChange'
  | 'speedLoss'
  | 'pressureMin'
  | 'pressureMax'
  | 'torqueCapacity'
  | 'axialCapacity'
  | 'torqueSafety'
  | 'axialSafety'
  | 'slipSafety'
  | 'hubHoopMax'
  | 'hubEquivalentMax'
  | 'hubYieldSafety'
  | 'shaftEquivalentMax'
  | 'shaftYieldSafety'

export type ShaftCaseQuantity =
  | 'reaction'
  | 'torqueMax'
  | 'bendingMax'
  | 'deflectionMax'
  | 'slope'
  | 'equivalentMax'
  | 'yieldSafety'
  | 'fatigueSafety'
  | 'torqueResidual'
