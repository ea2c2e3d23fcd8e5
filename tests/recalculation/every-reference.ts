import type { LayoutDocument } from '@shared/layout/layout-document'
import type { HubCaseQuantity, HubQuantity, QuantityReference } from '@shared/recalculation/derivation'
import type { HubLoadCaseResult, HubResult, LayoutResults } from '@shared/recalculation/layout-results'

export interface ReferencedValue {
  reference: QuantityReference
  /** The number as it stands in the results. */
  value: number | null
}

const HUB_VALUES: Readonly<Record<HubQuantity, (hub: HubResult) => number | null>> = {
  interferenceMin: (hub) => hub.interference.minUm,
  interferenceMax: (hub) => hub.interference.maxUm,
  embeddingLoss: (hub) => hub.interference.embeddingLossUm,
  windowRequired: (hub) => hub.window.requiredUm,
  windowPermissible: (hub) => hub.window.permissibleUm,
  pressureMaxAtRest: (hub) => hub.atRest.pressureMaxMPa,
  hubEquivalentAtRest: (hub) => hub.atRest.hubEquivalentMaxMPa,
  hubYieldSafetyAtRest: (hub) => hub.atRest.hubYieldSafety,
  outerDiameterGrowth: (hub) => hub.outerDiameterGrowthUm.max,
  joiningTemperature: (hub) => hub.assembly.joiningC,
  ovenTemperature: (hub) => hub.assembly.ovenC,
  pressForce: (hub) => hub.assembly.pressForceMaxN,
  effectiveLength: (hub) => (hub.verdict === 'notComputable' ? null : hub.seat.effectiveLengthMm),
}

const HUB_CASE_VALUES: Readonly<Record<HubCaseQuantity, (inCase: HubLoadCaseResult) => number | null>> = {
  effectiveMin: (inCase) => inCase.effectiveMinUm,
  effectiveMax: (inCase) => inCase.effectiveMaxUm,
  thermalChange: (inCase) => inCase.thermalChangeUm,
  speedLoss: (inCase) => inCase.speedLossUm,
  pressureMin: (inCase) => inCase.pressureMinMPa,
  pressureMax: (inCase) => inCase.pressureMaxMPa,
  torqueCapacity: (inCase) => inCase.torqueCapacityNm,
  axialCapacity: (inCase) => inCase.axialCapacityN,
  torqueSafety: (inCase) => inCase.torqueSafety,
  axialSafety: (inCase) => inCase.axialSafety,
  slipSafety: (inCase) => inCase.slipSafety,
  hubHoopMax: (inCase) => inCase.hubHoopMaxMPa,
  hubEquivalentMax: (inCase) => inCase.hubEquivalentMaxMPa,
  hubYieldSafety: (inCase) => inCase.hubYieldSafety,
  shaftEquivalentMax: (inCase) => inCase.shaftEquivalentMaxMPa,
  shaftYieldSafety: (inCase) => inCase.shaftYieldSafety,
}

/** Every number that can be opened, with its value in the results. */
export function everyReference(document: LayoutDocument, results: LayoutResults): ReferencedValue[] {
  const ofHubs = results.hubs.flatMap((hub) => [
    ...Object.entries(HUB_VALUES).map(([quantity, read]) => ({
      reference: { kind: 'hub', hub: hub.id, quantity: quantity as HubQuantity } as const,
      value: read(hub),
    })),
    ...hub.loadCases.flatMap((inCase) =>
      Object.entries(HUB_CASE_VALUES).map(([quantity, read]) => ({
        reference: {
          kind: 'hubCase',
          hub: hub.id,
          loadCase: inCase.loadCase,
          quantity: quantity as HubCaseQuantity,
        } as const,
        value: read(inCase),
      })),
    ),
  ])
  const ofShaft = results.shaft.loadCases.flatMap((result): ReferencedValue[] => {
    const base = { kind: 'shaftCase', loadCase: result.loadCase } as const
    return [
      { reference: { ...base, quantity: 'torqueMax' }, value: result.torqueMaxNm },
      { reference: { ...base, quantity: 'torqueResidual' }, value: result.torqueResidualNm },
      { reference: { ...base, quantity: 'bendingMax' }, value: result.bendingMaxNm?.value ?? null },
      { reference: { ...base, quantity: 'deflectionMax' }, value: result.deflectionMaxUm?.value ?? null },
      { reference: { ...base, quantity: 'equivalentMax' }, value: result.equivalentMaxMPa?.value ?? null },
      { reference: { ...base, quantity: 'yieldSafety' }, value: result.yieldSafety },
      { reference: { ...base, quantity: 'fatigueSafety' }, value: result.fatigueSafety?.value ?? null },
      ...result.slopes.map((slope) => ({
        reference: { ...base, quantity: 'slope' as const, part: slope.part },
        value: slope.mrad,
      })),
      ...result.reactions.map((reaction) => ({
        reference: { ...base, quantity: 'reaction' as const, part: reaction.bearing },
        value: Math.hypot(reaction.yN, reaction.zN),
      })),
    ]
  })
  const critical = results.shaft.lateralCriticalRpm[0] ?? null
  const ofAll: ReferencedValue[] = [
    { reference: { kind: 'shaft', quantity: 'lateralCriticalRpm' }, value: critical },
  ]
  // a document without hubs or load cases has none of theirs
  return document.hubs.length + document.loadCases.length > 0 ? [...ofHubs, ...ofShaft, ...ofAll] : ofAll
}
