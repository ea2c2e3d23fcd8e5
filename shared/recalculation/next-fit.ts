/** The nearest ISO 286 fit whose whole band lies inside the window of a seat. */
import type { InterferenceLimits } from '../engineering/interference-fit/interference-limits'
import type { InterferenceFit } from '../layout/layout-document'
import { interferenceOf, type Seat } from './seat'
import { caseState } from './seat-state'
import type { SeatWindow } from './seat-window'

type IsoFit = Extract<InterferenceFit, { kind: 'iso286' }>

export interface FittingFit {
  fit: IsoFit
  label: string
  interference: InterferenceLimits
}

/** Interference letters from looser to tighter. */
const LETTERS = ['k', 'm', 'n', 'p', 'r', 's', 't', 'u', 'v', 'x', 'y', 'z', 'za', 'zb', 'zc']

/** First at the grades chosen, then one grade finer on both sides when the band is too wide. */
const GRADE_STEPS = [0, -1, -2]

export function nextFit(seat: Seat, window: SeatWindow): FittingFit | null {
  const { required, permissible } = window
  if (!required || !permissible || window.isEmpty) return null
  const chosen: IsoFit = seat.fit.kind === 'iso286' ? seat.fit : { kind: 'iso286', hole: 'H7', shaft: 's6' }
  for (const step of GRADE_STEPS) {
    for (const fit of candidates(chosen, step)) {
      const interference = interferenceOf(fit, seat.rings.seatDiameter)
      if ('code' in interference) continue
      if (interference.min < required.interference || interference.max > permissible.interference) continue
      return { fit, label: `${fit.hole}/${fit.shaft}`, interference }
    }
  }
  return null
}

/** Keeps the basis the designer chose: the bore class in hole basis, the seat class when it is h. */
function candidates(chosen: IsoFit, gradeStep: number): IsoFit[] {
  const holeGrade = Number(/\d+$/.exec(chosen.hole)?.[0] ?? 7) + gradeStep
  const shaftGrade = Number(/\d+$/.exec(chosen.shaft)?.[0] ?? 6) + gradeStep
  const isShaftBasis = /^h\d/.test(chosen.shaft)
  return LETTERS.map((letter) =>
    isShaftBasis
      ? { kind: 'iso286', hole: `${letter.toUpperCase()}${holeGrade}`, shaft: `h${shaftGrade}` }
      : { kind: 'iso286', hole: `H${holeGrade}`, shaft: `${letter}${shaftGrade}` },
  )
}

/** Slip safety the seat would have in one load case with other limits of interference. */
export function slipSafetyWith(
  seat: Seat,
  interference: InterferenceLimits,
  loadCaseId: string,
): number | null {
  const seatCase = seat.cases.find((one) => one.id === loadCaseId)
  return seatCase ? caseState({ ...seat, interference }, seatCase).slipSafety : null
}
