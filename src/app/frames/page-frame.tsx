import { Suspense, useContext, useEffect, useRef } from 'react'
import { Outlet, useLocation } from 'react-router'
import { Cautions } from '@/drawings/cautions'
import { ErrorBoundary } from '../error-boundary'
import { PageLoading } from '../page-loading'
import { useWorkspaceNews } from '../use-workspace-news'
import { WorkspaceContext } from '../workspace-context'
import { TopBar } from './top-bar'

/** Bar and page: every signed-in page except the bench. Pages with results carry the cautions. */
export function PageFrame({ showsResults = false }: { showsResults?: boolean }) {
  const { pathname } = useLocation()
  const main = useRef<HTMLElement>(null)
  const shownPath = useRef(pathname)
  useWorkspaceNews(useContext(WorkspaceContext)?.id ?? null)

  useEffect(() => {
    if (shownPath.current === pathname) return
    shownPath.current = pathname
    // A screen reader would otherwise stay on the link that led here.
    main.current?.focus()
    scrollTo(0, 0)
  }, [pathname])

  return (
    <div className="flex min-h-dvh flex-col">
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:absolute focus:top-2 focus:left-2 focus:z-50 focus:rounded-md focus:bg-card focus:px-4 focus:py-2 focus:font-semibold"
      >
        Skip to the page
      </a>
      <TopBar />
      <main
        ref={main}
        id="main"
        tabIndex={-1}
        className="mx-auto w-full max-w-[1400px] flex-1 px-4 py-6 outline-none sm:px-6"
      >
        <ErrorBoundary resetKey={pathname}>
          <Suspense fallback={<PageLoading />}>
            <Outlet />
          </Suspense>
        </ErrorBoundary>
      </main>
      {showsResults && (
        <footer className="mx-auto w-full max-w-[1400px] px-4 pb-6 sm:px-6">
          <Cautions />
        </footer>
      )}
    </div>
  )
}
