import { useSyncExternalStore } from 'react'

function subscribe(onChange: () => void): () => void {
  addEventListener('online', onChange)
  addEventListener('offline', onChange)
  return () => {
    removeEventListener('online', onChange)
    removeEventListener('offline', onChange)
  }
}

export function OfflineBanner() {
  const isOnline = useSyncExternalStore(subscribe, () => navigator.onLine)
  if (isOnline) return null
  return (
    // The bench fills the window and makes room for this line by its mark and its height.
    <p
      role="status"
      data-offline-banner
      className="bg-straw-soft px-4 py-1.5 text-center text-sm font-semibold text-straw-ink md:h-8"
    >
      This device is offline. What is on screen may be old; edits wait here until the line is back.
    </p>
  )
}
