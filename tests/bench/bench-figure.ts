/** What a measurement gives. One figure is one line of JSON on standard output. */
export interface BenchFigure {
  figure: string
  value: number
  unit: 'ms' | 'kB' | 'us'
  /** The value stays at or under this; null where we only watch. */
  goal: number | null
  /** How many runs the value is taken from. */
  runs: number
  /** Smallest and largest run, to see how far to trust the value. */
  min?: number
  max?: number
}

/** The middle value; of an even number of values the mean of the two in the middle. */
export function median(values: readonly number[]): number {
  if (values.length === 0) throw new RangeError('No values to take the median of')
  const sorted = [...values].sort((a, b) => a - b)
  const upper = sorted[Math.floor(sorted.length / 2)] ?? 0
  const lower = sorted[Math.floor((sorted.length - 1) / 2)] ?? 0
  return (lower + upper) / 2
}
