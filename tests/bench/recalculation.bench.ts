/** Recalculation of a layout with 30 hubs, 6 sections and 5 load cases: from nothing, and with one hub moved. */
import { recalculateLayout } from '@shared/recalculation/recalculate-layout'
import { generatedLayout } from '../support/generated-layout'
import { median, type BenchFigure } from './bench-figure'

const SIZE = { hubs: 30, sections: 6, loadCases: 5 }
const WARM_UP_RUNS = 60
const RUNS = 41

function timed(run: () => void): number {
  const start = performance.now()
  run()
  return performance.now() - start
}

function figure(name: string, goal: number, values: number[]): BenchFigure {
  return {
    figure: name,
    value: Number(median(values).toFixed(2)),
    unit: 'ms',
    goal,
    runs: values.length,
    min: Number(Math.min(...values).toFixed(2)),
    max: Number(Math.max(...values).toFixed(2)),
  }
}

export function measure(): BenchFigure[] {
  // every variant differs in every hub, so that no cached part of an earlier run can be used
  const variants = Array.from({ length: WARM_UP_RUNS + RUNS }, (_, index) =>
    generatedLayout({ ...SIZE, variant: index + 1 }),
  )
  const cold = variants.map((variant) => timed(() => recalculateLayout(variant))).slice(WARM_UP_RUNS)

  const still = generatedLayout(SIZE)
  recalculateLayout(still)
  const moved = Array.from({ length: WARM_UP_RUNS + RUNS }, (_, index) => ({
    ...still,
    hubs: still.hubs.map((hub, position) =>
      position === 7 ? { ...hub, stationMm: hub.stationMm + (index + 1) / 100 } : hub,
    ),
  }))
  const warm = moved.map((document) => timed(() => recalculateLayout(document))).slice(WARM_UP_RUNS)
  return [
    figure('recalculation of 30 hubs, 6 sections, 5 load cases, nothing cached', 8, cold),
    figure('recalculation of the same layout with one hub moved', 8, warm),
  ]
}
