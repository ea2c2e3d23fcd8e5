import type { AddOperation, RemoveOperation } from './operations'

/** The target that an added item is from then on. */
export function targetOfAdded(operation: AddOperation): RemoveOperation['target'] {
  switch (operation.collection) {
    case 'sections':
      return { kind: 'section', id: operation.item.id }
    case 'hubs':
      return { kind: 'hub', id: operation.item.id }
    case 'bearings':
      return { kind: 'bearing', id: operation.item.id }
    case 'loadCases':
      return { kind: 'loadCase', id: operation.item.id }
    case 'loads':
      return { kind: 'load', loadCaseId: operation.loadCaseId, id: operation.item.id }
    case 'timing':
      return { kind: 'timing', hub: operation.item.hub }
  }
}
