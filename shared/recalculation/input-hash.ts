import { canonicalJson } from '../layout/canonical-json'
import type { LayoutDocument } from '../layout/layout-document'
import { sha256Hex } from './sha256'

/** Fingerprint of everything a recalculation reads: equal documents give equal hashes on every platform. */
export function inputHash(document: LayoutDocument): string {
  return `sha256:${sha256Hex(canonicalJson(document))}`
}
