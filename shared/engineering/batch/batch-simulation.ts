import {
  EngineeringInputError,
  requireFinite,
  requireNonNegative,
  requirePositive,
} from '../engineering-input-error'
import type { Length, Pressure } from '../quantities/quantity'
import { normalQuantile } from './normal-distribution'
import { seededRandom } from './seeded-random'

/** A size between two limits, as inspection leaves it. */
export interface SizeLimits {
  lower: Length
  upper: Length
}

/** One hub in the load case that governs its grip, boiled down to what varies from unit to unit. */
export interface BatchHub {
  id: string
  /** Deviations of seat and bore; for a fit given by limits of interference the bore does not vary. */
  seat: SizeLimits
  bore: SizeLimits
  embeddingLoss: Length
  /** What temperature and speed add to the interference in the governing case, usually negative. */
  serviceChange: Length
  /** Pressure for one metre of effective interference, Pa/m. */
  pressurePerInterference: number
  /** Slip safety for one pascal at nominal friction; null when nothing loads the seat. */
  slipSafetyPerPressure: number | null
  slipSafetyLimit: number
  /** Pressure at which the weaker of hub and shaft reaches its strength. */
  pressureAtStrength: Pressure
  strengthSafetyLimit: number
}

/** How sizes scatter within their limits and everything else about its nominal value. */
export interface BatchScatter {
  sizes: 'normal' | 'uniform'
  /** C_p of the machining of seat and bore; units outside the limits are rejected by inspection. */
  capability: number
  /** Coefficients of variation: standard deviation over nominal. */
  friction: number
  embedding: number
  youngsModulus: number
  strength: number
}

export const BATCH_INPUTS = ['seat', 'bore', 'friction', 'embedding', 'youngsModulus', 'strength'] as const
export type BatchInput = (typeof BATCH_INPUTS)[number]

export interface BatchHubResult {
  id: string
  units: number
  /** Share of units below the required slip safety; null when nothing loads the seat. */
  chanceOfSlip: number | null
  /** Share of units above the permitted stress. */
  chanceOfOverstress: number
  /** 0.1 %, 50 % and 99.9 % points. */
  interference: Quantiles
  slipSafety: Quantiles | null
  strengthSafety: Quantiles
  /** As-made interference, equal bins from the smallest to the largest possible. */
  histogram: { from: Length; to: Length; counts: number[] }
  /** Share of the variance that goes with each input, largest first. */
  slipSensitivity: { input: BatchInput; share: number }[]
  strengthSensitivity: { input: BatchInput; share: number }[]
}

export interface Quantiles {
  low: number
  median: number
  high: number
}

export const HISTOGRAM_BINS = 40

/** Safety of a seat without pressure on the stress side; keeps infinity out of the statistics. */
const LARGEST_SAFETY = 1e6

function requireHub(hub: BatchHub, index: number): void {
  const path = `hubs.${index}`
  for (const [name, size] of [
    ['seat', hub.seat],
    ['bore', hub.bore],
  ] as const) {
    requireFinite(size.lower, `${path}.${name}.lower`)
    requireFinite(size.upper, `${path}.${name}.upper`)
    if (size.lower > size.upper)
      throw new EngineeringInputError(
        'outOfRange',
        `${path}.${name}.lower`,
        'The lower limit is above the upper',
      )
  }
  requireNonNegative(hub.embeddingLoss, `${path}.embeddingLoss`)
  requireFinite(hub.serviceChange, `${path}.serviceChange`)
  requirePositive(hub.pressurePerInterference, `${path}.pressurePerInterference`)
  if (hub.slipSafetyPerPressure !== null)
    requirePositive(hub.slipSafetyPerPressure, `${path}.slipSafetyPerPressure`)
  requirePositive(hub.pressureAtStrength, `${path}.pressureAtStrength`)
}

function quantiles(values: Float64Array): Quantiles {
  const sorted = values.slice().sort()
  const at = (share: number) =>
    sorted[Math.min(sorted.length - 1, Math.max(0, Math.round(share * (sorted.length - 1))))]!
  return { low: at(0.001), median: at(0.5), high: at(0.999) }
}

/** Squared correlations of the inputs with an outcome, as shares of their sum. */
function sensitivities(
  inputs: readonly Float64Array[],
  outcome: Float64Array,
): { input: BatchInput; share: number }[] {
  const count = outcome.length
  const meanOf = (values: Float64Array) => values.reduce((sum, value) => sum + value, 0) / count
  const outcomeMean = meanOf(outcome)
  const squares = inputs.map((values) => {
    const mean = meanOf(values)
    let covariance = 0
    let variance = 0
    for (let i = 0; i < count; i++) {
      const deviation = values[i]! - mean
      covariance += deviation * (outcome[i]! - outcomeMean)
      variance += deviation * deviation
    }
    return variance > 0 ? (covariance * covariance) / variance : 0
  })
  const total = squares.reduce((sum, value) => sum + value, 0)
  return BATCH_INPUTS.map((input, i) => ({ input, share: total > 0 ? squares[i]! / total : 0 })).sort(
    (a, b) => b.share - a.share,
  )
}

function simulateHub(hub: BatchHub, scatter: BatchScatter, units: number, seed: number): BatchHubResult {
  const random = seededRandom(seed)
  // Neither 0 nor 1, where the normal quantile is infinite.
  const open = () => Math.max(random.next(), 2 ** -33)
  const normal = () => normalQuantile(open())
  const tail = scatter.sizes === 'normal' ? normalTail(scatter.capability) : 0
  const size = ({ lower, upper }: SizeLimits) => {
    const half = (upper - lower) / 2
    if (half === 0) return lower as number
    if (scatter.sizes === 'uniform') return lower + random.next() * 2 * half
    // Inspection cuts the tails: draw only from the part of the distribution between the limits.
    const z = normalQuantile(tail + open() * (1 - 2 * tail))
    return lower + half + (z * half) / (3 * scatter.capability)
  }
  const draws = BATCH_INPUTS.map(() => new Float64Array(units))
  const [seats, bores, frictions, embeddings, moduli, strengths] = draws as [
    Float64Array,
    Float64Array,
    Float64Array,
    Float64Array,
    Float64Array,
    Float64Array,
  ]
  const factor = (variation: number) => (variation === 0 ? 1 : Math.max(0.01, 1 + variation * normal()))
  const interference = new Float64Array(units)
  const slip = new Float64Array(units)
  const strength = new Float64Array(units)
  const low = hub.seat.lower - hub.bore.upper
  const high = hub.seat.upper - hub.bore.lower
  const counts = new Array<number>(HISTOGRAM_BINS).fill(0)
  let slipped = 0
  let overstressed = 0
  for (let i = 0; i < units; i++) {
    const made = (seats[i] = size(hub.seat)) - (bores[i] = size(hub.bore))
    const friction = (frictions[i] = factor(scatter.friction))
    const embedding = (embeddings[i] = factor(scatter.embedding))
    const modulus = (moduli[i] = factor(scatter.youngsModulus))
    const strengthFactor = (strengths[i] = factor(scatter.strength))
    interference[i] = made
    const bin = high > low ? Math.floor(((made - low) / (high - low)) * HISTOGRAM_BINS) : 0
    counts[Math.min(HISTOGRAM_BINS - 1, Math.max(0, bin))]!++
    const perMetre = hub.pressurePerInterference * modulus
    const holding = Math.max(0, made - embedding * hub.embeddingLoss + hub.serviceChange) * perMetre
    const pressing = Math.max(0, made) * perMetre
    slip[i] = hub.slipSafetyPerPressure === null ? 0 : holding * friction * hub.slipSafetyPerPressure
    if (hub.slipSafetyPerPressure !== null && slip[i]! < hub.slipSafetyLimit) slipped++
    strength[i] = Math.min(
      LARGEST_SAFETY,
      pressing > 0 ? (hub.pressureAtStrength * strengthFactor) / pressing : LARGEST_SAFETY,
    )
    if (strength[i]! < hub.strengthSafetyLimit) overstressed++
  }
  const isLoaded = hub.slipSafetyPerPressure !== null
  return {
    id: hub.id,
    units,
    chanceOfSlip: isLoaded ? slipped / units : null,
    chanceOfOverstress: overstressed / units,
    interference: quantiles(interference),
    slipSafety: isLoaded ? quantiles(slip) : null,
    strengthSafety: quantiles(strength),
    histogram: { from: low as Length, to: high as Length, counts },
    slipSensitivity: isLoaded ? sensitivities(draws, slip) : [],
    strengthSensitivity: sensitivities(draws, strength),
  }
}

/** Share beyond one limit that lies three C_p standard deviations from the mean. */
function normalTail(capability: number): number {
  // Found by the quantile's own inverse so that the cut fits the draws to the last bit.
  let low = 0
  let high = 0.5
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2
    if (middle > 0 && normalQuantile(middle) < -3 * capability) low = middle
    else high = middle
  }
  return high
}

/**
 * What a batch of units will do: chance of slip, chance of overstress, spread, and what drives them.
 *
 * Model: sizes normal (cut at the limits by inspection) or uniform between their limits; friction, embedding,
 * Young's modulus and strength normal about their nominal values; grip at service with the loss of interference,
 * stress at rest without it; squared correlations as shares of the variance.
 * @param hubs [SI] each in its governing load case
 * @param scatter [1] distribution of sizes, process capability and coefficients of variation, each ≥ 0
 * @param units [1] units drawn for each hub, 100 to 1 000 000
 * @param seed [1] integer; equal seeds give equal results everywhere
 * @returns [1, m] one result a hub
 * @throws EngineeringInputError `notFinite`, `negative`, `notPositive`, `outOfRange`
 *
 * Validity: sampling error of a chance P is about √(P(1 − P)/units); friction and strength are as uncertain as sizes.
 * Source: shigley-9 section 1-14; monte-carlo
 * Example: monte-carlo, two uniform sizes of equal width: the interference has a triangular distribution
 */
export function simulateBatch(
  hubs: readonly BatchHub[],
  scatter: BatchScatter,
  units: number,
  seed: number,
): BatchHubResult[] {
  requirePositive(scatter.capability, 'scatter.capability')
  for (const name of ['friction', 'embedding', 'youngsModulus', 'strength'] as const)
    requireNonNegative(scatter[name], `scatter.${name}`)
  if (!Number.isInteger(units) || units < 100 || units > 1_000_000)
    throw new EngineeringInputError('outOfRange', 'units', 'Draw from 100 to 1 000 000 units')
  hubs.forEach(requireHub)
  // Each hub has its own stream, so that adding one does not change the others.
  return hubs.map((hub, index) => simulateHub(hub, scatter, units, seed + 7919 * index))
}
