import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { inflateSync } from 'node:zlib'
import { readTrueType } from '../../shared/exporters/pdf/true-type.ts'
import { unpackWoff } from '../../shared/exporters/pdf/woff.ts'
import type { DocumentFont } from '../../shared/exporters/pdf/write-pdf.ts'

const require = createRequire(import.meta.url)

/** The design's font as a maker's page embeds it: Latin first, then what accented titles need. */
export async function readDocumentFonts(): Promise<readonly DocumentFont[]> {
  const files = [
    ['latin', '400', false],
    ['latin', '700', true],
    ['latin-ext', '400', false],
    ['greek', '400', false],
    ['cyrillic', '400', false],
  ] as const
  return Promise.all(
    files.map(async ([subset, weight, isBold]) => {
      const packed = readFileSync(require.resolve(`@fontsource/jetbrains-mono/files/jetbrains-mono-${subset}-${weight}-normal.woff`))
      return { font: readTrueType(await unpackWoff(packed, (data) => inflateSync(data))), isBold }
    }),
  )
}
