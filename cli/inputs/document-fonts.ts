import { existsSync, readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { fileURLToPath } from 'node:url'
import { inflateSync } from 'node:zlib'
import { readTrueType } from '../../shared/exporters/pdf/true-type.ts'
import { unpackWoff } from '../../shared/exporters/pdf/woff.ts'
import type { DocumentFont } from '../../shared/exporters/pdf/write-pdf.ts'

const require = createRequire(import.meta.url)

/** Built, the fonts lie beside the program; from sources, in the package they come in. */
function fontPath(name: string): string {
  const beside = fileURLToPath(new URL(`../fonts/${name}`, import.meta.url))
  return existsSync(beside) ? beside : require.resolve(`@fontsource/jetbrains-mono/files/${name}`)
}

/** Latin in two weights always; the rest where a text has characters that only they draw. */
const files = [
  { subset: 'latin', weight: 400, isBold: false, needed: null },
  { subset: 'latin', weight: 700, isBold: true, needed: null },
  { subset: 'latin-ext', weight: 400, isBold: false, needed: /[\u0100-\u024f\u1e00-\u1eff]/u },
  { subset: 'greek', weight: 400, isBold: false, needed: /[\u0370-\u03ff]/u },
  { subset: 'cyrillic', weight: 400, isBold: false, needed: /[\u0400-\u04ff]/u },
] as const

/**
 * The fonts a printed page embeds, unpacked from the package they come in.
 * @param text everything authors wrote that will be on the pages
 */
export const readDocumentFonts = async (text: string): Promise<readonly DocumentFont[]> =>
  Promise.all(
    files
      .filter(({ needed }) => needed === null || needed.test(text))
      .map(async ({ subset, weight, isBold }) => {
        const path = fontPath(`jetbrains-mono-${subset}-${String(weight)}-normal.woff`)
        const font = readTrueType(await unpackWoff(readFileSync(path), (data) => inflateSync(data)))
        return { font, isBold }
      }),
  )
