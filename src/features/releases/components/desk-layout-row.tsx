/** One layout that is waiting or in work: verdict, open findings and what changed, opened on demand. */
import { type ReactNode, useId, useState } from 'react'
import { Link } from 'react-router'
import { buttonClasses } from '@/components/button'
import { Icon } from '@/components/icon'
import { paths } from '@/config/paths'
import type { DeskLayout } from '@shared/protocol/releases'
import { ChangesSince } from './changes-since'
import { DeskFindings } from './desk-findings'

export function DeskLayoutRow({
  workspaceId,
  layout,
  children,
}: {
  workspaceId: string
  layout: DeskLayout
  /** Who asked, when and with what note. */
  children?: ReactNode
}) {
  const [opened, setOpened] = useState<'findings' | 'changes' | null>(null)
  const panelId = useId()
  const warnings = layout.findings.length - layout.findings.filter((each) => each.severity === 'fails').length
  const toggle = (which: 'findings' | 'changes') => setOpened(opened === which ? null : which)
  const { lastReleaseId, lastReleaseLetter, changeCount } = layout
  return (
    <li className="border-b border-hairline py-4">
      <div className="flex flex-wrap items-start justify-between gap-x-6 gap-y-3">
        <div className="min-w-0 flex-1 basis-80">
          <h3 className="font-bold">
            <Link to={paths.bench(workspaceId, layout.layoutId)} className="hover:underline">
              {layout.name}
            </Link>{' '}
            <span className="font-semibold whitespace-nowrap text-quiet">
              revision {layout.revisionLetter}
            </span>
          </h3>
          {children}
        </div>
        <Link to={paths.bench(workspaceId, layout.layoutId)} className={buttonClasses('secondary', 'sm')}>
          Open on the bench
        </Link>
      </div>
      <div className="mt-2 flex flex-wrap items-center gap-x-5 gap-y-1 text-sm">
        {layout.findings.length === 0 ? (
          <span className="inline-flex items-center gap-1.5 font-semibold text-good">
            <Icon name="check" className="size-3.5" />
            Passes, no open finding
          </span>
        ) : (
          <Disclosure isOpen={opened === 'findings'} panelId={panelId} onToggle={() => toggle('findings')}>
            <span className="inline-flex flex-wrap items-center gap-x-1.5">
              {layout.failingCount > 0 ? (
                <>
                  <Icon name="cross" className="size-3.5 text-bad" />
                  <span className="text-bad">
                    {layout.failingCount} {layout.failingCount === 1 ? 'finding fails' : 'findings fail'}
                    {warnings > 0 && ','}
                  </span>
                </>
              ) : (
                <>
                  <Icon name="check" className="size-3.5 text-good" />
                  <span className="text-good">Passes{warnings > 0 && ','}</span>
                </>
              )}
              {warnings > 0 && (
                <span className="text-straw-ink">
                  {warnings} {warnings === 1 ? 'warning' : 'warnings'}
                </span>
              )}
            </span>
          </Disclosure>
        )}
        {lastReleaseId === null || changeCount === null ? (
          <span className="text-quiet">First release of this layout</span>
        ) : (
          <Disclosure isOpen={opened === 'changes'} panelId={panelId} onToggle={() => toggle('changes')}>
            {changeCount === 0
              ? `No change since release ${lastReleaseLetter ?? ''}`
              : `${changeCount} ${changeCount === 1 ? 'part' : 'parts'} changed since release ${lastReleaseLetter ?? ''}`}
          </Disclosure>
        )}
      </div>
      {opened !== null && (
        <div id={panelId} className="mt-3 border-l-2 border-hairline pl-4">
          {opened === 'findings' && <DeskFindings findings={layout.findings} />}
          {opened === 'changes' && lastReleaseId !== null && (
            <ChangesSince
              releaseId={lastReleaseId}
              releaseLetter={lastReleaseLetter ?? ''}
              layoutId={layout.layoutId}
              revision={layout.revision}
              letter={layout.revisionLetter}
            />
          )}
        </div>
      )}
    </li>
  )
}

function Disclosure({
  isOpen,
  panelId,
  onToggle,
  children,
}: {
  isOpen: boolean
  panelId: string
  onToggle: () => void
  children: ReactNode
}) {
  return (
    <button
      type="button"
      aria-expanded={isOpen}
      aria-controls={isOpen ? panelId : undefined}
      className="-ml-1 inline-flex items-center gap-1 rounded px-1 py-0.5 font-semibold hover:bg-steel-soft"
      onClick={onToggle}
    >
      <Icon name={isOpen ? 'chevronDown' : 'chevronRight'} className="size-3.5 text-quiet" />
      <span>{children}</span>
    </button>
  )
}
