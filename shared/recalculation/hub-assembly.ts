/** Joining figures of one hub: temperatures against their limit, and the press force. */
import { coolingTemperature, joiningTemperature } from '../engineering/interference-fit/joining-temperature'
import { pressForce } from '../engineering/interference-fit/press-force'
import { kelvin, toCelsius } from '../engineering/quantities/units'
import { finiteOrNull } from './attempt'
import type { Seat } from './seat'
import type { TightState } from './seat-state'
import { coldestShaft } from './seat-window'

export interface JoiningFigures {
  /** Hub temperature that gives the travel clearance; shaft temperature when only the shaft is cooled. */
  joiningC: number | null
  ovenC: number | null
  /** Hottest hub; coldest shaft when only the shaft is cooled. */
  limitC: number | null
  pressForceMaxN: number | null
  isBeyondLimit: boolean
}

export function joiningFigures(seat: Seat, rest: TightState): JoiningFigures {
  const { method, joint, handlingAllowance, hubLimit } = seat.joining
  const force = pressForce(
    rest.pressureMax,
    seat.rings.seatDiameter,
    seat.effectiveLength,
    seat.friction.pressing,
  )
  const pressForceMaxN = finiteOrNull(force)
  if (method === 'press')
    return { joiningC: null, ovenC: null, limitC: null, pressForceMaxN, isBeyondLimit: false }
  if (method === 'cool-shaft') {
    const needed = coolingTemperature(seat.interference.max, joint)
    const coldest = coldestShaft(seat)
    return {
      joiningC: finiteOrNull(toCelsius(needed)),
      ovenC: null,
      limitC: toCelsius(coldest),
      pressForceMaxN,
      isBeyondLimit: needed < coldest,
    }
  }
  const joining = joiningTemperature(seat.interference.max, joint)
  const oven = kelvin(joining + handlingAllowance)
  return {
    joiningC: finiteOrNull(toCelsius(joining)),
    ovenC: finiteOrNull(toCelsius(oven)),
    limitC: hubLimit === null ? null : toCelsius(hubLimit),
    pressForceMaxN,
    isBeyondLimit: hubLimit !== null && oven > hubLimit,
  }
}
