import { requireNonNegative } from '../engineering-input-error'
import type { Length } from '../quantities/quantity'
import { metre } from '../quantities/units'

/** Share of the peak-to-valley heights of both surfaces that is flattened, on the diameter. */
const EMBEDDED_SHARE = 0.8

/**
 * Interference lost because the peaks of both surfaces are flattened on joining.
 *
 * Model: each surface loses 0.4 Rz on both sides of the diameter; loss = 0.8 (Rz_hub + Rz_shaft).
 * @param hubRoughness [m] mean peak-to-valley height Rz of the hub bore, ≥ 0
 * @param shaftRoughness [m] mean peak-to-valley height Rz of the seat, ≥ 0
 * @returns [m] diametral loss, ≥ 0
 * @throws EngineeringInputError `notFinite`, `negative`
 *
 * Validity: ground, turned or reamed metal, Rz below about 20 µm; smaller for heated than for pressed assembly.
 * Source: din-7190-1 (from memory)
 * Example: no published number is vouched for; Rz 6.3 and 4 µm give 8.24 µm by the formula
 */
export function embeddingLoss(hubRoughness: Length, shaftRoughness: Length): Length {
  requireNonNegative(hubRoughness, 'hub.roughness')
  requireNonNegative(shaftRoughness, 'shaft.roughness')
  return metre(EMBEDDED_SHARE * (hubRoughness + shaftRoughness))
}
