/** What a PDF needs of a TrueType font. Metrics are in thousandths of the body. */
export interface TrueTypeFont {
  readonly name: string
  readonly ascent: number
  readonly descent: number
  readonly capHeight: number
  readonly box: readonly [number, number, number, number]
  readonly advance: (glyph: number) => number
  /** Glyph of a character; 0 where the font has none. */
  readonly glyphOf: (codePoint: number) => number
  /** The font with the outlines of some glyphs only, glyph numbers kept. */
  readonly subset: (glyphs: ReadonlySet<number>) => Uint8Array
}

interface Table {
  readonly offset: number
  readonly length: number
}

const tagText = (view: DataView, at: number): string =>
  String.fromCharCode(view.getUint8(at), view.getUint8(at + 1), view.getUint8(at + 2), view.getUint8(at + 3))

/** Character map of format 4 (basic plane) or 12 (all planes), whichever the font has; 12 first. */
function readCharacterMap(view: DataView, table: Table): (codePoint: number) => number {
  const count = view.getUint16(table.offset + 2)
  const subtables = Array.from(
    { length: count },
    (_, index) => table.offset + view.getUint32(table.offset + 8 + index * 8),
  )
  const wide = subtables.find((at) => view.getUint16(at) === 12)
  if (wide !== undefined) {
    const groups = view.getUint32(wide + 12)
    return (codePoint) => {
      for (let index = 0; index < groups; index += 1) {
        const at = wide + 16 + index * 12
        const start = view.getUint32(at)
        if (codePoint >= start && codePoint <= view.getUint32(at + 4)) return view.getUint32(at + 8) + codePoint - start
      }
      return 0
    }
  }
  const narrow = subtables.find((at) => view.getUint16(at) === 4)
  if (narrow === undefined) return () => 0
  const twice = view.getUint16(narrow + 6)
  return (codePoint) => {
    if (codePoint > 0xffff) return 0
    for (let index = 0; index < twice; index += 2) {
      const end = view.getUint16(narrow + 14 + index)
      if (codePoint > end) continue
      const start = view.getUint16(narrow + 16 + twice + index)
      if (codePoint < start) return 0
      const delta = view.getInt16(narrow + 16 + 2 * twice + index)
      const rangeAt = narrow + 16 + 3 * twice + index
      const range = view.getUint16(rangeAt)
      if (range === 0) return (codePoint + delta) & 0xffff
      const glyph = view.getUint16(rangeAt + range + 2 * (codePoint - start))
      return glyph === 0 ? 0 : (glyph + delta) & 0xffff
    }
    return 0
  }
}

/** Glyphs that compound glyphs are put together from, the given ones included. */
function withComponents(
  view: DataView,
  glyphs: ReadonlySet<number>,
  glyphAt: (glyph: number) => Table,
): ReadonlySet<number> {
  const found = new Set<number>([0, ...glyphs])
  const queue = [...found]
  for (let glyph = queue.pop(); glyph !== undefined; glyph = queue.pop()) {
    const { offset, length } = glyphAt(glyph)
    if (length === 0 || view.getInt16(offset) >= 0) continue
    let at = offset + 10
    let flags: number
    do {
      flags = view.getUint16(at)
      const component = view.getUint16(at + 2)
      if (!found.has(component)) {
        found.add(component)
        queue.push(component)
      }
      at += 4 + (flags & 1 ? 4 : 2) + (flags & 8 ? 2 : flags & 0x40 ? 4 : flags & 0x80 ? 8 : 0)
    } while (flags & 0x20)
  }
  return found
}

function assemble(version: number, tables: readonly (readonly [string, Uint8Array])[]): Uint8Array {
  const head = 12 + 16 * tables.length
  const total = tables.reduce((sum, [, table]) => sum + Math.ceil(table.length / 4) * 4, head)
  const font = new Uint8Array(total)
  const out = new DataView(font.buffer)
  const power = 2 ** Math.floor(Math.log2(tables.length))
  out.setUint32(0, version)
  out.setUint16(4, tables.length)
  out.setUint16(6, power * 16)
  out.setUint16(8, Math.log2(power))
  out.setUint16(10, (tables.length - power) * 16)
  let offset = head
  tables.forEach(([tag, table], index) => {
    const at = 12 + index * 16
    for (let character = 0; character < 4; character += 1) out.setUint8(at + character, tag.charCodeAt(character))
    font.set(table, offset)
    let sum = 0
    for (let word = offset; word < offset + table.length; word += 4) sum = (sum + out.getUint32(word)) >>> 0
    out.setUint32(at + 4, sum)
    out.setUint32(at + 8, offset)
    out.setUint32(at + 12, table.length)
    offset += Math.ceil(table.length / 4) * 4
  })
  return font
}

/** Tables a PDF reader draws glyphs from; the rest of the font stays behind. */
const keptTables = ['cvt ', 'fpgm', 'glyf', 'head', 'hhea', 'hmtx', 'loca', 'maxp', 'prep'] as const

/**
 * Reads a TrueType font with `glyf` outlines.
 * @throws RangeError for a font of another make
 */
export function readTrueType(bytes: Uint8Array): TrueTypeFont {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  const tables = new Map<string, Table>()
  for (let index = 0; index < view.getUint16(4); index += 1) {
    const at = 12 + index * 16
    tables.set(tagText(view, at), { offset: view.getUint32(at + 8), length: view.getUint32(at + 12) })
  }
  const need = (tag: string): Table => {
    const table = tables.get(tag)
    if (table === undefined) throw new RangeError(`the font has no ${tag} table; a TrueType font is needed`)
    return table
  }
  const head = need('head')
  const hhea = need('hhea')
  const hmtx = need('hmtx')
  const loca = need('loca')
  const glyf = need('glyf')
  const unitsPerEm = view.getUint16(head.offset + 18)
  const isLong = view.getInt16(head.offset + 50) === 1
  const glyphCount = view.getUint16(need('maxp').offset + 4)
  const advances = view.getUint16(hhea.offset + 34)
  const toThousandths = (value: number): number => Math.round((value * 1000) / unitsPerEm)
  const place = (glyph: number): number =>
    isLong ? view.getUint32(loca.offset + glyph * 4) : view.getUint16(loca.offset + glyph * 2) * 2
  const glyphAt = (glyph: number): Table => ({
    offset: glyf.offset + place(glyph),
    length: place(glyph + 1) - place(glyph),
  })
  const os2 = tables.get('OS/2')
  const hasCapHeight = os2 !== undefined && view.getUint16(os2.offset) >= 2
  const subset = (glyphs: ReadonlySet<number>): Uint8Array => {
    const kept = withComponents(view, glyphs, glyphAt)
    const size = [...kept].reduce((sum, glyph) => sum + Math.ceil(glyphAt(glyph).length / 4) * 4, 0)
    const outlines = new Uint8Array(size)
    const places = new DataView(new ArrayBuffer((glyphCount + 1) * 4))
    let offset = 0
    for (let glyph = 0; glyph < glyphCount; glyph += 1) {
      places.setUint32(glyph * 4, offset)
      if (!kept.has(glyph)) continue
      const { offset: at, length } = glyphAt(glyph)
      outlines.set(bytes.subarray(at, at + length), offset)
      offset += Math.ceil(length / 4) * 4
    }
    places.setUint32(glyphCount * 4, offset)
    const made = keptTables.flatMap((tag): (readonly [string, Uint8Array])[] => {
      const table = tables.get(tag)
      if (table === undefined) return []
      if (tag === 'glyf') return [[tag, outlines]]
      if (tag === 'loca') return [[tag, new Uint8Array(places.buffer)]]
      const copy = bytes.slice(table.offset, table.offset + table.length)
      // Offsets of the new index are long ones.
      if (tag === 'head') new DataView(copy.buffer).setInt16(50, 1)
      return [[tag, copy]]
    })
    return assemble(view.getUint32(0), made)
  }
  return {
    name: 'JetBrainsMono',
    ascent: toThousandths(view.getInt16(hhea.offset + 4)),
    descent: toThousandths(view.getInt16(hhea.offset + 6)),
    capHeight: hasCapHeight ? toThousandths(view.getInt16(os2.offset + 88)) : 730,
    box: [36, 38, 40, 42].map((at) => toThousandths(view.getInt16(head.offset + at))) as unknown as TrueTypeFont['box'],
    advance: (glyph) => toThousandths(view.getUint16(hmtx.offset + Math.min(glyph, advances - 1) * 4)),
    glyphOf: readCharacterMap(view, need('cmap')),
    subset,
  }
}
