import { create } from 'zustand'
import type { Tone } from './banner'

export interface Toast {
  id: number
  tone: Tone
  text: string
}
interface ToastState {
  toasts: Toast[]
  dismiss: (id: number) => void
}

export const useToastStore = create<ToastState>()((set) => ({
  toasts: [],
  dismiss: (id) => set((state) => ({ toasts: state.toasts.filter((toast) => toast.id !== id) })),
}))

let lastId = 0

/** Passing news. Bad news stays until it is dismissed. */
export function showToast(text: string, tone: Tone = 'good'): void {
  const id = ++lastId
  useToastStore.setState((state) => ({ toasts: [...state.toasts.slice(-3), { id, tone, text }] }))
}
