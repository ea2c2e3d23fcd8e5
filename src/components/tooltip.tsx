import { type ReactNode, useState } from 'react'

/**
 * A short label on hover and keyboard focus. It repeats or adds to what the control already says,
 * so nothing depends on it: touch screens never show it. Escape hides it.
 */
export function Tooltip({
  text,
  side = 'below',
  children,
}: {
  text: string
  side?: 'below' | 'above'
  children: ReactNode
}) {
  const [isShown, setIsShown] = useState(false)
  return (
    <span
      className="relative inline-flex"
      onPointerEnter={(event) => event.pointerType === 'mouse' && setIsShown(true)}
      onPointerLeave={() => setIsShown(false)}
      onPointerDown={() => setIsShown(false)}
      onFocus={(event) => event.target.matches(':focus-visible') && setIsShown(true)}
      onBlur={() => setIsShown(false)}
      onKeyDown={(event) => event.key === 'Escape' && setIsShown(false)}
    >
      {children}
      {isShown && (
        <span
          role="tooltip"
          className={`pointer-events-none absolute left-1/2 z-40 -translate-x-1/2 rounded bg-bar px-2 py-1 text-xs font-medium whitespace-nowrap text-bar-ink ${
            side === 'below' ? 'top-full mt-1.5' : 'bottom-full mb-1.5'
          }`}
        >
          {text}
        </span>
      )}
    </span>
  )
}
