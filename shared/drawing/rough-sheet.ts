import { boundsOf, heightOf, widthOf } from '../geometry/bounds.ts'
import { distanceToSegment } from '../geometry/contains-point.ts'
import type { Point, Polygon, Segment } from '../geometry/shapes.ts'
import { movePolygon, rotation } from '../geometry/transform.ts'
import type { Blank } from '../pieces/blank.ts'
import type { Millimetres } from '../units/units.ts'

/** The rectangle a blank is first cut as, and what meets its edges. */
export interface RoughSheet {
  /** Corners counter-clockwise on the blank, the lowest first. */
  readonly corners: Polygon
  readonly length: Millimetres
  readonly width: Millimetres
  /** Degrees by which it is turned on the blank: 45 for a square standing on a corner. */
  readonly turn: 0 | 45
  readonly edges: readonly RoughEdge[]
}

/** Something to mark on an edge, measured from the edge's start. */
export interface EdgeMark {
  readonly at: Millimetres
  readonly what: 'fold' | 'cut'
  readonly name: string
}

export interface RoughEdge {
  readonly name: string
  readonly line: Segment
  /** Corners it runs between. */
  readonly from: string
  readonly to: string
  readonly length: Millimetres
  readonly marks: readonly EdgeMark[]
}

const near: Millimetres = 0.01

function rectangleAt(outline: Polygon, turn: 0 | 45): Polygon {
  const turned = turn === 0 ? outline : movePolygon(outline, rotation(-turn))
  const { left, bottom, right, top } = boundsOf(turned)
  const corners = [
    { x: left, y: bottom },
    { x: right, y: bottom },
    { x: right, y: top },
    { x: left, y: top },
  ]
  return turn === 0 ? corners : movePolygon(corners, rotation(turn))
}

/** Where the line through a score crosses an edge; `null` where it runs past it. */
function crossing(score: Segment, edge: Segment): Point | null {
  const d = { x: score.to.x - score.from.x, y: score.to.y - score.from.y }
  const e = { x: edge.to.x - edge.from.x, y: edge.to.y - edge.from.y }
  const area = d.x * e.y - d.y * e.x
  if (Math.abs(area) < 1e-9) return null
  const share = (d.x * (score.from.y - edge.from.y) - d.y * (score.from.x - edge.from.x)) / area
  if (share < -1e-9 || share > 1 + 1e-9) return null
  return { x: edge.from.x + share * e.x, y: edge.from.y + share * e.y }
}

function marksOn(blank: Blank, edge: Segment): readonly EdgeMark[] {
  const along = (p: Point): Millimetres => Math.hypot(p.x - edge.from.x, p.y - edge.from.y)
  const long = along(edge.to)
  const folds = blank.scores
    .filter((score) => !score.name.startsWith('tab'))
    .flatMap((score) => {
      const at = crossing(score, edge)
      return at === null ? [] : [{ at: along(at), what: 'fold' as const, name: score.name }]
    })
  const cuts = [blank.outline, ...blank.cuts.map(({ from, to }) => [from, to])].flatMap((points) =>
    points
      .filter((p) => distanceToSegment(p, edge) < near)
      .map((p) => ({ at: along(p), what: 'cut' as const, name: 'cut' })),
  )
  const found: EdgeMark[] = []
  // Folds first: where a cut begins on a fold's mark, the fold is what is marked.
  for (const mark of [...folds, ...cuts]) {
    const isEnd = mark.at < near || mark.at > long - near
    if (!isEnd && found.every((other) => Math.abs(other.at - mark.at) >= 0.05)) found.push(mark)
  }
  return found.sort((a, b) => a.at - b.at)
}

const edgeNames = {
  0: ['bottom edge', 'right edge', 'top edge', 'left edge'],
  45: ['lower right edge', 'upper right edge', 'upper left edge', 'lower left edge'],
} as const

const cornerNames = {
  0: ['lower left corner', 'lower right corner', 'upper right corner', 'upper left corner'],
  45: ['bottom corner', 'right corner', 'top corner', 'left corner'],
} as const

/** The sheet to cut for a blank: the smaller of its upright rectangle and the one standing on a corner. */
export function roughSheetOf(blank: Blank): RoughSheet {
  const areaAt = (turn: 0 | 45): number => {
    const bounds = boundsOf(turn === 0 ? blank.outline : movePolygon(blank.outline, rotation(-turn)))
    return widthOf(bounds) * heightOf(bounds)
  }
  const turn = areaAt(45) < areaAt(0) * 0.999 ? 45 : 0
  const corners = rectangleAt(blank.outline, turn)
  const edges = corners.map((from, index): RoughEdge => {
    const to = corners[(index + 1) % corners.length] ?? from
    const edge = { from, to }
    return {
      name: edgeNames[turn][index] ?? 'edge',
      line: edge,
      from: cornerNames[turn][index] ?? 'corner',
      to: cornerNames[turn][(index + 1) % 4] ?? 'corner',
      length: Math.hypot(to.x - from.x, to.y - from.y),
      marks: marksOn(blank, edge),
    }
  })
  return { corners, length: edges[0]?.length ?? 0, width: edges[1]?.length ?? 0, turn, edges }
}
