import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { inflateSync } from 'node:zlib'
import { readTrueType } from '../../shared/exporters/pdf/true-type.ts'
import { unpackWoff } from '../../shared/exporters/pdf/woff.ts'
import type { DocumentFont } from '../../shared/exporters/pdf/write-pdf.ts'

const require = createRequire(import.meta.url)

/** Latin in two weights, then what accented, Greek and Cyrillic titles need. */
const files = [
  { subset: 'latin', weight: 400, isBold: false },
  { subset: 'latin', weight: 700, isBold: true },
  { subset: 'latin-ext', weight: 400, isBold: false },
  { subset: 'greek', weight: 400, isBold: false },
  { subset: 'cyrillic', weight: 400, isBold: false },
] as const

/** The fonts a printed page embeds, unpacked from the package they come in. */
export const readDocumentFonts = async (): Promise<readonly DocumentFont[]> =>
  Promise.all(
    files.map(async ({ subset, weight, isBold }) => {
      const path = require.resolve(
        `@fontsource/jetbrains-mono/files/jetbrains-mono-${subset}-${String(weight)}-normal.woff`,
      )
      const font = readTrueType(await unpackWoff(readFileSync(path), (data) => inflateSync(data)))
      return { font, isBold }
    }),
  )
