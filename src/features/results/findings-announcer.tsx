import { useEffect, useRef, useState } from 'react'
import { useResultsStore } from '@/stores/results-store'
import type { Finding } from '@shared/recalculation/layout-results'
import { announcement } from './announcement'

/** While somebody drags, findings come and go; only what stays this long is spoken. */
const SETTLED_AFTER_MS = 1_200

/** Tells screen readers, politely, what began to fail and what was mended. */
export function FindingsAnnouncer() {
  const findings = useResultsStore((state) => state.results?.findings)
  const spoken = useRef<readonly Finding[] | null>(null)
  const [words, setWords] = useState('')

  useEffect(() => {
    if (findings === undefined) return
    const timer = setTimeout(() => {
      const { document } = useResultsStore.getState()
      if (document === null) return
      const text = announcement(spoken.current, findings, document)
      spoken.current = findings
      if (text !== '') setWords(text)
    }, SETTLED_AFTER_MS)
    return () => clearTimeout(timer)
  }, [findings])

  return (
    <p role="status" aria-live="polite" className="sr-only">
      {words}
    </p>
  )
}
