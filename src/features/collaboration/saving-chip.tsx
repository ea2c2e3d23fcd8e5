/** Where the edits are. It says "saved" only when nothing waits and the line is up. */
import { useEffect, useState } from 'react'
import { Icon, type IconName } from '@/components/icon'
import { useLayoutStore } from '@/stores/layout-store'
import type { ConnectionState } from '@/stores/layout-state'

interface SavingState {
  connection: ConnectionState
  pendingCount: number
  isStuck: boolean
  isStored: boolean
}

export interface SavingWords {
  words: string
  short: string
  tone: 'quiet' | 'straw' | 'bad'
  icon: IconName | null
}

/** An edit that waits longer than this is not "saving" any more. */
export const STUCK_AFTER_MS = 8_000

const edits = (count: number) => (count === 1 ? '1 edit' : `${count} edits`)

export function savingWords({ connection, pendingCount, isStuck, isStored }: SavingState): SavingWords {
  if (connection === 'refused') {
    return {
      words: pendingCount > 0 ? `not saved: ${edits(pendingCount)}` : 'closed',
      short: pendingCount > 0 ? 'not saved' : 'closed',
      tone: 'bad',
      icon: 'warning',
    }
  }
  if (connection === 'connecting') {
    return { words: 'connecting…', short: 'connecting', tone: 'quiet', icon: null }
  }
  if (connection === 'reconnecting') {
    const kept = isStored ? 'kept in this browser' : 'only in this tab'
    return pendingCount > 0
      ? {
          words: `no connection, ${edits(pendingCount)} not saved, ${kept}`,
          short: `${pendingCount} not saved`,
          tone: 'bad',
          icon: 'warning',
        }
      : { words: 'no connection, trying again', short: 'no connection', tone: 'straw', icon: 'warning' }
  }
  if (pendingCount === 0) return { words: 'all edits saved', short: 'saved', tone: 'quiet', icon: 'check' }
  return isStuck
    ? { words: `not saved yet: ${edits(pendingCount)}`, short: 'not saved', tone: 'bad', icon: 'warning' }
    : { words: `saving ${edits(pendingCount)}…`, short: 'saving…', tone: 'quiet', icon: null }
}

const TONES = { quiet: 'text-bar-quiet', straw: 'text-straw-bright', bad: 'text-[#f2a79d] font-semibold' }

export function SavingChip() {
  const connection = useLayoutStore((state) => state.connection)
  const pendingCount = useLayoutStore((state) => state.pending.length)
  const firstPending = useLayoutStore((state) => state.pending[0]?.editId ?? null)
  const isStored = useLayoutStore((state) => state.storageFailure === null)
  const [stuckEdit, setStuckEdit] = useState<string | null>(null)

  useEffect(() => {
    if (firstPending === null) return
    const timer = setTimeout(() => setStuckEdit(firstPending), STUCK_AFTER_MS)
    return () => clearTimeout(timer)
  }, [firstPending])

  const { words, short, tone, icon } = savingWords({
    connection,
    pendingCount,
    isStuck: firstPending !== null && stuckEdit === firstPending,
    isStored,
  })
  return (
    <span
      role="status"
      aria-live="polite"
      title={words}
      data-testid="saving-chip"
      className={`flex min-w-0 items-center gap-1.5 text-[13px] whitespace-nowrap ${TONES[tone]}`}
    >
      {icon && <Icon name={icon} className="size-3.5" />}
      <span className="truncate max-lg:sr-only">{words}</span>
      <span aria-hidden="true" className={`lg:hidden ${tone === 'quiet' ? 'max-sm:hidden' : ''}`}>
        {short}
      </span>
    </span>
  )
}
