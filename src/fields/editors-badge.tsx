/** Who else is typing in a field. */
export function EditorsBadge({ names }: { names: readonly string[] }) {
  if (names.length === 0) return null
  return (
    <span className="rounded-full bg-good-soft px-1.5 text-[11px] leading-4 font-semibold text-good">
      {names.map((name) => name.split(' ')[0]).join(', ')} {names.length === 1 ? 'is' : 'are'} editing
    </span>
  )
}
