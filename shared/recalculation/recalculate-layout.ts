/** From a layout document to every result and finding: pure, synchronous, memoised by inputs. */
import type { LayoutDocument } from '../layout/layout-document'
import { assemblyFindings } from './assembly-findings'
import { calculateAssembly, type AssemblyCalculation } from './assembly-results'
import { CAUTIONS } from './cautions'
import { ENGINE_VERSION } from './engine-version'
import { geometryFindings } from './geometry-findings'
import { calculateHub, type HubCalculation } from './hub-result'
import { inputFindings } from './input-findings'
import { inputHash } from './input-hash'
import type { Finding, HubResult, LayoutResults, Severity } from './layout-results'
import { phaseFindings } from './phase-findings'
import { resolveSeat } from './seat'
import { seatProblemFindings } from './seat-problem-findings'
import { shaftFindings } from './shaft-findings'
import { calculateShaft, type ShaftCalculation } from './shaft-results'

/** Everything a recalculation knows; the formula view reads more of it than the results show. */
export interface LayoutCalculation {
  hubs: HubCalculation[]
  shaft: ShaftCalculation
  assembly: AssemblyCalculation
  findings: Finding[]
}

export function calculateLayout(document: LayoutDocument): LayoutCalculation {
  const resolved = document.hubs.map((hub) => ({ hub, seat: resolveSeat(document, hub) }))
  const hubs = resolved.map(({ hub, seat }) => calculateHub(hub.id, hub.joining.side, seat))
  const shaft = calculateShaft(document, hubs)
  const { spans } = shaft.inputs
  const assembly = calculateAssembly(document, spans, hubs)
  const findings = [
    ...resolved.flatMap(({ hub, seat }) => seatProblemFindings(hub, seat.problems)),
    ...hubs.flatMap((hub) => hub.findings),
    ...inputFindings(document, shaft),
    ...geometryFindings(document, spans),
    ...assemblyFindings(document, spans, assembly),
    ...phaseFindings(document),
    ...shaftFindings(document, shaft),
  ]
  return { hubs, shaft, assembly, findings: inOrderOfSeverity(findings) }
}

/**
 * All results of a layout. Never throws on a document that satisfies the schema: what cannot be
 * computed is null with a reason, and no number is ever NaN or infinite.
 */
export function recalculateLayout(document: LayoutDocument): LayoutResults {
  const { hubs, shaft, assembly, findings } = calculateLayout(document)
  return {
    engineVersion: ENGINE_VERSION,
    inputHash: inputHash(document),
    verdict: findings.some((finding) => finding.severity === 'fails') ? 'fails' : 'passes',
    findings,
    hubs: hubs.map((hub) => withAssembly(hub.result, assembly, findings)),
    shaft: shaft.results,
    assembly: {
      feasible: assembly.isFeasible,
      order: assembly.order.order.map(({ id, side }) => ({ part: id, side })),
      blocked: assembly.blocked,
    },
    cautions: [...CAUTIONS],
  }
}

const RANK: Readonly<Record<Severity, number>> = { fails: 0, warns: 1, notes: 2 }

/** What fails comes first; within one severity the order of the calculation stays. */
function inOrderOfSeverity(findings: Finding[]): Finding[] {
  return [...findings].sort((one, other) => RANK[one.severity] - RANK[other.severity])
}

/** Place in the order and verdict come from the whole layout, not from the seat alone. */
function withAssembly(
  result: HubResult,
  assembly: AssemblyCalculation,
  findings: readonly Finding[],
): HubResult {
  const index = assembly.order.order.findIndex((mounted) => mounted.id === result.id)
  const fails = findings.some((finding) => finding.part === result.id && finding.severity === 'fails')
  return {
    ...result,
    assembly: {
      ...result.assembly,
      side: assembly.order.order[index]?.side ?? result.assembly.side,
      order: index < 0 ? null : index + 1,
    },
    verdict: result.verdict === 'notComputable' ? 'notComputable' : fails ? 'fails' : 'passes',
  }
}
