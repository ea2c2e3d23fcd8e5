/**
 * Carries out what the tools ask for: previews and edits through the session, selection, pan. It
 * handles at most one pointer move a frame, so a fast mouse does not queue work, and repeats the
 * last move when a modifier key changes, so that Alt and Shift act at once.
 */
import { newPartId } from '@shared/layout/new-ids'
import { useLayoutStore } from '@/stores/layout-store'
import { useSelectionStore } from '@/stores/selection-store'
import type { LayoutSession } from '@/sync/layout-session'
import { commitEdit } from './commit-edit'
import { shownLoadCaseId } from './shown-loads'
import { useToolStore } from './tool-store'
import { partExtent } from './tools/part'
import type { Modifiers, ToolContext, ToolEffect, ToolEvent, ToolId, ToolPointer } from './tools/tool'
import { READING_TOOLS, type RunningTool, startTool } from './tools/tool-runner'
import { useViewStore } from './view-store'

export interface ToolDriver {
  takeUp: (id: ToolId) => void
  pointer: (type: 'down' | 'move' | 'up', pointer: ToolPointer) => void
  leave: () => void
  /** Escape. Answers whether a drag was in progress that it has put back. */
  cancel: () => boolean
  modifiers: (modifiers: Modifiers) => void
  /** While the space bar or the middle button is held, every tool pans. */
  holdPan: (isHeld: boolean) => void
  dispose: () => void
}

function toolContext(): ToolContext | null {
  const { visible, access } = useLayoutStore.getState()
  if (!visible) return null
  return {
    document: visible,
    canEdit: access?.canEdit ?? false,
    selectedIds: useSelectionStore.getState().selectedIds,
    loadCaseId: shownLoadCaseId(visible),
    hubRole: useToolStore.getState().hubRole,
    mmPerPx: 1 / useViewStore.getState().view.pxPerMm,
    newPartId,
  }
}

export function createToolDriver(session: LayoutSession): ToolDriver {
  let tool: RunningTool = startTool('select')
  let heldPan: RunningTool | null = null
  let isPressed = false
  let waitingMove: ToolPointer | null = null
  let lastPointer: ToolPointer | null = null
  let frame = 0
  let hasPreview = false

  const active = () => heldPan ?? tool

  const showDisplay = () => {
    const display = active().display()
    useToolStore.setState({ display, toolId: tool.id })
    shareGhost(display.movingIds)
  }

  let hasGhost = false
  const shareGhost = (movingIds: readonly string[]) => {
    const { visible } = useLayoutStore.getState()
    const [first] = movingIds
    const extent = first !== undefined && visible && hasPreview ? partExtent(visible, first) : null
    if (!extent) {
      if (hasGhost) session.updatePresence({ ghost: null })
      hasGhost = false
      return
    }
    hasGhost = true
    session.updatePresence({
      ghost: { part: extent.id, stationMm: extent.leftMm, lengthMm: extent.rightMm - extent.leftMm },
    })
  }

  const carryOut = (effect: ToolEffect) => {
    const selection = useSelectionStore.getState()
    switch (effect.type) {
      case 'select':
        return selection.select(effect.ids)
      case 'toggle':
        return selection.toggle(effect.id)
      case 'hover':
        return selection.hover(effect.id)
      case 'preview':
        hasPreview = true
        return session.setPreview(effect.label, effect.operations)
      case 'dropPreview':
        hasPreview = false
        return session.clearPreview()
      case 'commit':
        hasPreview = false
        commitEdit(session, effect.label, effect.operations)
        return undefined
      case 'pan':
        return useViewStore.getState().pan(effect.dxPx, effect.dyPx)
      case 'finish':
        if (tool.id !== 'select') tool = startTool('select')
        return undefined
    }
  }

  const send = (event: ToolEvent) => {
    const context = toolContext()
    if (!context) return
    for (const effect of active().send(event, context)) carryOut(effect)
    showDisplay()
  }

  const flushMove = () => {
    cancelAnimationFrame(frame)
    frame = 0
    const pointer = waitingMove
    waitingMove = null
    if (pointer) send({ type: 'move', pointer })
  }

  const putBack = () => {
    const wasBusy = isPressed || hasPreview
    send({ type: 'cancel' })
    isPressed = false
    return wasBusy
  }

  return {
    takeUp(id) {
      const canEdit = useLayoutStore.getState().access?.canEdit ?? false
      if (tool.id === id || (!canEdit && !READING_TOOLS.includes(id))) return
      if (isPressed) putBack()
      tool = startTool(id)
      showDisplay()
    },
    pointer(type, pointer) {
      lastPointer = pointer
      if (type === 'move') {
        waitingMove = pointer
        if (frame === 0) frame = requestAnimationFrame(flushMove)
        return
      }
      flushMove()
      isPressed = type === 'down'
      send({ type, pointer })
    },
    leave() {
      waitingMove = null
      send({ type: 'leave' })
    },
    cancel: putBack,
    modifiers(modifiers) {
      if (!lastPointer || !isPressed) return
      lastPointer = { ...lastPointer, ...modifiers }
      send({ type: 'move', pointer: lastPointer })
    },
    holdPan(isHeld) {
      if (isHeld === (heldPan !== null)) return
      // A drag in hand is finished first; the space bar then does nothing.
      if (isHeld && isPressed) return
      heldPan = isHeld ? startTool('pan') : null
      showDisplay()
    },
    dispose() {
      cancelAnimationFrame(frame)
      if (hasPreview) session.clearPreview()
      useToolStore.setState({ toolId: 'select', display: startTool('select').display() })
    },
  }
}
