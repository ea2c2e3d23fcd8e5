import { EngineeringInputError } from '../engineering-input-error'

/**
 * Share of a normal distribution below a value.
 *
 * Model: Φ(z) = erfc(−z/√2)/2 with W. J. Cody's rational approximations of erf and erfc.
 * @param z [1] standardised value
 * @returns [1] probability from 0 to 1
 * @throws nothing; infinite arguments give 0 or 1
 *
 * Validity: absolute error below 1e-15 in the middle, relative error below 1e-13 in the tails to |z| = 37.
 * Source: cody-erf
 * Example: abramowitz-stegun Table 26.1, Φ(1.96) = 0.97500 21049
 */
export function normalProbability(z: number): number {
  const x = Math.abs(z) / Math.SQRT2
  const tail = 0.5 * complementaryError(x)
  return z > 0 ? 1 - tail : tail
}

const ERF_P = [
  3.1611237438705656, 1.13864154151050156e2, 3.77485237685302021e2, 3.20937758913846947e3,
  1.85777706184603153e-1,
]
const ERF_Q = [2.36012909523441209e1, 2.44024637934444173e2, 1.28261652607737228e3, 2.84423683343917062e3]
const MIDDLE_P = [
  5.64188496988670089e-1, 8.88314979438837594, 6.61191906371416295e1, 2.98635138197400131e2,
  8.8195222124176909e2, 1.71204761263407058e3, 2.05107837782607147e3, 1.23033935479799725e3,
  2.15311535474403846e-8,
]
const MIDDLE_Q = [
  1.57449261107098347e1, 1.17693950891312499e2, 5.37181101862009858e2, 1.62138957456669019e3,
  3.29079923573345963e3, 4.36261909014324716e3, 3.43936767414372164e3, 1.23033935480374942e3,
]
const TAIL_P = [
  3.05326634961232344e-1, 3.60344899949804439e-1, 1.25781726111229246e-1, 1.60837851487422766e-2,
  6.58749161529837803e-4, 1.63153871373020978e-2,
]
const TAIL_Q = [
  2.56852019228982242, 1.87295284992346047, 5.27905102951428412e-1, 6.05183413124413191e-2,
  2.33520497626869185e-3,
]

function complementaryError(x: number): number {
  if (x <= 0.46875) {
    const y = x * x
    let above = ERF_P[4]! * y
    let below = y
    for (let i = 0; i < 3; i++) {
      above = (above + ERF_P[i]!) * y
      below = (below + ERF_Q[i]!) * y
    }
    return 1 - (x * (above + ERF_P[3]!)) / (below + ERF_Q[3]!)
  }
  if (x <= 4) {
    let above = MIDDLE_P[8]! * x
    let below = x
    for (let i = 0; i < 7; i++) {
      above = (above + MIDDLE_P[i]!) * x
      below = (below + MIDDLE_Q[i]!) * x
    }
    return Math.exp(-x * x) * ((above + MIDDLE_P[7]!) / (below + MIDDLE_Q[7]!))
  }
  if (x > 26.5) return 0
  const y = 1 / (x * x)
  let above = TAIL_P[5]! * y
  let below = y
  for (let i = 0; i < 4; i++) {
    above = (above + TAIL_P[i]!) * y
    below = (below + TAIL_Q[i]!) * y
  }
  const series = (y * (above + TAIL_P[4]!)) / (below + TAIL_Q[4]!)
  return (Math.exp(-x * x) / x) * (1 / Math.sqrt(Math.PI) - series)
}

const CENTRE_A = [
  3.387132872796366608, 1.3314166789178437745e2, 1.9715909503065514427e3, 1.3731693765509461125e4,
  4.5921953931549871457e4, 6.7265770927008700853e4, 3.3430575583588128105e4, 2.5090809287301226727e3,
]
const CENTRE_B = [
  1, 4.2313330701600911252e1, 6.871870074920579083e2, 5.3941960214247511077e3, 2.1213794301586595867e4,
  3.930789580009271061e4, 2.8729085735721942674e4, 5.226495278852854561e3,
]
const NEAR_C = [
  1.42343711074968357734, 4.6303378461565452959, 5.7694972214606914055, 3.64784832476320460504,
  1.27045825245236838258, 2.4178072517745061177e-1, 2.27238449892691845833e-2, 7.7454501427834140764e-4,
]
const NEAR_D = [
  1, 2.05319162663775882187, 1.6763848301838038494, 6.8976733498510000455e-1, 1.4810397642748007459e-1,
  1.51986665636164571966e-2, 5.475938084995344946e-4, 1.05075007164441684324e-9,
]
const FAR_E = [
  6.6579046435011037772, 5.4637849111641143699, 1.7848265399172913358, 2.9656057182850489123e-1,
  2.6532189526576123093e-2, 1.2426609473880784386e-3, 2.71155556874348757815e-5, 2.01033439929228813265e-7,
]
const FAR_F = [
  1, 5.9983220655588793769e-1, 1.3692988092273580531e-1, 1.48753612908506148525e-2, 7.868691311456132591e-4,
  1.8463183175100546818e-5, 1.4215117583164458887e-7, 2.04426310338993978564e-15,
]

function ratio(above: readonly number[], below: readonly number[], r: number): number {
  let a = above[7]!
  let b = below[7]!
  for (let i = 6; i >= 0; i--) {
    a = a * r + above[i]!
    b = b * r + below[i]!
  }
  return a / b
}

/**
 * Value below which a given share of a normal distribution lies: the inverse of `normalProbability`.
 *
 * Model: M. J. Wichura's algorithm AS 241 (PPND16).
 * @param probability [1] above 0 and below 1
 * @returns [1] standardised value
 * @throws EngineeringInputError `outOfRange`
 *
 * Validity: relative error about 1e-16.
 * Source: wichura-as241
 * Example: abramowitz-stegun Table 26.1, the 97.5 % point is 1.959964
 */
export function normalQuantile(probability: number): number {
  if (!(probability > 0 && probability < 1))
    throw new EngineeringInputError('outOfRange', 'probability', 'A probability lies between 0 and 1')
  const q = probability - 0.5
  if (Math.abs(q) <= 0.425) return q * ratio(CENTRE_A, CENTRE_B, 0.180625 - q * q)
  const r = Math.sqrt(-Math.log(q < 0 ? probability : 1 - probability))
  const value = r <= 5 ? ratio(NEAR_C, NEAR_D, r - 1.6) : ratio(FAR_E, FAR_F, r - 5)
  return q < 0 ? -value : value
}
