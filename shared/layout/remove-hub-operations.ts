import { hubDependents } from './apply-remove'
import type { LayoutDocument } from './layout-document'
import type { Operation } from './operations'

/** One edit's worth of operations that take a hub and everything that names it. */
export function removeHubOperations(document: LayoutDocument, hubId: string): Operation[] {
  return [...hubDependents(document, hubId), { type: 'remove', target: { kind: 'hub', id: hubId } }]
}
