import type { ReactNode } from 'react'
import { Link, NavLink } from 'react-router'
import { Mark } from '@/components/mark'
import { paths } from '@/config/paths'
import { useNearestWorkspace } from '../workspace-context'
import { AccountMenu } from './account-menu'
import { WorkspaceSwitcher } from './workspace-switcher'

const navClasses = ({ isActive }: { isActive: boolean }) =>
  `flex h-full items-center border-b-2 px-1 text-sm font-semibold whitespace-nowrap -outline-offset-2 ${
    isActive ? 'border-straw-bright text-bar-ink' : 'border-transparent text-bar-quiet hover:text-bar-ink'
  }`

/**
 * The dark bar. Pages about one thing (the bench) pass a `title` in place of the navigation and their
 * `actions`; the mark then leads back to the layouts.
 */
export function TopBar({ title, actions }: { title?: ReactNode; actions?: ReactNode }) {
  const workspace = useNearestWorkspace()
  return (
    <header className="on-bar bg-bar text-bar-ink">
      <div className="flex h-14 items-center gap-3 px-4 sm:gap-5 sm:px-6">
        <Link
          to={workspace ? paths.layouts(workspace.id) : paths.home}
          aria-label="Hubstead, layouts"
          className="flex shrink-0 items-center gap-3 rounded text-lg font-bold"
        >
          <Mark />
          <span className={title ? 'hidden xl:inline' : 'hidden sm:inline'}>Hubstead</span>
        </Link>
        {title ? (
          <div className="flex min-w-0 flex-1 items-center gap-3">{title}</div>
        ) : (
          <WorkspaceSwitcher />
        )}
        {!title && workspace && (
          <nav aria-label="Workspace" className="hidden h-full gap-5 md:flex">
            <WorkspaceLinks workspaceId={workspace.id} />
          </nav>
        )}
        <div className="ml-auto flex shrink-0 items-center gap-3">
          {actions}
          <AccountMenu />
        </div>
      </div>
      {!title && workspace && (
        <nav aria-label="Workspace" className="flex h-11 gap-5 border-t border-bar-line px-4 md:hidden">
          <WorkspaceLinks workspaceId={workspace.id} />
        </nav>
      )}
    </header>
  )
}

function WorkspaceLinks({ workspaceId }: { workspaceId: string }) {
  return (
    <>
      <NavLink to={paths.layouts(workspaceId)} className={navClasses}>
        Layouts
      </NavLink>
      <NavLink to={paths.releases(workspaceId)} className={navClasses}>
        Release desk
      </NavLink>
      <NavLink to={paths.people(workspaceId)} className={navClasses}>
        People
      </NavLink>
    </>
  )
}
