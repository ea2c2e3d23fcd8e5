import { Icon } from '@/components/icon'
import type { ProjectGroup } from '../arrange-layouts'
import { CARD_GRID } from './card-grid'
import { LayoutCard } from './layout-card'

/** How many columns of the page a folder takes, and how its own cards stand in them. */
const FOLDER_SPANS = {
  one: { folder: '', cards: 'grid gap-5' },
  two: { folder: 'md:col-span-2', cards: 'grid gap-5 md:grid-cols-2' },
  row: { folder: 'md:col-span-2 xl:col-span-3', cards: CARD_GRID },
}
const spanOf = (count: number) => (count > 2 ? 'row' : count === 2 ? 'two' : 'one')

/**
 * Projects as folders, side by side where they are small. Headings only where there is a project to name.
 */
export function LayoutGroups({ groups, canEdit }: { groups: ProjectGroup[]; canEdit: boolean }) {
  const cardsOf = ({ layouts }: ProjectGroup) =>
    layouts.map((layout) => <LayoutCard key={layout.id} layout={layout} canEdit={canEdit} />)

  if (groups.every((group) => group.project === null))
    return <div className={CARD_GRID}>{groups.flatMap(cardsOf)}</div>
  return (
    <div className="grid items-start gap-x-5 gap-y-10 md:grid-cols-2 xl:grid-cols-3">
      {groups.map((group) => {
        const count = group.layouts.length
        const { folder, cards } = FOLDER_SPANS[spanOf(count)]
        return (
          <details key={group.project ?? ''} open className={`group/folder ${folder}`}>
            <summary className="mb-4 flex items-center gap-2 border-b border-hairline pb-2 [&::-webkit-details-marker]:hidden">
              <Icon name="chevronRight" className="size-3.5 group-open/folder:rotate-90" />
              <Icon name="folder" className="size-4 text-quiet" />
              <h2 className="truncate font-bold">{group.project ?? 'Without project'}</h2>
              <span className="text-sm whitespace-nowrap text-quiet">
                {count} {count === 1 ? 'layout' : 'layouts'}
              </span>
            </summary>
            <div className={cards}>{cardsOf(group)}</div>
          </details>
        )
      })}
    </div>
  )
}
