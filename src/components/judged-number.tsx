import { ValueButton } from './value-button'

interface JudgedNumberProps {
  text: string
  verdict: 'holds' | 'fails' | 'none'
  /** What the number is, for the accessible name: "combined slip safety of Pinion". */
  label: string
  /** Opens how the number came about. */
  onOpen?: () => void
}

/** A number with its verdict: a sign beside the colour, a word for screen readers. */
export function JudgedNumber({ text, verdict, label, onOpen }: JudgedNumberProps) {
  return (
    <span
      className={`font-bold tabular-nums ${verdict === 'fails' ? 'text-bad' : verdict === 'holds' ? 'text-good' : 'font-semibold! text-quiet'}`}
    >
      {verdict === 'fails' && <span aria-hidden="true">✕ </span>}
      {verdict !== 'none' && <span className="sr-only">{verdict}: </span>}
      {onOpen === undefined ? (
        text
      ) : (
        <ValueButton label={`formula of ${label}`} onOpen={onOpen}>
          {text}
        </ValueButton>
      )}
    </span>
  )
}

/** A safety against its limit; without demand or limit there is nothing to judge. */
export const safetyVerdict = (value: number | null, limit: number | null): JudgedNumberProps['verdict'] =>
  value === null || limit === null ? 'none' : value < limit ? 'fails' : 'holds'
