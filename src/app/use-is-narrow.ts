import { useSyncExternalStore } from 'react'

/** Tailwind's `md`: below it a page is one column. */
const NARROW = '(max-width: 767px)'

function subscribe(onChange: () => void): () => void {
  const query = matchMedia(NARROW)
  query.addEventListener('change', onChange)
  return () => query.removeEventListener('change', onChange)
}

/** Only where another tree has to be rendered; what merely looks different is a matter for CSS. */
export const useIsNarrow = (): boolean => useSyncExternalStore(subscribe, () => matchMedia(NARROW).matches)
