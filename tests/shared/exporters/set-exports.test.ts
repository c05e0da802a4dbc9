import { describe, expect, it } from 'vitest'
import { judgeSet } from '../../../shared/assembly/judge-set.ts'
import { checkSet } from '../../../shared/check-template.ts'
import { bookPages } from '../../../shared/exporters/book.ts'
import { cutList } from '../../../shared/exporters/cut-list.ts'
import { editionIn } from '../../../shared/exporters/edition.ts'
import { exportSet, type ExportSet } from '../../../shared/exporters/export-set.ts'
import { planSteps } from '../../../shared/exporters/steps/plan-steps.ts'
import { templateDocument } from '../../../shared/exporters/template-document.ts'
import { readSet } from '../../../shared/template/read-set.ts'
import type { TemplateSet } from '../../../shared/template/template-model.ts'
import { isOnGrid } from '../../../shared/units/grid.ts'
import { demoSets, demoWorkspace } from '../../support/demo.ts'
import { anExportSet, documentOptions } from '../../support/export-sets.ts'
import { aBox, aCard, anInsert } from '../../support/given-pieces.ts'
import { carryOut } from '../../support/steps-interpreter.ts'

const options = { file: 'set.yaml', asOf: '2026-12-01' }

function demo(): readonly { readonly file: string; readonly set: TemplateSet; readonly made: ExportSet }[] {
  const workspace = demoWorkspace()
  return demoSets().map(({ file, text }) => {
    const { set } = readSet(text, file, workspace)
    if (set === null) throw new Error(`${file} cannot be read`)
    return { file, set, made: exportSet(judgeSet(set, options), checkSet(set, options), 'version 1') }
  })
}

const words = (pages: ReturnType<typeof templateDocument>): string =>
  pages.flatMap((page) => page.marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : []))).join('\n')

describe('the demo sets', () => {
  it('export whole: every sheet has its page, every step its sheet', () => {
    for (const { file, made } of demo()) {
      const steps = planSteps(made)
      const pages = templateDocument(made, steps, documentOptions())
      for (const { blank } of made.pieces.flatMap((piece) => piece.sheets)) {
        expect(
          pages.some((page) => page.title.startsWith(blank.name)),
          `${file}: ${blank.name}`,
        ).toBe(true)
      }
      expect(() => carryOut(steps), file).not.toThrow()
      expect(words(pages), file).toContain('version 1 · digest')
    }
  })

  it('tell on the page of a piece which pages hold what it goes with', () => {
    const notes = demo().find(({ file }) => file.endsWith('fern-notes.yaml'))
    if (notes === undefined) throw new Error('no such set')
    const pages = templateDocument(notes.made, planSteps(notes.made), documentOptions())
    const lidPage = pages.findIndex((page) => page.title === 'lid') + 1
    const base = pages.find((page) => page.title === 'base')
    const heads = base?.marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : [])).join(' ') ?? ''
    expect(lidPage).toBeGreaterThan(0)
    expect(heads).toMatch(new RegExp(`goes with pages? [\\d, and]*\\b${String(lidPage)}\\b`))
  })
})

describe('large print', () => {
  it('keeps everything on its pages, in type of at least 22 points for the steps', () => {
    for (const { file, made } of demo()) {
      const pages = templateDocument(made, planSteps(made), documentOptions({ isLargePrint: true }))
      for (const page of pages) {
        for (const mark of page.marks) {
          if (mark.kind !== 'text') continue
          expect(mark.at.y, `${file}, ${page.title}: ${mark.text}`).toBeGreaterThan(5)
          expect(mark.at.y).toBeLessThan(page.height - 5)
          if (
            page.title.startsWith('Steps') &&
            mark.role === 'paragraph' &&
            mark.at.y > 24 &&
            mark.at.y < page.height - 18
          ) {
            expect(mark.size).toBeGreaterThanOrEqual(0.85 * 22 * (25.4 / 72))
          }
        }
      }
    }
  })
})

describe('the cut list', () => {
  it('lays every sheet once on paper, none over another, and counts what is left', () => {
    for (const { file, made } of demo()) {
      for (const list of cutList(made)) {
        const wanted = list.items
          .filter((item) => !list.tooLarge.includes(item))
          .reduce((sum, item) => sum + item.copies, 0)
        expect(
          list.sheets.reduce((sum, sheet) => sum + sheet.placed.length, 0),
          `${file} ${list.title}`,
        ).toBe(wanted)
        for (const sheet of list.sheets) {
          const parts = [...sheet.placed, ...sheet.offcuts]
          parts.forEach((a, index) => {
            expect(a.x + a.length).toBeLessThanOrEqual(list.sheet.length + 1e-6)
            expect(a.y + a.width).toBeLessThanOrEqual(list.sheet.width + 1e-6)
            for (const b of parts.slice(index + 1)) {
              const apart =
                a.x + a.length <= b.x + 1e-6 ||
                b.x + b.length <= a.x + 1e-6 ||
                a.y + a.width <= b.y + 1e-6 ||
                b.y + b.width <= a.y + 1e-6
              expect(apart, `${file}: two parts of ${list.title} overlap`).toBe(true)
            }
          })
        }
      }
    }
  })

  it('says that 5 × 7 in comes three times from 12 × 12 in by straight cuts and four times by knife', () => {
    const inch = 25.4
    const set = anExportSet([anInsert({ name: 'card', size: { length: 7 * inch, width: 5 * inch } })], {
      sheet: { name: '12x12in', length: 12 * inch, width: 12 * inch },
    })
    const [list] = cutList(set)
    expect(list?.items[0]).toMatchObject({ guillotine: 3, knife: 4 })
  })

  it('takes small sheets from what large ones leave over', () => {
    const set = anExportSet([aBox({ name: 'base' }), anInsert({ name: 'label', size: { length: 80, width: 40 } })])
    const [list] = cutList(set)
    expect(list?.sheets).toHaveLength(1)
    expect(list?.fromOffcuts).toEqual(['label'])
  })

  it('names what does not go on its paper', () => {
    const set = anExportSet([anInsert({ name: 'poster', size: { length: 500, width: 400 } })])
    const [list] = cutList(set)
    expect(list?.tooLarge.map((item) => item.name)).toEqual(['poster'])
  })
})

describe('the other edition', () => {
  it('lies on the marks of the other ruler throughout, and its steps say so', () => {
    for (const { file, set } of demo()) {
      const other = set.tokens.units === 'mm' ? 'in' : 'mm'
      const edition = editionIn(set, other, options)
      expect(edition.tokens.units).toBe(other)
      const { cut, score } = edition.tokens.ruler
      for (const piece of judgeSet(edition, options).pieces.values()) {
        if (piece.form.kind !== 'box' || piece.blank === null) continue
        expect(isOnGrid(piece.blank.length, cut), `${file} ${piece.given.name}`).toBe(true)
        for (const wall of [...piece.form.walls.length, ...piece.form.walls.width])
          expect(isOnGrid(wall, score)).toBe(true)
      }
      const made = exportSet(judgeSet(edition, options), checkSet(edition, options), 'version 1')
      expect(words(templateDocument(made, planSteps(made), documentOptions()))).toContain(
        other === 'in' ? 'measures in inches' : 'measures in millimetres',
      )
    }
  })

  it('is the set itself in its own unit', () => {
    const [first] = demo()
    if (first === undefined) throw new Error('no demo')
    expect(editionIn(first.set, first.set.tokens.units, options)).toBe(first.set)
  })

  it('is judged again: its report is another than that of the first design', () => {
    const notes = demo().find(({ file }) => file.endsWith('fern-notes.yaml'))
    if (notes === undefined) throw new Error('no such set')
    const edition = editionIn(notes.set, 'in', options)
    expect(checkSet(edition, options).digest).not.toBe(checkSet(notes.set, options).digest)
  })
})

describe('a book of a family', () => {
  it('has contents whose pages are right, the family mark on every page, and a slot for a photograph', () => {
    const sets = demo()
      .filter(({ made }) => made.family?.name === 'fernbrook')
      .map(({ made }) => ({ set: made, steps: planSteps(made) }))
    expect(sets.length).toBeGreaterThan(1)
    const pages = bookPages(sets, { ...documentOptions(), title: 'Fernbrook', mark: 'fern', bleed: 3 })
    const text = (index: number): readonly string[] =>
      pages[index]?.marks.flatMap((mark) => (mark.kind === 'text' ? [mark.text] : [])) ?? []
    const contents = text(0)
    for (const { set } of sets) {
      const page = Number(contents[contents.indexOf(set.title) + 1])
      expect(text(page - 1), set.title).toContain(set.title)
      expect(text(page - 1)).toContain('photograph of the finished sample')
    }
    pages.forEach((page, index) => {
      expect(text(index)).toContain(`page ${String(index + 1)} of ${String(pages.length)}`)
      expect(page.trim).toEqual({ left: 3, bottom: 3, right: page.width - 3, top: page.height - 3 })
      if (index > 0) expect(text(index).some((word) => word.startsWith('fern · '))).toBe(true)
    })
  })
})

describe('equal sheets of one piece', () => {
  it('are drawn once and counted', () => {
    const set = anExportSet([aBox({ name: 'base', walls: 'doubled' }), aCard({ name: 'card' })])
    expect(set.pieces[0]?.sheets).toHaveLength(5)
    const [sampler] = demo().filter(({ file }) => file.endsWith('lark-sampler.yaml'))
    const names = sampler?.made.pieces.flatMap((piece) =>
      piece.sheets.map((sheet) => `${sheet.blank.name} × ${String(sheet.copies)}`),
    )
    expect(names).toContain('base/side wall lining × 2')
  })
})
