/** Stands under every page that shows results. The sheets print the same words. */
import { CAUTIONS_LINE } from '@shared/recalculation/cautions'

export function Cautions({ className = '' }: { className?: string }) {
  return <p className={`text-xs text-quiet ${className}`}>{CAUTIONS_LINE}</p>
}
