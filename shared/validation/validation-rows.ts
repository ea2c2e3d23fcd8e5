import { findSource } from '../engineering/sources/source-registry'
import { ALL_CHECKS } from './all-checks'
import { runCheck } from './validation-check'
import type { ValidationRow } from './worker-messages'

/** Runs every check. */
export function validationRows(): ValidationRow[] {
  return ALL_CHECKS.map((check) => {
    const { ours, deviation, passes } = runCheck(check)
    return {
      id: check.id,
      topic: check.topic,
      title: check.title,
      citation: findSource(check.source).citation,
      place: check.place,
      evidence: check.evidence,
      isFromMemory: check.isFromMemory,
      unit: check.unit,
      reference: [...check.reference],
      ours: [...ours],
      deviation,
      tolerance: check.tolerance,
      reason: check.reason,
      passes,
    }
  })
}
