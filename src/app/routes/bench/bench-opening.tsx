/** Before the layout is there, and when it will not come. */
import { Link, useParams } from 'react-router'
import { buttonClasses } from '@/components/button'
import { EmptyState } from '@/components/empty-state'
import { Spinner } from '@/components/spinner'
import { paths } from '@/config/paths'
import type { RejectReason } from '@shared/protocol/realtime'
import { TopBar } from '../../frames/top-bar'

export function BenchOpening() {
  return (
    <div className="flex h-dvh flex-col">
      <TopBar title={<span className="text-sm text-bar-quiet">Opening the layout…</span>} />
      <main className="flex flex-1 items-center justify-center" aria-busy="true">
        <Spinner label="Opening the layout" />
      </main>
    </div>
  )
}

const TITLES: Partial<Record<RejectReason, string>> = {
  notFound: 'This layout is not here',
  forbidden: 'This layout is not open to you',
  signedOut: 'You are signed out',
  protocolVersion: 'Hubstead was updated',
}

export function BenchClosed({ reason, message }: { reason: RejectReason; message: string }) {
  const { workspaceId } = useParams()
  return (
    <div className="flex h-dvh flex-col">
      <TopBar title={<span className="text-sm text-bar-quiet">Layout</span>} />
      <main className="flex flex-1 items-center justify-center">
        <EmptyState
          title={TITLES[reason] ?? 'The layout could not be opened'}
          action={
            reason === 'protocolVersion' ? (
              <button
                type="button"
                className={buttonClasses('primary')}
                onClick={() => window.location.reload()}
              >
                Reload the page
              </button>
            ) : (
              <Link to={paths.layouts(workspaceId)} className={buttonClasses('secondary')}>
                To the layouts
              </Link>
            )
          }
        >
          {message}
        </EmptyState>
      </main>
    </div>
  )
}
