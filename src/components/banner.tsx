import type { ReactNode } from 'react'
import { Sign, type SignName } from './sign'

export type Tone = 'neutral' | 'good' | 'bad' | 'straw' | 'steel'

const TONES: Record<Tone, { classes: string; icon: SignName }> = {
  neutral: { classes: 'border-hairline bg-paper text-ink', icon: 'info' },
  good: { classes: 'border-good/40 bg-good-soft text-ink', icon: 'check' },
  bad: { classes: 'border-bad/40 bg-bad-soft text-ink', icon: 'warning' },
  straw: { classes: 'border-straw/50 bg-straw-soft text-ink', icon: 'warning' },
  steel: { classes: 'border-steel/30 bg-steel-soft text-ink', icon: 'info' },
}

/** A message that stays until its cause is gone. Bad news is read out at once. */
export function Banner({
  tone = 'neutral',
  title,
  action,
  children,
}: {
  tone?: Tone
  title?: string
  action?: ReactNode
  children?: ReactNode
}) {
  const { classes, icon } = TONES[tone]
  return (
    <div
      role={tone === 'bad' ? 'alert' : 'status'}
      className={`flex flex-wrap items-start gap-x-3 gap-y-2 rounded-md border px-3.5 py-2.5 text-sm ${classes}`}
    >
      <Sign
        name={icon}
        className={`mt-0.5 size-4 ${tone === 'bad' ? 'text-bad' : tone === 'good' ? 'text-good' : ''}`}
      />
      <div className="min-w-0 flex-1">
        {title && <p className="font-semibold">{title}</p>}
        {children}
      </div>
      {action}
    </div>
  )
}
