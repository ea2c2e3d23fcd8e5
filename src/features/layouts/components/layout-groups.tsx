import { Icon } from '@/components/icon'
import type { ProjectGroup } from '../arrange-layouts'
import { LayoutCard } from './layout-card'

/** Projects as folders; a heading only where there is more than one group to tell apart. */
export function LayoutGroups({ groups, canEdit }: { groups: ProjectGroup[]; canEdit: boolean }) {
  const hasHeadings = groups.some((group) => group.project !== null)
  return (
    <div className="grid gap-10">
      {groups.map(({ project, layouts }) => {
        const cards = (
          <div className="grid grid-cols-[repeat(auto-fill,minmax(min(23rem,100%),1fr))] gap-5">
            {layouts.map((layout) => (
              <LayoutCard key={layout.id} layout={layout} canEdit={canEdit} />
            ))}
          </div>
        )
        if (!hasHeadings) return <div key={project ?? ''}>{cards}</div>
        return (
          <details key={project ?? ''} open className="group/folder">
            <summary className="mb-4 flex items-center gap-2 border-b border-hairline pb-2 [&::-webkit-details-marker]:hidden">
              <Icon name="chevronRight" className="size-3.5 group-open/folder:rotate-90" />
              <Icon name="folder" className="size-4 text-quiet" />
              <h2 className="font-bold">{project ?? 'Without project'}</h2>
              <span className="text-sm text-quiet">
                {layouts.length} {layouts.length === 1 ? 'layout' : 'layouts'}
              </span>
            </summary>
            {cards}
          </details>
        )
      })}
    </div>
  )
}
