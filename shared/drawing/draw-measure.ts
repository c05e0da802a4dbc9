import type { Point } from '../geometry/shapes.ts'
import type { Millimetres } from '../units/units.ts'
import { fill, line, text, type Mark } from './drawing.ts'
import { capHeight, textWidth } from './text-width.ts'

const arrowLength: Millimetres = 2.2
const arrowHalf: Millimetres = 0.6

const arrowhead = (tip: Point, direction: Point): Mark =>
  fill('dimension', [
    tip,
    {
      x: tip.x - direction.x * arrowLength - direction.y * arrowHalf,
      y: tip.y - direction.y * arrowLength + direction.x * arrowHalf,
    },
    {
      x: tip.x - direction.x * arrowLength + direction.y * arrowHalf,
      y: tip.y - direction.y * arrowLength - direction.x * arrowHalf,
    },
  ])

/**
 * A dimension between two points: extension lines, a line with arrows and the text on it, moved off by `offset` to the
 * left of the way from `from` to `to` (a negative offset moves it right). Arrows go outside where there is no room.
 * @param share where along the line the text stands
 */
export function drawMeasure(
  from: Point,
  to: Point,
  content: string,
  offset: Millimetres,
  size: Millimetres,
  share = 0.5,
): readonly Mark[] {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  if (length < 1e-6) return []
  const u = { x: (to.x - from.x) / length, y: (to.y - from.y) / length }
  const n = { x: -u.y, y: u.x }
  const move = (p: Point, along: number, across: number): Point => ({
    x: p.x + u.x * along + n.x * across,
    y: p.y + u.y * along + n.y * across,
  })
  const side = Math.sign(offset) || 1
  const [a, b] = [move(from, 0, offset), move(to, 0, offset)]
  const isTight = length < 2 * arrowLength + 1
  const wide = textWidth(content, size)
  const angle = (Math.atan2(u.y, u.x) * 180) / Math.PI
  const isFlipped = angle > 90.5 || angle < -89.5
  const upright = isFlipped ? angle + 180 : angle
  // Text sits above its line as it is read; beside the arrows where the span is too short for it.
  const base = isFlipped ? -0.8 : 0.8
  const isBeside = wide > length - (isTight ? 0 : 1)
  const middle = isBeside && isTight ? move(b, arrowLength * 2 + wide / 2 + 0.5, 0) : move(a, length * share, 0)
  const at = { x: middle.x + n.x * base, y: middle.y + n.y * base }
  const extension = (p: Point): Mark[] =>
    Math.abs(offset) < 0.5
      ? []
      : [line('dimension', [move(p, 0, side * 0.8), move(p, 0, offset + side * 1.2)], { weight: 'plain' })]
  return [
    ...extension(from),
    ...extension(to),
    line('dimension', isTight ? [move(a, -2 * arrowLength, 0), move(b, 2 * arrowLength, 0)] : [a, b], {
      weight: 'plain',
    }),
    arrowhead(a, isTight ? u : { x: -u.x, y: -u.y }),
    arrowhead(b, isTight ? { x: -u.x, y: -u.y } : u),
    text('dimension', at, content, size, { anchor: 'middle', angle: ((upright % 360) + 360) % 360 }),
  ]
}

/** Height that a row of dimensions takes. */
export const measureRow = (size: Millimetres): Millimetres => size * capHeight + 2.4
