/**
 * Other people on the drawing: their pointers with names, what they have selected, and the ghost of
 * what they drag. Plain SVG over the canvas, so that a moving cursor redraws no part.
 */
import { memo } from 'react'
import { presenceColour } from '@/components/presence-colours'
import { heightToPx, stationToPx, type ViewTransform } from '@/lib/view-transform'
import type { PresenceState } from '@shared/protocol/realtime'
import { editingWords, firstName } from './presence-words'
import { useOtherWindows } from './use-others'

export interface OverlayExtent {
  leftMm: number
  rightMm: number
  outerRadiusMm: number
}

interface PresenceOverlayProps {
  view: ViewTransform
  /** Where a part lies on the layout this person sees; null when it is not there. */
  extentOf: (partId: string) => OverlayExtent | null
}

export function PresenceOverlay({ view, extentOf }: PresenceOverlayProps) {
  const others = useOtherWindows()
  if (others.length === 0) return null
  return (
    <svg aria-hidden="true" className="pointer-events-none absolute inset-0 size-full overflow-hidden">
      {others.map((window) => (
        <Selections key={window.connectionId} window={window} view={view} extentOf={extentOf} />
      ))}
      {others.map(
        (window) =>
          window.cursor && (
            <Cursor
              key={window.connectionId}
              x={stationToPx(view, window.cursor.xMm)}
              y={heightToPx(view, window.cursor.yMm)}
              colour={presenceColour(window.colourIndex)}
              words={[firstName(window.name), editingWords(window.editing)].filter(Boolean).join(', ')}
            />
          ),
      )}
    </svg>
  )
}

function Selections({ window, view, extentOf }: PresenceOverlayProps & { window: PresenceState }) {
  const colour = presenceColour(window.colourIndex)
  const isEditingWithoutCursor = window.cursor === null && window.editing !== null
  return (
    <>
      {window.selection.map((partId, index) => {
        const extent = extentOf(partId)
        if (!extent) return null
        const box = boxOf(extent, view, 6)
        return (
          <g key={partId}>
            <rect {...box} rx={4} fill="none" stroke={colour} strokeWidth={1.6} strokeDasharray="6 3" />
            {index === 0 && isEditingWithoutCursor && (
              <Tag
                x={box.x}
                y={box.y + box.height + 3}
                colour={colour}
                words={`${firstName(window.name)}, ${editingWords(window.editing) ?? ''}`}
              />
            )}
          </g>
        )
      })}
      {window.ghost && <Ghost window={window} view={view} extentOf={extentOf} />}
    </>
  )
}

/** Where the part is in their hand; it moves on this screen when they let go. */
function Ghost({ window, view, extentOf }: PresenceOverlayProps & { window: PresenceState }) {
  const { ghost } = window
  const extent = ghost && extentOf(ghost.part)
  if (!ghost || !extent) return null
  const colour = presenceColour(window.colourIndex)
  const box = boxOf(
    { ...extent, leftMm: ghost.stationMm, rightMm: ghost.stationMm + ghost.lengthMm },
    view,
    0,
  )
  return (
    <g>
      <rect
        {...box}
        fill={colour}
        fillOpacity={0.16}
        stroke={colour}
        strokeWidth={1.6}
        strokeDasharray="4 3"
      />
      <Tag
        x={box.x}
        y={box.y + box.height + 3}
        colour={colour}
        words={`${firstName(window.name)}, ${Math.round(ghost.stationMm * 10) / 10} mm`}
      />
    </g>
  )
}

const boxOf = (extent: OverlayExtent, view: ViewTransform, marginPx: number) => ({
  x: stationToPx(view, extent.leftMm) - marginPx,
  y: heightToPx(view, extent.outerRadiusMm) - marginPx,
  width: Math.max(1, (extent.rightMm - extent.leftMm) * view.pxPerMm + 2 * marginPx),
  height: 2 * extent.outerRadiusMm * view.pxPerMm + 2 * marginPx,
})

const Cursor = memo(function Cursor({
  x,
  y,
  colour,
  words,
}: {
  x: number
  y: number
  colour: string
  words: string
}) {
  return (
    // Others send twenty times a second; gliding between is easier on the eye than jumping.
    <g style={{ transform: `translate(${x}px, ${y}px)`, transition: 'transform 60ms linear' }}>
      <path d="M0 0 3.4 14.5 6.6 9.6 12.4 8.6z" fill={colour} stroke="#fffefb" strokeWidth={1.2} />
      <Tag x={12} y={12} colour={colour} words={words} />
    </g>
  )
})

function Tag({ x, y, colour, words }: { x: number; y: number; colour: string; words: string }) {
  // Manrope at 11.5 px is close to 6.4 px a letter; the ground may be a little wide, never short.
  const width = words.length * 6.5 + 14
  return (
    <g>
      <rect x={x} y={y} width={width} height={19} rx={4} fill={colour} />
      <text x={x + 7} y={y + 13.2} fill="#ffffff" fontSize={11.5} fontWeight={700}>
        {words}
      </text>
    </g>
  )
}
