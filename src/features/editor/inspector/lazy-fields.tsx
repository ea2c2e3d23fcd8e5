/**
 * The fields that need the material and friction libraries. Most visits only read a layout, so the
 * libraries are fetched when somebody unfolds the fields.
 */
import { lazy, type ReactNode, Suspense, useState } from 'react'

export const MaterialFields = lazy(async () => ({
  default: (await import('./material-fields')).MaterialFields,
}))
export const FrictionPairs = lazy(async () => ({ default: (await import('./friction-pairs')).FrictionPairs }))

export function Unfolding({ summary, children }: { summary: ReactNode; children: ReactNode }) {
  const [isOpen, setIsOpen] = useState(false)
  return (
    <details className="mt-1" open={isOpen} onToggle={(event) => setIsOpen(event.currentTarget.open)}>
      <summary className="text-[13px]">{summary}</summary>
      {isOpen && (
        <div className="mt-1">
          <Suspense fallback={<p className="text-xs text-quiet">Fetching the library…</p>}>
            {children}
          </Suspense>
        </div>
      )}
    </details>
  )
}
