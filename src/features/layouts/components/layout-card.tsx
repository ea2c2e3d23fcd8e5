import type { ReactNode } from 'react'
import { Link } from 'react-router'
import { Avatar } from '@/components/avatar'
import { Icon } from '@/components/icon'
import { paths } from '@/config/paths'
import { ShaftThumbnail } from '@/drawings/shaft-thumbnail'
import { formatAgoAndWhen } from '@/lib/format-time'
import type { LayoutSummary } from '@shared/protocol/layouts'
import { STATUS_NAMES } from '../status-texts'
import { LayoutMenu } from './layout-menu'
import { LayoutVerdict } from './layout-verdict'

/** A drawing sheet in small: the shaft, and a title block with what one needs to know before opening it. */
export function LayoutCard({ layout, canEdit }: { layout: LayoutSummary; canEdit: boolean }) {
  const { name, peopleInIt } = layout
  return (
    <article
      className="relative flex flex-col border border-hairline bg-card outline-steel hover:border-edge has-[h3_a:focus-visible]:outline-2 has-[h3_a:focus-visible]:outline-offset-2"
      aria-label={name}
    >
      <div className="relative bg-paper/40 px-2 py-1">
        <ShaftThumbnail thumbnail={layout.thumbnail} label={drawingLabel(layout)} />
        {peopleInIt.length > 0 && (
          <ul aria-label="In it now" className="absolute top-2 right-2 flex -space-x-1.5">
            {peopleInIt.map((person) => (
              <li key={person.userId}>
                <Avatar name={person.name} size="sm" />
              </li>
            ))}
          </ul>
        )}
      </div>
      <div className="flex-1 border-t border-hairline px-4 py-3">
        <div className="flex items-start justify-between gap-2">
          <h3 className="min-w-0 font-bold">
            <Link
              to={paths.bench(layout.workspaceId, layout.id)}
              className="line-clamp-2 outline-none after:absolute after:inset-0"
            >
              {name}
            </Link>
          </h3>
          {canEdit && (
            <div className="relative z-10 -mt-1 -mr-2">
              <LayoutMenu layout={layout} />
            </div>
          )}
        </div>
        <LayoutVerdict layout={layout} />
      </div>
      <dl className="grid grid-cols-[auto_auto_1fr] divide-x divide-hairline border-t border-hairline text-[13px]">
        <TitleBlockCell term="Revision">{layout.revisionLetter}</TitleBlockCell>
        <TitleBlockCell term="Status">
          <span className="inline-flex items-center gap-1">
            {layout.status === 'released' && <Icon name="lock" className="size-3" />}
            {STATUS_NAMES[layout.status]}
          </span>
        </TitleBlockCell>
        <TitleBlockCell term="Last edit">
          <span className="block truncate">{layout.editedByName}</span>
          <time dateTime={layout.editedAt} className="block font-normal text-quiet">
            {formatAgoAndWhen(layout.editedAt)}
          </time>
        </TitleBlockCell>
      </dl>
    </article>
  )
}

function TitleBlockCell({ term, children }: { term: string; children: ReactNode }) {
  return (
    <div className="min-w-0 px-3 py-2 first:pl-4">
      <dt className="text-[11px] text-quiet">{term}</dt>
      <dd className="min-w-0 font-semibold">{children}</dd>
    </div>
  )
}

function drawingLabel({ name, thumbnail }: LayoutSummary): string {
  const failing = thumbnail.hubs.filter((hub) => hub.verdict === 'fails').length
  return `Half section of ${name}: ${thumbnail.sections.length} shaft sections, ${thumbnail.hubs.length} hubs${
    failing > 0 ? `, ${failing} of them failing` : ''
  }`
}
