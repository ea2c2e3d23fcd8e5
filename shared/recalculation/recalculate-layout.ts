/** From a layout document to every result and finding: pure, synchronous, memoised by inputs. */
import type { LayoutDocument } from '../layout/layout-document'
import { CAUTIONS } from './cautions'
import { ENGINE_VERSION } from './engine-version'
import { calculateHub } from './hub-result'
import { inputHash } from './input-hash'
import type { Finding, LayoutResults } from './layout-results'
import { resolveSeat } from './seat'
import { seatProblemFindings } from './seat-problem-findings'
import { calculateShaft } from './shaft-results'

export function recalculateLayout(document: LayoutDocument): LayoutResults {
  const resolved = document.hubs.map((hub) => resolveSeat(document, hub))
  const hubs = document.hubs.map((hub, index) =>
    calculateHub(hub.id, hub.joining.side, resolved[index] ?? resolveSeat(document, hub)),
  )
  const shaft = calculateShaft(document, hubs)
  const findings: Finding[] = document.hubs.flatMap((hub, index) => [
    ...seatProblemFindings(hub, resolved[index]?.problems ?? []),
    ...(hubs[index]?.findings ?? []),
  ])
  return {
    engineVersion: ENGINE_VERSION,
    inputHash: inputHash(document),
    verdict: findings.some((finding) => finding.severity === 'fails') ? 'fails' : 'passes',
    findings,
    hubs: hubs.map((hub) => hub.result),
    shaft: shaft.results,
    assembly: { feasible: true, order: [], blocked: [] },
    cautions: [...CAUTIONS],
  }
}
