/** Prints the table of checks against published values and independent solvers. Exit status 1 when one is off. */
import { findSource } from '@shared/engineering/sources/source-registry'
import { ALL_CHECKS } from '@shared/validation/all-checks'
import { runCheck, type ValidationOutcome } from '@shared/validation/validation-check'

const number = (value: number) => String(Number(value.toPrecision(6)))

function row({ check, ours, deviation, passes }: ValidationOutcome): string {
  const isRelative = check.tolerance.kind === 'relative'
  const share = (value: number) =>
    isRelative ? `${number(value * 100)} %` : `${number(value)} ${check.unit}`.trim()
  return [
    passes ? 'ok ' : 'OFF',
    check.title,
    `${findSource(check.source).citation}, ${check.place}${check.isFromMemory ? ' (from memory)' : ''}`,
    `reference ${check.reference.map(number).join(' / ')} ${check.unit}`.trim(),
    `ours ${ours.map(number).join(' / ')}`,
    `deviation ${share(deviation)}`,
    `tolerance ${share(check.tolerance.value)}: ${check.reason}`,
  ].join(' | ')
}

const outcomes = ALL_CHECKS.map(runCheck)
for (const outcome of outcomes) process.stdout.write(`${row(outcome)}\n`)
const off = outcomes.filter((outcome) => !outcome.passes)
const sources = new Set(ALL_CHECKS.map((check) => check.source))
process.stdout.write(`${outcomes.length} checks from ${sources.size} sources, ${off.length} off\n`)
process.exitCode = off.length > 0 ? 1 : 0
