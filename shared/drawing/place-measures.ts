import { containsPoint } from '../geometry/contains-point.ts'
import type { Point, Segment } from '../geometry/shapes.ts'
import type { Blank, BlankMeasure } from '../pieces/blank.ts'
import type { Millimetres, RulerUnit } from '../units/units.ts'
import { drawMeasure } from './draw-measure.ts'
import type { Mark } from './drawing.ts'
import { overlaps, takenBy, type FreeSpace, type Taken } from './free-space.ts'
import { lengthText } from './length-text.ts'
import { textWidth } from './text-width.ts'

const firstRow: Millimetres = 4
const rowStep: Millimetres = 1.5
const lastRow = 24

/** Where along its line a dimension's figures may stand. */
const shares = [0.5, 0.35, 0.65, 0.22, 0.78] as const

interface Row {
  readonly angle: number
  readonly line: Taken
  readonly figures: Taken
}

const drawnLength = ({ from, to }: Segment): Millimetres => Math.hypot(to.x - from.x, to.y - from.y)

/** A line as the narrow rectangle it takes. */
export function takenByLine({ from, to }: Segment, high: Millimetres): Taken {
  const middle = { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 }
  return takenBy(middle, drawnLength({ from, to }), high, (Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI)
}

const isParallel = (a: number, b: number): boolean => Math.abs(Math.sin(((a - b) * Math.PI) / 180)) < 0.02

/** True where a dimension gets in no other's way: rows side by side apart, figures clear of every line. */
const isClear = (row: Row, placed: readonly Row[]): boolean =>
  placed.every((other) => {
    if (isParallel(row.angle, other.angle) && overlaps(row.line, other.line)) return false
    return (
      !overlaps(row.figures, other.figures) && !overlaps(row.figures, other.line) && !overlaps(row.line, other.figures)
    )
  })

/**
 * Dimensions inside the sheet, each in the nearest row where it gets in the way of no other, the longest first because
 * they need the most room in one piece. One that finds no row is left out: every measure is in the steps too.
 */
export function placeMeasures(blank: Blank, units: RulerUnit, size: Millimetres, space: FreeSpace): readonly Mark[] {
  const lines = [...blank.scores, ...blank.cuts].map((score) => takenByLine(score, 0.8))
  const placed: Row[] = []
  const marks: Mark[] = []
  const tryRow = (measure: BlankMeasure, content: string, offset: Millimetres, share: number): Row | null => {
    const turn = Math.atan2(measure.to.y - measure.from.y, measure.to.x - measure.from.x)
    const angle = (turn * 180) / Math.PI
    const wide = textWidth(content, size)
    const shift = (p: Point, by: number): Point => ({ x: p.x - Math.sin(turn) * by, y: p.y + Math.cos(turn) * by })
    const ends = { from: shift(measure.from, offset), to: shift(measure.to, offset) }
    const at = {
      x: ends.from.x + share * (ends.to.x - ends.from.x),
      y: ends.from.y + share * (ends.to.y - ends.from.y),
    }
    const isFlipped = angle > 90.5 || angle < -89.5
    const figures = takenBy(shift(at, (isFlipped ? -1 : 1) * (0.8 + size * 0.36)), wide + 1, size * 0.95, angle)
    if (!figures.corners.every((corner) => containsPoint(blank.outline, corner))) return null
    const row = { angle, line: takenByLine(ends, 3), figures }
    if (!isClear(row, placed) || !space.isFree(figures)) return null
    return lines.some((score) => overlaps(score, figures)) ? null : row
  }
  const place = (measure: BlankMeasure): void => {
    const content = lengthText(measure.length, units)
    const isLong = textWidth(content, size) + 8 < drawnLength(measure)
    for (let step = 0; step < lastRow; step += 1) {
      for (const side of [1, -1]) {
        for (const share of isLong ? shares : [0.5]) {
          const offset = side * (firstRow + step * rowStep)
          const row = tryRow(measure, content, offset, share)
          if (row === null) continue
          placed.push(row)
          space.take(row.figures)
          space.take(
            takenByLine({ from: row.line.corners[0] ?? measure.from, to: row.line.corners[1] ?? measure.to }, 0.5),
          )
          marks.push(...drawMeasure(measure.from, measure.to, content, offset, size, share))
          return
        }
      }
    }
  }
  blank.measures
    .filter((measure) => drawnLength(measure) > 0.05)
    .toSorted((a, b) => drawnLength(b) - drawnLength(a))
    .forEach(place)
  return marks
}
