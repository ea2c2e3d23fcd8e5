/** Stands once in the bench. Formulas and their typesetting are fetched when the first number is opened. */
import { lazy, Suspense } from 'react'
import { useDerivationStore } from '@/stores/derivation-store'

const OpenDerivation = lazy(async () => ({ default: (await import('./open-derivation')).OpenDerivation }))

export function DerivationDialog() {
  const isOpen = useDerivationStore((state) => state.trail.length > 0)
  if (!isOpen) return null
  return (
    <Suspense fallback={null}>
      <OpenDerivation />
    </Suspense>
  )
}
