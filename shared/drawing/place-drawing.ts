import type { Point } from '../geometry/shapes.ts'
import { rotation } from '../geometry/transform.ts'
import type { Millimetres } from '../units/units.ts'
import type { Drawing, Mark } from './drawing.ts'
import { capHeight } from './text-width.ts'

/** How a drawing is laid on a page: turned about its origin, then scaled, then moved. */
export interface Placement {
  readonly x: Millimetres
  readonly y: Millimetres
  /** Degrees counter-clockwise. */
  readonly turn: number
  /** 1 for true size. Text keeps the size it has. */
  readonly scale: number
}

export const placePoint = (p: Point, { x, y, turn, scale }: Placement): Point => {
  const turned = turn === 0 ? p : rotation(turn).point(p)
  return { x: x + scale * turned.x, y: y + scale * turned.y }
}

/** Text that would stand on its head is turned to be read from the bottom or the right. */
function uprightAngle(angle: number): number {
  const within = ((angle % 360) + 360) % 360
  return within > 90.5 && within <= 270.5 ? within - 180 : within
}

function placeMark(mark: Mark, placement: Placement): Mark {
  const move = (p: Point): Point => placePoint(p, placement)
  switch (mark.kind) {
    case 'line':
      return { ...mark, points: mark.points.map(move) }
    case 'fill':
      return { ...mark, polygon: mark.polygon.map(move) }
    case 'text': {
      const angle = mark.angle + placement.turn
      const upright = uprightAngle(angle)
      const isFlipped = Math.abs(upright - (((angle % 360) + 360) % 360)) > 1
      const anchor = isFlipped ? ({ start: 'end', middle: 'middle', end: 'start' } as const)[mark.anchor] : mark.anchor
      const at = move(mark.at)
      if (!isFlipped) return { ...mark, at, angle: upright, anchor }
      // Turned about the middle of its capitals, so that it keeps its distance from the line it belongs to.
      const up = capHeight * mark.size
      const turned = (angle * Math.PI) / 180
      return {
        ...mark,
        at: { x: at.x - Math.sin(turned) * up, y: at.y + Math.cos(turned) * up },
        angle: upright,
        anchor,
      }
    }
  }
}

/** A drawing laid on a page. */
export const placeDrawing = (drawing: Drawing, placement: Placement): readonly Mark[] =>
  drawing.marks.map((mark) => placeMark(mark, placement))
