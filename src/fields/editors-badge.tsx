/** Who else is typing in a field: the first name, short enough for a narrow label. */
export function EditorsBadge({ names }: { names: readonly string[] }) {
  if (names.length === 0) return null
  const firstNames = names.map((name) => name.split(' ')[0]).join(', ')
  return (
    <span
      title={`${firstNames} ${names.length === 1 ? 'is' : 'are'} editing this`}
      className="inline-flex min-w-0 items-center gap-1 font-semibold text-good"
    >
      <span aria-hidden="true" className="size-1.5 shrink-0 rounded-full bg-good" />
      <span className="truncate">{firstNames}</span>
      <span className="sr-only">{names.length === 1 ? 'is' : 'are'} editing</span>
    </span>
  )
}
