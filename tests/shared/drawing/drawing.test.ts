import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dashLine } from '../../../shared/drawing/dash-line.ts'
import { drawBlank } from '../../../shared/drawing/draw-blank.ts'
import { fitOnPage } from '../../../shared/drawing/fit-on-page.ts'
import { hatch } from '../../../shared/drawing/hatch.ts'
import { bareLength, lengthText, sizeText } from '../../../shared/drawing/length-text.ts'
import { dashFor, lineStyles } from '../../../shared/drawing/line-styles.ts'
import { pageSizeText, readPageSize } from '../../../shared/drawing/page-size.ts'
import { roughSheetOf } from '../../../shared/drawing/rough-sheet.ts'
import { barLengths, correctionRows, narrowWindow, windowText } from '../../../shared/drawing/scale-bar.ts'
import { charactersIn, clipText, textWidth, wrapText } from '../../../shared/drawing/text-width.ts'
import { tileCount } from '../../../shared/drawing/tile-pages.ts'
import { planSteps } from '../../../shared/exporters/steps/plan-steps.ts'
import { templateDocument } from '../../../shared/exporters/template-document.ts'
import { containsPoint } from '../../../shared/geometry/contains-point.ts'
import { rectangle } from '../../../shared/geometry/rectangle.ts'
import { drawPiece } from '../../../shared/pieces/draw-registry.ts'
import { anExportSet, documentOptions } from '../../support/export-sets.ts'
import { aBag, aBaronial, aBox, aCard, foldGiven } from '../../support/given-pieces.ts'
import { validPiece } from '../../support/valid-pieces.ts'

describe('lengths on a page', () => {
  it('are millimetres to a tenth or fractions of an inch, and say where a fraction is only near', () => {
    expect(lengthText(201.50461, 'mm')).toBe('201.5 mm')
    expect(sizeText(25.4 * 7.875, 25.4 * 6.25, 'in')).toBe('7 7/8 × 6 1/4 in')
    expect(bareLength(99, 'in')).toBe('~3 29/32')
    expect(bareLength(25.4 / 16, 'in')).toBe('1/16')
  })
})

describe('the sheet to print on', () => {
  it('is read by name or size, and always shown with its exact size', () => {
    const letter = readPageSize('Letter')
    expect(letter.ok && pageSizeText(letter.value)).toBe('Letter, 215.9 × 279.4 mm')
    const own = readPageSize('330 x 480 mm')
    expect(own.ok && [own.value.width, own.value.height]).toEqual([330, 480])
    const square = readPageSize('12x12in')
    expect(square.ok && square.value.width).toBeCloseTo(304.8, 9)
  })

  it('is refused with what to write instead', () => {
    for (const written of ['a0', '10 x 10 mm', 'big', '0x0', '-3x4']) {
      const read = readPageSize(written)
      expect(read.ok).toBe(false)
      expect(!read.ok && read.remedy).toContain('330x480mm')
    }
  })
})

describe('scale bars', () => {
  it('are the longest whole centimetres that fit, from 100 to 250 mm, and whole inches', () => {
    expect(barLengths(187)).toEqual({ mm: 180, inches: 7 })
    expect(barLengths(900)).toEqual({ mm: 250, inches: 9 })
  })

  it('tell the percentage to print at: 97.2 of 100 wants 102.88', () => {
    for (const { measured, printAt } of correctionRows({ mm: 100, inches: 3 })) {
      expect(Number(printAt)).toBeCloseTo(100 / (Number(measured) / 100), 1)
    }
  })

  it('name the window in which the fits hold, never wider than the figures on the page bear', () => {
    expect(windowText({ mm: 200, inches: 7 }, { min: 0.99, max: 1.005 })).toContain('198.0 to 201.0 mm')
    expect(narrowWindow({ min: 0.9, max: 1.1 })).toEqual({ min: 0.98, max: 1.02 })
    expect(windowText({ mm: 200, inches: 7 }, null)).toContain('exactly 200 mm')
  })
})

describe('tiles', () => {
  it('number as reckoned: 430 × 300 on A4 with margins of 5 and overlaps of 10 takes 3 × 2', () => {
    expect([tileCount(430, 200), tileCount(300, 287)]).toEqual([3, 2])
    expect(tileCount(200, 200)).toBe(1)
  })

  it('cover the whole sheet between them, repeating ten millimetres', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20, max: 1500, noNaN: true }),
        fc.double({ min: 80, max: 400, noNaN: true }),
        (length, page) => {
          const count = tileCount(length, page)
          const reach = count * page - (count - 1) * 10
          expect(reach).toBeGreaterThanOrEqual(length - 1e-6)
          if (count > 1) expect((count - 1) * page - (count - 2) * 10).toBeLessThan(length)
        },
      ),
    )
  })
})

describe('text', () => {
  it('wraps at spaces, breaks what is longer than a line, and loses nothing', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 400 }), fc.integer({ min: 4, max: 60 }), (content, room) => {
        const lines = wrapText(content, room)
        expect(lines.every((one) => [...one].length <= room)).toBe(true)
        expect(lines.join('').replace(/\s/gu, '')).toBe(content.replace(/\s/gu, ''))
      }),
    )
  })

  it('is cut to its room with an ellipsis', () => {
    expect(clipText('a'.repeat(300), 30, 2.5)).toHaveLength(charactersIn(30, 2.5))
    expect(textWidth(clipText('a'.repeat(300), 30, 2.5), 2.5)).toBeLessThanOrEqual(30)
    expect(clipText('short', 30, 2.5)).toBe('short')
  })
})

describe('patterns', () => {
  it('lay dashes end to end and cover their share of a line', () => {
    const dashes = dashLine(
      [
        { x: 0, y: 0 },
        { x: 90, y: 0 },
      ],
      lineStyles.valley.dash,
      0.25,
    )
    expect(dashes).toHaveLength(20)
    expect(dashes.reduce((sum, { from, to }) => sum + to.x - from.x, 0)).toBeCloseTo(60, 9)
  })

  it('shorten on a short line, but not below a third', () => {
    expect(dashFor(lineStyles.valley, 100)).toEqual([3, 1.5])
    expect(dashFor(lineStyles.valley, 9)).toEqual([2, 1])
    expect(dashFor(lineStyles.valley, 1)).toEqual([1, 0.5])
  })

  it('hatch inside the outline only, with at least three strokes', () => {
    const area = [
      { x: 0, y: 0 },
      { x: 30, y: 0 },
      { x: 15, y: 8 },
      { x: 30, y: 20 },
      { x: 0, y: 20 },
    ]
    const strokes = hatch(area, 2, 60)
    expect(strokes.length).toBeGreaterThan(5)
    for (const { from, to } of strokes) {
      for (const share of [0.02, 0.5, 0.98]) {
        expect(
          containsPoint(area, { x: from.x + share * (to.x - from.x), y: from.y + share * (to.y - from.y) }, 1e-6),
        ).toBe(true)
      }
    }
    expect(hatch(rectangle(0, 0, 3, 3), 2).length).toBeGreaterThanOrEqual(3)
  })
})

describe('fitting on a page', () => {
  const room = { left: 15, bottom: 24, right: 204, top: 279 }

  it('turns a sheet only where that makes it fit', () => {
    expect(fitOnPage(rectangle(0, 0, 150, 200), room)?.turn).toBe(0)
    expect(fitOnPage(rectangle(0, 0, 250, 150), room)?.turn).toBe(90)
    expect(fitOnPage(rectangle(0, 0, 300, 260), room)).toBeNull()
  })

  it('leads a nine-inch square envelope with a measuring plan on A4 and letter', () => {
    const envelope = aBaronial({ name: 'envelope', pocket: { length: 180, width: 130 } })
    for (const size of [documentOptions().size, { name: 'Letter', width: 215.9, height: 279.4 }]) {
      const set = anExportSet([envelope])
      const pages = templateDocument(set, planSteps(set), documentOptions({ size, pieces: ['envelope'] }))
      expect(pages.map((page) => page.title)).toEqual(['envelope: measuring plan', 'envelope: marking strips'])
      const tiled = templateDocument(
        set,
        planSteps(set),
        documentOptions({ size, pieces: ['envelope'], isTiled: true }),
      )
      expect(tiled.filter((page) => page.title.includes('tile')).length).toBeGreaterThan(1)
    }
  })
})

describe('a measuring plan', () => {
  it('gives every measure of the sheet, and strips with a tick for every fold', () => {
    const set = anExportSet([aBag({ name: 'bag', inside: { width: 200, depth: 90, height: 250 } })])
    const pages = templateDocument(set, planSteps(set), documentOptions({ pieces: ['bag'] }))
    const words = pages.flatMap((page) => page.marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : [])))
    const blank = set.pieces[0]?.sheets[0]?.blank
    for (const measure of blank?.measures ?? [])
      expect(words).toContain(`${measure.name}: ${lengthText(measure.length, 'mm')}`)
    for (const edge of roughSheetOf(blank ?? never()).edges.slice(0, 1)) {
      for (const mark of edge.marks) expect(words).toContain(`fold ${lengthText(mark.at, 'mm')}`)
    }
  })
})

function never(): never {
  throw new Error('no blank')
}

describe('every page', () => {
  it('keeps within the printer’s margin and carries both scale bars', () => {
    fc.assert(
      fc.property(validPiece, fc.boolean(), (given, isTiled) => {
        const set = anExportSet([given])
        for (const page of templateDocument(set, planSteps(set), documentOptions({ isTiled, margin: 6 }))) {
          for (const mark of page.marks) {
            if (mark.kind === 'text') continue
            for (const point of mark.kind === 'line' ? mark.points : mark.polygon) {
              expect(point.x, page.title).toBeGreaterThan(6 - 0.3)
              expect(point.x, page.title).toBeLessThan(page.width - 6 + 0.3)
              expect(point.y, page.title).toBeGreaterThan(6 - 0.3)
              expect(point.y, page.title).toBeLessThan(page.height - 6 + 0.3)
            }
          }
          const bars = page.marks.filter(
            (mark) => mark.kind === 'text' && / mm$/.test(mark.text) && mark.layer === 'legend' && mark.size === 2,
          )
          expect(bars.length).toBeGreaterThanOrEqual(2)
        }
      }),
      { numRuns: 40 },
    )
  })

  it('of a sheet that fits names it, its quantity, its face and its grain', () => {
    const set = anExportSet([aCard({ name: 'card' })])
    const blanks = drawPiece('card', foldGiven(aCard({ name: 'card' })), () => 'long')
    const sheet = set.pieces[0]
    const grained = {
      ...set,
      pieces:
        sheet === undefined ? [] : [{ ...sheet, sheets: blanks.map((blank) => ({ piece: 'card', blank, copies: 6 })) }],
    }
    const [page] = templateDocument(grained, planSteps(grained), documentOptions({ pieces: ['card'] }))
    const words = page?.marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : [])) ?? []
    expect(words).toContain('card')
    expect(words).toContain('make 6 · card-stock · this side up: inside')
    expect(words).toContain('grain')
  })
})

describe('one description for every exporter', () => {
  it('is the same drawing with and without its words', () => {
    const [blank] = drawPiece('base', foldGiven(aBox({ name: 'base' })))
    if (blank === undefined) throw new Error('no blank')
    const cut = (isBare: boolean) =>
      drawBlank(blank, { units: 'mm', isBare }).marks.filter((mark) => mark.layer === 'cut')
    expect(cut(true)).toEqual(cut(false))
    expect(drawBlank(blank, { units: 'mm', isBare: true }).marks.some((mark) => mark.kind === 'text')).toBe(false)
  })
})
