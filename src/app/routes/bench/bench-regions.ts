/** Which regions of the bench are open and how large they are. Kept in the browser, per person and device. */
import { create } from 'zustand'

export type RegionId = 'outline' | 'endView' | 'diagrams' | 'inspector' | 'tables'
export type SizedRegionId = 'diagrams' | 'inspector' | 'tables'

interface Regions {
  open: Record<RegionId, boolean>
  /** Height of diagrams and tables, width of the inspector. */
  sizePx: Record<SizedRegionId, number>
}

interface RegionsState extends Regions {
  toggle: (id: RegionId) => void
  show: (id: RegionId) => void
  resize: (id: SizedRegionId, sizePx: number) => void
}

const STORAGE_KEY = 'hubstead.bench-regions'

export const REGION_LIMITS_PX: Record<SizedRegionId, { least: number; most: number }> = {
  diagrams: { least: 90, most: 520 },
  inspector: { least: 260, most: 560 },
  tables: { least: 110, most: 640 },
}

/** What fits the window the bench is first opened in. */
function firstRegions(): Regions {
  const isWide = window.innerWidth >= 1280
  const isTall = window.innerHeight >= 850
  return {
    open: { outline: false, endView: isWide, diagrams: true, inspector: true, tables: true },
    sizePx: { diagrams: isTall ? 172 : 128, inspector: isWide ? 356 : 288, tables: isTall ? 216 : 152 },
  }
}

function load(): Regions {
  const first = firstRegions()
  try {
    const stored = JSON.parse(localStorage.getItem(STORAGE_KEY) ?? '{}') as Partial<Regions>
    for (const id of Object.keys(first.open) as RegionId[]) {
      if (typeof stored.open?.[id] === 'boolean') first.open[id] = stored.open[id]
    }
    for (const id of Object.keys(first.sizePx) as SizedRegionId[]) {
      const size = stored.sizePx?.[id]
      if (typeof size === 'number' && Number.isFinite(size)) first.sizePx[id] = clamp(id, size)
    }
  } catch {
    // Storage forbidden or damaged: the first sizes serve.
  }
  return first
}

function save({ open, sizePx }: Regions): void {
  try {
    localStorage.setItem(STORAGE_KEY, JSON.stringify({ open, sizePx }))
  } catch {
    // The choice then lasts until the page is left.
  }
}

const clamp = (id: SizedRegionId, sizePx: number) =>
  Math.round(Math.min(REGION_LIMITS_PX[id].most, Math.max(REGION_LIMITS_PX[id].least, sizePx)))

export const useBenchRegions = create<RegionsState>()((set, get) => ({
  ...load(),
  toggle: (id) => {
    set((state) => ({ open: { ...state.open, [id]: !state.open[id] } }))
    save(get())
  },
  show: (id) => {
    if (get().open[id]) return
    set((state) => ({ open: { ...state.open, [id]: true } }))
    save(get())
  },
  resize: (id, sizePx) => {
    set((state) => ({ sizePx: { ...state.sizePx, [id]: clamp(id, sizePx) } }))
    save(get())
  },
}))
