import { Icon } from '@/components/icon'
import type { LayoutSummary } from '@shared/protocol/layouts'

/** The verdict in a word and a sign, with the worst finding where it fails. */
export function LayoutVerdict({ layout }: { layout: LayoutSummary }) {
  const { verdict, failingCount, worstFinding } = layout
  if (verdict === 'passes')
    return (
      <p className="mt-1 flex items-center gap-1.5 text-sm font-semibold text-good">
        <Icon name="check" className="size-3.5" />
        Passes
      </p>
    )
  const others = failingCount - 1
  return (
    <p className="mt-1 flex items-start gap-1.5 text-sm">
      <Icon name="cross" className="mt-1 size-3.5 text-bad" />
      <span className="min-w-0">
        <span className="font-semibold text-bad">Fails</span>
        {worstFinding && `: ${worstFinding}`}
        {others > 0 && <span className="text-quiet"> and {others} more</span>}
      </span>
    </p>
  )
}
