/**
 * Speaks what became of the selected part after a change: "Pinion at 74 mm, slip safety 1.65,
 * holds". It waits until the numbers have settled, and says nothing when only the selection changed.
 */
import { useEffect, useRef, useState } from 'react'
import { useResultsStore } from '@/stores/results-store'
import { useSelectionStore } from '@/stores/selection-store'
import { spokenResult, type WordsContext } from './part-words'

const SETTLE_MS = 600

export function LiveResult({ words }: { words: WordsContext }) {
  const selectedId = useSelectionStore((state) =>
    state.selectedIds.length === 1 ? (state.selectedIds[0] ?? null) : null,
  )
  const isStale = useResultsStore((state) => state.isStale)
  const [spoken, setSpoken] = useState('')
  const last = useRef<{ id: string | null; text: string }>({ id: null, text: '' })
  const text = selectedId === null ? '' : spokenResult(words, selectedId)

  useEffect(() => {
    if (last.current.id !== selectedId) {
      last.current = { id: selectedId, text }
      return
    }
    if (isStale || last.current.text === text) return
    const timer = setTimeout(() => {
      last.current = { id: selectedId, text }
      setSpoken(text)
    }, SETTLE_MS)
    return () => clearTimeout(timer)
  }, [selectedId, text, isStale])

  return (
    <p aria-live="polite" className="sr-only" data-testid="live-result">
      {spoken}
    </p>
  )
}
