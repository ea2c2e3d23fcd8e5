import { describe, expect, it } from 'vitest'
import {
  HISTOGRAM_BINS,
  simulateBatch,
  type BatchHub,
  type BatchScatter,
} from '@shared/engineering/batch/batch-simulation'
import { normalProbability } from '@shared/engineering/batch/normal-distribution'
import { seededRandom } from '@shared/engineering/batch/seeded-random'
import { mPa, um } from '@shared/engineering/quantities/units'

const STILL: BatchScatter = {
  sizes: 'normal',
  capability: 1,
  friction: 0,
  embedding: 0,
  youngsModulus: 0,
  strength: 0,
}

/** 65 H7/t6 with 1 MPa a micrometre, much as a gear on a shaft. */
const hub: BatchHub = {
  id: 'A',
  seat: { lower: um(66), upper: um(85) },
  bore: { lower: um(0), upper: um(30) },
  embeddingLoss: um(8),
  serviceChange: um(0),
  pressurePerInterference: 1e12,
  slipSafetyPerPressure: 1.5 / mPa(40),
  slipSafetyLimit: 1.5,
  pressureAtStrength: mPa(100),
  strengthSafetyLimit: 1.2,
}

describe('seeded stream', () => {
  it('is uniform: mean 1/2, variance 1/12, every tenth filled alike (chi-square below its 99.9 % point 27.9)', () => {
    const random = seededRandom(1)
    const n = 200_000
    const tenths = new Array<number>(10).fill(0)
    let sum = 0
    let square = 0
    for (let i = 0; i < n; i++) {
      const x = random.next()
      sum += x
      square += x * x
      tenths[Math.floor(10 * x)]!++
    }
    expect(sum / n).toBeCloseTo(0.5, 2)
    expect(square / n - (sum / n) ** 2).toBeCloseTo(1 / 12, 3)
    expect(tenths.reduce((chi, count) => chi + (count - n / 10) ** 2 / (n / 10), 0)).toBeLessThan(27.9)
  })

  it('repeats itself for the same seed and differs for another', () => {
    const take = (seed: number) => Array.from({ length: 5 }, seededRandom(seed).next)
    expect(take(7)).toEqual(take(7))
    expect(take(7)).not.toEqual(take(8))
  })
})

describe('batch', () => {
  it('meets the closed form when only sizes vary and inspection cuts nothing away', () => {
    // With C_p = 1.6 the limits lie 4.8 σ out; the difference of two normals is normal.
    const [result] = simulateBatch([hub], { ...STILL, capability: 1.6 }, 200_000, 11)
    const mean = 75.5 - 15
    const sigma = Math.hypot(19, 30) / (6 * 1.6)
    const required = 40 + 8
    const expected = normalProbability((required - mean) / sigma)
    // Four standard errors of the estimate.
    expect(Math.abs(result!.chanceOfSlip! - expected)).toBeLessThan(
      4 * Math.sqrt((expected * (1 - expected)) / 200_000),
    )
    expect(result!.interference.median * 1e6).toBeCloseTo(mean, 0)
    expect(result!.interference.low * 1e6).toBeCloseTo(mean - 3.09 * sigma, 0)
  })

  it('never leaves the limits of its sizes and counts every unit once', () => {
    for (const sizes of ['normal', 'uniform'] as const) {
      const [result] = simulateBatch([hub], { ...STILL, sizes, capability: 0.4 }, 20_000, 3)
      expect(result!.interference.low).toBeGreaterThanOrEqual(um(36))
      expect(result!.interference.high).toBeLessThanOrEqual(um(85))
      expect(result!.histogram.counts).toHaveLength(HISTOGRAM_BINS)
      expect(result!.histogram.counts.reduce((a, b) => a + b, 0)).toBe(20_000)
    }
  })

  it('has the triangular spread of two equal uniform sizes', () => {
    const even = { ...hub, seat: { lower: um(50), upper: um(80) } }
    const [result] = simulateBatch([even], { ...STILL, sizes: 'uniform' }, 200_000, 5)
    // P(interference < low + 10 µm) of a triangle 60 µm wide: 10²/(2·30²)
    const required = { ...even, slipSafetyPerPressure: 1 / mPa(30), slipSafetyLimit: 1, embeddingLoss: um(0) }
    const [below] = simulateBatch([required], { ...STILL, sizes: 'uniform' }, 200_000, 5)
    expect(below!.chanceOfSlip!).toBeCloseTo(100 / 1800, 2)
    expect(result!.interference.median * 1e6).toBeCloseTo(50, 0)
  })

  it('names the input that drives the spread', () => {
    const scatter = { ...STILL, friction: 0.3, capability: 1.33 }
    const [result] = simulateBatch([hub], scatter, 50_000, 9)
    expect(result!.slipSensitivity[0]!.input).toBe('friction')
    expect(result!.strengthSensitivity[0]!.input).toBe('bore')
    expect(result!.slipSensitivity.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 9)
  })

  it('is the same for the same seed, whatever stands beside it', () => {
    const alone = simulateBatch([hub], { ...STILL, friction: 0.1 }, 5_000, 21)
    const beside = simulateBatch([hub, { ...hub, id: 'B' }], { ...STILL, friction: 0.1 }, 5_000, 21)
    expect(beside[0]).toEqual(alone[0])
    expect(beside[1]!.chanceOfSlip).not.toBe(alone[0]!.chanceOfSlip)
  })

  it('says nothing of slip where nothing loads the seat', () => {
    const [result] = simulateBatch([{ ...hub, slipSafetyPerPressure: null }], STILL, 1_000, 1)
    expect(result!.chanceOfSlip).toBeNull()
    expect(result!.slipSafety).toBeNull()
  })

  it('refuses limits the wrong way round and names the field', () => {
    expect(() => simulateBatch([{ ...hub, bore: { lower: um(30), upper: um(0) } }], STILL, 1_000, 1)).toThrow(
      expect.objectContaining({ code: 'outOfRange', path: 'hubs.0.bore.lower' }) as Error,
    )
  })
})
