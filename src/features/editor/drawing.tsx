/** The drawing with what floats over it: tools, view, the menu of a part, the hint of the tool in hand. */
import { type ReactNode, useCallback, useState } from 'react'
import type { LayoutDocument } from '@shared/layout/layout-document'
import { useLayoutSession } from '@/lib/layout-session-context'
import type { ViewTransform } from '@/lib/view-transform'
import { useLayoutStore } from '@/stores/layout-store'
import { useBenchActions } from './bench-actions'
import { LayoutCanvas } from './canvas/layout-canvas'
import { PartMenu } from './toolbar/part-menu'
import { StatusLine } from './toolbar/status-line'
import { ToolList } from './toolbar/tool-list'
import { ViewControls } from './toolbar/view-controls'
import { partExtent, type PartExtent } from './tools/part'
import { useViewStore } from './view-store'

/** What another feature needs to lay its own marks over the drawing. */
export interface DrawingPlace {
  view: ViewTransform
  extentOf: (partId: string) => PartExtent | null
}

interface DrawingProps {
  document: LayoutDocument
  /** Buttons beside zoom, such as the choice of regions. */
  viewExtras?: ReactNode
  /** A page that scrolls under a finger keeps vertical swipes for itself. */
  letsPageScroll?: boolean
  overlay?: (place: DrawingPlace) => ReactNode
}

export function Drawing({ document, viewExtras, letsPageScroll = false, overlay }: DrawingProps) {
  const session = useLayoutSession()
  const { driver } = useBenchActions()
  const view = useViewStore((state) => state.view)
  const [menuPlace, setMenuPlace] = useState<{ xPx: number; yPx: number } | null>(null)
  const shareCursor = useCallback(
    (cursor: { xMm: number; yMm: number } | null) => session.updatePresence({ cursor }),
    [session],
  )
  const closeMenu = useCallback(() => setMenuPlace(null), [])
  const extentOf = useCallback((partId: string) => partExtent(document, partId), [document])

  return (
    <div className="flex min-h-0 min-w-0 flex-1 flex-col">
      <div className="relative flex min-h-0 min-w-0 flex-1">
        <LayoutCanvas
          document={document}
          driver={driver}
          onCursor={shareCursor}
          onContextMenu={setMenuPlace}
          letsPageScroll={letsPageScroll}
        >
          {overlay?.({ view, extentOf })}
        </LayoutCanvas>
        <ToolList />
        {document.shaft.sections.length === 0 && <EmptyShaft />}
        {menuPlace && <PartMenu place={menuPlace} onClose={closeMenu} />}
      </div>
      <div className="flex h-9 shrink-0 items-center gap-3 border-t border-hairline pr-1 pl-3">
        <StatusLine document={document} />
        <ViewControls>{viewExtras}</ViewControls>
      </div>
    </div>
  )
}

function EmptyShaft() {
  const canEdit = useLayoutStore((state) => state.access?.canEdit ?? false)
  return (
    <p className="pointer-events-none absolute inset-x-32 top-1/4 text-center text-sm text-quiet">
      {canEdit
        ? 'There is no shaft yet. Take the section tool (S) and draw its first section to the right of station 0.'
        : 'There is no shaft yet.'}
    </p>
  )
}
