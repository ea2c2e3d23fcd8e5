/** Pass an empty label where words beside it already say what is going on. */
export function Spinner({ label = 'Loading' }: { label?: string }) {
  return (
    <span role={label ? 'status' : undefined} className="inline-flex items-center gap-2">
      <svg viewBox="0 0 16 16" className="size-4 animate-spin" aria-hidden="true">
        <circle cx="8" cy="8" r="6.5" fill="none" stroke="currentColor" strokeWidth="2" opacity="0.25" />
        <path d="M8 1.5A6.5 6.5 0 0 1 14.5 8" fill="none" stroke="currentColor" strokeWidth="2" />
      </svg>
      {label && <span className="sr-only">{label}</span>}
    </span>
  )
}
