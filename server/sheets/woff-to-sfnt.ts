/**
 * Unpacks a WOFF file to the plain font it wraps (W3C WOFF 1.0, sections 3 to 5). The PDF library
 * reads WOFF too, but inflates a table again, in JavaScript, for every glyph it looks up.
 */
import { inflateSync } from 'node:zlib'

const WOFF_SIGNATURE = 0x774f4646
const WOFF_HEADER_BYTES = 44
const WOFF_ENTRY_BYTES = 20
const SFNT_HEADER_BYTES = 12
const SFNT_ENTRY_BYTES = 16

export function woffToSfnt(woff: Buffer): Buffer {
  if (woff.readUInt32BE(0) !== WOFF_SIGNATURE) throw new Error('Not a WOFF file')
  const count = woff.readUInt16BE(12)
  const tables = Array.from({ length: count }, (_, index) => {
    const entry = WOFF_HEADER_BYTES + index * WOFF_ENTRY_BYTES
    const offset = woff.readUInt32BE(entry + 4)
    const packedLength = woff.readUInt32BE(entry + 8)
    const length = woff.readUInt32BE(entry + 12)
    const packed = woff.subarray(offset, offset + packedLength)
    return {
      tag: woff.readUInt32BE(entry),
      checksum: woff.readUInt32BE(entry + 16),
      // A table that deflate would not shorten is stored as it is.
      bytes: packedLength < length ? inflateSync(packed) : packed,
    }
  })
  const power = Math.floor(Math.log2(count))
  const header = Buffer.alloc(SFNT_HEADER_BYTES + count * SFNT_ENTRY_BYTES)
  header.writeUInt32BE(woff.readUInt32BE(4), 0)
  header.writeUInt16BE(count, 4)
  header.writeUInt16BE(16 * 2 ** power, 6)
  header.writeUInt16BE(power, 8)
  header.writeUInt16BE(16 * (count - 2 ** power), 10)
  const bodies: Buffer[] = []
  let offset = header.length
  tables.forEach((table, index) => {
    const entry = SFNT_HEADER_BYTES + index * SFNT_ENTRY_BYTES
    header.writeUInt32BE(table.tag, entry)
    header.writeUInt32BE(table.checksum, entry + 4)
    header.writeUInt32BE(offset, entry + 8)
    header.writeUInt32BE(table.bytes.length, entry + 12)
    const padding = Buffer.alloc((4 - (table.bytes.length % 4)) % 4)
    bodies.push(table.bytes, padding)
    offset += table.bytes.length + padding.length
  })
  return Buffer.concat([header, ...bodies])
}
