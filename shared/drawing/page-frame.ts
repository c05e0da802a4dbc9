import type { Bounds } from '../geometry/bounds.ts'
import type { Millimetres, RulerUnit } from '../units/units.ts'
import { line, text, type Mark, type Page } from './drawing.ts'
import { pageSizeText, type PageSize } from './page-size.ts'
import { barLengths, correctionLine, scaleBar, windowText, type PrintWindow } from './scale-bar.ts'
import { charactersIn, clipText, textWidth } from './text-width.ts'

/** What every page of a document carries besides its own matter. */
export interface PageFrame {
  readonly size: PageSize
  /** Strip along the edges on which the printer prints nothing. */
  readonly margin: Millimetres
  readonly units: RulerUnit
  readonly title: string
  /** `version 3`, or words for one that was never published. */
  readonly version: string
  readonly digest: string
  readonly window: PrintWindow | null
  /** Stamped on every page; `null` for a set that passes. */
  readonly draft: string | null
  /** Family's mark, a word or sign; shown in a book. */
  readonly mark: string | null
}

/** A page before it is numbered. */
export interface PagePlan {
  readonly title: string
  /** Beside the title, in the same line. */
  readonly aside: string
  readonly isTurned: boolean
  readonly marks: readonly Mark[]
  readonly trim?: Page['trim']
  /** Sheets whose true-size page this is, for `goes with page n`. */
  readonly piece?: string
}

const headHeight: Millimetres = 13
const footHeight: Millimetres = 19
const barStrip: Millimetres = 10
const small: Millimetres = 2.3

const sizeOf = (frame: PageFrame, isTurned: boolean): { readonly width: Millimetres; readonly height: Millimetres } =>
  isTurned ? { width: frame.size.height, height: frame.size.width } : frame.size

/** The part of a page left for its own matter. */
export function roomOn(frame: PageFrame, isTurned: boolean): Bounds {
  const { width, height } = sizeOf(frame, isTurned)
  return {
    left: frame.margin + barStrip,
    bottom: frame.margin + footHeight,
    right: width - frame.margin - 1,
    top: height - frame.margin - headHeight,
  }
}

function headMarks(frame: PageFrame, plan: PagePlan, number: number, count: number): readonly Mark[] {
  const { width, height } = sizeOf(frame, plan.isTurned)
  const left = frame.margin + 1
  const right = width - frame.margin - 1
  const top = height - frame.margin
  const across = right - left
  const pageText = `page ${String(number)} of ${String(count)}`
  const below = [frame.title, frame.version, frame.digest === '' ? '' : `digest ${frame.digest}`]
    .filter((part) => part !== '')
    .join(' · ')
  const mark = frame.mark === null ? '' : `${frame.mark} · `
  const titleText = clipText(plan.title, across * 0.6, 4)
  const titleWidth = textWidth(titleText, 4) * 1.02
  return [
    text('legend', { x: left, y: top - 4.2 }, titleText, 4, { isBold: true, role: 'heading' }),
    text('legend', { x: right, y: top - 4.2 }, clipText(plan.aside, across - titleWidth - 3, 2.6), 2.6, {
      anchor: 'end',
      role: 'paragraph',
    }),
    text(
      'legend',
      { x: left, y: top - 8.4 },
      clipText(`${mark}${below}`, across - textWidth(pageText, small) - 3, small),
      small,
      { role: 'paragraph' },
    ),
    text('legend', { x: right, y: top - 8.4 }, pageText, small, { anchor: 'end', role: 'paragraph' }),
    line(
      'legend',
      [
        { x: left, y: top - 10.5 },
        { x: right, y: top - 10.5 },
      ],
      { weight: 'plain' },
    ),
  ]
}

function footMarks(frame: PageFrame, isTurned: boolean): readonly Mark[] {
  const { width, height } = sizeOf(frame, isTurned)
  const left = frame.margin + barStrip
  const bottom = frame.margin
  const across = width - frame.margin - 1 - left
  const bars = { x: barLengths(across), y: barLengths(height - 2 * frame.margin - headHeight - footHeight + 2) }
  const lineRoom = charactersIn(across, small)
  const words = [
    `${windowText(bars.x, frame.window)} Print at 100 %, no fit to page, on ${pageSizeText(frame.size)}.`,
    correctionLine(bars.x, lineRoom),
  ]
  return [
    ...scaleBar({ x: left, y: bottom + 12.2 }, bars.x, 'x'),
    ...scaleBar({ x: frame.margin + 4.6, y: bottom + footHeight }, bars.y, 'y'),
    ...words.map((content, index) =>
      text('legend', { x: left, y: bottom + 4.2 - index * 3.2 }, clipText(content, across, small), small, {
        role: 'paragraph',
      }),
    ),
  ]
}

function draftMarks(frame: PageFrame, isTurned: boolean): readonly Mark[] {
  if (frame.draft === null) return []
  const { width, height } = sizeOf(frame, isTurned)
  const room = roomOn(frame, isTurned)
  const content = clipText(`DRAFT: ${frame.draft}`, room.right - room.left, 3.2)
  return [
    text('legend', { x: width / 2, y: height - frame.margin - headHeight - 3 }, content, 3.2, {
      anchor: 'middle',
      isBold: true,
      role: 'paragraph',
    }),
    text('legend', { x: width / 2, y: height / 2 }, 'DRAFT', 12, { anchor: 'middle', angle: 30, isBold: true }),
  ]
}

/**
 * Pages numbered and framed: head, scale bars in both directions, foot, and the stamp of a draft.
 * @param numbering pages before these and in all, where they are part of a longer document
 */
export function framePages(
  frame: PageFrame,
  plans: readonly PagePlan[],
  numbering: { readonly before: number; readonly total: number } = { before: 0, total: plans.length },
): readonly Page[] {
  return plans.map((plan, index) => {
    const { width, height } = sizeOf(frame, plan.isTurned)
    return {
      width,
      height,
      title: plan.title,
      trim: plan.trim ?? null,
      marks: [
        ...headMarks(frame, plan, numbering.before + index + 1, numbering.total),
        ...plan.marks,
        ...draftMarks(frame, plan.isTurned),
        ...footMarks(frame, plan.isTurned),
      ],
    }
  })
}
