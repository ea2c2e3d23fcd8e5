import { useState } from 'react'
import { Banner } from '@/components/banner'
import { ColumnHead, DataTable } from '@/components/data-table'
import { Sign } from '@/components/sign'
import { Spinner } from '@/components/spinner'
import type { ValidationTopic } from '@shared/validation/validation-check'
import { VALIDATION_TOPICS } from '@shared/validation/validation-check'
import type { ValidationRow } from '@shared/validation/worker-messages'
import { useValidationRows } from './use-validation-rows'

const TOPIC_WORDS: Record<ValidationTopic, string> = {
  tolerances: 'Limits and fits',
  interferenceFit: 'Pressure, capacity and stress of a seat',
  rotation: 'Rotation',
  temperature: 'Temperature and joining',
  loads: 'Loads by their source',
  beam: 'Shaft: statics',
  fatigue: 'Shaft: fatigue and notches',
  vibration: 'Shaft: natural frequencies',
  statistics: 'Statistics of a batch',
  contact: 'Contact of the whole shaft',
}

const EVIDENCE_WORDS = {
  published: 'published',
  solver: 'independent solver',
  closedForm: 'closed form',
  commonPractice: 'common practice',
} as const

const SHORT_TOPIC = 12

const number = (value: number) => String(Number(value.toPrecision(6)))

function deviationWords({ deviation, tolerance, unit }: ValidationRow): string {
  const words = (value: number) =>
    tolerance.kind === 'relative'
      ? `${Number((value * 100).toPrecision(2))} %`
      : `${Number(value.toPrecision(2))} ${unit}`.trim()
  return `${words(deviation)} of ${words(tolerance.value)}`
}

function Row({ row }: { row: ValidationRow }) {
  return (
    <tr className="border-b border-hairline align-top">
      <td className="px-3 py-2 whitespace-nowrap">
        {row.passes ? (
          <span className="inline-flex items-center gap-1 text-good">
            <Sign name="check" className="size-4" /> agrees
          </span>
        ) : (
          <span className="inline-flex items-center gap-1 font-semibold text-bad">
            <Sign name="cross" className="size-4" /> off
          </span>
        )}
      </td>
      <td className="min-w-56 px-3 py-2">{row.title}</td>
      <td className="min-w-56 px-3 py-2 text-quiet">
        {row.citation}, {row.place}
        <span className="block text-xs">
          {EVIDENCE_WORDS[row.evidence]}
          {row.isFromMemory && ', from memory'}
        </span>
      </td>
      <td className="px-3 py-2 text-right tabular-nums">
        {row.reference.map(number).join(' / ')} {row.unit}
      </td>
      <td className="px-3 py-2 text-right tabular-nums">{row.ours.map(number).join(' / ')}</td>
      <td className="px-3 py-2 tabular-nums">
        {deviationWords(row)}
        <span className="block text-xs text-quiet">{row.reason}</span>
      </td>
    </tr>
  )
}

function Topic({ topic, rows }: { topic: ValidationTopic; rows: ValidationRow[] }) {
  const off = rows.filter((row) => !row.passes).length
  const [isOpen, setIsOpen] = useState(rows.length <= SHORT_TOPIC || off > 0)
  return (
    <details
      open={isOpen}
      onToggle={(event) => setIsOpen(event.currentTarget.open)}
      className="border-t border-hairline py-3"
    >
      <summary className="cursor-pointer py-1">
        <h3 className="inline font-bold">{TOPIC_WORDS[topic]}</h3>{' '}
        <span className={off > 0 ? 'font-semibold text-bad' : 'text-quiet'}>
          {rows.length} checks, {off === 0 ? 'all agree' : `${off} off`}
        </span>
      </summary>
      {isOpen && (
        <DataTable label={TOPIC_WORDS[topic]}>
          <thead>
            <tr>
              <ColumnHead>State</ColumnHead>
              <ColumnHead>Check</ColumnHead>
              <ColumnHead>Source</ColumnHead>
              <ColumnHead align="right">Reference</ColumnHead>
              <ColumnHead align="right">Ours</ColumnHead>
              <ColumnHead>Deviation of what is allowed, and why</ColumnHead>
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <Row key={row.id} row={row} />
            ))}
          </tbody>
        </DataTable>
      )}
    </details>
  )
}

export function ValidationTable() {
  const run = useValidationRows()
  if (run.state === 'running')
    return (
      <p className="flex items-center gap-2 text-quiet">
        <Spinner label="" /> Running the checks in this browser
      </p>
    )
  if (run.state === 'failed') return <Banner tone="bad">{run.message}</Banner>
  const sources = new Set(run.rows.map((row) => row.citation)).size
  const off = run.rows.filter((row) => !row.passes).length
  return (
    <>
      <p className="mb-3" role="status">
        {run.rows.length} checks against {sources} sources outside this program,{' '}
        {off === 0 ? 'all within their tolerance' : `${off} off`}. They have just been run in this browser.
      </p>
      {VALIDATION_TOPICS.map((topic) => (
        <Topic key={topic} topic={topic} rows={run.rows.filter((row) => row.topic === topic)} />
      ))}
    </>
  )
}
