/**
 * One konva shape that draws with plain functions. Inside the drawing group lengths are millimetres,
 * y runs down, and `px` is how many millimetres one pixel is, for lines and marks of constant size.
 * Shapes never listen: what is under the pointer comes from tools/hit-test.
 */
import { memo } from 'react'
import { Shape } from 'react-konva/lib/ReactKonvaCore'

export type Pen = CanvasRenderingContext2D

export interface DrawnProps {
  /** Keep it stable (useCallback): a new function draws anew. */
  draw: (pen: Pen, px: number) => void
}

export const Drawn = memo(function Drawn({ draw }: DrawnProps) {
  return (
    <Shape
      listening={false}
      perfectDrawEnabled={false}
      sceneFunc={(context, shape) => {
        const pen = context._context
        pen.save()
        draw(pen, 1 / shape.getAbsoluteScale().x)
        pen.restore()
      }}
    />
  )
})
