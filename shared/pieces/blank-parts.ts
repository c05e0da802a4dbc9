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
  ...line,
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

type Parts = Pick<Blank, 'name' | 'stock' | 'outline'> & Partial<Blank>

/** A blank with its lower left at the origin and its outline counter-clockwise; parts not given are empty. */
export function makeBlank(parts: Parts): Blank {
  const bounds = boundsOf(parts.outline)
  const move = translation(-bounds.left, -bounds.bottom)
  return {
    name: parts.name,
    stock: parts.stock,
    outline: movePolygon(counterClockwise(parts.outline), move),
    holes: (parts.holes ?? []).map((hole) => movePolygon(hole, move)),
    scores: (parts.scores ?? []).map((line) => moveSegment(line, move)),
    cuts: (parts.cuts ?? []).map((line) => moveSegment(line, move)),
    perforations: (parts.perforations ?? []).map((line) => moveSegment(line, move)),
    areas: (parts.areas ?? []).map((part) => ({ ...part, polygon: movePolygon(part.polygon, move) })),
    measures: (parts.measures ?? []).map((line) => moveSegment(line, move)),
    grain: parts.grain ?? null,
  }
}
