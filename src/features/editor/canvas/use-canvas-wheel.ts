/**
 * A mouse wheel zooms at the pointer, as does a pinch on a trackpad (which browsers report as wheel
 * with Control). Two fingers on a trackpad, and the wheel with Shift, scroll.
 */
import { type RefObject, useEffect } from 'react'
import { useViewStore } from '../view-store'

/** Notches of a wheel come in whole hundreds or in lines; trackpads send small and slanted steps. */
const isWheelNotch = (event: WheelEvent) =>
  event.deltaMode !== WheelEvent.DOM_DELTA_PIXEL ||
  (event.deltaX === 0 && Number.isInteger(event.deltaY) && Math.abs(event.deltaY) >= 60)

const LINE_PX = 24

export function useCanvasWheel(target: RefObject<HTMLElement | null>): void {
  useEffect(() => {
    const element = target.current
    if (!element) return
    const onWheel = (event: WheelEvent) => {
      event.preventDefault()
      const { zoom, pan } = useViewStore.getState()
      const unit = event.deltaMode === WheelEvent.DOM_DELTA_PIXEL ? 1 : LINE_PX
      const dx = event.deltaX * unit
      const dy = event.deltaY * unit
      if (event.shiftKey) return pan(-(dx || dy), 0)
      if (!event.ctrlKey && !event.metaKey && !isWheelNotch(event)) return pan(-dx, -dy)
      const box = element.getBoundingClientRect()
      const speed = event.ctrlKey && !isWheelNotch(event) ? 0.01 : 0.0016
      const factor = Math.exp(-Math.min(240, Math.max(-240, dy)) * speed)
      zoom(factor, event.clientX - box.left, event.clientY - box.top)
    }
    element.addEventListener('wheel', onWheel, { passive: false })
    return () => element.removeEventListener('wheel', onWheel)
  }, [target])
}
