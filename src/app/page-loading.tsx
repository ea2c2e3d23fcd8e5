import { useEffect, useState } from 'react'
import { Spinner } from '@/components/spinner'

const QUIET_FOR_MS = 200

/** Says nothing for a moment, so that quick pages do not flicker. */
export function PageLoading({ label = 'Loading the page' }: { label?: string }) {
  const [isShown, setIsShown] = useState(false)
  useEffect(() => {
    const timer = setTimeout(() => setIsShown(true), QUIET_FOR_MS)
    return () => clearTimeout(timer)
  }, [])
  return (
    <div className="grid min-h-60 place-items-center text-quiet">{isShown && <Spinner label={label} />}</div>
  )
}
