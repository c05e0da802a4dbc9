import type { JudgedSet } from '../../assembly/judge-set.ts'
import { turnOf } from '../../geometry/area.ts'
import { boundsOf, heightOf, widthOf } from '../../geometry/bounds.ts'
import type { Point, Polygon } from '../../geometry/shapes.ts'
import type { Blank } from '../../pieces/blank.ts'
import type { TemplateSet } from '../../template/template-model.ts'
import { drawnBlanks } from '../drawn-blanks.ts'
import { oncePerSet } from '../once-per-set.ts'

/** What a blank is cut from: the sheet its paper is bought in, else the sheet of the set. */
export function sheetOf(judged: JudgedSet, blank: Blank): TemplateSet['sheet'] {
  const name = judged.options.paper ?? blank.stock
  return (name === null ? null : judged.set.tokens.stocks.get(name)?.sheet) ?? judged.set.sheet
}

/** A rectangle to be cut out of a sheet, length the larger side. */
export interface Rectangle {
  readonly length: number
  readonly width: number
}

const rectangleOf = (a: number, b: number): Rectangle => ({ length: Math.max(a, b), width: Math.min(a, b) })

function boundsAlong(outline: Polygon, direction: Point): Rectangle {
  const size = Math.hypot(direction.x, direction.y)
  const x = direction.x / size
  const y = direction.y / size
  const bounds = boundsOf(outline.map((point) => ({ x: point.x * x + point.y * y, y: point.y * x - point.x * y })))
  return rectangleOf(widthOf(bounds), heightOf(bounds))
}

/** The corners of an outline that a rubber band round it would touch. */
function hullOf(outline: Polygon): Polygon {
  const points = outline.toSorted((a, b) => a.x - b.x || a.y - b.y)
  const half = (run: Polygon): Point[] => {
    const kept: Point[] = []
    for (const point of run) {
      for (;;) {
        const before = kept.at(-2)
        const last = kept.at(-1)
        if (before === undefined || last === undefined || turnOf(before, last, point) > 0) break
        kept.pop()
      }
      kept.push(point)
    }
    return kept.slice(0, -1)
  }
  return [...half(points), ...half(points.toReversed())]
}

/**
 * The smallest rectangle round an outline, by area; one side of it lies along the hull (known result).
 * An outline that is a square standing on a corner is one turned by half a right angle.
 */
export function smallestRectangle(outline: Polygon): Rectangle {
  const bounds = boundsOf(outline)
  const upright = rectangleOf(widthOf(bounds), heightOf(bounds))
  const hull = hullOf(outline)
  let best = upright
  hull.forEach((point, index) => {
    const next = hull[(index + 1) % hull.length]
    if (next === undefined) return
    const side = { x: next.x - point.x, y: next.y - point.y }
    // Sides along the axes are what the upright bounds are; nothing is shorter than a point.
    if (Math.abs(side.x) < 1e-6 || Math.abs(side.y) < 1e-6) return
    const turned = boundsAlong(outline, side)
    if (turned.length * turned.width < best.length * best.width - 1e-6) best = turned
  })
  return best
}

/** A sheet's rectangle and what it is cut from. */
export interface CutRectangle {
  readonly blank: Blank
  readonly rectangle: Rectangle
  readonly sheet: TemplateSet['sheet']
}

/** The rectangle every blank of a piece takes, by the piece's name. */
export const cutRectangles = oncePerSet((judged): ReadonlyMap<string, readonly CutRectangle[]> => {
  return new Map(
    [...drawnBlanks(judged)].map(([name, blanks]) => [
      name,
      blanks.map((blank) => ({
        blank,
        rectangle: smallestRectangle(blank.outline),
        sheet: sheetOf(judged, blank),
      })),
    ]),
  )
})
