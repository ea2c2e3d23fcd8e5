import type { LayoutDocument } from '@shared/layout/layout-document'
import type { Finding } from '@shared/recalculation/layout-results'
import { FINDING_WORDS } from './finding-words'

/** Names a finding across recalculations, whatever its numbers. */
export const findingKey = ({ code, part, loadCase, stationMm }: Finding): string =>
  [code, part, loadCase ?? '', stationMm === undefined ? '' : stationMm.toFixed(2)].join('|')

export function partName(layout: LayoutDocument, id: string): string {
  if (id === '') return 'Layout'
  const hub = layout.hubs.find((item) => item.id === id)
  if (hub !== undefined) return hub.name
  const bearing = layout.bearings.find((item) => item.id === id)
  if (bearing !== undefined) return `Bearing ${bearing.name}`
  const section = layout.shaft.sections.findIndex((item) => item.id === id)
  return section < 0 ? id : `Section ${section + 1}`
}

/** What changed among the failing findings since the last announcement; '' when nothing did. */
export function announcement(
  before: readonly Finding[] | null,
  after: readonly Finding[],
  layout: LayoutDocument,
): string {
  const failing = (findings: readonly Finding[]) =>
    new Map(
      findings
        .filter(({ severity }) => severity === 'fails')
        .map((finding) => [`${finding.code}|${finding.part}`, finding]),
    )
  const now = failing(after)
  const count = after.filter(({ severity }) => severity === 'fails').length
  const total =
    count === 0 ? 'Nothing fails.' : `${count} ${count === 1 ? 'finding fails' : 'findings fail'}.`
  if (before === null) return total
  const then = failing(before)
  const words = (findings: Finding[]) =>
    findings
      .map(({ code, part }) => `${partName(layout, part)}: ${FINDING_WORDS[code].toLowerCase()}`)
      .join(', ')
  const added = [...now].filter(([key]) => !then.has(key)).map(([, finding]) => finding)
  const mended = [...then].filter(([key]) => !now.has(key)).map(([, finding]) => finding)
  if (added.length === 0 && mended.length === 0) return ''
  return [
    added.length > 0 ? `New: ${words(added)}.` : '',
    mended.length > 0 ? `Mended: ${words(mended)}.` : '',
    total,
  ]
    .filter((sentence) => sentence !== '')
    .join(' ')
}
