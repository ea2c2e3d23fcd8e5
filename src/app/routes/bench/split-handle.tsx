/** The edge between two regions: dragged with the pointer, moved with the arrow keys, closed with Enter. */
import { type KeyboardEvent, type PointerEvent, useRef } from 'react'
import { REGION_LIMITS_PX, type SizedRegionId, useBenchRegions } from './bench-regions'

const KEY_STEP_PX = 24

export function SplitHandle({
  region,
  label,
  direction,
}: {
  /** The region after the edge: it grows when the edge moves up or left. */
  region: SizedRegionId
  label: string
  direction: 'row' | 'column'
}) {
  const sizePx = useBenchRegions((state) => state.sizePx[region])
  const resize = useBenchRegions((state) => state.resize)
  const toggle = useBenchRegions((state) => state.toggle)
  const from = useRef<{ pointerPx: number; sizePx: number } | null>(null)
  const isRow = direction === 'row'
  const along = (event: PointerEvent) => (isRow ? event.clientY : event.clientX)

  const onKeyDown = (event: KeyboardEvent) => {
    const grow = isRow ? 'ArrowUp' : 'ArrowLeft'
    const shrink = isRow ? 'ArrowDown' : 'ArrowRight'
    if (event.key === grow) resize(region, sizePx + KEY_STEP_PX)
    else if (event.key === shrink) resize(region, sizePx - KEY_STEP_PX)
    else if (event.key === 'Enter') toggle(region)
    else return
    event.preventDefault()
    event.stopPropagation()
  }

  return (
    <div
      role="separator"
      tabIndex={0}
      aria-label={label}
      aria-orientation={isRow ? 'horizontal' : 'vertical'}
      aria-valuenow={sizePx}
      aria-valuemin={REGION_LIMITS_PX[region].least}
      aria-valuemax={REGION_LIMITS_PX[region].most}
      className={`group relative z-10 shrink-0 touch-none ${
        isRow ? '-my-1 h-2 cursor-row-resize' : '-mx-1 w-2 cursor-col-resize'
      }`}
      onPointerDown={(event) => {
        event.currentTarget.setPointerCapture(event.pointerId)
        from.current = { pointerPx: along(event), sizePx }
      }}
      onPointerMove={(event) => {
        if (from.current) resize(region, from.current.sizePx + from.current.pointerPx - along(event))
      }}
      onPointerUp={() => {
        from.current = null
      }}
      onPointerCancel={() => {
        from.current = null
      }}
      onKeyDown={onKeyDown}
    >
      <span
        className={`absolute bg-hairline group-hover:bg-steel group-focus-visible:bg-steel ${
          isRow ? 'inset-x-0 top-1/2 h-px group-hover:h-0.5' : 'inset-y-0 left-1/2 w-px group-hover:w-0.5'
        }`}
      />
    </div>
  )
}
