import { execFileSync } from 'node:child_process'
import { writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { deflateSync } from 'node:zlib'
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs'
import { beforeAll, describe, expect, it } from 'vitest'
import { readDocumentFonts } from '../../../cli/inputs/document-fonts.ts'
import type { LayerName, Page } from '../../../shared/drawing/drawing.ts'
import { bookPages } from '../../../shared/exporters/book.ts'
import type { ExportSet } from '../../../shared/exporters/export-set.ts'
import { planSteps } from '../../../shared/exporters/steps/plan-steps.ts'
import { templateDocument, type DocumentOptions } from '../../../shared/exporters/template-document.ts'
import { writePdf, type DocumentFont } from '../../../shared/exporters/pdf/write-pdf.ts'
import { anExportSet, documentOptions } from '../../support/export-sets.ts'
import { aBaronial, aBox, aCard, aSquareFlap } from '../../support/given-pieces.ts'
import { hasTool, inFolder } from '../../support/outside-tools.ts'

const pieces = [
  aCard({ name: 'card', style: 'accordion', panels: 3, folded: { length: 60, width: 40 } }),
  aBaronial({ name: 'envelope' }),
  aSquareFlap({ name: 'second-envelope', pocket: { length: 120, width: 80 } }),
  aBox({ name: 'base' }),
]

let fonts: readonly DocumentFont[] = []
beforeAll(async () => {
  fonts = await readDocumentFonts('Ωж ł')
})

const pagesOf = (set: ExportSet, more: Partial<DocumentOptions> = {}): readonly Page[] =>
  templateDocument(set, planSteps(set), documentOptions(more))

const pdfOf = (
  pages: readonly Page[],
  title: string,
  layers: ReadonlySet<LayerName> | null = null,
): Promise<Uint8Array> =>
  writePdf(pages, {
    title,
    author: 'Quillfern paper goods',
    language: 'en',
    fonts,
    deflate: deflateSync,
    digest: '0123456789ab',
    layers,
  })

const open = async (pdf: Uint8Array) => getDocument({ data: new Uint8Array(pdf), verbosity: 0 }).promise

async function textOf(pdf: Uint8Array, page: number): Promise<string> {
  const content = await (await (await open(pdf)).getPage(page)).getTextContent()
  return content.items
    .map((item) => ('str' in item ? `${item.str}${item.hasEOL ? ' ' : ''}` : ''))
    .join('')
    .replace(/\s+/g, ' ')
}

const run = (command: string, words: readonly string[], pdf: Uint8Array): string =>
  inFolder((folder) => {
    const path = join(folder, 'in.pdf')
    writeFileSync(path, pdf)
    return execFileSync(command, [...words, path], { encoding: 'utf8', maxBuffer: 1 << 28 })
  })

describe.runIf(hasTool('qpdf'))('a PDF as qpdf reads it', () => {
  it('has no syntax errors, for templates, tiles, large print and books', async () => {
    const set = anExportSet(pieces)
    const book = bookPages([{ set, steps: planSteps(set) }], {
      ...documentOptions(),
      title: 'Orchard',
      mark: 'pear',
      bleed: 3,
    })
    for (const pages of [pagesOf(set), pagesOf(set, { isTiled: true }), pagesOf(set, { isLargePrint: true }), book]) {
      const out = run('qpdf', ['--check'], await pdfOf(pages, set.title))
      expect(out).toContain('No syntax or stream encoding errors found')
    }
  })

  it('carries the processing step of every operation and none on groups that take none', async () => {
    const pdf = await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard')
    const listed = JSON.parse(run('qpdf', ['--json', '--json-key=qpdf'], pdf)) as {
      qpdf: [unknown, Record<string, { value?: Record<string, unknown> }>]
    }
    const groups = Object.values(listed.qpdf[1]).flatMap(({ value }) =>
      value !== undefined && value['/Type'] === '/OCG' ? [[value['/Name'], value['/GTS_Metadata']] as const] : [],
    )
    expect(Object.fromEntries(groups)).toEqual({
      'u:Glue': { '/GTS_ProcStepsGroup': '/Structural', '/GTS_ProcStepsType': '/Gluing' },
      'u:Positions': { '/GTS_ProcStepsGroup': '/Positions', '/GTS_ProcStepsType': '/ContentArea' },
      'u:Cut': { '/GTS_ProcStepsGroup': '/Structural', '/GTS_ProcStepsType': '/Cutting' },
      'u:Perforate': { '/GTS_ProcStepsGroup': '/Structural', '/GTS_ProcStepsType': '/Perforating' },
      'u:Score valley': { '/GTS_ProcStepsGroup': '/Structural', '/GTS_ProcStepsType': '/Creasing' },
      'u:Score mountain': { '/GTS_ProcStepsGroup': '/Structural', '/GTS_ProcStepsType': '/ReverseCreasing' },
      'u:Dimensions': { '/GTS_ProcStepsGroup': '/Dimensions' },
      'u:Legend': { '/GTS_ProcStepsGroup': '/Legend' },
    })
  })

  it('paints every operation in a spot colour of its own with overprint, black on screen', async () => {
    const pdf = await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard')
    const text = run('qpdf', ['--json', '--json-key=qpdf'], pdf)
    const names = [...text.matchAll(/"\/Foldgauge [A-Za-z ]+"/g)].map((match) => match[0])
    expect(new Set(names).size).toBe(8)
    expect(names.some((name) => /\/(Cyan|Magenta|Yellow|Black|All|None)"/.test(name))).toBe(false)
    expect(text).toMatch(/"\/OP": true/)
    expect(text).toMatch(/"\/op": true/)
  })
})

describe.runIf(hasTool('pdffonts'))('fonts as poppler reads them', () => {
  it('are embedded subsets with a map back to characters', async () => {
    const rows = run('pdffonts', [], await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard'))
      .trim()
      .split('\n')
      .slice(2)
    expect(rows.length).toBeGreaterThan(0)
    for (const row of rows) {
      expect(row).toMatch(/^[A-Z]{6}\+JetBrainsMono/)
      expect(row).toMatch(/yes yes yes/)
    }
  })

  it('has page boxes of the sheet it is printed on', async () => {
    const out = run(
      'pdfinfo',
      ['-box'],
      await pdfOf(pagesOf(anExportSet(pieces), { size: { name: 'Letter', width: 215.9, height: 279.4 } }), 'Orchard'),
    )
    expect(out).toMatch(/MediaBox:\s+0\.00\s+0\.00\s+612\.00\s+792\.00/)
    expect(out).toMatch(/TrimBox:\s+0\.00\s+0\.00\s+612\.00\s+792\.00/)
  })

  it('keeps the finished size of a book inside its bleed', async () => {
    const set = anExportSet([aCard({ name: 'card', folded: { length: 60, width: 40 } })])
    const options = {
      ...documentOptions({ size: { name: 'Letter', width: 215.9, height: 279.4 } }),
      title: 'Orchard',
      mark: 'pear',
      bleed: 3,
    }
    const out = run('pdfinfo', ['-box'], await pdfOf(bookPages([{ set, steps: planSteps(set) }], options), 'Orchard'))
    expect(out).toMatch(/MediaBox:\s+0\.00\s+0\.00\s+629\.01\s+809\.01/)
    expect(out).toMatch(/TrimBox:\s+8\.50\s+8\.50\s+620\.50\s+800\.50/)
  })
})

describe('a PDF as pdf.js reads it', () => {
  it('asks for no scaling, and gives its title, author and language', async () => {
    const document = await open(await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard notes'))
    expect(await document.getViewerPreferences()).toMatchObject({ PrintScaling: 'None', DisplayDocTitle: true })
    const { info } = (await document.getMetadata()) as unknown as { info: Record<string, unknown> }
    expect(info).toMatchObject({ Title: 'Orchard notes', Author: 'Quillfern paper goods', Language: 'en' })
    expect(await document.getMarkInfo()).toMatchObject({ Marked: true })
  })

  it('has one layer an operation, all shown', async () => {
    const document = await open(await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard'))
    const layers = await document.getOptionalContentConfig()
    const names = [...layers].map(([, group]) => (group as { name: string }).name)
    expect(names).toEqual([
      'Glue',
      'Positions',
      'Cut',
      'Perforate',
      'Score valley',
      'Score mountain',
      'Dimensions',
      'Legend',
    ])
  })

  it('gives its text in reading order: head, matter, foot', async () => {
    const pdf = await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard')
    const cover = await textOf(pdf, 1)
    const order = [
      'Start here',
      'page 1 of',
      'checked 2026-12-01',
      'Scale check: print this page alone first',
      'Pieces',
      'Papers',
      'Tools',
      'Lines',
      'Take care',
      'Must measure',
      'If it measures (mm) print at (%)',
    ].map((words) => cover.indexOf(words))
    expect(order.every((at) => at >= 0)).toBe(true)
    // The scale check repeats the window, so only what comes once is held to its order.
    expect([...order.slice(0, 9)]).toEqual([...order.slice(0, 9)].sort((a, b) => a - b))
  })

  it('says on every page what it is of, its version and digest, its number, and how the bars must measure', async () => {
    const pages = pagesOf(anExportSet(pieces))
    const pdf = await pdfOf(pages, 'Orchard')
    for (let page = 1; page <= pages.length; page += 1) {
      const content = await textOf(pdf, page)
      expect(content).toContain('not published · digest 0123456789ab')
      expect(content).toContain(`page ${String(page)} of ${String(pages.length)}`)
      expect(content).toMatch(/Must measure [\d.]+ to [\d.]+ mm, in both directions\./)
      expect(content).toMatch(/If it measures \(mm\) print at \(%\): /)
    }
  })

  it('has tagged headings and paragraphs in the order of the page', async () => {
    const page = await (await open(await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard'))).getPage(1)
    const tree = JSON.stringify(await page.getStructTree())
    expect(tree).toContain('"role":"H2"')
    expect(tree).toContain('"role":"H1"')
    expect(tree).toContain('"role":"P"')
  })

  it('stamps every page of a failing set with what fails', async () => {
    const pages = pagesOf(anExportSet(pieces, { draft: 'lid-on-base:width fails (fit/clearance)' }))
    const pdf = await pdfOf(pages, 'Orchard')
    for (let page = 1; page <= pages.length; page += 1)
      expect(await textOf(pdf, page)).toContain('DRAFT: lid-on-base:width fails')
  })

  it('writes single operations without the others', async () => {
    const pdf = await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard', new Set(['cut']))
    const layers = await (await open(pdf)).getOptionalContentConfig()
    expect([...layers].map(([, group]) => (group as { name: string }).name)).toEqual(['Cut'])
  })
})

describe('the same set', () => {
  it('gives the same bytes every time', async () => {
    const [first, second] = [
      await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard'),
      await pdfOf(pagesOf(anExportSet(pieces)), 'Orchard'),
    ]
    expect(Buffer.compare(Buffer.from(first), Buffer.from(second))).toBe(0)
  })
})

const printable = (text: string): string => [...text].filter((character) => character >= ' ').join('')

describe('hostile titles', () => {
  const titles = [
    '"><script>alert(1)</script>',
    ']]> <![CDATA[',
    'Ὀπωρών Сад São Łódź',
    '🍐🍎 pear',
    'עץ הדר',
    '\\ ( ) << /Type /Catalog >>',
    'a'.repeat(300),
    'line\nbreak\u0000\u0007',
  ]

  it('come out whole as the document title and legible on the page', async () => {
    for (const title of titles) {
      const pages = pagesOf(anExportSet([aCard({ name: 'card' })], { title }))
      const pdf = await pdfOf(pages, title)
      const document = await open(pdf)
      const { info } = (await document.getMetadata()) as unknown as { info: Record<string, unknown> }
      // pdf.js leaves control characters out of what it shows.
      expect(printable(String(info['Title']))).toBe(printable(title))
      if (hasTool('qpdf')) expect(run('qpdf', ['--check'], pdf)).toContain('No syntax')
    }
    const greek = await pdfOf(pagesOf(anExportSet([aCard({ name: 'card' })], { title: 'Сад São Łódź' })), 'x')
    expect(await textOf(greek, 1)).toContain('Сад São Łódź')
  })
})
