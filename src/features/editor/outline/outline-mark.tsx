/** Verdict of a part as a sign, not only a colour. The words stand in the item's label. */
import type { PartVerdict } from '../part-states'

const SIGNS: Record<PartVerdict, { sign: string; classes: string }> = {
  holds: { sign: '✓', classes: 'text-good' },
  warns: { sign: '!', classes: 'text-straw-ink' },
  fails: { sign: '✕', classes: 'text-bad' },
  unknown: { sign: '?', classes: 'text-quiet' },
}

export function OutlineMark({ verdict }: { verdict: PartVerdict | null }) {
  const mark = verdict === null ? null : SIGNS[verdict]
  return (
    <span aria-hidden="true" className={`w-3 shrink-0 text-center text-xs font-bold ${mark?.classes ?? ''}`}>
      {mark?.sign}
    </span>
  )
}
