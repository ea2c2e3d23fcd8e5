/** Messages between the page and the recalculation worker. */
import type { LayoutDocument } from '../layout/layout-document'
import type { Derivation, QuantityReference } from './derivation'
import type { LayoutResults } from './layout-results'

export type RecalculationRequest =
  | { kind: 'recalculate'; runId: number; document: LayoutDocument }
  | { kind: 'derive'; requestId: number; document: LayoutDocument; reference: QuantityReference }

export type RecalculationReply =
  | { kind: 'results'; runId: number; results: LayoutResults }
  | { kind: 'notCalculated'; runId: number; message: string }
  | { kind: 'derivation'; requestId: number; derivation: Derivation }
  | { kind: 'notDerived'; requestId: number; message: string }
