import { boundsOf, heightOf, widthOf, type Bounds } from '../geometry/bounds.ts'
import { rectangle } from '../geometry/rectangle.ts'
import type { Point } from '../geometry/shapes.ts'
import type { Millimetres } from '../units/units.ts'
import { drawBlank } from './draw-blank.ts'
import { line, text, type Mark } from './drawing.ts'
import { fitOnPage, fitScaled } from './fit-on-page.ts'
import { lengthText, sizeText } from './length-text.ts'
import { roomOn, type PageFrame, type PagePlan } from './page-frame.ts'
import { placeDrawing } from './place-drawing.ts'
import { roughSheetOf, type RoughEdge } from './rough-sheet.ts'
import { scaleBlank } from './scale-blank.ts'
import { charactersIn, clipText, textWidth, wrapText } from './text-width.ts'
import type { SheetToDraw } from './sheet-to-draw.ts'
import { tilePages } from './tile-pages.ts'

export interface PieceOptions {
  /** True-size tiles for a sheet larger than the page. */
  readonly isTiled: boolean
}

const aside = ({ copies, paper }: SheetToDraw): string => `make ${String(copies)} · ${paper} · this side up: inside`

/** A true-size page, upright or turned, whichever fits; `null` where the sheet is larger than the page. */
function trueSizePage(sheet: SheetToDraw, frame: PageFrame): PagePlan | null {
  for (const isTurned of [false, true]) {
    const placement = fitOnPage(sheet.blank.outline, roomOn(frame, isTurned))
    if (placement === null) continue
    return {
      title: sheet.blank.name,
      aside: aside(sheet),
      isTurned,
      marks: placeDrawing(drawBlank(sheet.blank, { units: frame.units }), placement),
      piece: sheet.piece,
    }
  }
  return null
}

/** A scaled plan with every dimension, and each of them once more as a line of text. */
function measuringPlan(sheet: SheetToDraw, frame: PageFrame): PagePlan {
  const isTurned = widthOf(boundsOf(sheet.blank.outline)) > heightOf(boundsOf(sheet.blank.outline)) * 1.15
  const room = roomOn(frame, isTurned)
  const size = 2.8
  const rows = sheet.blank.measures.map((measure) => `${measure.name}: ${lengthText(measure.length, frame.units)}`)
  const columns = isTurned ? 3 : 2
  const listHeight = Math.ceil(rows.length / columns) * size * 1.5 + 14
  const plan: Bounds = { ...room, bottom: room.bottom + listHeight }
  const placement = fitScaled(sheet.blank.outline, plan)
  const drawing = drawBlank(scaleBlank(sheet.blank, placement.scale), { units: frame.units })
  const rough = roughSheetOf(sheet.blank)
  const wide = (room.right - room.left) / columns
  const top = room.bottom + listHeight - 6
  return {
    title: `${sheet.blank.name}: measuring plan`,
    aside: aside(sheet),
    isTurned,
    piece: sheet.piece,
    marks: [
      ...placeDrawing(drawing, { ...placement, scale: 1 }),
      text(
        'legend',
        { x: room.left, y: top },
        clipText(
          `Not true to size. Larger than this page: cut ${sizeText(rough.length, rough.width, frame.units)} and measure, or use the marking strips.`,
          room.right - room.left,
          size,
        ),
        size,
        { isBold: true, role: 'paragraph' },
      ),
      ...rows.map((row, index) =>
        text(
          'legend',
          { x: room.left + (index % columns) * wide, y: top - 5 - Math.floor(index / columns) * size * 1.5 },
          clipText(row, wide - 2, size),
          size,
          { role: 'paragraph' },
        ),
      ),
    ],
  }
}

const stripHeight: Millimetres = 18
const stripGap: Millimetres = 9

interface Strip {
  readonly edge: RoughEdge
  /** Where it is laid: which corner its left end goes to, and along which edges. */
  readonly uses: readonly string[]
}

const sameMarks = (a: readonly Millimetres[], b: readonly Millimetres[]): boolean =>
  a.length === b.length && a.every((value, index) => Math.abs(value - (b[index] ?? NaN)) < 0.05)

/** Edges that carry the same marks, from one end or from the other, need one strip. */
function distinctEdges(edges: readonly RoughEdge[]): readonly Strip[] {
  const found: { edge: RoughEdge; uses: string[] }[] = []
  for (const edge of edges) {
    const forwards = edge.marks.map((mark) => mark.at)
    const backwards = edge.marks.map((mark) => edge.length - mark.at).reverse()
    const isAlike = (other: RoughEdge, marks: readonly Millimetres[]): boolean =>
      Math.abs(other.length - edge.length) < 0.05 &&
      sameMarks(
        other.marks.map((mark) => mark.at),
        marks,
      )
    const twin =
      found.find(({ edge: other }) => isAlike(other, forwards)) ??
      found.find(({ edge: other }) => isAlike(other, backwards))
    if (twin === undefined) found.push({ edge, uses: [`${edge.from}, ${edge.name}`] })
    else twin.uses.push(`${isAlike(twin.edge, forwards) ? edge.from : edge.to}, ${edge.name}`)
  }
  return found
}

/** One true-size strip, or the part of it between two lengths, its upper edge to be laid along the paper. */
function stripMarks(
  { edge, uses }: Strip,
  at: Point,
  from: Millimetres,
  to: Millimetres,
  frame: PageFrame,
): readonly Mark[] {
  const { x, y } = at
  const isWhole = from === 0 && Math.abs(to - edge.length) < 1e-6
  const part = isWhole ? '' : ` · part from ${lengthText(from, frame.units)} to ${lengthText(to, frame.units)}`
  const inner = edge.marks.filter((mark) => mark.at >= from - 1e-6 && mark.at <= to + 1e-6)
  const words = inner.map((mark) => `${mark.what} ${lengthText(mark.at, frame.units)}`)
  const ticks = inner.flatMap((mark, index): readonly Mark[] => {
    const tick = x + mark.at - from
    const [before, after] = [inner[index - 1]?.at ?? from, inner[index + 1]?.at ?? to]
    const wide = textWidth(words[index] ?? '', 2.3) + 1.5
    // Figures stand on the side where the next mark leaves them room, on a level of their own where neither does.
    const isLeft = mark.at - before > after - mark.at && mark.at - from > wide
    const level = y - 5.4 - (Math.max(mark.at - before, after - mark.at) < wide ? (index % 3) * 3 : 0)
    return [
      line(
        'dimension',
        [
          { x: tick, y },
          { x: tick, y: y - 6 },
        ],
        { weight: 'plain' },
      ),
      text('dimension', { x: isLeft ? tick - 0.6 : tick + 0.6, y: level }, words[index] ?? '', 2.3, {
        anchor: isLeft ? 'end' : 'start',
      }),
    ]
  })
  const ends: readonly [Millimetres, boolean][] = [
    [x, from > 0],
    [x + to - from, to < edge.length - 1e-6],
  ]
  return [
    line('cut', rectangle(x, y - stripHeight, x + to - from, y), { isClosed: true }),
    ...wrapText(
      `This edge along the paper, ${lengthText(edge.length, frame.units)}${part}. Left end at the ${uses.join('; ')}.`,
      charactersIn(to - from - 2, 2.3),
    )
      .slice(0, 2)
      .map((words, index) =>
        text('legend', { x: x + 1, y: y - stripHeight + 4.4 - index * 3 }, words, 2.3, { role: 'paragraph' }),
      ),
    ...ticks,
    ...ends.flatMap(([tick, isJoin]): readonly Mark[] =>
      isJoin
        ? [
            text('legend', { x: tick, y: y - stripHeight - 3.2 }, 'join here', 2.3, {
              anchor: tick === x ? 'start' : 'end',
            }),
          ]
        : [],
    ),
  ]
}

/** Marking strips: one true-size strip an edge, several on a page, in parts where an edge is longer than the page. */
function stripPages(sheet: SheetToDraw, frame: PageFrame): readonly PagePlan[] {
  const rough = roughSheetOf(sheet.blank)
  const longest = Math.max(...rough.edges.map((edge) => edge.length))
  const upright = roomOn(frame, false)
  const isTurned = longest > upright.right - upright.left && frame.size.height > frame.size.width
  const room = roomOn(frame, isTurned)
  const across = room.right - room.left
  const strips = distinctEdges(rough.edges).flatMap((strip) => {
    const { edge } = strip
    const parts = Math.ceil(edge.length / across - 1e-9)
    return Array.from({ length: parts }, (_, index) => ({
      strip,
      from: (edge.length * index) / parts,
      to: (edge.length * (index + 1)) / parts,
    }))
  })
  const perPage = Math.max(1, Math.floor((room.top - room.bottom - 6) / (stripHeight + stripGap)))
  const pages: PagePlan[] = []
  for (let start = 0; start < strips.length; start += perPage) {
    const marks = strips
      .slice(start, start + perPage)

      .flatMap(({ strip, from, to }, index) =>
        stripMarks(strip, { x: room.left, y: room.top - 6 - index * (stripHeight + stripGap) }, from, to, frame),
      )
    pages.push({
      title: `${sheet.blank.name}: marking strips`,
      aside: 'cut out, lay along the edge, mark',
      isTurned,
      piece: sheet.piece,
      marks: [
        text(
          'legend',
          { x: room.left, y: room.top - 2 },
          clipText(
            'Lay the upper edge of a strip against the edge of the paper, inside up, its left end at the corner it names, and mark at the ticks.',
            across,
            2.6,
          ),
          2.6,
          { role: 'paragraph' },
        ),
        ...marks,
      ],
    })
  }
  return pages
}

/** The pages of one sheet: true size where it fits; else a measuring plan, marking strips and, if wanted, tiles. */
export function piecePages(sheet: SheetToDraw, frame: PageFrame, options: PieceOptions): readonly PagePlan[] {
  const page = trueSizePage(sheet, frame)
  if (page !== null) return [page]
  return [measuringPlan(sheet, frame), ...stripPages(sheet, frame), ...(options.isTiled ? tilePages(sheet, frame) : [])]
}
