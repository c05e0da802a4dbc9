import { clipToHalfPlane } from '../../geometry/clip-convex.ts'
import { point, rectangle } from '../../geometry/rectangle.ts'
import type { Point, Polygon, Segment } from '../../geometry/shapes.ts'
import { samePoint } from '../../geometry/tolerance.ts'
import { movePolygon, reflection } from '../../geometry/transform.ts'
import type { Millimetres } from '../../units/units.ts'

export interface Corners {
  readonly left: Millimetres
  readonly right: Millimetres
  readonly bottom: Millimetres
  readonly flap: Millimetres
}

/** One value for each corner of the pocket. */
export interface PocketCorners {
  readonly bottomLeft: Millimetres
  readonly bottomRight: Millimetres
  readonly topLeft: Millimetres
  readonly topRight: Millimetres
}

/**
 * A pointed-flap envelope as folds in a square that stands on a corner. Its folds lie at 45° to the square's edges.
 * Where a notch is negative the folds cross outside the square and the face lacks that corner: no such envelope closes.
 */
export interface BaronialShape {
  readonly square: Millimetres
  /** Half of the square's diagonal: D = S/√2. */
  readonly halfDiagonal: Millimetres
  /** Pocket between scores: along the throat and across it. */
  readonly along: Millimetres
  readonly across: Millimetres
  /** Middle of the pocket from the middle of the square. */
  readonly offset: Point
  /** e = D − (W+H)/2, the notch leg of a centred pocket. */
  readonly surplus: Millimetres
  /** Distance from each corner of the square at which its fold cuts both edges: √2 × reach. */
  readonly corners: Corners
  /** Height of each flap from its fold to its point. */
  readonly reach: {
    readonly left: Millimetres
    readonly right: Millimetres
    readonly bottom: Millimetres
    readonly top: Millimetres
  }
  /** Perpendicular width of the seams: √2 × notch leg, the narrower of left and right. */
  readonly seam: { readonly bottom: Millimetres; readonly top: Millimetres }
  readonly notch: { readonly bottom: Millimetres; readonly top: Millimetres }
  readonly notches: PocketCorners
  /** Where folds cut an edge of the square, from the bottom corner on a lower edge and from the flap's corner on an upper one. */
  readonly marks: {
    readonly lower: { readonly left: Millimetres; readonly right: Millimetres; readonly bottom: Millimetres }
    readonly upper: { readonly left: Millimetres; readonly right: Millimetres; readonly top: Millimetres }
  }
}

/**
 * Shape of a baronial from its square and how far from each corner the folds cut both edges.
 * @see physics B.5 (derived): reach a/√2; W = √2·S − (left + right)/√2, H likewise with bottom and flap
 */
export function baronialFromCorners(square: Millimetres, corners: Corners): BaronialShape {
  const halfDiagonal = square * Math.SQRT1_2
  const reach = {
    left: corners.left * Math.SQRT1_2,
    right: corners.right * Math.SQRT1_2,
    bottom: corners.bottom * Math.SQRT1_2,
    top: corners.flap * Math.SQRT1_2,
  }
  const along = 2 * halfDiagonal - reach.left - reach.right
  const across = 2 * halfDiagonal - reach.bottom - reach.top
  // A pocket corner lies D − r from the middle along each diagonal; what is left of D is the leg of its notch.
  const notchOf = (first: Millimetres, second: Millimetres): Millimetres => first + second - halfDiagonal
  const notches = {
    bottomLeft: notchOf(reach.left, reach.bottom),
    bottomRight: notchOf(reach.right, reach.bottom),
    topLeft: notchOf(reach.left, reach.top),
    topRight: notchOf(reach.right, reach.top),
  }
  const notch = {
    bottom: Math.min(notches.bottomLeft, notches.bottomRight),
    top: Math.min(notches.topLeft, notches.topRight),
  }
  const sideMarks = { left: square - corners.left, right: square - corners.right }
  return {
    square,
    halfDiagonal,
    along,
    across,
    offset: point((reach.left - reach.right) / 2, (reach.bottom - reach.top) / 2),
    surplus: halfDiagonal - (along + across) / 2,
    corners,
    reach,
    seam: { bottom: Math.SQRT2 * notch.bottom, top: Math.SQRT2 * notch.top },
    notch,
    notches,
    marks: { lower: { ...sideMarks, bottom: corners.bottom }, upper: { ...sideMarks, top: corners.flap } },
  }
}

/**
 * Shape of a baronial from its pocket between scores and its seams.
 * @see physics B.5 (derived): S = (W+H)/√2 + (g_b+g_t)/2; y0 = (g_b−g_t)/(2√2)
 */
export function baronialFromPocket(
  pocket: { readonly along: Millimetres; readonly across: Millimetres },
  seam: { readonly bottom: Millimetres; readonly top: Millimetres },
): BaronialShape {
  const square = (pocket.along + pocket.across) * Math.SQRT1_2 + (seam.bottom + seam.top) / 2
  const raisedBy = (seam.bottom - seam.top) / (2 * Math.SQRT2)
  const diagonal = Math.SQRT2 * square
  const side = (diagonal - pocket.along) / 2
  const bottom = (diagonal - pocket.across) / 2 + raisedBy
  const flap = (diagonal - pocket.across) / 2 - raisedBy
  const shape = baronialFromCorners(square, {
    left: Math.SQRT2 * side,
    right: Math.SQRT2 * side,
    bottom: Math.SQRT2 * bottom,
    flap: Math.SQRT2 * flap,
  })
  // What was given is kept to the last digit; going through the corners loses it.
  return { ...shape, along: pocket.along, across: pocket.across, seam }
}

export interface BaronialFolds {
  readonly left: Segment
  readonly right: Segment
  readonly bottom: Segment
  readonly flap: Segment
}

interface Fold {
  readonly name: keyof BaronialFolds
  readonly line: Segment
}

const sidesOf = (shape: BaronialShape) => ({
  left: shape.reach.left - shape.halfDiagonal,
  right: shape.halfDiagonal - shape.reach.right,
  bottom: shape.reach.bottom - shape.halfDiagonal,
  top: shape.halfDiagonal - shape.reach.top,
})

/** The square standing on a corner, its middle at the origin. */
export const baronialSquare = ({ halfDiagonal: d }: BaronialShape): Polygon => [
  point(0, -d),
  point(d, 0),
  point(0, d),
  point(-d, 0),
]

/** The pocket between scores, in the same place. */
export function baronialPocket(shape: BaronialShape): Polygon {
  const { left, bottom, right, top } = sidesOf(shape)
  return rectangle(left, bottom, right, top)
}

/** The four folds over the pocket's sides, each with the face on its left. */
function foldsOf(shape: BaronialShape): readonly Fold[] {
  const { left, bottom, right, top } = sidesOf(shape)
  const line = (x1: number, y1: number, x2: number, y2: number): Segment => ({ from: point(x1, y1), to: point(x2, y2) })
  return [
    { name: 'left', line: line(left, top, left, bottom) },
    { name: 'right', line: line(right, bottom, right, top) },
    { name: 'bottom', line: line(left, bottom, right, bottom) },
    { name: 'flap', line: line(right, top, left, top) },
  ]
}

/** The part of the square beyond one fold and between the two folds beside it, once the notches are cut. */
function flatFlap(shape: BaronialShape, fold: keyof BaronialFolds): Polygon {
  const { left, bottom, right, top } = sidesOf(shape)
  const clip = (polygon: Polygon, x1: number, y1: number, x2: number, y2: number): Polygon =>
    clipToHalfPlane(polygon, point(x1, y1), point(x2, y2))
  const square = baronialSquare(shape)
  if (fold === 'left' || fold === 'right') {
    const between = clip(clip(square, left, bottom, right, bottom), right, top, left, top)
    return fold === 'left' ? clip(between, left, bottom, left, top) : clip(between, right, top, right, bottom)
  }
  const between = clip(clip(square, left, top, left, bottom), right, bottom, right, top)
  return fold === 'bottom' ? clip(between, right, bottom, left, bottom) : clip(between, left, top, right, top)
}

export interface BaronialFlap {
  readonly name: keyof BaronialFolds
  readonly fold: Segment
  readonly flat: Polygon
  readonly folded: Polygon
}

/** The four flaps in the order they are folded in: sides, bottom, then the seal flap. */
export function baronialFlaps(shape: BaronialShape): readonly BaronialFlap[] {
  return foldsOf(shape).map(({ name, line }) => {
    const flat = flatFlap(shape, name)
    return { name, fold: line, flat, folded: movePolygon(flat, reflection(line)) }
  })
}

/** Pocket and folded flaps, as the layer map takes them. */
export function foldedBaronialFlaps(shape: BaronialShape): {
  readonly pocket: Polygon
  readonly flaps: readonly Polygon[]
} {
  return { pocket: baronialPocket(shape), flaps: baronialFlaps(shape).map((flap) => flap.folded) }
}

/** The blank with its notches cut, counter-clockwise from the bottom point; a pocket corner outside the square has no notch. */
export function baronialOutline(shape: BaronialShape): Polygon {
  const { left, bottom, right, top } = sidesOf(shape)
  const { bottomLeft, bottomRight, topLeft, topRight } = shape.notches
  const [tip, east, apex, west] = baronialSquare(shape)
  if (tip === undefined || east === undefined || apex === undefined || west === undefined) return []
  const notch = (leg: Millimetres, before: Point, inner: Point, after: Point): readonly Point[] =>
    leg > samePoint ? [before, inner, after] : []
  return [
    tip,
    ...notch(bottomRight, point(right, bottom - bottomRight), point(right, bottom), point(right + bottomRight, bottom)),
    east,
    ...notch(topRight, point(right + topRight, top), point(right, top), point(right, top + topRight)),
    apex,
    ...notch(topLeft, point(left, top + topLeft), point(left, top), point(left - topLeft, top)),
    west,
    ...notch(bottomLeft, point(left - bottomLeft, bottom), point(left, bottom), point(left, bottom - bottomLeft)),
  ]
}

/**
 * Area glued on one side of the bottom seam: e·M − e²/2 with M = min(2·r_s − e, W + e).
 * @see physics B.5 (derived)
 */
export function baronialSeamArea(shape: BaronialShape): number {
  const leg = shape.notch.bottom
  if (leg <= 0) return 0
  const mouth = Math.min(2 * Math.min(shape.reach.left, shape.reach.right) - leg, shape.along + leg)
  return leg * mouth - (leg * leg) / 2
}
