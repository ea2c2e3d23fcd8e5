/** Which number's derivation is open. Any panel opens one; the dialog stands once in the bench. */
import { create } from 'zustand'
import type { QuantityReference } from '@shared/recalculation/derivation'

interface DerivationState {
  /** The way from the number first opened to the one shown, so that one can go back. */
  trail: QuantityReference[]
  open: (reference: QuantityReference) => void
  /** From inside a derivation to one of its inputs. */
  follow: (reference: QuantityReference) => void
  back: () => void
  close: () => void
}

const CLOSED: QuantityReference[] = []

export const useDerivationStore = create<DerivationState>()((set) => ({
  trail: CLOSED,
  open: (reference) => set({ trail: [reference] }),
  follow: (reference) => set((state) => ({ trail: [...state.trail, reference] })),
  back: () => set((state) => (state.trail.length > 1 ? { trail: state.trail.slice(0, -1) } : state)),
  close: () => set((state) => (state.trail.length === 0 ? state : { trail: CLOSED })),
}))
