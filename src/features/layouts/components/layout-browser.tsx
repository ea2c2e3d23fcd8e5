import { useQuery } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import { Button } from '@/components/button'
import { EmptyState } from '@/components/empty-state'
import { LoadFailure } from '@/components/load-failure'
import { messageOf } from '@/lib/http-client'
import { layoutListQuery } from '../api/layout-list'
import { arrangeLayouts, projectsOf } from '../arrange-layouts'
import { useLayoutFilter } from '../hooks/use-layout-filter'
import { LayoutGroups } from './layout-groups'
import { LayoutToolbar } from './layout-toolbar'
import { LoadingCards } from './loading-cards'

interface LayoutBrowserProps {
  workspaceId: string
  canEdit: boolean
  /** What an empty workspace offers to start with. */
  startActions: ReactNode
}

export function LayoutBrowser({ workspaceId, canEdit, startActions }: LayoutBrowserProps) {
  const { filter, isArchived, setParameter, clear } = useLayoutFilter()
  const { data: layouts, error, isFetching, refetch } = useQuery(layoutListQuery(workspaceId, isArchived))
  const groups = arrangeLayouts(layouts ?? [], filter)
  const count = groups.reduce((sum, group) => sum + group.layouts.length, 0)

  return (
    <>
      <LayoutToolbar
        filter={filter}
        isArchived={isArchived}
        projects={projectsOf(layouts ?? [])}
        setParameter={setParameter}
      />
      <p role="status" className="sr-only">
        {layouts ? `${count} of ${layouts.length} layouts shown` : ''}
      </p>
      {error && (
        <div className="mb-6">
          <LoadFailure
            message={layouts ? `This list may be old. ${messageOf(error)}` : messageOf(error)}
            isRetrying={isFetching}
            onRetry={() => void refetch()}
          />
        </div>
      )}
      {!layouts ? (
        !error && <LoadingCards />
      ) : count > 0 ? (
        <LayoutGroups groups={groups} canEdit={canEdit} />
      ) : layouts.length > 0 ? (
        <EmptyState
          title="Nothing matches"
          action={<Button onClick={clear}>Clear search and filters</Button>}
        >
          None of the {layouts.length} layouts here fits the search and the filters.
        </EmptyState>
      ) : isArchived ? (
        <EmptyState title="The archive is empty">
          Archived layouts keep their history and their releases.
        </EmptyState>
      ) : (
        <EmptyState title="No layouts yet" action={startActions}>
          A layout is one shaft with its hubs, bearings and load cases.
          {!canEdit && ' Designers of this workspace can start one.'}
        </EmptyState>
      )}
    </>
  )
}
