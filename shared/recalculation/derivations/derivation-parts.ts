/** Small builders for derivations, so that each one reads as its formula. */
import { findSource, type SourceId } from '../../engineering/sources/source-registry'
import type { Derivation, DerivationInput, QuantityReference } from '../derivation'
import { finiteOrNull } from '../attempt'

/** Cites a registered source; the clause is narrower than the registry's where it can be. */
export function cite(id: SourceId, clause?: string): Derivation['sources'][number] {
  const source = findSource(id)
  return {
    id,
    citation: `${source.citation}, ${source.edition}`,
    clause: clause ?? source.clauses,
    isFromMemory: source.isFromMemory,
  }
}

export function input(
  symbol: string,
  name: string,
  value: number | string,
  unit: string,
  origin?: string,
): DerivationInput {
  const shown = typeof value === 'number' && !Number.isFinite(value) ? 'out of range' : value
  return origin === undefined
    ? { symbol, name, value: shown, unit }
    : { symbol, name, value: shown, unit, origin }
}

/** An input that is itself a result and can be opened. */
export function opening(
  symbol: string,
  name: string,
  value: number | null,
  unit: string,
  opens: QuantityReference,
): DerivationInput {
  return { symbol, name, value: value ?? 'not computable', unit, origin: 'calculated', opens }
}

export interface DerivationBody {
  title: string
  formula: string[]
  inputs: DerivationInput[]
  symbol: string
  value: number | null
  unit: string
  model: string
  validity: string
  sources: Derivation['sources']
  notComputable?: string
}

export function derivation(body: DerivationBody): Derivation {
  const value = finiteOrNull(body.value)
  const { title, formula, inputs, model, validity, sources } = body
  const result = { symbol: body.symbol, value, unit: body.unit }
  const complete: Derivation = { title, formula, inputs, result, model, validity, sources }
  if (value !== null) return complete
  return {
    ...complete,
    notComputable: body.notComputable ?? 'There is nothing to divide by: no demand or no stress.',
  }
}

/** Stands for a number that cannot be opened because its part has no results. */
export function missing(title: string, unit: string, reason: string): Derivation {
  return derivation({
    title,
    formula: [],
    inputs: [],
    symbol: '',
    value: null,
    unit,
    model: '',
    validity: '',
    sources: [],
    notComputable: reason,
  })
}
