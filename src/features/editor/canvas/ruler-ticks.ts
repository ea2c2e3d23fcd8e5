/** Where the ruler has its marks: whole steps of 1, 2 or 5 in the unit on screen, never closer than readable. */
import type { ViewTransform } from '@/lib/view-transform'

export interface RulerTick {
  stationMm: number
  /** Null on the short marks. */
  label: string | null
}

const MIN_LABEL_GAP_PX = 58
const MM_PER_INCH = 25.4

function wholeStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least))
  return [1, 2, 5, 10].map((digit) => digit * power).find((step) => step >= least) ?? 10 * power
}

export function rulerTicks(view: ViewTransform, widthPx: number, isInch: boolean): RulerTick[] {
  const mmPerUnit = isInch ? MM_PER_INCH : 1
  const pxPerUnit = view.pxPerMm * mmPerUnit
  if (!(pxPerUnit > 0) || widthPx <= 0) return []
  const step = wholeStep(MIN_LABEL_GAP_PX / pxPerUnit)
  const divisions = (step * pxPerUnit) / 10 >= 5 ? 10 : 5
  const small = step / divisions
  const first = Math.ceil(-view.originXPx / pxPerUnit / small)
  const last = Math.floor((widthPx - view.originXPx) / pxPerUnit / small)
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9))
  const ticks: RulerTick[] = []
  for (let index = first; index <= last; index += 1) {
    const isLabelled = index % divisions === 0
    ticks.push({
      stationMm: index * small * mmPerUnit,
      label: isLabelled ? (index * small).toFixed(decimals).replace('-', '−') : null,
    })
  }
  return ticks
}
