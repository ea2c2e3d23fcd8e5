import { useEffect } from 'react'
import { Icon } from './icon'
import { type Toast, useToastStore } from './toast-store'

const SHOWN_FOR_MS = 5_000

function ToastLine({ toast }: { toast: Toast }) {
  const dismiss = useToastStore((state) => state.dismiss)
  useEffect(() => {
    if (toast.tone === 'bad') return
    const timer = setTimeout(() => dismiss(toast.id), SHOWN_FOR_MS)
    return () => clearTimeout(timer)
  }, [toast, dismiss])
  return (
    <div
      role={toast.tone === 'bad' ? 'alert' : 'status'}
      className="pointer-events-auto flex max-w-md items-start gap-3 rounded-md bg-bar py-2.5 pr-2 pl-3.5 text-sm text-bar-ink shadow-lg"
    >
      <Icon name={toast.tone === 'bad' ? 'warning' : 'check'} className="mt-0.5 size-4 text-straw-bright" />
      <span className="flex-1">{toast.text}</span>
      <button
        type="button"
        aria-label="Dismiss"
        className="rounded p-1 hover:bg-bar-line"
        onClick={() => dismiss(toast.id)}
      >
        <Icon name="close" className="size-3.5" />
      </button>
    </div>
  )
}

export function ToastRegion() {
  const toasts = useToastStore((state) => state.toasts)
  return (
    <div className="on-bar pointer-events-none fixed inset-x-0 bottom-4 z-50 grid justify-items-center gap-2 px-4">
      {toasts.map((toast) => (
        <ToastLine key={toast.id} toast={toast} />
      ))}
    </div>
  )
}
