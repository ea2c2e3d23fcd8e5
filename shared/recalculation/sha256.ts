/**
 * SHA-256 (FIPS 180-4) over UTF-8 text. The same code runs in the browser, the worker and Node and
 * answers at once, which the hash functions of the platforms do not offer together.
 */
const ROUND_CONSTANTS = new Int32Array(64)
const INITIAL = new Int32Array(8)

/** First 32 bits of the fractional part. */
const fraction = (value: number) => Math.floor((value - Math.floor(value)) * 2 ** 32)

function fillConstants(): void {
  let found = 0
  for (let candidate = 2; found < 64; candidate += 1) {
    let isPrime = true
    for (let divisor = 2; divisor * divisor <= candidate; divisor += 1)
      if (candidate % divisor === 0) isPrime = false
    if (!isPrime) continue
    if (found < 8) INITIAL[found] = fraction(Math.sqrt(candidate))
    ROUND_CONSTANTS[found] = fraction(Math.cbrt(candidate))
    found += 1
  }
}
fillConstants()

const encoder = new TextEncoder()

/** Message, one bit, zeros and the length in bits, in blocks of 64 bytes. */
function padded(text: string): DataView {
  const bytes = encoder.encode(text)
  const blocks = new Uint8Array(Math.ceil((bytes.length + 9) / 64) * 64)
  blocks.set(bytes)
  blocks[bytes.length] = 0x80
  const view = new DataView(blocks.buffer)
  view.setUint32(blocks.length - 8, Math.floor(bytes.length / 2 ** 29))
  view.setUint32(blocks.length - 4, (bytes.length * 8) >>> 0)
  return view
}

export function sha256Hex(text: string): string {
  const message = padded(text)
  const state = Int32Array.from(INITIAL)
  const words = new Int32Array(64)
  for (let offset = 0; offset < message.byteLength; offset += 64) {
    for (let index = 0; index < 16; index += 1) words[index] = message.getInt32(offset + index * 4)
    expand(words)
    compress(state, words)
  }
  return Array.from(state, (word) => (word >>> 0).toString(16).padStart(8, '0')).join('')
}

function expand(words: Int32Array): void {
  for (let index = 16; index < 64; index += 1) {
    const early = words[index - 15] as number
    const late = words[index - 2] as number
    const small0 = ((early >>> 7) | (early << 25)) ^ ((early >>> 18) | (early << 14)) ^ (early >>> 3)
    const small1 = ((late >>> 17) | (late << 15)) ^ ((late >>> 19) | (late << 13)) ^ (late >>> 10)
    words[index] = ((words[index - 16] as number) + small0 + (words[index - 7] as number) + small1) | 0
  }
}

/** Words stay 32-bit integers throughout, which engines keep in registers. */
function compress(state: Int32Array, words: Int32Array): void {
  let a = state[0] as number
  let b = state[1] as number
  let c = state[2] as number
  let d = state[3] as number
  let e = state[4] as number
  let f = state[5] as number
  let g = state[6] as number
  let h = state[7] as number
  for (let round = 0; round < 64; round += 1) {
    const big1 = ((e >>> 6) | (e << 26)) ^ ((e >>> 11) | (e << 21)) ^ ((e >>> 25) | (e << 7))
    const choice = (e & f) ^ (~e & g)
    const first = (h + big1 + choice + (ROUND_CONSTANTS[round] as number) + (words[round] as number)) | 0
    const big0 = ((a >>> 2) | (a << 30)) ^ ((a >>> 13) | (a << 19)) ^ ((a >>> 22) | (a << 10))
    const majority = (a & b) ^ (a & c) ^ (b & c)
    h = g
    g = f
    f = e
    e = (d + first) | 0
    d = c
    c = b
    b = a
    a = (first + big0 + majority) | 0
  }
  state[0] = ((state[0] as number) + a) | 0
  state[1] = ((state[1] as number) + b) | 0
  state[2] = ((state[2] as number) + c) | 0
  state[3] = ((state[3] as number) + d) | 0
  state[4] = ((state[4] as number) + e) | 0
  state[5] = ((state[5] as number) + f) | 0
  state[6] = ((state[6] as number) + g) | 0
  state[7] = ((state[7] as number) + h) | 0
}
