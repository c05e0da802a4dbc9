import { deflateSync } from 'node:zlib'
import { beforeAll, describe, expect, it } from 'vitest'
import { readDocumentFonts } from '../../../cli/inputs/document-fonts.ts'
import type { LayerName, Page } from '../../../shared/drawing/drawing.ts'
import { lineStyles } from '../../../shared/drawing/line-styles.ts'
import { writePdf, type DocumentFont } from '../../../shared/exporters/pdf/write-pdf.ts'
import { planSteps } from '../../../shared/exporters/steps/plan-steps.ts'
import { templateDocument } from '../../../shared/exporters/template-document.ts'
import type { PieceGiven } from '../../../shared/pieces/given.ts'
import { anExportSet, documentOptions, pageNamed } from '../../support/export-sets.ts'
import { aBag, aBaronial, aBox, aCard, anInsert, aSleeve, aSquareFlap } from '../../support/given-pieces.ts'
import { darkBounds, hasTool, rasterPdf, type Raster } from '../../support/outside-tools.ts'

const near = 0.1

let fonts: readonly DocumentFont[] = []
beforeAll(async () => {
  fonts = await readDocumentFonts('Ωж ł')
})

/** The true-size page of a piece on the smallest sheet that holds it. */
function pageOf(given: PieceGiven, sizes: readonly string[] = ['a4', 'tabloid']): Page {
  const set = anExportSet([given])
  for (const size of sizes) {
    const options = documentOptions({ size: pageNamed(size), pieces: [given.name] })
    const page = templateDocument(set, planSteps(set), options)[0]
    if (page !== undefined && !page.title.includes('plan')) return page
  }
  throw new Error(`${given.name} fits no page`)
}

const pdfOf = (page: Page, layers: readonly LayerName[]): Promise<Uint8Array> =>
  writePdf([page], {
    title: 'x',
    author: 'x',
    language: 'en',
    fonts,
    deflate: deflateSync,
    digest: '00',
    layers: new Set(layers),
  })

/** Middles of dark bands across the picture along one axis, in millimetres: where lines of one direction lie. */
function bandsOf(raster: Raster, axis: 'x' | 'y', leastShare: number): readonly number[] {
  const across = axis === 'x' ? raster.width : raster.height
  const counts = new Array<number>(across).fill(0)
  for (let y = 0; y < raster.height; y += 1) {
    const row = raster.row(y)
    for (let x = row.indexOf(0); x >= 0; x = row.indexOf(0, x + 1)) {
      const index = axis === 'x' ? x : y
      counts[index] = (counts[index] ?? 0) + 1
    }
  }
  const most = Math.max(...counts)
  const bands: number[] = []
  let start = -1
  for (let a = 0; a <= across; a += 1) {
    const isBand = (counts[a] ?? 0) >= most * leastShare && most > 0
    if (isBand && start < 0) start = a
    if (!isBand && start >= 0) {
      bands.push((start + a) / 2 / raster.perMm)
      start = -1
    }
  }
  return bands
}

describe.runIf(hasTool('pdftoppm'))('pages rastered at 600 dpi', () => {
  const samples: readonly { readonly given: PieceGiven; readonly size: readonly [number, number] }[] = [
    { given: aBox({ name: 'base' }), size: [200, 158] },
    { given: aCard({ name: 'card' }), size: [210, 148] },
    { given: aCard({ name: 'short-card', fold: 'short-edge', folded: { length: 120, width: 90 } }), size: [240, 90] },
    { given: aSquareFlap({ name: 'square-envelope', pocket: { length: 120, width: 80 } }), size: [150, 74 + 80 + 32] },
    {
      given: aSleeve({ name: 'sleeve', blank: { length: 230, width: 60, scores: [80, 110, 190, 215] } }),
      size: [230, 60],
    },
    {
      given: aBag({ name: 'bag', inside: { width: 60, depth: 30, height: 120 } }),
      size: [15 + 2 * 60.3 + 2 * 30.3, 30 + 120 + 35.15],
    },
    { given: anInsert({ name: 'divider', size: { length: 140, width: 95 } }), size: [140, 95] },
  ]

  it('show every blank as large as its measures, from the pixels of its cut line', async () => {
    for (const { given, size } of samples) {
      const raster = rasterPdf(await pdfOf(pageOf(given), ['cut']), 600, 1)
      const { left, right, top, bottom } = darkBounds(raster)
      const line = lineStyles.cut.width
      const measured = [right - left - line, bottom - top - line].sort((a, b) => a - b)
      const expected = [...size].sort((a, b) => a - b)
      measured.forEach((value, index) => {
        expect(Math.abs(value - (expected[index] ?? 0)), `${given.name} measures ${value.toFixed(3)}`).toBeLessThan(
          near,
        )
      })
    }
  })

  it('show the scores of a box 20 mm in from its edges', async () => {
    const page = pageOf(aBox({ name: 'base' }))
    const cut = darkBounds(rasterPdf(await pdfOf(page, ['cut']), 600, 1))
    const raster = rasterPdf(await pdfOf(page, ['valley']), 600, 1)
    const half = lineStyles.cut.width / 2
    const edges = { left: cut.left + half, right: cut.right - half, top: cut.top + half, bottom: cut.bottom - half }
    const across = bandsOf(raster, 'x', 0.5)
    const down = bandsOf(raster, 'y', 0.5)
    expect(across.some((x) => Math.abs(x - edges.left - 20) < near)).toBe(true)
    expect(across.some((x) => Math.abs(edges.right - x - 20) < near)).toBe(true)
    expect(down.some((y) => Math.abs(y - edges.top - 20) < near)).toBe(true)
    expect(down.some((y) => Math.abs(edges.bottom - y - 20) < near)).toBe(true)
  })

  it('show a card folded in the middle and a sleeve scored where it says', async () => {
    const card = pageOf(aCard({ name: 'card' }))
    const cardCut = darkBounds(rasterPdf(await pdfOf(card, ['cut']), 600, 1))
    const raster = rasterPdf(await pdfOf(card, ['valley']), 600, 1)
    const isUpright = cardCut.right - cardCut.left > cardCut.bottom - cardCut.top
    const folds = bandsOf(raster, isUpright ? 'x' : 'y', 0.6)
    const middle = isUpright ? (cardCut.left + cardCut.right) / 2 : (cardCut.top + cardCut.bottom) / 2
    expect(folds.some((at) => Math.abs(at - middle) < near)).toBe(true)
    const sleeve = pageOf(aSleeve({ name: 'sleeve', blank: { length: 230, width: 60, scores: [80, 110, 190, 215] } }))
    const cut = darkBounds(rasterPdf(await pdfOf(sleeve, ['cut']), 600, 1))
    const isLevel = cut.right - cut.left > cut.bottom - cut.top
    const half = lineStyles.cut.width / 2
    const start = isLevel ? cut.left + half : cut.bottom - half
    const bands = bandsOf(rasterPdf(await pdfOf(sleeve, ['valley']), 600, 1), isLevel ? 'x' : 'y', 0.4).map((at) =>
      Math.abs(at - start),
    )
    for (const score of [80, 110, 190, 215])
      expect(
        bands.some((at) => Math.abs(at - score) < near),
        `score at ${String(score)}`,
      ).toBe(true)
  })

  it('show a square that stands on a corner point to point, and its pocket between its folds', async () => {
    const given = aBaronial({ name: 'envelope', pocket: { length: 110, width: 80 }, seam: { bottom: 12, top: 12 } })
    const square = (110 + 80) / Math.SQRT2 + 12
    const page = pageOf(given, ['tabloid'])
    const cut = darkBounds(rasterPdf(await pdfOf(page, ['cut']), 600, 1))
    // A mitred right-angled point reaches half the line's width times √2 beyond the corner.
    const diagonal = square * Math.SQRT2 + lineStyles.cut.width * Math.SQRT2
    expect(Math.abs(cut.right - cut.left - diagonal)).toBeLessThan(near)
    const raster = rasterPdf(await pdfOf(page, ['valley']), 600, 1)
    const [across, down] = [bandsOf(raster, 'x', 0.4), bandsOf(raster, 'y', 0.4)]
    expect(Math.abs(Math.max(...across) - Math.min(...across) - 110)).toBeLessThan(near)
    expect(Math.abs(Math.max(...down) - Math.min(...down) - 80)).toBeLessThan(near)
  })

  it('show scale bars as long as they say, in both directions, in millimetres and inches', async () => {
    const set = anExportSet([aCard({ name: 'card' })])
    const page = templateDocument(set, planSteps(set), documentOptions({ pieces: ['card'] }))[0]
    if (page === undefined) throw new Error('no page')
    const bare: Page = { ...page, marks: page.marks.filter((mark) => mark.kind === 'line') }
    const raster = rasterPdf(await pdfOf(bare, ['legend']), 600, 1)
    const longest = (axis: 'x' | 'y', from: number, to: number): number => {
      const [outer, inner] = axis === 'x' ? [raster.height, raster.width] : [raster.width, raster.height]
      let best = 0
      for (let a = Math.round(from * outer); a < to * outer; a += 1) {
        let run = 0
        for (let b = 0; b < inner; b += 1) {
          run = (axis === 'x' ? raster.isDark(b, a) : raster.isDark(a, b)) ? run + 1 : 0
          best = Math.max(best, run)
        }
      }
      return best / raster.perMm
    }
    // The bar at the foot and the one up the left side; a tick's width reaches beyond each end.
    expect(Math.abs(longest('x', 0.9, 1) - 180)).toBeLessThan(near + lineStyles.legend.width)
    expect(Math.abs(longest('y', 0, 0.1) - 250)).toBeLessThan(near + lineStyles.legend.width)
  })
})

describe.runIf(hasTool('pdftoppm'))('lines in black and white at 300 dpi', () => {
  it('are told apart by width and pattern alone', async () => {
    const runsOf = async (layer: LayerName): Promise<{ readonly width: number; readonly runs: readonly number[] }> => {
      const page: Page = {
        width: 120,
        height: 30,
        title: layer,
        trim: null,
        marks: [
          {
            kind: 'line',
            layer,
            points: [
              { x: 10, y: 15 },
              { x: 110, y: 15 },
            ],
            isClosed: false,
            weight: 'own',
          },
        ],
      }
      const raster = rasterPdf(await pdfOf(page, [layer]), 300, 1)
      const { top, bottom } = darkBounds(raster)
      const row = Math.round(((top + bottom) / 2) * raster.perMm)
      const runs: number[] = []
      let run = 0
      for (let x = 0; x <= raster.width; x += 1) {
        if (x < raster.width && raster.isDark(x, row)) run += 1
        else if (run > 0) {
          runs.push(run / raster.perMm)
          run = 0
        }
      }
      return { width: bottom - top, runs }
    }
    const [cut, valley, mountain, perforate, dimension] = await Promise.all(
      (['cut', 'valley', 'mountain', 'perforate', 'dimension'] as const).map(runsOf),
    )
    if (!cut || !valley || !mountain || !perforate || !dimension) throw new Error('a line is missing')
    expect(cut.runs).toHaveLength(1)
    expect(dimension.runs).toHaveLength(1)
    expect(cut.width).toBeGreaterThan(1.7 * dimension.width)
    expect(new Set(valley.runs.slice(0, -1).map((run) => Math.round(run)))).toEqual(new Set([3]))
    expect(Math.max(...mountain.runs)).toBeGreaterThan(4.5)
    expect(Math.min(...mountain.runs.slice(0, -1))).toBeLessThan(0.8)
    expect(perforate.runs.length).toBeGreaterThan(50)
    expect(Math.max(...perforate.runs)).toBeLessThan(0.8)
  })

  it('have three whole repeats, or a letter or word beside them, on every page', () => {
    const pieces = [
      aCard({ name: 'card', style: 'accordion', panels: 4, folded: { length: 30, width: 20 } }),
      aBox({
        name: 'base',
        by: { given: 'blank', blank: { length: 70, width: 60 }, wall: { length: [9, 9], width: [9, 9] } },
      }),
    ]
    for (const given of pieces) {
      const page = pageOf(given)
      const scores = page.marks.flatMap((mark) =>
        mark.kind === 'line' && (mark.layer === 'valley' || mark.layer === 'mountain') ? [mark] : [],
      )
      expect(scores.length).toBeGreaterThan(2)
      for (const score of scores) {
        const [from, to] = score.points
        if (from === undefined || to === undefined) throw new Error('a score without ends')
        const long = Math.hypot(to.x - from.x, to.y - from.y)
        const period = lineStyles[score.layer].dash.reduce((sum, part) => sum + part, 0)
        const hasLabel = page.marks.some(
          (mark) =>
            mark.kind === 'text' &&
            mark.layer === score.layer &&
            Math.hypot(mark.at.x - (from.x + to.x) / 2, mark.at.y - (from.y + to.y) / 2) < long / 2 + 3,
        )
        expect(long >= 3 * period || hasLabel, `${given.name}: a ${score.layer} score ${long.toFixed(1)} mm long`).toBe(
          true,
        )
      }
    }
  })
})
