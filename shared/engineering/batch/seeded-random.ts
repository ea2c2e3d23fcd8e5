/** Uniform numbers in [0, 1) from a seed: the same on the server, in the browser and in a test. */
export interface RandomStream {
  next(): number
}

/**
 * Seeded stream of uniform random numbers.
 *
 * Model: xoshiro128** seeded through splitmix32; 32 bits a number.
 * @param seed [1] any integer; equal seeds give equal streams
 * @returns [1] numbers from 0 to below 1
 * @throws nothing
 *
 * Validity: statistics, not secrets; period 2^128 − 1.
 * Source: blackman-vigna
 * Example: blackman-vigna, the mean of many numbers is 1/2 and their variance 1/12
 */
export function seededRandom(seed: number): RandomStream {
  let z = seed | 0
  const split = () => {
    z = (z + 0x9e3779b9) | 0
    let t = z ^ (z >>> 16)
    t = Math.imul(t, 0x21f0aaad)
    t ^= t >>> 15
    t = Math.imul(t, 0x735a2d97)
    return (t ^ (t >>> 15)) >>> 0
  }
  let a = split()
  let b = split()
  let c = split()
  let d = split()
  return {
    next() {
      const scrambled = Math.imul(b, 5)
      const result = Math.imul((scrambled << 7) | (scrambled >>> 25), 9) >>> 0
      const shifted = b << 9
      c ^= a
      d ^= b
      b ^= c
      a ^= d
      c ^= shifted
      d = (d << 11) | (d >>> 21)
      return result / 4294967296
    },
  }
}
