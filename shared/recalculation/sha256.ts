/**
 * SHA-256 (FIPS 180-4) over UTF-8 text. The same code runs in the browser, the worker and Node and
 * answers at once, which the hash functions of the platforms do not offer together.
 */
const ROUND_CONSTANTS = new Uint32Array(64)
const INITIAL = new Uint32Array(8)

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

const rotate = (word: number, by: number) => (word >>> by) | (word << (32 - by))

export function sha256Hex(text: string): string {
  const message = padded(text)
  const state = Uint32Array.from(INITIAL)
  const words = new Uint32Array(64)
  for (let offset = 0; offset < message.byteLength; offset += 64) {
    for (let index = 0; index < 16; index += 1) words[index] = message.getUint32(offset + index * 4)
    for (let index = 16; index < 64; index += 1) {
      const early = words[index - 15] as number
      const late = words[index - 2] as number
      const small0 = rotate(early, 7) ^ rotate(early, 18) ^ (early >>> 3)
      const small1 = rotate(late, 17) ^ rotate(late, 19) ^ (late >>> 10)
      words[index] = (words[index - 16] as number) + small0 + (words[index - 7] as number) + small1
    }
    compress(state, words)
  }
  return Array.from(state, (word) => word.toString(16).padStart(8, '0')).join('')
}

function compress(state: Uint32Array, words: Uint32Array): void {
  let [a, b, c, d, e, f, g, h] = state as unknown as [
    number,
    number,
    number,
    number,
    number,
    number,
    number,
    number,
  ]
  for (let round = 0; round < 64; round += 1) {
    const big1 = rotate(e, 6) ^ rotate(e, 11) ^ rotate(e, 25)
    const choice = (e & f) ^ (~e & g)
    const first = (h + big1 + choice + (ROUND_CONSTANTS[round] as number) + (words[round] as number)) | 0
    const big0 = rotate(a, 2) ^ rotate(a, 13) ^ rotate(a, 22)
    const majority = (a & b) ^ (a & c) ^ (b & c)
    const second = (big0 + majority) | 0
    h = g
    g = f
    f = e
    e = (d + first) | 0
    d = c
    c = b
    b = a
    a = (first + second) | 0
  }
  const next = [a, b, c, d, e, f, g, h]
  for (let index = 0; index < 8; index += 1) state[index] = (state[index] as number) + (next[index] as number)
}
