import type { ReactNode } from 'react'

interface ValueButtonProps {
  /** Said to screen readers after the value: "Formula of interface pressure". */
  label: string
  onOpen: () => void
  children: ReactNode
  className?: string
}

/** A number that can be opened to show where it comes from. Looks like a number until pointed at. */
export function ValueButton({ label, onOpen, children, className = '' }: ValueButtonProps) {
  return (
    <button
      type="button"
      onClick={onOpen}
      title="Show formula and source"
      className={`cursor-help rounded-sm decoration-dotted decoration-1 underline-offset-4 tabular-nums hover:underline focus-visible:underline ${className}`}
    >
      {children}
      <span className="sr-only">, {label}</span>
    </button>
  )
}
