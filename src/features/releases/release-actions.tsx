/** What a person may do about review and release, by role and status, in the bar of the bench. */
import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { Button } from '@/components/button'
import { ConfirmDialog } from '@/components/confirm-dialog'
import { Icon } from '@/components/icon'
import { Menu, type MenuItem } from '@/components/menu'
import { showToast } from '@/components/toast-store'
import { download } from '@/lib/download'
import { messageOf } from '@/lib/http-client'
import { useLayoutStore } from '@/stores/layout-store'
import { roleCovers } from '@shared/protocol/roles'
import { useTakeBackReview } from './api/change-status'
import { layoutReleasesQuery } from './api/layout-releases'
import { FreezeDialog } from './components/freeze-dialog'
import { NextRevisionDialog } from './components/next-revision-dialog'
import { ReviewDialog } from './components/review-dialog'
import { useWorkspaceId } from './use-workspace-id'

type OpenDialog = 'review' | 'takeBack' | 'freeze' | 'nextRevision'

interface ReleaseAction {
  label: string
  isMain: boolean
  run: () => void
}

export function ReleaseActions({ layoutId }: { layoutId: string }) {
  const workspaceId = useWorkspaceId()
  const access = useLayoutStore((state) => state.access)
  const [dialog, setDialog] = useState<OpenDialog | null>(null)
  const isFrozen = access?.status === 'released' || access?.status === 'withdrawn'
  const releases = useQuery({
    ...layoutReleasesQuery(workspaceId, layoutId, `${access?.status ?? ''} ${access?.revisionLetter ?? ''}`),
    enabled: isFrozen,
  })
  if (!access) return null
  const letter = access.revisionLetter
  const current = releases.data?.find((release) => release.revisionLetter === letter)
  const isDesigner = roleCovers(access.role, 'designer')
  const isManager = roleCovers(access.role, 'manager')

  const actions: ReleaseAction[] = []
  const add = (isAllowed: boolean, label: string, run: () => void, isMain = false) => {
    if (isAllowed) actions.push({ label, isMain, run })
  }
  if (access.status === 'draft') add(isDesigner, 'Ask for review', () => setDialog('review'))
  if (access.status === 'inReview') add(isDesigner, 'Take back', () => setDialog('takeBack'))
  if (!isFrozen) add(isManager, 'Freeze layout', () => setDialog('freeze'), true)
  if (isFrozen) {
    add(isManager, 'Start next revision', () => setDialog('nextRevision'))
    if (current) add(true, 'Release sheet', () => void saveSheet(current.id), true)
  }
  if (actions.length === 0) return null

  const items: MenuItem[] = actions.map(({ label, run }) => ({ label, onSelect: run }))
  return (
    <>
      <div className="hidden items-center gap-2 lg:flex">
        {actions.map(({ label, isMain, run }) => (
          <Button key={label} variant={isMain ? 'barPrimary' : 'bar'} size="sm" onClick={run}>
            {label}
          </Button>
        ))}
      </div>
      <div className="lg:hidden">
        <Menu
          label="Review and release"
          items={items}
          buttonClassName="inline-flex min-h-8 items-center gap-1 rounded-md border border-bar-line px-2.5 text-[13px] font-semibold text-bar-ink hover:bg-bar-line/50"
          button={
            <>
              <span className="max-sm:sr-only">Release</span>
              <Icon name="lock" className="size-3.5 sm:hidden" />
              <Icon name="chevronDown" className="size-3.5" />
            </>
          }
        />
      </div>
      {dialog === 'review' && (
        <ReviewDialog
          workspaceId={workspaceId}
          layoutId={layoutId}
          letter={letter}
          onClose={() => setDialog(null)}
        />
      )}
      {dialog === 'takeBack' && (
        <TakeBackDialog workspaceId={workspaceId} layoutId={layoutId} onClose={() => setDialog(null)} />
      )}
      {dialog === 'freeze' && (
        <FreezeDialog
          workspaceId={workspaceId}
          layoutId={layoutId}
          letter={letter}
          onClose={() => setDialog(null)}
        />
      )}
      {dialog === 'nextRevision' && (
        <NextRevisionDialog
          workspaceId={workspaceId}
          layoutId={layoutId}
          letter={letter}
          onClose={() => setDialog(null)}
        />
      )}
    </>
  )
}

async function saveSheet(releaseId: string): Promise<void> {
  try {
    await download(`/api/releases/${releaseId}/sheet.pdf`, 'release-sheet.pdf')
  } catch (error) {
    showToast(messageOf(error), 'bad')
  }
}

function TakeBackDialog({
  workspaceId,
  layoutId,
  onClose,
}: {
  workspaceId: string
  layoutId: string
  onClose: () => void
}) {
  const takeBack = useTakeBackReview(workspaceId, layoutId)
  return (
    <ConfirmDialog
      title="Take the question for review back"
      confirmLabel="Take back"
      isBusy={takeBack.isPending}
      error={takeBack.error ? messageOf(takeBack.error) : null}
      onConfirm={() =>
        takeBack.mutate(undefined, {
          onSuccess: () => {
            showToast('The layout is a draft again.')
            onClose()
          },
        })
      }
      onClose={onClose}
    >
      <p>The layout leaves the release desk and is a draft again. Nothing in it changes.</p>
    </ConfirmDialog>
  )
}
