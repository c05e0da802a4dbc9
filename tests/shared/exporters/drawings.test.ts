import DxfParser from 'dxf-parser'
import fc from 'fast-check'
import { existsSync } from 'node:fs'
import { chromium } from 'playwright-core'
import { describe, expect, it } from 'vitest'
import { drawBlank } from '../../../shared/drawing/draw-blank.ts'
import { writeDxf } from '../../../shared/exporters/dxf/write-dxf.ts'
import { exportDrawings } from '../../../shared/exporters/export-drawings.ts'
import { areaOf } from '../../../shared/geometry/area.ts'
import { crossingsOf } from '../../../shared/geometry/crossings.ts'
import type { Polygon } from '../../../shared/geometry/shapes.ts'
import { mirrorAcross, movePolygon } from '../../../shared/geometry/transform.ts'
import { drawPiece } from '../../../shared/pieces/draw-registry.ts'
import { anExportSet } from '../../support/export-sets.ts'
import { aBaronial, aBox, aCard, aSquareFlap, foldGiven } from '../../support/given-pieces.ts'
import { validPiece } from '../../support/valid-pieces.ts'

interface Entity {
  readonly type: string
  readonly layer: string
  readonly shape?: boolean
  readonly vertices?: readonly { readonly x: number; readonly y: number }[]
  readonly text?: string
}

interface ReadDxf {
  readonly header: Readonly<Record<string, unknown>>
  readonly entities: readonly Entity[]
  readonly tables: { readonly layer: { readonly layers: Readonly<Record<string, unknown>> } }
}

function readDxf(text: string): ReadDxf {
  const read: unknown = new DxfParser().parseSync(text)
  return read as ReadDxf
}

const cutOutlines = (dxf: ReadDxf): readonly Polygon[] =>
  dxf.entities
    .filter((entity) => entity.layer === 'CUT' && entity.shape === true)
    .map((entity) => (entity.vertices ?? []).map(({ x, y }) => ({ x, y })))

const plain = { units: 'mm', layers: null, areDashesDrawn: false } as const

describe('DXF as a general reader takes it', () => {
  it('declares its unit, and one layer an operation with plain names', () => {
    const [blank] = drawPiece('base', foldGiven(aBox({ name: 'base' })))
    if (blank === undefined) throw new Error('no blank')
    const dxf = readDxf(writeDxf(drawBlank(blank, { units: 'mm' }), plain))
    expect(dxf.header['$INSUNITS']).toBe(4)
    expect(Object.keys(dxf.tables.layer.layers)).toEqual(
      expect.arrayContaining(['CUT', 'SCORE_VALLEY', 'GLUE', 'DIMENSIONS', 'LEGEND']),
    )
    expect(dxf.entities.filter((entity) => entity.layer === 'CUT').every((entity) => entity.text === undefined)).toBe(
      true,
    )
    const inches = readDxf(writeDxf(drawBlank(blank, { units: 'in' }), { ...plain, units: 'in' }))
    expect(inches.header['$INSUNITS']).toBe(1)
    expect(areaOf(cutOutlines(inches)[0] ?? [])).toBeCloseTo(areaOf(blank.outline) / 25.4 ** 2, 6)
  })

  it('has closed cut outlines without crossings, as large as the blank to a millionth, for every kind of piece', () => {
    fc.assert(
      fc.property(validPiece, (given) => {
        for (const blank of drawPiece('piece', foldGiven(given))) {
          const outlines = cutOutlines(readDxf(writeDxf(drawBlank(blank, { units: 'mm' }), plain)))
          expect(outlines).toHaveLength(1)
          const outline = outlines[0] ?? []
          expect(crossingsOf(outline)).toEqual([])
          expect(Math.abs(areaOf(outline) - areaOf(blank.outline))).toBeLessThan(1e-6)
        }
      }),
      { numRuns: 60 },
    )
  })

  it('has no line twice', () => {
    fc.assert(
      fc.property(validPiece, (given) => {
        for (const blank of drawPiece('piece', foldGiven(given))) {
          const dxf = readDxf(writeDxf(drawBlank(blank, { units: 'mm', isBare: true }), plain))
          const keys = dxf.entities.flatMap(({ vertices = [], layer, type }) => {
            if (type !== 'LINE') return []
            const ends = vertices.map(({ x, y }) => `${x.toFixed(4)},${y.toFixed(4)}`).sort()
            return [`${layer} ${ends.join(' ')}`]
          })
          expect(new Set(keys).size).toBe(keys.length)
        }
      }),
      { numRuns: 60 },
    )
  })

  it('agrees for a shape and its mirror image', () => {
    const [blank] = drawPiece('envelope', foldGiven(aBaronial({ name: 'envelope' })))
    if (blank === undefined) throw new Error('no blank')
    const mirrored = {
      ...blank,
      outline: movePolygon(blank.outline, mirrorAcross),
      areas: [],
      scores: [],
      measures: [],
    }
    const [plainOutline] = cutOutlines(readDxf(writeDxf(drawBlank(blank, { units: 'mm' }), plain)))
    const [mirrorOutline] = cutOutlines(readDxf(writeDxf(drawBlank(mirrored, { units: 'mm' }), plain)))
    expect(areaOf(mirrorOutline ?? [])).toBeCloseTo(areaOf(plainOutline ?? []), 9)
    const back = movePolygon(mirrorOutline ?? [], mirrorAcross)
    const first = new Set((plainOutline ?? []).map(({ x, y }) => `${x.toFixed(6)},${y.toFixed(6)}`))
    expect(back.every(({ x, y }) => first.has(`${x.toFixed(6)},${y.toFixed(6)}`))).toBe(true)
  })

  it('draws dashes as strokes on request', () => {
    const [blank] = drawPiece('card', foldGiven(aCard({ name: 'card' })))
    if (blank === undefined) throw new Error('no blank')
    const strokes = (areDashesDrawn: boolean): number =>
      readDxf(writeDxf(drawBlank(blank, { units: 'mm' }), { ...plain, areDashesDrawn })).entities.filter(
        (entity) => entity.layer === 'SCORE_VALLEY' && entity.type === 'LINE',
      ).length
    expect(strokes(false)).toBe(1)
    expect(strokes(true)).toBe(Math.ceil(148 / 4.5))
  })

  it('is the same text every time', () => {
    const set = anExportSet([aBox({ name: 'base' })])
    const write = () => exportDrawings(set, { format: 'dxf', isSeparate: false, areDashesDrawn: false, pieces: null })
    expect(write()).toEqual(write())
  })
})

describe('hostile titles in drawings', () => {
  const titles = [
    '"><script>alert(1)</script>',
    ']]> <x>',
    "it's & 'so'",
    '🍐 pear',
    'עץ הדר',
    'a'.repeat(300),
    'line\nbreak\u0000',
  ]

  it('leave SVG well formed and DXF readable', () => {
    for (const title of titles) {
      const set = anExportSet([aCard({ name: 'card' })], { title })
      const [svg] = exportDrawings(set, { format: 'svg', isSeparate: false, areDashesDrawn: false, pieces: null })
      const content = String(svg?.content)
      expect(content).not.toContain('<script')
      expect(content).not.toContain('\u0000')
      const [dxf] = exportDrawings(set, { format: 'dxf', isSeparate: false, areDashesDrawn: false, pieces: null })
      expect(() => readDxf(String(dxf?.content))).not.toThrow()
    }
  })

  it('never make a file name that leaves its folder', () => {
    const set = anExportSet([aCard({ name: 'card' })], { name: '../../etc/pass wd' })
    for (const file of exportDrawings(set, { format: 'svg', isSeparate: true, areDashesDrawn: false, pieces: null })) {
      expect(file.name).toMatch(/^[a-z0-9][a-z0-9.-]*\.svg$/)
    }
  })
})

const browserPath = '/usr/bin/chromium'

describe.runIf(existsSync(browserPath))('SVG in a browser', () => {
  it('is well formed and as large as its measures, from pixels', async () => {
    const browser = await chromium.launch({ executablePath: browserPath, args: ['--no-sandbox'] })
    try {
      const page = await browser.newPage({ deviceScaleFactor: 4, viewport: { width: 1000, height: 900 } })
      const perMm = (96 / 25.4) * 4
      for (const [given, width, height] of [
        [aBox({ name: 'base' }), 200, 158],
        [aCard({ name: 'card' }), 210, 148],
        [aSquareFlap({ name: 'envelope', pocket: { length: 120, width: 80 } }), 150, 186],
      ] as const) {
        const set = anExportSet([given], { title: '"><b>&' })
        const [file] = exportDrawings(set, { format: 'svg', isSeparate: true, areDashesDrawn: false, pieces: null })
        const svg = String(file?.content).replace(/^<\?xml[^>]*>\s*/, '')
        // A browser snaps a bare SVG file to whole pixels; inside a page it keeps its size.
        await page.setContent(`<body style="margin:0;background:#fff">${svg}</body>`)
        const isBroken = await page.evaluate(
          (markup) => new DOMParser().parseFromString(markup, 'image/svg+xml').querySelector('parsererror') !== null,
          svg,
        )
        expect(isBroken).toBe(false)
        const picture = await page.screenshot()
        const bounds = await page.evaluate(async (data) => {
          const image = new Image()
          image.src = `data:image/png;base64,${data}`
          await image.decode()
          const canvas = new OffscreenCanvas(image.width, image.height)
          const context = canvas.getContext('2d')
          if (context === null) throw new Error('no canvas')
          context.drawImage(image, 0, 0)
          const pixels = context.getImageData(0, 0, image.width, image.height).data
          let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity]
          for (let y = 0; y < image.height; y += 1) {
            for (let x = 0; x < image.width; x += 1) {
              if ((pixels[(y * image.width + x) * 4] ?? 255) > 127) continue
              left = Math.min(left, x)
              right = Math.max(right, x + 1)
              top = Math.min(top, y)
              bottom = Math.max(bottom, y + 1)
            }
          }
          return { width: right - left, height: bottom - top }
        }, picture.toString('base64'))
        expect(Math.abs(bounds.width / perMm - 0.5 - width)).toBeLessThan(0.1)
        expect(
          Math.abs(bounds.height / perMm - 0.5 - height),
          `${given.name} ${String(bounds.height / perMm)}`,
        ).toBeLessThan(0.1)
      }
    } finally {
      await browser.close()
    }
  })
})
