/** What one load case of the shaft is calculated from. */
import type { FactoredBeam } from '../engineering/shaft/beam-solver'
import type { DiagramStation } from '../engineering/shaft/section-forces'
import type { ShaftLoad, ShaftModel, ShaftSegment } from '../engineering/shaft/shaft-model'
import type { Notch } from './notches'

export interface Place {
  part: string
  stationMm: number
}

export interface ShaftCaseInputs {
  loadCaseId: string
  applicationFactor: number
  model: ShaftModel
  beam: FactoredBeam
  stations: readonly DiagramStation[]
  loads: readonly ShaftLoad[]
  bearings: readonly Place[]
  locatingId: string | null
  /** Where slope and deflection are reported. */
  places: readonly Place[]
  /** Interface pressure over each station at the most interference; 0 beside seats. */
  pressures: Float64Array
  /** Section under each station, on its side of a step. */
  sections: readonly ShaftSegment[]
  notches: readonly Notch[]
}
