/** What the schedule shows of each hub, and how its rows are put in order. */
import type { Sorting } from '@/components/data-table'
import { shownHubCase } from '@/stores/shown-load-case'
import type { Hub, LayoutDocument } from '@shared/layout/layout-document'
import type { HubLoadCaseResult, HubResult, LayoutResults } from '@shared/recalculation/layout-results'

export interface ScheduleRow {
  hub: Hub
  /** Place along the layout's own list, from 1. */
  number: number
  result: HubResult | null
  shown: HubLoadCaseResult | null
}

export type ScheduleColumn =
  | 'number'
  | 'name'
  | 'station'
  | 'length'
  | 'outerDiameter'
  | 'seatDiameter'
  | 'interference'
  | 'slip'
  | 'torque'
  | 'axial'
  | 'hubStress'
  | 'joining'
  | 'order'

export function scheduleRows(
  layout: LayoutDocument,
  results: LayoutResults | null,
  selectedLoadCase: string | null,
): ScheduleRow[] {
  return layout.hubs.map((hub, index) => {
    const result = results?.hubs.find(({ id }) => id === hub.id) ?? null
    return {
      hub,
      number: index + 1,
      result,
      shown: result === null ? null : shownHubCase(result, selectedLoadCase),
    }
  })
}

const KEYS: Record<ScheduleColumn, (row: ScheduleRow) => number | string | null> = {
  number: ({ number }) => number,
  name: ({ hub }) => hub.name,
  station: ({ hub }) => hub.stationMm,
  length: ({ hub }) => hub.lengthMm,
  outerDiameter: ({ hub }) => hub.outerDiameterMm,
  seatDiameter: ({ result }) => result?.seat.diameterMm ?? null,
  interference: ({ result }) => result?.interference.minUm ?? null,
  slip: ({ shown }) => shown?.slipSafety ?? null,
  torque: ({ shown }) => shown?.torqueSafety ?? null,
  axial: ({ shown }) => shown?.axialSafety ?? null,
  hubStress: ({ shown }) => shown?.hubYieldSafety ?? null,
  joining: ({ result }) => result?.assembly.ovenC ?? null,
  order: ({ result }) => result?.assembly.order ?? null,
}

/** Rows without a value stay at the end in both directions; equal rows keep the layout's order. */
export function sortRows(
  rows: readonly ScheduleRow[],
  { key, direction }: Sorting<ScheduleColumn>,
): ScheduleRow[] {
  const valueOf = KEYS[key]
  const sign = direction === 'ascending' ? 1 : -1
  return [...rows].sort((one, other) => {
    const a = valueOf(one)
    const b = valueOf(other)
    if (a === null || b === null) return a === b ? one.number - other.number : a === null ? 1 : -1
    const compared =
      typeof a === 'string' || typeof b === 'string'
        ? String(a).localeCompare(String(b), 'en', { numeric: true, sensitivity: 'base' })
        : a - b
    return compared === 0 ? one.number - other.number : sign * compared
  })
}
