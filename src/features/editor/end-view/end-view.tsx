/** The shaft seen from one end: lobes and phase angles, directions of the loads, and both as a list. */
import { useDeferredValue, useState } from 'react'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { formatGiven, formatResult } from '@/lib/format-quantity'
import { usePreferencesStore } from '@/stores/preferences-store'
import { useSelectionStore } from '@/stores/selection-store'
import { useShownLoadCaseId } from '../shown-loads'
import { EndViewDrawing } from './end-view-drawing'
import { forceMarks, phaseMarks, type ViewedFrom } from './end-view-geometry'

const OTHER_END: Record<ViewedFrom, ViewedFrom> = { left: 'right', right: 'left' }

export function EndView({ document: newest }: { document: LayoutDocument }) {
  // The drawing has the first call on a frame while something is dragged.
  const document = useDeferredValue(newest)
  const [from, setFrom] = useState<ViewedFrom>('right')
  const units = usePreferencesStore((state) => state.units)
  const select = useSelectionStore((state) => state.select)
  const hover = useSelectionStore((state) => state.hover)
  const selectedIds = useSelectionStore((state) => state.selectedIds)
  const loadCaseId = useShownLoadCaseId(document)
  const phases = phaseMarks(document)
  const forces = forceMarks(document, loadCaseId)
  const loadCase = document.loadCases.find(({ id }) => id === loadCaseId)

  const item = (hubId: string) =>
    `flex w-full items-baseline justify-between gap-2 rounded px-1 text-left hover:bg-steel-soft ${
      selectedIds.includes(hubId) ? 'bg-steel-soft' : ''
    }`
  const handlers = (hubId: string) => ({
    onClick: () => select([hubId]),
    onPointerEnter: () => hover(hubId),
    onPointerLeave: () => hover(null),
  })

  return (
    <section aria-label="End view" className="flex h-full min-h-0 flex-col overflow-y-auto px-2 pt-2 pb-3">
      <div className="flex items-baseline justify-between gap-2">
        <h2 className="text-[13px] font-bold whitespace-nowrap">From the {from} end</h2>
        <button
          type="button"
          className="rounded text-xs font-semibold whitespace-nowrap text-steel underline"
          onClick={() => setFrom(OTHER_END[from])}
        >
          see from {OTHER_END[from]}
        </button>
      </div>
      <p className="text-[11px] text-quiet">
        Angles from the top, {from === 'left' ? 'clockwise' : 'anticlockwise'}
      </p>
      <EndViewDrawing document={document} phases={phases} forces={forces} from={from} />
      {phases.length > 0 && (
        <>
          <h3 className="mt-1 text-xs font-bold text-bronze-ink">Angles</h3>
          <ul className="text-xs tabular-nums">
            {phases.map((mark) => (
              <li key={mark.hubId}>
                <button type="button" className={item(mark.hubId)} {...handlers(mark.hubId)}>
                  <span className="min-w-0 truncate">{mark.name}</span>
                  <span className={`shrink-0 font-semibold ${mark.isOff ? 'text-bad' : ''}`}>
                    {mark.isOff && '✕ '}
                    {formatGiven(mark.phaseDeg, 'angle', units).text}
                    {mark.isOff && mark.requiredDeg !== null && (
                      <span className="font-normal">
                        , chart {formatGiven(mark.requiredDeg, 'angle', units).text}
                      </span>
                    )}
                  </span>
                </button>
              </li>
            ))}
          </ul>
        </>
      )}
      {forces.length > 0 && (
        <>
          <h3 className="mt-1.5 text-xs font-bold text-plum">Forces, {loadCase?.name}</h3>
          <ul className="text-xs tabular-nums">
            {forces.map((mark, index) => (
              <li key={`${mark.hubId}-${index}`}>
                <button type="button" className={item(mark.hubId)} {...handlers(mark.hubId)}>
                  <span className="min-w-0 truncate">{mark.name}</span>
                  <span className="shrink-0 font-semibold">
                    {formatResult(mark.forceN, 'force', units).text}
                    <span className="font-normal"> at {Math.round(mark.angleDeg)}°</span>
                  </span>
                </button>
              </li>
            ))}
          </ul>
        </>
      )}
      {phases.length === 0 && forces.length === 0 && (
        <p className="mt-2 text-xs text-quiet">No phase angles and no radial forces in this load case.</p>
      )}
    </section>
  )
}
