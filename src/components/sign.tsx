/**
 * The signs of state, apart from the other icons: they come with every field and banner, also on the pages
 * before sign-in, which load nothing they do not show.
 */
export const SIGN_PATHS = {
  check: 'M3 8.5 6.5 12 13 4.5',
  cross: 'm4 4 8 8M12 4l-8 8',
  info: 'M8 14.5a6.5 6.5 0 1 0 0-13 6.5 6.5 0 0 0 0 13zM8 7.2V11M8 4.8v.4',
  warning: 'M8 2 14.5 13.5h-13zM8 6.5v3.2M8 11.6v.3',
} as const

export type SignName = keyof typeof SIGN_PATHS

export function Sign({ name, className }: { name: SignName; className: string }) {
  return <LineDrawing path={SIGN_PATHS[name]} className={className} />
}

/** One path on a 16 px grid in the colour of the text. */
export function LineDrawing({
  path,
  className,
  strokeWidth = 1.5,
}: {
  path: string
  className: string
  strokeWidth?: number
}) {
  return (
    <svg viewBox="0 0 16 16" className={`shrink-0 ${className}`} aria-hidden="true" focusable="false">
      <path
        d={path}
        fill="none"
        stroke="currentColor"
        strokeWidth={strokeWidth}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </svg>
  )
}
