import { requireFinite, requirePositive } from '../engineering-input-error'
import type { ExpansionCoefficient, Length, Temperature } from '../quantities/quantity'
import { celsius, metre } from '../quantities/units'

/** Sizes and interference are stated at 20 °C (ISO 1). */
export const REFERENCE_TEMPERATURE = celsius(20)

/**
 * Change of interference when the parts are not at 20 °C.
 *
 * Model: uniform temperature in each part; D (α_I (t_I − 20 °C) − α_A (t_A − 20 °C)).
 * @param seatDiameter [m] joint diameter D, > 0
 * @param shaftExpansion [1/K] mean expansion of the shaft, ≥ 0
 * @param shaftTemperature [K] temperature of the shaft
 * @param hubExpansion [1/K] mean expansion of the hub, ≥ 0
 * @param hubTemperature [K] temperature of the hub
 * @returns [m] diametral change, negative when interference is lost
 * @throws EngineeringInputError `notPositive`, `notFinite`
 *
 * Validity: mean coefficients from 20 °C; aluminium above 100 to 120 °C also creeps, which is not covered.
 * Source: shigley-9 Eq. 3-60
 * Example: singer-pytel Problem 267 read backwards, tire 55 K hotter on 2 m, 11.7e-6/K: −1.287 mm
 */
export function temperatureChange(
  seatDiameter: Length,
  shaftExpansion: ExpansionCoefficient,
  shaftTemperature: Temperature,
  hubExpansion: ExpansionCoefficient,
  hubTemperature: Temperature,
): Length {
  requirePositive(seatDiameter, 'seatDiameter')
  requireFinite(shaftTemperature, 'shaftTemperature')
  requireFinite(hubTemperature, 'hubTemperature')
  const shaftStrain = shaftExpansion * (shaftTemperature - REFERENCE_TEMPERATURE)
  const hubStrain = hubExpansion * (hubTemperature - REFERENCE_TEMPERATURE)
  return metre(seatDiameter * (shaftStrain - hubStrain))
}
