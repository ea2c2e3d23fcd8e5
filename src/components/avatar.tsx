import { presenceColour } from './presence-colours'

const initialsOf = (name: string): string => {
  const words = name.trim().split(/\s+/)
  return ((words[0]?.[0] ?? '?') + (words.length > 1 ? (words.at(-1)?.[0] ?? '') : '')).toUpperCase()
}

/** A person as initials on a colour; the same name gets the same colour unless an index is given. */
export function Avatar({
  name,
  colourIndex,
  size = 'md',
}: {
  name: string
  colourIndex?: number
  size?: 'sm' | 'md'
}) {
  const index = colourIndex ?? [...name].reduce((sum, letter) => sum + letter.charCodeAt(0), 0)
  return (
    <span
      role="img"
      aria-label={name}
      title={name}
      style={{ backgroundColor: presenceColour(index) }}
      className={`inline-flex shrink-0 items-center justify-center rounded-full font-bold text-white ring-2 ring-card select-none ${
        size === 'sm' ? 'size-6 text-[10px]' : 'size-8 text-xs'
      }`}
    >
      {initialsOf(name)}
    </span>
  )
}
