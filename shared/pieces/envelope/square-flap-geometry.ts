import { point, rectangle } from '../../geometry/rectangle.ts'
import type { Polygon, Segment } from '../../geometry/shapes.ts'
import { movePolygon, reflection } from '../../geometry/transform.ts'
import type { Millimetres } from '../../units/units.ts'

/** A square-flap envelope between scores: face `along` × `across`, the throat along its top. Taper in degrees. */
export interface SquareFlapSizes {
  readonly along: Millimetres
  readonly across: Millimetres
  readonly back: Millimetres
  readonly sideFlap: Millimetres
  readonly flap: Millimetres
  readonly taper: number
}

export interface SquareFlapPart {
  readonly name: 'left' | 'right' | 'back' | 'flap'
  readonly fold: Segment
  readonly flat: Polygon
  readonly folded: Polygon
}

/** Face with its lower left at the origin. */
export const squareFlapFace = ({ along, across }: SquareFlapSizes): Polygon => rectangle(0, 0, along, across)

/** Side flaps, back and seal flap, in the order they are folded over the face. */
export function squareFlapParts(sizes: SquareFlapSizes): readonly SquareFlapPart[] {
  const { along, across, back, sideFlap, flap } = sizes
  const lean = Math.min(sideFlap * Math.tan((sizes.taper * Math.PI) / 180), across / 2)
  const part = (name: SquareFlapPart['name'], fold: Segment, flat: Polygon): SquareFlapPart => ({
    name,
    fold,
    flat,
    folded: movePolygon(flat, reflection(fold)),
  })
  const fold = (x1: number, y1: number, x2: number, y2: number): Segment => ({ from: point(x1, y1), to: point(x2, y2) })
  return [
    part('left', fold(0, across, 0, 0), [
      point(0, across),
      point(-sideFlap, across - lean),
      point(-sideFlap, lean),
      point(0, 0),
    ]),
    part('right', fold(along, 0, along, across), [
      point(along, 0),
      point(along + sideFlap, lean),
      point(along + sideFlap, across - lean),
      point(along, across),
    ]),
    part('back', fold(0, 0, along, 0), rectangle(0, -back, along, 0)),
    part('flap', fold(along, across, 0, across), rectangle(0, across, along, across + flap)),
  ]
}

/** Pocket and folded flaps, as the layer map takes them. */
export function foldedSquareFlaps(sizes: SquareFlapSizes): {
  readonly pocket: Polygon
  readonly flaps: readonly Polygon[]
} {
  return { pocket: squareFlapFace(sizes), flaps: squareFlapParts(sizes).map((part) => part.folded) }
}

/** The blank with its four corners cut out, counter-clockwise from the back's lower left. */
export function squareFlapOutline(sizes: SquareFlapSizes): Polygon {
  const [left, right, back, flap] = squareFlapParts(sizes).map((part) => part.flat)
  if (left === undefined || right === undefined || back === undefined || flap === undefined) return []
  return [...back.slice(0, 2), ...right, ...flap.slice(2), ...left]
}
