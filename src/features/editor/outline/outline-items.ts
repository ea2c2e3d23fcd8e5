/** The items of the outline, grouped by kind and ordered along the shaft. */
import type { Load } from '@shared/layout/layout-document'
import { formatGiven } from '@/lib/format-quantity'
import type { PartVerdict } from '../part-states'
import { partName } from '../tools/part'
import { detailWords, itemWords, listedLoadCase, loadWords, type WordsContext } from './part-words'

export interface OutlineItem {
  id: string
  /** What is selected with it: a load selects its hub. */
  partId: string
  name: string
  detail: string
  spoken: string
  verdict: PartVerdict | null
  load: { loadCaseId: string; load: Load } | null
}

export interface OutlineGroup {
  label: string
  items: OutlineItem[]
}

function partItem(words: WordsContext, id: string, hasVerdict: boolean): OutlineItem {
  const { verdict } = words.stateOf(id)
  return {
    id,
    partId: id,
    name: partName(words.document, id),
    detail: detailWords(words, id),
    spoken: itemWords(words, id),
    verdict: hasVerdict || verdict === 'fails' || verdict === 'warns' ? verdict : null,
    load: null,
  }
}

export function outlineGroups(words: WordsContext): OutlineGroup[] {
  const { document } = words
  const along = <T extends { stationMm: number }>(parts: readonly T[]) =>
    [...parts].sort((a, b) => a.stationMm - b.stationMm)
  const loadCase = listedLoadCase(document, words.selectedLoadCaseId)
  const groups: OutlineGroup[] = [
    { label: 'Hubs', items: along(document.hubs).map(({ id }) => partItem(words, id, true)) },
    { label: 'Bearings', items: along(document.bearings).map(({ id }) => partItem(words, id, false)) },
    {
      label: 'Shaft sections',
      items: document.shaft.sections.map(({ id }) => partItem(words, id, false)),
    },
    {
      label: `Loads, ${loadCase?.name ?? ''}`,
      items: loadCase
        ? along(loadCase.loads).map((load) => ({
            id: `load:${loadCase.id}:${load.id}`,
            partId: load.hub,
            name: partName(document, load.hub),
            detail: formatGiven(load.stationMm, 'length', words.units).text,
            spoken: loadWords(words, loadCase, load),
            verdict: null,
            load: { loadCaseId: loadCase.id, load },
          }))
        : [],
    },
  ]
  return groups.filter((group) => group.items.length > 0)
}
