import { requireFinite } from '../engineering-input-error'
import type { Length, Pressure, RingCompliance } from '../quantities/quantity'
import { metre, pascal, perPascal } from '../quantities/units'
import { ringRatios, type HubRing, type ShaftRing } from './annulus'

export interface SeatRings {
  seatDiameter: Length
  shaft: ShaftRing
  hub: HubRing
}

/** Pressure for one metre of interference, and the parts it is made of. */
export interface SeatCompliance {
  hub: RingCompliance
  shaft: RingCompliance
  /** D (K_A + K_I): interference for one pascal. */
  interferencePerPressure: number
}

/**
 * Flexibility of the two rings of a seat.
 *
 * Model: K_A = ((1 + Q_A²)/(1 − Q_A²) + ν_A)/E_A, K_I = ((1 + Q_I²)/(1 − Q_I²) − ν_I)/E_I; thick rings in plane
 * stress, linear elastic, equal lengths, uniform pressure.
 * @param rings.seatDiameter [m] joint diameter D, > 0
 * @param rings.shaft [m] bore ≥ 0 and smaller than the seat; material
 * @param rings.hub [m] outer diameter greater than the seat; material
 * @returns [1/Pa] compliance of hub and shaft, and [m/Pa] their sum times D
 * @throws EngineeringInputError `notPositive`, `negative`, `boreNotInside`
 *
 * Validity: hubs from about L/D = 0.5 for the mean pressure within 5 % (fe-press-fit); shorter ones hold more.
 * Source: shigley-9 Eqs. 3-56 and 7-39; brown-marks Eqs. 3.11 to 3.15; din-7190-1
 * Example: brown-marks Example 6, 0.02 mm on 100 mm in 160 mm, E 207 GPa: 12.6 MPa
 */
export function seatCompliance({ seatDiameter, shaft, hub }: SeatRings): SeatCompliance {
  const ratio = ringRatios(seatDiameter, shaft.bore, hub.outerDiameter)
  const hubSquare = ratio.hub * ratio.hub
  const shaftSquare = ratio.shaft * ratio.shaft
  const ofHub = ((1 + hubSquare) / (1 - hubSquare) + hub.material.poissonRatio) / hub.material.youngsModulus // Eq. 3-56, outer part
  const ofShaft =
    ((1 + shaftSquare) / (1 - shaftSquare) - shaft.material.poissonRatio) / shaft.material.youngsModulus // inner part
  return {
    hub: perPascal(ofHub),
    shaft: perPascal(ofShaft),
    interferencePerPressure: seatDiameter * (ofHub + ofShaft),
  }
}

/**
 * Pressure between hub and shaft for an interference that is really effective.
 *
 * Model: p = d / (D (K_A + K_I)), no pressure when the interference is used up.
 * @param effectiveInterference [m] diametral interference after embedding, temperature and speed, any sign
 * @param compliance [1/Pa] from `seatCompliance`
 * @returns [Pa] mean interface pressure, ≥ 0
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: linear elastic; stresses within the elastic limit of both parts.
 * Source: shigley-9 Eq. 3-56; timoshenko-2 compound cylinders; lame
 * Example: timoshenko-2, 4/6/8 in steel cylinders with 0.005 in radial interference: 4050 psi
 */
export function interfacePressure(effectiveInterference: Length, compliance: SeatCompliance): Pressure {
  requireFinite(effectiveInterference, 'effectiveInterference')
  return pascal(effectiveInterference > 0 ? effectiveInterference / compliance.interferencePerPressure : 0)
}

/**
 * Interference that gives a pressure: the inverse of `interfacePressure`.
 *
 * Model: d = p D (K_A + K_I).
 * @param pressure [Pa] interface pressure, ≥ 0
 * @param compliance [1/Pa] from `seatCompliance`
 * @returns [m] effective diametral interference, ≥ 0
 * @throws EngineeringInputError `notFinite`
 *
 * Validity: as `interfacePressure`.
 * Source: shigley-9 Eq. 3-56
 * Example: singer-pytel Problem 267 read backwards, 1.5444 MPa on a 2 m tire: 1.287 mm (thin ring, within 1.5 %)
 */
export function interferenceForPressure(pressure: Pressure, compliance: SeatCompliance): Length {
  requireFinite(pressure, 'pressure')
  return metre(pressure * compliance.interferencePerPressure)
}
