/** Turns zlib data back into bytes; may take its time, as browsers do. */
export type Inflate = (data: Uint8Array) => Uint8Array | Promise<Uint8Array>

const signature = 0x774f4646

/** True for a font packed as WOFF 1. */
export const isWoff = (bytes: Uint8Array): boolean =>
  bytes.length > 44 && new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength).getUint32(0) === signature

/**
 * A font packed as WOFF 1 laid out as the TrueType file it was made from: each table is inflated on its own.
 * @param bytes a WOFF 1 file; anything else is given back as it is
 * @throws RangeError where a table does not inflate to the length it declares
 */
export async function unpackWoff(bytes: Uint8Array, inflate: Inflate): Promise<Uint8Array> {
  if (!isWoff(bytes)) return bytes
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  const count = view.getUint16(12)
  const entries = Array.from({ length: count }, (_, index) => {
    const at = 44 + index * 20
    return {
      tag: view.getUint32(at),
      offset: view.getUint32(at + 4),
      packed: view.getUint32(at + 8),
      length: view.getUint32(at + 12),
      checksum: view.getUint32(at + 16),
    }
  })
  const tables = await Promise.all(
    entries.map(async ({ offset, packed, length }) => {
      const data = bytes.subarray(offset, offset + packed)
      const table = packed === length ? data : await inflate(data)
      if (table.length !== length) throw new RangeError('a table of the font does not unpack to its declared length')
      return table
    }),
  )
  const head = 12 + 16 * count
  const total = tables.reduce((sum, table) => sum + Math.ceil(table.length / 4) * 4, head)
  const font = new Uint8Array(total)
  const out = new DataView(font.buffer)
  const power = 2 ** Math.floor(Math.log2(count))
  out.setUint32(0, view.getUint32(4))
  out.setUint16(4, count)
  out.setUint16(6, power * 16)
  out.setUint16(8, Math.log2(power))
  out.setUint16(10, (count - power) * 16)
  let offset = head
  entries.forEach((entry, index) => {
    const table = tables[index]
    if (table === undefined) return
    const at = 12 + index * 16
    out.setUint32(at, entry.tag)
    out.setUint32(at + 4, entry.checksum)
    out.setUint32(at + 8, offset)
    out.setUint32(at + 12, table.length)
    font.set(table, offset)
    offset += Math.ceil(table.length / 4) * 4
  })
  return font
}
