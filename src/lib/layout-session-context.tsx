/**
 * Hands the open layout session down to the features. It stands in lib because features may not
 * import app, and knows only the interface of the session, not how it is opened: the bench route
 * opens and closes it.
 */
import { createContext, type ReactNode, useContext } from 'react'
import type { LayoutSession } from '@/sync/layout-session'

const LayoutSessionContext = createContext<LayoutSession | null>(null)

export function LayoutSessionProvider({
  session,
  children,
}: {
  session: LayoutSession
  children: ReactNode
}) {
  return <LayoutSessionContext value={session}>{children}</LayoutSessionContext>
}

/** The session of the layout on screen. Only inside the bench. */
export function useLayoutSession(): LayoutSession {
  const session = useContext(LayoutSessionContext)
  if (session === null) throw new Error('useLayoutSession needs the bench around it')
  return session
}
