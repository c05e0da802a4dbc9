import type { Page } from '../drawing/drawing.ts'
import { line, text } from '../drawing/drawing.ts'
import { flowBlocks, gap, heading, paragraph, table } from '../drawing/flow.ts'
import { framePages, roomOn, type PageFrame, type PagePlan } from '../drawing/page-frame.ts'
import { placeDrawing } from '../drawing/place-drawing.ts'
import type { Millimetres } from '../units/units.ts'
import type { ExportSet } from './export-set.ts'
import { goesWith } from './goes-with.ts'
import type { Step } from './steps/step.ts'
import { frameOf, planDocument, type DocumentOptions } from './template-document.ts'

export interface BookSet {
  readonly set: ExportSet
  readonly steps: readonly Step[]
}

export interface BookOptions extends DocumentOptions {
  readonly title: string
  readonly mark: string | null
  /** Paper printed beyond the trimmed page all round. */
  readonly bleed: Millimetres
}

/** First page of a set in a book: its title and a slot for a photograph of the finished sample. */
function openingPage({ set }: BookSet, frame: PageFrame): PagePlan {
  const room = roomOn(frame, false)
  const width = room.right - room.left
  const bottom = room.bottom + 12
  const top = room.top - 26
  const words = flowBlocks(
    [
      ...heading(set.title, width, 6, 'title'),
      ...paragraph(`${set.version} · digest ${set.digest} · checked ${set.asOf}`, width, { size: 3 }),
    ],
    room,
  )
  return {
    title: set.title,
    aside: 'photograph of the finished sample',
    isTurned: false,
    marks: [
      ...(words[0] ?? []),
      line(
        'legend',
        [
          { x: room.left, y: bottom },
          { x: room.right, y: bottom },
          { x: room.right, y: top },
          { x: room.left, y: top },
        ],
        { isClosed: true, weight: 'plain' },
      ),
      text(
        'legend',
        { x: (room.left + room.right) / 2, y: (bottom + top) / 2 },
        'photograph of the finished sample',
        3.2,
        { anchor: 'middle', role: 'paragraph' },
      ),
    ],
  }
}

function contentsPages(
  entries: readonly { readonly title: string; readonly page: number }[],
  options: BookOptions,
  frame: PageFrame,
): readonly PagePlan[] {
  const room = roomOn(frame, false)
  const width = room.right - room.left
  const blocks = [
    ...heading(options.title, width, 7, 'title'),
    gap(4),
    ...table(
      ['set', 'page'],
      entries.map((entry) => [entry.title, String(entry.page)]),
      [6, 1],
      width,
      3.6,
    ),
  ]
  return flowBlocks(blocks, room).map((marks, index) => ({
    title: index === 0 ? 'Contents' : 'Contents, continued',
    aside: options.title,
    isTurned: false,
    marks,
  }))
}

/** The same page with its bleed round it: marks moved in, the finished size as its trim. */
function withBleed(page: Page, bleed: Millimetres): Page {
  if (bleed <= 0) return page
  return {
    ...page,
    width: page.width + 2 * bleed,
    height: page.height + 2 * bleed,
    trim: { left: bleed, bottom: bleed, right: page.width + bleed, top: page.height + bleed },
    marks: placeDrawing(page, { x: bleed, y: bleed, turn: 0, scale: 1 }),
  }
}

/** A family's sets in one document: contents, then each set from its opening page, numbered throughout. */
export function bookPages(sets: readonly BookSet[], options: BookOptions): readonly Page[] {
  const frames = sets.map(({ set }) => ({ ...frameOf(set, options), mark: options.mark }))
  const first = frames[0]
  if (first === undefined) return []
  const bodies = sets.map((one, index) => {
    const frame = frames[index] ?? first
    return [openingPage(one, frame), ...planDocument(one.set, one.steps, frame, options)]
  })
  const count = (contents: number): readonly { readonly title: string; readonly page: number }[] => {
    let page = contents + 1
    return sets.map(({ set }, index) => {
      const entry = { title: set.title, page }
      page += bodies[index]?.length ?? 0
      return entry
    })
  }
  const contentsFrame: PageFrame = {
    ...first,
    title: options.title,
    version: '',
    digest: first.digest,
    window: null,
    draft: null,
  }
  const length = contentsPages(count(1), options, contentsFrame).length
  const entries = count(length)
  const contents = contentsPages(entries, options, contentsFrame)
  const total = contents.length + bodies.reduce((sum, body) => sum + body.length, 0)
  const numbered = [
    { frame: contentsFrame, plans: contents, before: 0 },
    ...bodies.map((plans, index) => {
      const before = (entries[index]?.page ?? 1) - 1
      return { frame: frames[index] ?? first, plans: goesWith(plans, sets[index]?.set.fits ?? [], before), before }
    }),
  ]
  return numbered.flatMap(({ frame, plans, before }) =>
    framePages(frame, plans, { before, total }).map((page) => withBleed(page, options.bleed)),
  )
}
