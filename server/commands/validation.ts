/** Prints the table of checks against published values and independent solvers. Exit status 1 when one is off. */
import { validationRows } from '@shared/validation/validation-rows'
import type { ValidationRow } from '@shared/validation/worker-messages'

const number = (value: number) => String(Number(value.toPrecision(6)))

function line(row: ValidationRow): string {
  const isRelative = row.tolerance.kind === 'relative'
  const share = (value: number) =>
    isRelative ? `${number(value * 100)} %` : `${number(value)} ${row.unit}`.trim()
  return [
    row.passes ? 'ok ' : 'OFF',
    row.title,
    `${row.citation}, ${row.place}${row.isFromMemory ? ' (from memory)' : ''}`,
    `reference ${row.reference.map(number).join(' / ')} ${row.unit}`.trim(),
    `ours ${row.ours.map(number).join(' / ')}`,
    `deviation ${share(row.deviation)}`,
    `tolerance ${share(row.tolerance.value)}: ${row.reason}`,
  ].join(' | ')
}

const rows = validationRows()
for (const row of rows) process.stdout.write(`${line(row)}\n`)
const off = rows.filter((row) => !row.passes)
const sources = new Set(rows.map((row) => row.citation))
process.stdout.write(`${rows.length} checks from ${sources.size} sources, ${off.length} off\n`)
process.exitCode = off.length > 0 ? 1 : 0
