import { Dialog } from '@/components/dialog'
import { useDerivationStore } from '@/stores/derivation-store'

export function DerivationDialog() {
  const reference = useDerivationStore((state) => state.trail.at(-1))
  const close = useDerivationStore((state) => state.close)
  if (reference === undefined) return null
  return (
    <Dialog title={reference.quantity} onClose={close}>
      {null}
    </Dialog>
  )
}
