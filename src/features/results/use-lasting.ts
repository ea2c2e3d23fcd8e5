import { useEffect, useState } from 'react'

/** A run takes a few milliseconds; words that flash for that long only disturb. */
const UPDATING_SHOWN_AFTER_MS = 250

/**
 * True once `isOn` has lasted long enough to be worth saying.
 * @param progress whatever changes as things move on: during a drag each new set of results starts
 * the wait afresh, because numbers that follow are not old ones
 */
export function useLasting(isOn: boolean, progress: unknown, afterMs = UPDATING_SHOWN_AFTER_MS): boolean {
  const [hasLasted, setHasLasted] = useState(false)
  useEffect(() => {
    if (!isOn) return
    const timer = setTimeout(() => setHasLasted(true), afterMs)
    return () => {
      clearTimeout(timer)
      setHasLasted(false)
    }
  }, [isOn, progress, afterMs])
  return isOn && hasLasted
}
