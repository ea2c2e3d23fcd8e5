/** One quiet line of help under the drawing: what the tool in hand expects. */
import { useToolStore } from '../tool-store'

export function StatusLine() {
  const hint = useToolStore((state) => state.display.hint)
  if (hint === null) return null
  return (
    <p className="pointer-events-none absolute bottom-14 left-3 z-10 max-w-[calc(100%-14rem)] rounded bg-bar/90 px-2.5 py-1 text-xs font-medium text-bar-ink max-md:hidden">
      {hint}
    </p>
  )
}
