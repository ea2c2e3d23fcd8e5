/** The formula dialog; its code comes with the first number that is opened. */
import { lazy, Suspense } from 'react'
import { useDerivationStore } from '@/stores/derivation-store'

const DerivationDialog = lazy(async () => ({
  default: (await import('@/features/results/derivation-dialog')).DerivationDialog,
}))

export function OpenDerivation() {
  const isOpen = useDerivationStore((state) => state.trail.length > 0)
  return isOpen ? (
    <Suspense fallback={null}>
      <DerivationDialog />
    </Suspense>
  ) : null
}
