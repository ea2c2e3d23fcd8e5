/** Two rings on a line. */
export function Mark({ className = 'size-7' }: { className?: string }) {
  return (
    <svg viewBox="0 0 28 28" className={className} aria-hidden="true">
      <path d="M1 14h26" stroke="currentColor" strokeWidth="3" />
      <rect x="5" y="4" width="6.5" height="20" rx="1.5" fill="currentColor" />
      <rect x="16.5" y="7.5" width="6.5" height="13" rx="1.5" className="fill-straw" />
    </svg>
  )
}
