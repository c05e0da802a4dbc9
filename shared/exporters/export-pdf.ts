import type { Page } from '../drawing/drawing.ts'
import { layerTitles } from '../drawing/line-styles.ts'
import { fileName, separateLayers, type ExportedFile } from './exported-file.ts'
import type { Deflate } from './pdf/pdf-fonts.ts'
import { writePdf, type DocumentFont } from './pdf/write-pdf.ts'

export interface PdfFileOptions {
  readonly name: string
  readonly title: string
  readonly author: string
  readonly digest: string
  readonly fonts: readonly DocumentFont[]
  readonly deflate: Deflate | null
  readonly isSeparate: boolean
}

/** Pages as one PDF, or as one for every operation, the notes of each page kept in all of them. */
export async function exportPdf(pages: readonly Page[], options: PdfFileOptions): Promise<readonly ExportedFile[]> {
  const { name, title, author, digest, fonts, deflate } = options
  const common = { title, author, language: 'en', fonts, deflate, digest }
  if (!options.isSeparate)
    return [{ name: `${fileName(name)}.pdf`, content: await writePdf(pages, { ...common, layers: null }) }]
  const present = separateLayers.filter((layer) =>
    pages.some((page) => page.marks.some((mark) => mark.layer === layer)),
  )
  return Promise.all(
    present.map(async (layer) => ({
      name: `${fileName(name, layerTitles[layer])}.pdf`,
      content: await writePdf(pages, { ...common, layers: new Set([layer, 'legend' as const]) }),
    })),
  )
}
