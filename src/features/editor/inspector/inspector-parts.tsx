import type { ReactNode } from 'react'
import { JudgedNumber, safetyVerdict } from '@/components/judged-number'
import { ValueButton } from '@/components/value-button'
import { formatSafety } from '@/lib/format-quantity'
import { useDerivationStore } from '@/stores/derivation-store'
import type { QuantityReference } from '@shared/recalculation/derivation'

export function Group({ title, note, children }: { title: string; note?: ReactNode; children: ReactNode }) {
  return (
    <section aria-label={title} className="mt-4">
      <h3 className="flex items-baseline justify-between gap-2 text-[13px] font-bold text-plum">
        {title}
        {note && <span className="text-xs font-medium text-quiet">{note}</span>}
      </h3>
      {children}
    </section>
  )
}

/** Fields side by side. */
export function FieldGrid({ columns = 2, children }: { columns?: 2 | 3; children: ReactNode }) {
  return (
    <div className={`mt-1 grid gap-x-2 gap-y-1.5 ${columns === 3 ? 'grid-cols-3' : 'grid-cols-2'}`}>
      {children}
    </div>
  )
}

interface ResultRowProps {
  label: ReactNode
  /** For the accessible name of the number when the label is not plain text. */
  name?: string
  value: string
  reference?: QuantityReference
  safety?: { value: number | null; limit: number | null; reference?: QuantityReference }
}

/** One calculated number, openable to its formula, with the safety that belongs to it. */
export function ResultRow({ label, name, value, reference, safety }: ResultRowProps) {
  const spoken = name ?? (typeof label === 'string' ? label.toLowerCase() : 'this number')
  return (
    <div className="flex items-baseline justify-between gap-3 border-b border-dashed border-hairline py-1 text-[13px]">
      <span className="text-quiet">{label}</span>
      <span className="text-right font-semibold whitespace-nowrap tabular-nums">
        {value !== '' && <Openable reference={reference} label={`formula of ${spoken}`} text={value} />}
        {safety && (
          <span className={value === '' ? '' : 'ml-2'}>
            <Safety {...safety} label={`the safety of ${spoken}`} />
          </span>
        )}
      </span>
    </div>
  )
}

function Openable({
  reference,
  label,
  text,
}: {
  reference?: QuantityReference
  label: string
  text: string
}) {
  const open = useDerivationStore((state) => state.open)
  if (reference === undefined) return <>{text}</>
  return (
    <ValueButton label={label} onOpen={() => open(reference)}>
      {text}
    </ValueButton>
  )
}

function Safety({
  value,
  limit,
  reference,
  label,
}: NonNullable<ResultRowProps['safety']> & { label: string }) {
  const open = useDerivationStore((state) => state.open)
  return (
    <JudgedNumber
      text={formatSafety(value, limit)}
      verdict={safetyVerdict(value, limit)}
      label={label}
      onOpen={reference === undefined ? undefined : () => open(reference)}
    />
  )
}
