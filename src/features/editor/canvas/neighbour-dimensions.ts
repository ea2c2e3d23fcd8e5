/** The live dimensions while something moves: its own length and the gaps to what lies left and right of it. */
import type { LayoutDocument } from '@shared/layout/layout-document'
import { totalLengthMm } from '@shared/layout/shaft-geometry'
import { partExtent, type PartExtent, partExtents, roundMm } from '../tools/part'

export interface LiveDimension {
  fromMm: number
  toMm: number
  kind: 'own' | 'gap' | 'overlap'
}

const SAME_PLACE_MM = 1e-6

export function neighbourDimensions(
  document: LayoutDocument,
  movingIds: readonly string[],
): { dimensions: LiveDimension[]; radiusMm: number } | null {
  const moving = movingIds.flatMap((id) => partExtent(document, id) ?? [])
  const [first] = moving
  if (!first) return null
  const radiusMm = Math.max(...moving.map((part) => part.outerRadiusMm))
  const own = moving.map((part): LiveDimension => ({ fromMm: part.leftMm, toMm: part.rightMm, kind: 'own' }))
  if (first.kind === 'section') return { dimensions: own, radiusMm }

  const leftMm = Math.min(...moving.map((part) => part.leftMm))
  const rightMm = Math.max(...moving.map((part) => part.rightMm))
  const others = partExtents(document).filter(
    (part) => part.kind !== 'section' && !movingIds.includes(part.id),
  )
  const overlapping = others.filter((part) => overlapMm(part, leftMm, rightMm) > SAME_PLACE_MM)
  const leftOnes = others.filter((part) => part.rightMm <= leftMm + SAME_PLACE_MM)
  const rightOnes = others.filter((part) => part.leftMm >= rightMm - SAME_PLACE_MM)
  const leftNeighbour = Math.max(0, ...leftOnes.map((part) => part.rightMm))
  const rightNeighbour = Math.min(totalLengthMm(document), ...rightOnes.map((part) => part.leftMm))
  const dimensions = [...own]
  if (leftMm - leftNeighbour > SAME_PLACE_MM && !overlapping.some((part) => part.leftMm < leftMm)) {
    dimensions.push({ fromMm: leftNeighbour, toMm: leftMm, kind: 'gap' })
  }
  if (rightNeighbour - rightMm > SAME_PLACE_MM && !overlapping.some((part) => part.rightMm > rightMm)) {
    dimensions.push({ fromMm: rightMm, toMm: rightNeighbour, kind: 'gap' })
  }
  for (const part of overlapping) {
    dimensions.push({
      fromMm: Math.max(part.leftMm, leftMm),
      toMm: Math.min(part.rightMm, rightMm),
      kind: 'overlap',
    })
  }
  return {
    dimensions: dimensions.map((dimension) => ({
      ...dimension,
      fromMm: roundMm(dimension.fromMm),
      toMm: roundMm(dimension.toMm),
    })),
    radiusMm,
  }
}

const overlapMm = (part: PartExtent, leftMm: number, rightMm: number) =>
  Math.min(part.rightMm, rightMm) - Math.max(part.leftMm, leftMm)
