import type { ReactNode } from 'react'
import type { Tone } from './banner'
import { Icon, type IconName } from './icon'

const TONES: Record<Tone | 'plum', string> = {
  neutral: 'bg-hairline/60 text-ink',
  good: 'bg-good-soft text-good',
  bad: 'bg-bad-soft text-bad',
  straw: 'bg-straw-soft text-straw-ink',
  steel: 'bg-steel-soft text-steel',
  plum: 'bg-plum/12 text-plum',
}

/** A state in a word; give an icon where the tone carries meaning. */
export function Chip({
  tone = 'neutral',
  icon,
  children,
}: {
  tone?: Tone | 'plum'
  icon?: IconName
  children: ReactNode
}) {
  return (
    <span
      className={`inline-flex items-center gap-1 rounded-full px-2 py-0.5 text-xs font-semibold whitespace-nowrap ${TONES[tone]}`}
    >
      {icon && <Icon name={icon} className="size-3" />}
      {children}
    </span>
  )
}
