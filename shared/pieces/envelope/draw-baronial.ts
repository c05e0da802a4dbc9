import { clipToConvex, clipToHalfPlane } from '../../geometry/clip-convex.ts'
import { roundCorners } from '../../geometry/round-corner.ts'
import type { Polygon } from '../../geometry/shapes.ts'
import { samePoint } from '../../geometry/tolerance.ts'
import { movePolygon, reflection } from '../../geometry/transform.ts'
import { area, grainAlong, makeBlank, measure, score, type DrawContext } from '../blank-parts.ts'
import type { Blank, BlankArea } from '../blank.ts'
import type { EnvelopeForm } from '../folded-piece.ts'
import {
  baronialFlaps,
  baronialFromCorners,
  baronialOutline,
  baronialPocket,
  baronialSquare,
  type BaronialFlap,
  type BaronialShape,
} from './baronial-geometry.ts'
import { drawLiner } from './draw-liner.ts'
import type { EnvelopeGiven } from './envelope-given.ts'

const flapNames = { left: 'side flap', right: 'side flap', bottom: 'bottom flap', flap: 'seal flap' } as const
const foldNames = { left: 'left fold', right: 'right fold', bottom: 'bottom fold', flap: 'flap fold' } as const

/** Where one folded flap is glued on another, laid back on the flat blank. */
function gluedStrip(on: BaronialFlap, under: BaronialFlap): readonly BlankArea[] {
  const shared = clipToConvex(on.folded, under.folded)
  return shared.length < 3 ? [] : [area('glue', 'bottom flap', movePolygon(shared, reflection(on.fold)))]
}

/** Strips along the two sloping edges of the seal flap, as wide as the top seam, to gum or seal. */
function sealStrips(shape: BaronialShape, flap: BaronialFlap): readonly BlankArea[] {
  const wide = shape.seam.top
  if (wide <= 0) return []
  const [, east, apex, west] = baronialSquare(shape)
  if (east === undefined || apex === undefined || west === undefined) return []
  const inward = wide * Math.SQRT1_2
  const strip = (from: { x: number; y: number }, to: { x: number; y: number }, side: number): Polygon => {
    const move = (p: { x: number; y: number }) => ({ x: p.x + side * inward, y: p.y - inward })
    return clipToHalfPlane(flap.flat, move(to), move(from))
  }
  return [strip(east, apex, -1), strip(apex, west, 1)]
    .filter((polygon) => polygon.length >= 3)
    .map((polygon) => area('glue', 'seal flap', polygon))
}

/** A pointed-flap envelope standing on a corner, inside up: face in the middle, seal flap above. */
export function drawBaronial(
  given: EnvelopeGiven,
  form: Extract<EnvelopeForm, { style: 'baronial' }>,
  context: DrawContext,
): readonly Blank[] {
  const shape = baronialFromCorners(form.square, form.corners)
  const flaps = baronialFlaps(shape)
  const named = (name: BaronialFlap['name']): BaronialFlap | undefined => flaps.find((flap) => flap.name === name)
  const [bottom, seal] = [named('bottom'), named('flap')]
  const [tip, east, apex, west] = baronialSquare(shape)
  if (
    bottom === undefined ||
    seal === undefined ||
    tip === undefined ||
    east === undefined ||
    apex === undefined ||
    west === undefined
  )
    return []
  const onEdge = (from: typeof tip, to: typeof tip, distance: number) => ({
    x: from.x + ((to.x - from.x) * distance) / shape.square,
    y: from.y + ((to.y - from.y) * distance) / shape.square,
  })
  const outline = roundCorners(
    baronialOutline(shape),
    given.corner,
    (corner) => Math.abs(corner.x - apex.x) < samePoint && Math.abs(corner.y - apex.y) < samePoint,
  )
  const lengthRuns = form.throatAlong === 'length' ? 'x' : 'y'
  return [
    makeBlank({
      name: context.name,
      stock: given.stock,
      outline,
      scores: flaps.map((flap) => score(foldNames[flap.name], foldWithin(shape, flap), 180)),
      areas: () => [
        area('panel', 'face', baronialPocket(shape)),
        ...flaps.map((flap) => area('flap', flapNames[flap.name], flap.flat)),
        ...flaps.slice(0, 2).flatMap((side) => gluedStrip(bottom, side)),
        ...sealStrips(shape, seal),
      ],
      measures: () => [
        measure('square', tip, east),
        measure('left corner', west, onEdge(west, tip, shape.corners.left)),
        measure('right corner', east, onEdge(east, tip, shape.corners.right)),
        measure('bottom corner', tip, onEdge(tip, west, shape.corners.bottom)),
        measure('flap corner', apex, onEdge(apex, west, shape.corners.flap)),
      ],
      grain: grainAlong(context, given.stock, lengthRuns),
    }),
    ...drawLiner(context, given, [baronialPocket(shape), seal.flat], lengthRuns),
  ]
}

/** The part of a fold that lies on the square, where a pocket corner lies outside it. */
function foldWithin(shape: BaronialShape, flap: BaronialFlap) {
  const { x: x1, y: y1 } = flap.fold.from
  const { x: x2, y: y2 } = flap.fold.to
  const reachable = (x: number, y: number, isUpright: boolean) =>
    isUpright
      ? { x, y: Math.sign(y) * Math.min(Math.abs(y), Math.max(0, shape.halfDiagonal - Math.abs(x))) }
      : { x: Math.sign(x) * Math.min(Math.abs(x), Math.max(0, shape.halfDiagonal - Math.abs(y))), y }
  const isUpright = x1 === x2
  return { from: reachable(x1, y1, isUpright), to: reachable(x2, y2, isUpright) }
}
