/** Finding what an operation points at, and the words for it. */
import type { LayoutDocument, LoadCase } from './layout-document'
import type { ReorderOperation, Target } from './operations'

export type TargetObject = Readonly<Record<string, unknown>>

/** The object a target names, or null when it is not there (any more). */
export function findTarget(document: LayoutDocument, target: Target): TargetObject | null {
  switch (target.kind) {
    case 'layout':
      return document
    case 'shaft':
      return document.shaft
    case 'criteria':
      return document.criteria
    case 'section':
      return document.shaft.sections.find((section) => section.id === target.id) ?? null
    case 'hub':
      return document.hubs.find((hub) => hub.id === target.id) ?? null
    case 'bearing':
      return document.bearings.find((bearing) => bearing.id === target.id) ?? null
    case 'loadCase':
      return findLoadCase(document, target.id)
    case 'load':
      return findLoadCase(document, target.loadCaseId)?.loads.find((load) => load.id === target.id) ?? null
    case 'timing':
      return document.timing.find((entry) => entry.hub === target.hub) ?? null
  }
}

export function findLoadCase(document: LayoutDocument, id: string): LoadCase | null {
  return document.loadCases.find((loadCase) => loadCase.id === id) ?? null
}

export function hasHub(document: LayoutDocument, id: string): boolean {
  return document.hubs.some((hub) => hub.id === id)
}

/** Part ids are unique over sections, hubs and bearings together: findings and selections name parts by id alone. */
export function hasPart(document: LayoutDocument, id: string): boolean {
  return (
    hasHub(document, id) ||
    document.shaft.sections.some((section) => section.id === id) ||
    document.bearings.some((bearing) => bearing.id === id)
  )
}

/** Where the target stands in its list; -1 when it is not there. */
export function orderOf(document: LayoutDocument, target: ReorderOperation['target']): number {
  const lists = { section: document.shaft.sections, hub: document.hubs, loadCase: document.loadCases }
  return lists[target.kind].findIndex((item) => item.id === target.id)
}

/** Text that is equal for equal targets. */
export function targetKey(target: Target): string {
  switch (target.kind) {
    case 'layout':
    case 'shaft':
    case 'criteria':
      return target.kind
    case 'load':
      return `load/${target.loadCaseId}/${target.id}`
    case 'timing':
      return `timing/${target.hub}`
    case 'section':
    case 'hub':
    case 'bearing':
    case 'loadCase':
      return `${target.kind}/${target.id}`
  }
}
