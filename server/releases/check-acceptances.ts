/** Whether a layout may be frozen: each failing finding needs a reason, and each reason a finding. */
import { type Acceptance, findingKey } from '@shared/protocol/releases'
import type { Finding } from '@shared/recalculation/layout-results'

/** Messages by finding key; empty when everything fits. */
export interface AcceptanceProblems {
  missing: Record<string, string>
  unknown: Record<string, string>
}

export function checkAcceptances(
  findings: readonly Finding[],
  acceptances: readonly Acceptance[],
): AcceptanceProblems {
  const failing = new Map<string, Finding>()
  for (const finding of findings) if (finding.severity === 'fails') failing.set(findingKey(finding), finding)
  const problems: AcceptanceProblems = { missing: {}, unknown: {} }
  const accepted = new Set<string>()
  for (const acceptance of acceptances) {
    const key = findingKey(acceptance)
    if (!failing.has(key)) problems.unknown[key] = 'There is no such failing finding in this revision.'
    else if (accepted.has(key)) problems.unknown[key] = 'This finding is accepted twice.'
    accepted.add(key)
  }
  for (const [key, finding] of failing) if (!accepted.has(key)) problems.missing[key] = finding.message
  return problems
}
