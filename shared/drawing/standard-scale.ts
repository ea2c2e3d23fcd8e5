/** Scales of ISO 5455 (from memory): 1, 2 and 5 times a power of ten, enlarged or reduced. */
const STANDARD_SCALES = [
  { paper: 10, real: 1 },
  { paper: 5, real: 1 },
  { paper: 2, real: 1 },
  { paper: 1, real: 1 },
  { paper: 1, real: 2 },
  { paper: 1, real: 5 },
  { paper: 1, real: 10 },
  { paper: 1, real: 20 },
  { paper: 1, real: 50 },
  { paper: 1, real: 100 },
] as const

export interface StandardScale {
  /** Millimetres on paper for one millimetre of the part. */
  factor: number
  /** As a title block writes it, such as "1:2". */
  label: string
}

/** The largest standard scale at which the object fits the space; the smallest one if none does. */
export function standardScale(
  object: { widthMm: number; heightMm: number },
  space: { widthMm: number; heightMm: number },
): StandardScale {
  const fitting = STANDARD_SCALES.find(
    ({ paper, real }) =>
      (object.widthMm * paper) / real <= space.widthMm && (object.heightMm * paper) / real <= space.heightMm,
  )
  const { paper, real } = fitting ?? { paper: 1, real: 100 }
  return { factor: paper / real, label: `${paper}:${real}` }
}
