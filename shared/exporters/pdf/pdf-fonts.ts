import { PDFHexString, PDFNumber, type PDFName, PDFRawStream, type PDFContext, type PDFRef } from 'pdf-lib'
import { asciiBytes } from './ascii-bytes.ts'
import type { TrueTypeFont } from './true-type.ts'

/** Bytes made smaller for a PDF's FlateDecode filter: zlib format. */
export type Deflate = (data: Uint8Array) => Uint8Array

/** A stream, packed where a packer is given. */
export function streamOf(
  context: PDFContext,
  data: Uint8Array,
  deflate: Deflate | null,
  entries: Record<string, PDFName | PDFNumber> = {},
): PDFRawStream {
  const packed = deflate === null ? data : deflate(data)
  const dict = context.obj({
    ...entries,
    ...(deflate === null ? {} : { Filter: 'FlateDecode' }),
    Length: packed.length,
  })
  return PDFRawStream.of(dict, packed)
}

/** A font in use in one document: which of its glyphs, for which characters. */
export interface UsedFont {
  readonly font: TrueTypeFont
  readonly isBold: boolean
  /** Name in page resources. */
  readonly name: string
  readonly codePointByGlyph: Map<number, number>
}

/** A run of text in one font. */
export interface TextRun {
  readonly used: UsedFont
  readonly hex: string
  readonly cells: number
}

/** Stands for a character that none of the fonts has. */
const unknownCharacter = '\u00b7'

/** Text split into runs by the first font that has each character; control and direction marks are left out. */
export function runsOf(content: string, fonts: readonly UsedFont[]): readonly TextRun[] {
  const runs: { used: UsedFont; hex: string; cells: number }[] = []
  const put = (character: string): boolean => {
    const codePoint = character.codePointAt(0) ?? 0
    for (const used of fonts) {
      const glyph = used.font.glyphOf(codePoint)
      if (glyph === 0) continue
      used.codePointByGlyph.set(glyph, codePoint)
      const hex = glyph.toString(16).padStart(4, '0')
      const last = runs[runs.length - 1]
      if (last?.used === used) {
        last.hex += hex
        last.cells += 1
      } else runs.push({ used, hex, cells: 1 })
      return true
    }
    return false
  }
  for (const character of content) {
    if (!put(character)) put(unknownCharacter)
  }
  return runs
}

/** Map from glyphs back to characters, so that text can be searched, copied and read aloud. */
function toUnicode(used: UsedFont): Uint8Array {
  const rows = [...used.codePointByGlyph]
    .sort(([a], [b]) => a - b)
    .map(([glyph, codePoint]) => {
      const units = [...String.fromCodePoint(codePoint)].flatMap((character) =>
        Array.from({ length: character.length }, (_, index) => character.charCodeAt(index)),
      )
      return `<${glyph.toString(16).padStart(4, '0')}> <${units.map((unit) => unit.toString(16).padStart(4, '0')).join('')}>`
    })
  const blocks: string[] = []
  for (let start = 0; start < rows.length; start += 100) {
    const block = rows.slice(start, start + 100)
    blocks.push(`${String(block.length)} beginbfchar\n${block.join('\n')}\nendbfchar`)
  }
  return asciiBytes(
    `/CIDInit /ProcSet findresource begin\n12 dict begin\nbegincmap\n/CIDSystemInfo << /Registry (Adobe) /Ordering (UCS) /Supplement 0 >> def\n/CMapName /Adobe-Identity-UCS def\n/CMapType 2 def\n1 begincodespacerange\n<0000> <ffff>\nendcodespacerange\n${blocks.join('\n')}\nendcmap\nCMapName currentdict /CMap defineresource pop\nend\nend\n`,
  )
}

/** Six letters before a subset font's name, from what it holds, the same for the same text. */
function subsetTag(used: UsedFont): string {
  let hash = 2166136261
  for (const glyph of [...used.codePointByGlyph.keys()].sort((a, b) => a - b))
    hash = Math.imul(hash ^ glyph, 16777619) >>> 0
  let tag = ''
  for (let index = 0; index < 6; index += 1) {
    tag += String.fromCharCode(65 + (hash % 26))
    hash = Math.floor(hash / 26) + 7919 * (index + 1)
  }
  return tag
}

/** Embeds the used glyphs of a font as a composite font whose codes are glyph numbers. */
export function embedFont(context: PDFContext, used: UsedFont, deflate: Deflate | null): PDFRef {
  const { font, isBold } = used
  const glyphs = [...used.codePointByGlyph.keys()].sort((a, b) => a - b)
  const file = font.subset(new Set(glyphs))
  const fontFile = context.register(streamOf(context, file, deflate, { Length1: PDFNumber.of(file.length) }))
  const base = `${subsetTag(used)}+${font.name}-${isBold ? 'Bold' : 'Regular'}`
  const descriptor = context.register(
    context.obj({
      Type: 'FontDescriptor',
      FontName: base,
      // Fixed pitch and not a symbol font.
      Flags: 1 + 32,
      FontBBox: [...font.box],
      ItalicAngle: 0,
      Ascent: font.ascent,
      Descent: font.descent,
      CapHeight: font.capHeight,
      StemV: isBold ? 140 : 80,
      FontFile2: fontFile,
    }),
  )
  const descendant = context.register(
    context.obj({
      Type: 'Font',
      Subtype: 'CIDFontType2',
      BaseFont: base,
      CIDSystemInfo: context.obj({
        Registry: PDFHexString.of('41646f6265'),
        Ordering: PDFHexString.of('4964656e74697479'),
        Supplement: 0,
      }),
      FontDescriptor: descriptor,
      DW: font.advance(glyphs[0] ?? 0),
      CIDToGIDMap: 'Identity',
    }),
  )
  return context.register(
    context.obj({
      Type: 'Font',
      Subtype: 'Type0',
      BaseFont: base,
      Encoding: 'Identity-H',
      DescendantFonts: [descendant],
      ToUnicode: context.register(streamOf(context, toUnicode(used), deflate)),
    }),
  )
}
