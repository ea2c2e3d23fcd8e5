import { PRESENCE_COLOURS, PRESENCE_INK, presenceColour } from './presence-colours'

const initialsOf = (name: string): string => {
  const words = name.trim().split(/\s+/)
  return ((words[0]?.[0] ?? '?') + (words.length > 1 ? (words.at(-1)?.[0] ?? '') : '')).toUpperCase()
}

/** Multiplying spreads names that are anagrams of each other or differ in one letter. */
const colourIndexOf = (name: string): number =>
  [...name].reduce((hash, letter) => (hash * 31 + letter.charCodeAt(0)) % 9_973, 7) % PRESENCE_COLOURS.length

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
  const index = colourIndex ?? colourIndexOf(name)
  return (
    <span
      role="img"
      aria-label={name}
      title={name}
      style={{ backgroundColor: presenceColour(index), color: PRESENCE_INK }}
      className={`inline-flex shrink-0 items-center justify-center rounded-full font-bold ring-2 ring-card select-none in-[.on-bar]:ring-bar ${
        size === 'sm' ? 'size-6 text-[10px]' : 'size-8 text-xs'
      }`}
    >
      {initialsOf(name)}
    </span>
  )
}
