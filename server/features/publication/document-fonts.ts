import { existsSync, readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { fileURLToPath } from 'node:url'
import { inflateSync } from 'node:zlib'
import { readTrueType } from '../../../shared/exporters/pdf/true-type.ts'
import { unpackWoff } from '../../../shared/exporters/pdf/woff.ts'
import type { DocumentFont } from '../../../shared/exporters/pdf/write-pdf.ts'

const require = createRequire(import.meta.url)

/** Built, the fonts may lie beside the program; else in the package they come in. */
function fontPath(name: string): string {
  const beside = fileURLToPath(new URL(`../fonts/${name}`, import.meta.url))
  return existsSync(beside) ? beside : require.resolve(`@fontsource/jetbrains-mono/files/${name}`)
}

const subsets = [
  { subset: 'latin', weights: [400, 700], needed: null },
  { subset: 'latin-ext', weights: [400], needed: /[\u0100-\u024f\u1e00-\u1eff]/u },
  { subset: 'greek', weights: [400], needed: /[\u0370-\u03ff]/u },
  { subset: 'cyrillic', weights: [400], needed: /[\u0400-\u04ff]/u },
] as const

/** The fonts that printed pages embed: those that the characters of a text need. */
export const readDocumentFonts = (text: string): Promise<readonly DocumentFont[]> =>
  Promise.all(
    subsets
      .filter(({ needed }) => needed === null || needed.test(text))
      .flatMap(({ subset, weights }) => weights.map((weight) => ({ subset, weight })))
      .map(async ({ subset, weight }) => {
        const path = fontPath(`jetbrains-mono-${subset}-${String(weight)}-normal.woff`)
        const font = readTrueType(await unpackWoff(readFileSync(path), (data) => inflateSync(data)))
        return { font, isBold: weight === 700 }
      }),
  )
