import { counterClockwise } from '../geometry/area.ts'
import { boundsOf } from '../geometry/bounds.ts'
import type { Point, Polygon, Segment } from '../geometry/shapes.ts'
import { movePolygon, moveSegment, translation } from '../geometry/transform.ts'
import type { Millimetres } from '../units/units.ts'
import type { Blank, BlankArea, BlankMeasure, Score } from './blank.ts'

/** Grain of a stock in the words of its author; `null` where it is not known. */
export type GrainOf = (stock: string) => 'long' | 'short' | null

/** What drawing a piece depends on besides the folded piece: the name its blanks go by, and the grain of stocks. */
export interface DrawContext {
  readonly name: string
  readonly grainOf: GrainOf
}

/** Direction of the grain on a blank whose folded length runs along `lengthRuns`: long grain runs along the length. */
export function grainAlong(context: DrawContext, stock: string | null, lengthRuns: 'x' | 'y'): 'x' | 'y' | null {
  const grain = stock === null ? null : context.grainOf(stock)
  if (grain === null) return null
  const isAcross = grain === 'short'
  return (lengthRuns === 'x') === isAcross ? 'y' : 'x'
}

export const segment = (x1: Millimetres, y1: Millimetres, x2: Millimetres, y2: Millimetres): Segment => ({
  from: { x: x1, y: y1 },
  to: { x: x2, y: y2 },
})

export const score = (name: string, line: Segment, angle: number, fold: Score['fold'] = 'valley'): Score => ({
  from: line.from,
  to: line.to,
  name,
  fold,
  angle,
})

export const area = (role: BlankArea['role'], name: string, polygon: Polygon): BlankArea => ({ name, role, polygon })

/** A dimension between two points, its length the distance between them. */
export const measure = (name: string, from: Point, to: Point): BlankMeasure => ({
  name,
  from,
  to,
  length: Math.hypot(to.x - from.x, to.y - from.y),
})

type Parts = Pick<Blank, 'name' | 'stock' | 'outline'> &
  Partial<Omit<Blank, 'areas' | 'measures'>> & {
    readonly areas?: () => readonly BlankArea[]
    readonly measures?: () => readonly BlankMeasure[]
  }

/** Most sheets are drawn with their lower left at the origin already; they are taken as they are. */
const where = <T>(isMoved: boolean, parts: readonly T[] | undefined, move: (part: T) => T): readonly T[] =>
  parts === undefined ? [] : isMoved ? parts.map(move) : parts

/**
 * A blank with its lower left at the origin and its outline counter-clockwise; parts not given are empty. Areas and
 * measures are for pages only: they are worked out when first looked at.
 */
export function makeBlank(parts: Parts): Blank {
  const bounds = boundsOf(parts.outline)
  const isMoved = bounds.left !== 0 || bounds.bottom !== 0
  const move = translation(-bounds.left, -bounds.bottom)
  const polygon = (outline: Polygon): Polygon => movePolygon(outline, move)
  const line = <T extends Segment>(segment: T): T => moveSegment(segment, move)
  const outline = counterClockwise(parts.outline)
  let areas: readonly BlankArea[] | null = null
  let measures: readonly BlankMeasure[] | null = null
  return {
    name: parts.name,
    stock: parts.stock,
    outline: isMoved ? polygon(outline) : outline,
    holes: where(isMoved, parts.holes, polygon),
    scores: where(isMoved, parts.scores, ({ from, to, name, fold, angle }) => ({
      from: move.point(from),
      to: move.point(to),
      name,
      fold,
      angle,
    })),
    cuts: where(isMoved, parts.cuts, line),
    perforations: where(isMoved, parts.perforations, line),
    get areas() {
      areas ??= where(isMoved, parts.areas?.(), (part) => ({ ...part, polygon: polygon(part.polygon) }))
      return areas
    },
    get measures() {
      measures ??= where(isMoved, parts.measures?.(), line)
      return measures
    },
    grain: parts.grain ?? null,
  }
}
