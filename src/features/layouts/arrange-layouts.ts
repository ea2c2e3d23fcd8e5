/** Which layouts the page shows, in which order and under which project. Pure, so that it can be tested alone. */
import type { LayoutStatus, LayoutSummary } from '@shared/protocol/layouts'

export const SORTINGS = ['edited', 'name', 'verdict'] as const
export type LayoutSorting = (typeof SORTINGS)[number]

export interface LayoutFilter {
  search: string
  status: LayoutStatus | 'all'
  /** A project's name, '' for layouts without one, null for all. */
  project: string | null
  sorting: LayoutSorting
}

export interface ProjectGroup {
  project: string | null
  layouts: LayoutSummary[]
}

const byName = (a: LayoutSummary, b: LayoutSummary) => a.name.localeCompare(b.name, 'en', { numeric: true })

const ORDERS: Record<LayoutSorting, (a: LayoutSummary, b: LayoutSummary) => number> = {
  edited: (a, b) => Date.parse(b.editedAt) - Date.parse(a.editedAt) || byName(a, b),
  name: byName,
  verdict: (a, b) => b.failingCount - a.failingCount || byName(a, b),
}

const wordsOf = (text: string) => text.toLowerCase().split(/\s+/).filter(Boolean)

/** Every word of the search must occur in the name, the project, the editor's name or the worst finding. */
function matchesSearch(layout: LayoutSummary, words: string[]): boolean {
  const text = [layout.name, layout.project, layout.editedByName, layout.worstFinding].join(' ').toLowerCase()
  return words.every((word) => text.includes(word))
}

/** Groups follow the best-placed layout of each; layouts without a project come last. */
export function arrangeLayouts(layouts: readonly LayoutSummary[], filter: LayoutFilter): ProjectGroup[] {
  const words = wordsOf(filter.search)
  const shown = layouts
    .filter(
      (layout) =>
        (filter.status === 'all' || layout.status === filter.status) &&
        (filter.project === null || (layout.project ?? '') === filter.project) &&
        matchesSearch(layout, words),
    )
    .sort(ORDERS[filter.sorting])
  const groups = new Map<string, LayoutSummary[]>()
  for (const layout of shown) {
    const project = layout.project ?? ''
    groups.set(project, [...(groups.get(project) ?? []), layout])
  }
  return [...groups]
    .map(([project, members]) => ({ project: project || null, layouts: members }))
    .sort((a, b) => Number(a.project === null) - Number(b.project === null))
}

export function projectsOf(layouts: readonly LayoutSummary[]): string[] {
  const projects = new Set(layouts.flatMap((layout) => (layout.project ? [layout.project] : [])))
  return [...projects].sort((a, b) => a.localeCompare(b, 'en', { numeric: true }))
}
