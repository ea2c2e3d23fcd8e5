import type { Length } from '../quantities/quantity'

/** A place where elements are small: a seat edge, the foot of a web. */
export interface Focus {
  at: number
  size: number
}

const SAMPLES = 240

/**
 * Grid lines through all key stations, small at the foci and growing away from them.
 *
 * Model: wanted size h(x) = min over foci (size + growth · distance), never above `largest`; the lines
 * divide ∫dx/h between two keys into equal parts, so sizes change smoothly.
 * @param keys [m] stations every grid must contain, rising
 * @param foci [m] places and element sizes there
 * @param growth [1] growth of the size per distance, 0.2 to 0.5
 * @param largest [m] largest size as a function of the station
 * @returns [m] rising lines, the keys among them
 * @throws nothing
 *
 * Validity: source gives none; the sizes that reach a stated accuracy are those of fe-press-fit.
 * Source: fe-press-fit mesh study
 * Example: fe-press-fit, edge d/100, growth 0.3, largest d/10: about ten lines from a seat edge to half a diameter away
 */
export function gradedLines(
  keys: readonly number[],
  foci: readonly Focus[],
  growth: number,
  largest: (station: number) => number,
): Length[] {
  const size = (x: number) => {
    let h = largest(x)
    for (const focus of foci) {
      const wanted = focus.size + growth * Math.abs(x - focus.at)
      if (wanted < h) h = wanted
    }
    return h
  }
  const lines: number[] = [keys[0]!]
  const xs = new Float64Array(SAMPLES + 1)
  const count = new Float64Array(SAMPLES + 1)
  for (let key = 0; key + 1 < keys.length; key++) {
    const from = keys[key]!
    const to = keys[key + 1]!
    // Sampled densely towards both keys, because the small sizes stand there.
    for (let i = 0; i <= SAMPLES; i++)
      xs[i] = from + (to - from) * 0.5 * (1 - Math.cos((Math.PI * i) / SAMPLES))
    for (let i = 1; i <= SAMPLES; i++)
      count[i] = count[i - 1]! + (xs[i]! - xs[i - 1]!) / size(0.5 * (xs[i]! + xs[i - 1]!))
    const total = count[SAMPLES]!
    const parts = Math.max(1, Math.ceil(total - 0.02))
    let i = 0
    for (let part = 1; part < parts; part++) {
      const target = (total * part) / parts
      while (count[i + 1]! < target) i++
      lines.push(xs[i]! + ((target - count[i]!) / (count[i + 1]! - count[i]!)) * (xs[i + 1]! - xs[i]!))
    }
    lines.push(to)
  }
  return lines as Length[]
}
