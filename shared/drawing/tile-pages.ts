import { boundsOf, heightOf, widthOf, type Bounds } from '../geometry/bounds.ts'
import { clipSegment } from '../geometry/clip-segment.ts'
import type { Point } from '../geometry/shapes.ts'
import { movePolygon, rotation } from '../geometry/transform.ts'
import type { Millimetres } from '../units/units.ts'
import { dashLine } from './dash-line.ts'
import { drawBlank } from './draw-blank.ts'
import { line, text, type Mark } from './drawing.ts'
import { dashFor, lineStyles } from './line-styles.ts'
import { roomOn, type PageFrame, type PagePlan } from './page-frame.ts'
import type { SheetToDraw } from './sheet-to-draw.ts'
import { placeDrawing } from './place-drawing.ts'
import { roughSheetOf } from './rough-sheet.ts'

/** How far neighbouring tiles repeat one another. */
const overlap: Millimetres = 10

/** Number of tiles along a length: ceil((L − o)/(P − o)), one where it fits. @see physics J (derived) */
export const tileCount = (length: Millimetres, page: Millimetres): number =>
  length <= page + 1e-9 ? 1 : Math.ceil((length - overlap) / (page - overlap) - 1e-9)

/** Marks inside a window; dashes are laid first, so that a pattern runs on from tile to tile. */
function clipMarks(marks: readonly Mark[], window: Bounds): readonly Mark[] {
  return marks.flatMap((mark): readonly Mark[] => {
    if (mark.kind === 'text') {
      const { x, y } = mark.at
      return x > window.left && x < window.right && y > window.bottom && y < window.top ? [mark] : []
    }
    if (mark.kind === 'fill') {
      const isInside = mark.polygon.every(
        ({ x, y }) => x >= window.left && x <= window.right && y >= window.bottom && y <= window.top,
      )
      return isInside ? [mark] : []
    }
    const first = mark.points[0]
    const points = mark.isClosed && first !== undefined ? [...mark.points, first] : mark.points
    const style = lineStyles[mark.layer]
    const isDashed = mark.weight === 'own' && style.dash.length > 0
    const long = points.reduce(
      (sum, p, index) =>
        sum + (index === 0 ? 0 : Math.hypot(p.x - (points[index - 1]?.x ?? 0), p.y - (points[index - 1]?.y ?? 0))),
      0,
    )
    const segments = isDashed ? dashLine(points, dashFor(style, long), style.width) : dashLine(points, [], 0)
    const weight = isDashed ? 'plain' : mark.weight
    return segments.flatMap((segment) => {
      const kept = clipSegment(segment, window)
      return kept === null ? [] : [line(mark.layer, [kept.from, kept.to], { weight })]
    })
  })
}

const columnName = (index: number): string => String.fromCharCode(65 + (index % 26))

function matchMark(at: Point, name: string): readonly Mark[] {
  const { x, y } = at
  const arm = 3
  return [
    line(
      'position',
      [
        { x: x - arm, y },
        { x: x + arm, y },
      ],
      { weight: 'plain' },
    ),
    line(
      'position',
      [
        { x, y: y - arm },
        { x, y: y + arm },
      ],
      { weight: 'plain' },
    ),
    line(
      'position',
      [
        { x: x - 1.4, y },
        { x, y: y + 1.4 },
        { x: x + 1.4, y },
        { x, y: y - 1.4 },
      ],
      { isClosed: true, weight: 'plain' },
    ),
    text('position', { x: x + 1.8, y: y + 1 }, name, 2.2),
  ]
}

interface Tiling {
  readonly isTurned: boolean
  readonly columns: number
  readonly rows: number
  readonly room: Bounds
}

function chooseTiling(width: Millimetres, height: Millimetres, frame: PageFrame): Tiling {
  const tilings = ([false, true] as const).map((isTurned): Tiling => {
    const room = roomOn(frame, isTurned)
    return { isTurned, room, columns: tileCount(width, widthOf(room)), rows: tileCount(height, heightOf(room)) }
  })
  return tilings.reduce((best, tiling) => (tiling.columns * tiling.rows < best.columns * best.rows ? tiling : best))
}

/** A small plan of the whole with the tiles over it, this one framed. */
function keyPlan(tiling: Tiling, step: Point, at: Point, column: number, row: number): readonly Mark[] {
  const cell = { x: 7, y: (7 * step.y) / step.x }
  const frames: Mark[] = []
  for (let c = 0; c < tiling.columns; c += 1) {
    for (let r = 0; r < tiling.rows; r += 1) {
      const [x, y] = [at.x + c * cell.x, at.y + r * cell.y]
      const corners = [
        { x, y },
        { x: x + cell.x, y },
        { x: x + cell.x, y: y + cell.y },
        { x, y: y + cell.y },
      ]
      frames.push(line('legend', corners, { isClosed: true, weight: c === column && r === row ? 'wide' : 'plain' }))
      frames.push(
        text('legend', { x: x + cell.x / 2, y: y + cell.y / 2 - 0.8 }, `${columnName(c)}${String(r + 1)}`, 2.2, {
          anchor: 'middle',
          isBold: c === column && r === row,
        }),
      )
    }
  }
  return frames
}

/** True-size tiles with overlap, match marks that lie over one another when joined, and a key plan on each. */
export function tilePages(sheet: SheetToDraw, frame: PageFrame): readonly PagePlan[] {
  // A square that stands on a corner takes fewer tiles lying square.
  const { turn } = roughSheetOf(sheet.blank)
  const { left, bottom, right, top } = boundsOf(
    turn === 0 ? sheet.blank.outline : movePolygon(sheet.blank.outline, rotation(-turn)),
  )
  const tiling = chooseTiling(right - left, top - bottom, frame)
  const { room, columns, rows } = tiling
  const step = { x: widthOf(room) - overlap, y: heightOf(room) - overlap }
  const marks = placeDrawing(drawBlank(sheet.blank, { units: frame.units }), { x: 0, y: 0, turn: -turn, scale: 1 })
  const pages: PagePlan[] = []
  for (let row = 0; row < rows; row += 1) {
    for (let column = 0; column < columns; column += 1) {
      const origin = { x: left + column * step.x, y: bottom + row * step.y }
      const window = {
        left: origin.x,
        bottom: origin.y,
        right: origin.x + widthOf(room),
        top: origin.y + heightOf(room),
      }
      const middle = { x: origin.x + widthOf(room) / 2, y: origin.y + heightOf(room) / 2 }
      const half = overlap / 2
      const matches = [
        ...(column > 0
          ? matchMark(
              { x: window.left + half, y: middle.y },
              `${columnName(column - 1)}${columnName(column)}${String(row + 1)}`,
            )
          : []),
        ...(column < columns - 1
          ? matchMark(
              { x: window.right - half, y: middle.y },
              `${columnName(column)}${columnName(column + 1)}${String(row + 1)}`,
            )
          : []),
        ...(row > 0
          ? matchMark({ x: middle.x, y: window.bottom + half }, `${columnName(column)}${String(row)}${String(row + 1)}`)
          : []),
        ...(row < rows - 1
          ? matchMark(
              { x: middle.x, y: window.top - half },
              `${columnName(column)}${String(row + 1)}${String(row + 2)}`,
            )
          : []),
      ]
      const name = `${columnName(column)}${String(row + 1)}`
      pages.push({
        title: `${sheet.blank.name}: tile ${name}`,
        aside: `${String(columns)} × ${String(rows)} tiles, lay match marks over one another`,
        isTurned: tiling.isTurned,
        piece: sheet.piece,
        marks: [
          ...placeDrawing(
            { marks: [...clipMarks(marks, window), ...matches] },
            { x: room.left - origin.x, y: room.bottom - origin.y, turn: 0, scale: 1 },
          ),
          ...keyPlan(tiling, step, { x: room.right - columns * 7 - 2, y: room.bottom + 2 }, column, row),
        ],
      })
    }
  }
  return pages
}
