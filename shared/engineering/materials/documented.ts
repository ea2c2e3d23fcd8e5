import type { Documented, ProvenanceCode } from './material'

/** Joins a library value to where it came from, so that neither travels alone. */
export const documented = <Value>(
  value: Value,
  provenance: ProvenanceCode,
  note = '',
): Documented<Value> => ({
  value,
  provenance,
  note,
})
