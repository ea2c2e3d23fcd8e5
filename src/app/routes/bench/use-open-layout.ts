/** Opens the layout of the address with its calculation, and closes both when the page is left. */
import { useEffect, useState } from 'react'
import { startRecalculation } from '@/stores/recalculation'
import type { LayoutSession } from '@/sync/layout-session'
import { openLayout } from '@/sync/open-layout'

export function useOpenLayout(layoutId: string): LayoutSession | null {
  const [session, setSession] = useState<LayoutSession | null>(null)
  useEffect(() => {
    const opened = openLayout(layoutId)
    const recalculation = startRecalculation()
    setSession(opened)
    return () => {
      recalculation.stop()
      opened.close()
      setSession(null)
    }
  }, [layoutId])
  return session?.layoutId === layoutId ? session : null
}
