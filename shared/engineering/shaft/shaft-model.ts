/** The stepped shaft as the beam sees it. Axes: x along the shaft, y up, z completing a right-handed system. */
import { EngineeringInputError, requirePositive } from '../engineering-input-error'
import type { Material } from '../materials/material'
import type { Force, Length, Mass, Moment, MomentOfInertia, Stiffness } from '../quantities/quantity'

/** A length of constant section. Segments follow one another without gaps. */
export interface ShaftSegment {
  start: Length
  end: Length
  outerDiameter: Length
  bore: Length
}

export interface ShaftModel {
  segments: readonly ShaftSegment[]
  material: Material
}

/** A bearing idealised as a point support in both planes; no stiffness means rigid. */
export interface Support {
  station: Length
  stiffness: Stiffness | null
}

/** What one part puts on the shaft at one station. */
export interface ShaftLoad {
  station: Length
  /** Positive when the part drives the shaft. */
  torque: Moment
  forceY: Force
  forceZ: Force
  /** Positive towards +x. */
  axialForce: Force
  /** Moments about the y and z axes, right-handed. */
  momentY: Moment
  momentZ: Moment
}

/** A mass carried by the shaft at one station. */
export interface CarriedMass {
  station: Length
  mass: Mass
  /** About a diameter; lowers lateral frequencies. */
  diametralInertia: MomentOfInertia
  /** About the shaft axis; counts for torsion. */
  polarInertia: MomentOfInertia
}

/** Station of the right end: the length of the shaft. */
export function shaftLength(model: ShaftModel): number {
  return model.segments.at(-1)?.end ?? 0
}

/** The segment at a station; at a step the one on the side asked for. */
export function segmentAt(
  model: ShaftModel,
  station: number,
  side: 'left' | 'right',
): ShaftSegment | undefined {
  const { segments } = model
  return side === 'left'
    ? (segments.find((segment) => station <= segment.end) ?? segments.at(-1))
    : (segments.find((segment) => station < segment.end) ?? segments.at(-1))
}

/** Refuses shafts that have no length or no wall. */
export function requireShaft(model: ShaftModel): void {
  if (model.segments.length === 0)
    throw new EngineeringInputError('emptyShaft', 'shaft.segments', 'The shaft has no sections')
  model.segments.forEach((segment, index) => {
    const path = `shaft.segments[${index}]`
    requirePositive(segment.end - segment.start, `${path}.length`)
    requirePositive(segment.outerDiameter, `${path}.outerDiameter`)
    if (!(segment.bore < segment.outerDiameter))
      throw new EngineeringInputError('boreNotInside', `${path}.bore`, 'The bore is not inside the section')
  })
}
