import type { Page } from '../drawing/drawing.ts'
import { framePages, type PageFrame, type PagePlan } from '../drawing/page-frame.ts'
import type { PageSize } from '../drawing/page-size.ts'
import { piecePages } from '../drawing/piece-pages.ts'
import type { Millimetres } from '../units/units.ts'
import { cutListPages } from './cut-list-pages.ts'
import { cutList } from './cut-list.ts'
import { stockTitle, type ExportSet } from './export-set.ts'
import { coverPages } from './front-pages.ts'
import { goesWith } from './goes-with.ts'
import { stepsPages } from './steps-pages.ts'
import type { Step } from './steps/step.ts'

export interface DocumentOptions {
  readonly size: PageSize
  /** Strip along the edges on which the printer prints nothing. */
  readonly margin: Millimetres
  readonly isTiled: boolean
  readonly isLargePrint: boolean
  /** Only these pieces' pages, without cover, cut list and steps; `null` for the whole set. */
  readonly pieces: readonly string[] | null
}

/** Type of 9 points, or of 22 for low vision (practice: 22 to 24 points). */
const bodySize = (isLargePrint: boolean): Millimetres => (isLargePrint ? 22 : 9) * (25.4 / 72)

export function frameOf(set: ExportSet, options: DocumentOptions): PageFrame {
  return {
    size: options.size,
    margin: options.margin,
    units: set.units,
    title: set.title,
    version: set.version,
    digest: set.digest,
    window: set.window,
    draft: set.draft,
    mark: set.family?.mark ?? null,
  }
}

/** Pages of a set before they are numbered: cover, cut list, steps, then every sheet. */
export function planDocument(
  set: ExportSet,
  steps: readonly Step[],
  frame: PageFrame,
  options: DocumentOptions,
): readonly PagePlan[] {
  const size = bodySize(options.isLargePrint)
  const isWanted = (piece: string): boolean => options.pieces === null || options.pieces.includes(piece)
  const sheets = set.pieces
    .filter((piece) => isWanted(piece.name))
    .flatMap((piece) => piece.sheets)
    .flatMap(({ piece, blank, copies }) => {
      const paper = blank.stock === null ? 'paper' : stockTitle(set, blank.stock)
      return piecePages({ piece, blank, copies, paper }, frame, { isTiled: options.isTiled })
    })
  if (options.pieces !== null) return sheets
  return [
    ...coverPages(set, frame, size),
    ...cutListPages(set, cutList(set), frame, Math.min(size, 4)),
    ...stepsPages(set, steps, frame, size),
    ...sheets,
  ]
}

/** A set as the pages of one document. */
export function templateDocument(set: ExportSet, steps: readonly Step[], options: DocumentOptions): readonly Page[] {
  const frame = frameOf(set, options)
  return framePages(frame, goesWith(planDocument(set, steps, frame, options), set.fits, 0))
}
