/**
 * Torque, bending, deflection and equivalent stress under the section, over the same stations at
 * the same zoom. While the layout has moved on they are marked as old.
 */
import { type PointerEvent, type ReactNode, useEffect, useRef, useState } from 'react'
import { useDerivationStore } from '@/stores/derivation-store'
import { pxToStation } from '@/lib/view-transform'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useResultsStore } from '@/stores/results-store'
import { shownShaftCase } from '@/stores/shown-load-case'
import { useViewStore } from '../view-store'
import { DiagramRow } from './diagram-row'
import { diagramSeries } from './diagram-series'

/** Results follow a drag within a frame or two; only what lasts longer is worth saying. */
const STALE_AFTER_MS = 300

/** Old only when no newer numbers came meanwhile: during a drag they keep coming. */
function useIsOld(isStale: boolean, calculated: unknown): boolean {
  const [isOld, setIsOld] = useState(false)
  useEffect(() => {
    if (!isStale) return
    const timer = setTimeout(() => setIsOld(true), STALE_AFTER_MS)
    return () => {
      clearTimeout(timer)
      setIsOld(false)
    }
  }, [isStale, calculated])
  return isStale && isOld
}

function useHeight() {
  const target = useRef<HTMLDivElement>(null)
  const [heightPx, setHeightPx] = useState(0)
  useEffect(() => {
    const element = target.current
    if (!element) return
    const observer = new ResizeObserver(
      ([entry]) => entry && setHeightPx(Math.floor(entry.contentRect.height)),
    )
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  return { target, heightPx }
}

const MIN_ROW_PX = 29

export function Diagrams() {
  const { target, heightPx } = useHeight()
  const [showPlanes, setShowPlanes] = useState(false)
  const results = useResultsStore((state) => state.results)
  const document = useResultsStore((state) => state.document)
  const selected = useResultsStore((state) => state.selectedLoadCaseId)
  const isOld = useIsOld(
    useResultsStore((state) => state.isStale),
    document,
  )
  const failure = useResultsStore((state) => state.failure)
  const view = useViewStore((state) => state.view)
  const widthPx = useViewStore((state) => state.widthPx)
  const hoverStationMm = useViewStore((state) => state.hoverStationMm)
  const units = usePreferencesStore((state) => state.units)
  const open = useDerivationStore((state) => state.open)

  const shown = results && shownShaftCase(results, selected)
  const caseName = document?.loadCases.find(({ id }) => id === shown?.loadCase)?.name ?? shown?.loadCase ?? ''
  const series = shown ? diagramSeries(shown.diagrams) : []
  const rowPx = Math.max(MIN_ROW_PX, Math.floor(heightPx / 4) - 2)

  const onPointerMove = (event: PointerEvent<HTMLElement>) => {
    const box = event.currentTarget.getBoundingClientRect()
    useViewStore.getState().hoverStation(pxToStation(view, event.clientX - box.left))
  }

  return (
    <section
      ref={target}
      aria-label="Diagrams along the shaft"
      aria-busy={isOld}
      className="relative min-h-0 flex-1 overflow-x-hidden overflow-y-auto"
      onPointerMove={onPointerMove}
      onPointerLeave={() => useViewStore.getState().hoverStation(null)}
    >
      {shown === null || shown.diagrams.stationMm.length === 0 ? (
        <Note>
          {failure !== null
            ? `No diagrams: ${failure}`
            : results === null
              ? 'Calculating…'
              : 'Diagrams need at least two bearings and a load case.'}
        </Note>
      ) : (
        <div className={`flex flex-col gap-0.5 ${isOld ? 'opacity-40' : ''}`}>
          {series.map((entry) => (
            <DiagramRow
              key={entry.id}
              series={entry}
              stationMm={shown.diagrams.stationMm}
              view={view}
              widthPx={widthPx}
              heightPx={rowPx}
              hoverStationMm={hoverStationMm}
              showPlanes={showPlanes}
              units={units}
              caseName={caseName}
              onOpen={() => open({ kind: 'shaftCase', loadCase: shown.loadCase, quantity: entry.opens })}
            />
          ))}
        </div>
      )}
      {shown !== null && shown.diagrams.stationMm.length > 0 && (
        <div className="absolute top-0.5 right-3 flex items-center gap-2 text-[11px] font-semibold text-quiet">
          {isOld && <span className="rounded bg-paper/85 px-1.5">updating…</span>}
          <label className="flex items-center gap-1 rounded bg-paper/85 px-1.5">
            <input
              type="checkbox"
              checked={showPlanes}
              className="size-3 accent-steel"
              onChange={(event) => setShowPlanes(event.target.checked)}
            />
            planes
          </label>
        </div>
      )}
    </section>
  )
}

function Note({ children }: { children: ReactNode }) {
  return <p className="px-4 py-6 text-center text-sm text-quiet">{children}</p>
}
