/** Copies of the document with one list or one object replaced; everything else is shared. */
import type { LayoutDocument, Load } from './layout-document'
import type { Target } from './operations'
import type { TargetObject } from './find-target'

/** Puts `next` where `target` stood. The caller has checked that the target exists and that `next` is valid. */
export function replaceTarget(document: LayoutDocument, target: Target, next: TargetObject): LayoutDocument {
  switch (target.kind) {
    case 'layout':
      return next as LayoutDocument
    case 'shaft':
      return { ...document, shaft: next as LayoutDocument['shaft'] }
    case 'criteria':
      return { ...document, criteria: next as LayoutDocument['criteria'] }
    case 'section':
      return withSections(document, replaceById(document.shaft.sections, target.id, next))
    case 'hub':
      return { ...document, hubs: replaceById(document.hubs, target.id, next) }
    case 'bearing':
      return { ...document, bearings: replaceById(document.bearings, target.id, next) }
    case 'loadCase':
      return { ...document, loadCases: replaceById(document.loadCases, target.id, next) }
    case 'load':
      return withLoads(document, target.loadCaseId, (loads) => replaceById(loads, target.id, next))
    case 'timing':
      return {
        ...document,
        timing: document.timing.map((entry) =>
          entry.hub === target.hub ? (next as LayoutDocument['timing'][number]) : entry,
        ),
      }
  }
}

export function withSections(
  document: LayoutDocument,
  sections: LayoutDocument['shaft']['sections'],
): LayoutDocument {
  return { ...document, shaft: { ...document.shaft, sections } }
}

export function withLoads(
  document: LayoutDocument,
  loadCaseId: string,
  change: (loads: Load[]) => Load[],
): LayoutDocument {
  return {
    ...document,
    loadCases: document.loadCases.map((loadCase) =>
      loadCase.id === loadCaseId ? { ...loadCase, loads: change(loadCase.loads) } : loadCase,
    ),
  }
}

function replaceById<Item extends { id: string }>(items: Item[], id: string, next: TargetObject): Item[] {
  return items.map((item) => (item.id === id ? (next as Item) : item))
}

/** A copy with `item` at `index`, which is clamped to the list as it is now. */
export function insertedAt<Item>(items: readonly Item[], index: number, item: Item): Item[] {
  const at = Math.min(Math.max(index, 0), items.length)
  return [...items.slice(0, at), item, ...items.slice(at)]
}
