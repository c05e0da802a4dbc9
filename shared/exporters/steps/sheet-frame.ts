import { boundsOf } from '../../geometry/bounds.ts'
import { containsPoint, distanceToSegment, edgesOf } from '../../geometry/contains-point.ts'
import { differenceOf } from '../../geometry/combine.ts'
import { areaOf } from '../../geometry/area.ts'
import { rectangle } from '../../geometry/rectangle.ts'
import type { Point, Polygon, Segment } from '../../geometry/shapes.ts'
import { movePolygon, moveSegment, rotation, translation } from '../../geometry/transform.ts'
import { roughSheetOf, type RoughSheet } from '../../drawing/rough-sheet.ts'
import type { Blank, Score } from '../../pieces/blank.ts'
import type { Millimetres } from '../../units/units.ts'

/** A score as a maker makes it: one straight stroke across the sheet or part of it. */
export interface Stroke {
  readonly line: Segment
  readonly fold: Score['fold']
  readonly angle: number
  readonly names: readonly string[]
  /** True where it may run from edge to edge because whatever else it crosses is cut or scored too. */
  readonly isAcross: boolean
}

/** A blank laid square as the rectangle it is cut from: scores as strokes, and what is cut away. */
export interface SheetFrame {
  readonly rough: RoughSheet
  readonly length: Millimetres
  readonly width: Millimetres
  readonly outline: Polygon
  readonly strokes: readonly Stroke[]
  /** Cut-off parts, in the sheet's own coordinates from its lower left. */
  readonly waste: readonly Polygon[]
  readonly slits: readonly Segment[]
}

const near: Millimetres = 0.02

/** Where a line meets the edges of an upright rectangle from the origin. */
function acrossSheet({ from, to }: Segment, length: Millimetres, width: Millimetres): Segment {
  const [dx, dy] = [to.x - from.x, to.y - from.y]
  let enter = -Infinity
  let leave = Infinity
  for (const [step, start, end] of [
    [dx, from.x, length],
    [dy, from.y, width],
  ] as const) {
    if (Math.abs(step) < 1e-9) continue
    const [a, b] = [(0 - start) / step, (end - start) / step]
    enter = Math.max(enter, Math.min(a, b))
    leave = Math.min(leave, Math.max(a, b))
  }
  const at = (share: number): Point => ({ x: from.x + share * dx, y: from.y + share * dy })
  return { from: at(enter), to: at(leave) }
}

const sameLine = (a: Segment, b: Segment): boolean => {
  const [dx, dy] = [a.to.x - a.from.x, a.to.y - a.from.y]
  const long = Math.hypot(dx, dy)
  const off = (p: Point): number => Math.abs((p.x - a.from.x) * dy - (p.y - a.from.y) * dx) / long
  return off(b.from) < near && off(b.to) < near
}

/** Length of a line that lies on the sheet that is kept, sampled: strokes may run over waste and along cuts. */
function isCovered(
  line: Segment,
  scores: readonly Segment[],
  outline: Polygon,
  waste: readonly Polygon[],
  edges: readonly Segment[],
): boolean {
  const long = Math.hypot(line.to.x - line.from.x, line.to.y - line.from.y)
  const count = Math.max(8, Math.ceil(long / 2))
  for (let step = 0; step <= count; step += 1) {
    const share = (step + 0.5) / (count + 1)
    const p = { x: line.from.x + share * (line.to.x - line.from.x), y: line.from.y + share * (line.to.y - line.from.y) }
    if (scores.some((score) => distanceToSegment(p, score) < 1)) continue
    if (edges.some((edge) => distanceToSegment(p, edge) < 1.6) || waste.some((part) => containsPoint(part, p, 0)))
      continue
    if (containsPoint(outline, p, 0)) return false
  }
  return true
}

function strokesOf(
  scores: readonly Score[],
  length: Millimetres,
  width: Millimetres,
  outline: Polygon,
  waste: readonly Polygon[],
  cuts: readonly Segment[],
): readonly Stroke[] {
  const groups: Score[][] = []
  for (const score of scores) {
    const group = groups.find((other) => {
      const first = other[0]
      return first !== undefined && first.fold === score.fold && first.angle === score.angle && sameLine(first, score)
    })
    if (group === undefined) groups.push([score])
    else group.push(score)
  }
  const edges = [...edgesOf(outline), ...cuts]
  return groups.flatMap((group): Stroke[] => {
    const first = group[0]
    if (first === undefined) return []
    const common = { fold: first.fold, angle: first.angle, names: group.map((score) => score.name) }
    const across = acrossSheet(first, length, width)
    if (isCovered(across, group, outline, waste, edges)) return [{ ...common, line: across, isAcross: true }]
    return group.map((score) => ({
      ...common,
      names: [score.name],
      line: { from: score.from, to: score.to },
      isAcross: false,
    }))
  })
}

const known = new WeakMap<Blank, SheetFrame>()

/** Lays a blank as the sheet it is cut from. A square that stands on a corner is laid on its lower right edge. */
export function sheetFrame(blank: Blank): SheetFrame {
  const found = known.get(blank)
  if (found !== undefined) return found
  const made = layBlank(blank)
  known.set(blank, made)
  return made
}

function layBlank(blank: Blank): SheetFrame {
  const rough = roughSheetOf(blank)
  const turn = rotation(-rough.turn)
  const turned = rough.turn === 0 ? blank.outline : movePolygon(blank.outline, turn)
  const bounds = boundsOf(turned)
  const move = translation(-bounds.left, -bounds.bottom)
  const place = <T extends Segment>(line: T): T => moveSegment(rough.turn === 0 ? line : moveSegment(line, turn), move)
  const outline = movePolygon(turned, move)
  const sheet = rectangle(0, 0, rough.length, rough.width)
  const waste = differenceOf(sheet, [outline]).filter((part) => areaOf(part) > 1e-3)
  const slits = blank.cuts.map(place)
  return {
    rough,
    length: rough.length,
    width: rough.width,
    outline,
    strokes: strokesOf(blank.scores.map(place), rough.length, rough.width, outline, waste, slits),
    waste,
    slits,
  }
}
