import { ImpossiblePiece } from '../impossible-piece.ts'
import type { FoldContext } from '../fold-context.ts'
import type { EnvelopeForm, FoldedPiece, Measure } from '../folded-piece.ts'
import {
  betweenScores,
  cutSource,
  diagonalPrintSources,
  humiditySources,
  measureOf,
  scoreSource,
  type MarkEffect,
  type PlaneAxis,
} from '../making.ts'
import { dimension } from '../../uncertainty/arithmetic.ts'
import type { Dimension } from '../../uncertainty/dimension.ts'
import type { Millimetres } from '../../units/units.ts'
import { baronialFromCorners, baronialFromPocket, foldedBaronialFlaps } from './baronial-geometry.ts'
import { layerMap } from './layer-map.ts'
import { envelopePiece } from './envelope-piece.ts'
import type { BaronialByCorners, BaronialByPocket } from './envelope-given.ts'

/** Marks of the two corners folded towards each other: one measure where both are set alike. */
function cornerMarks(
  piece: string,
  names: readonly [string, string, string],
  corners: readonly [Millimetres, Millimetres],
  measures: Measure[],
): MarkEffect[] {
  // The pocket runs √2·S less 1/√2 of each corner's distance: physics B.5 (derived).
  const perCorner = -Math.SQRT1_2
  if (Math.abs(corners[0] - corners[1]) < 1e-9) {
    const both = measureOf(piece, names[2], corners[0], 'score')
    measures.push(both)
    return [{ measure: both, coefficient: 2 * perCorner }]
  }
  const marks = [measureOf(piece, names[0], corners[0], 'score'), measureOf(piece, names[1], corners[1], 'score')]
  measures.push(...marks)
  return marks.map((measure) => ({ measure, coefficient: perCorner }))
}

/** Folds that leave no pocket or lie off the square leave nothing to fold. Flaps that do not meet are a rule's business. */
function requirePocket(
  given: BaronialByPocket | BaronialByCorners,
  shape: ReturnType<typeof baronialFromPocket>,
): void {
  const key = given.by === 'corners' ? 'corners' : 'pocket'
  if (shape.along <= 0 || shape.across <= 0) {
    const hint = 'Let the distances of two opposite corners add up to less than twice the side of the square.'
    throw new ImpossiblePiece(given.name, `The folds of ${given.name} leave no pocket between them.`, hint, key)
  }
  const reaches = [shape.reach.left + shape.reach.right, shape.reach.bottom + shape.reach.top]
  if (Math.min(...Object.values(shape.reach)) <= 0 || Math.max(...reaches) >= 2 * shape.halfDiagonal) {
    throw new ImpossiblePiece(
      given.name,
      `A fold of ${given.name} lies off its square.`,
      'Make every corner distance shorter than the side of the square.',
      key,
    )
  }
}

/** A baronial envelope from its pocket or from its square and corners. @see physics B.5 (derived) */
export function foldBaronial(given: BaronialByPocket | BaronialByCorners, context: FoldContext): FoldedPiece {
  if (given.by === 'pocket' && given.pocket === 'fit') throw new RangeError(`${given.name} has no size yet`)
  const shape =
    given.by === 'corners'
      ? baronialFromCorners(given.square, given.corners)
      : baronialFromPocket(
          given.pocket === 'fit' ? { along: 0, across: 0 } : { along: given.pocket.length, across: given.pocket.width },
          given.seam,
        )
  requirePocket(given, shape)
  const throatAlong: PlaneAxis = shape.along >= shape.across ? 'length' : 'width'
  const square = measureOf(given.name, 'square', shape.square, 'cut')
  const measures: Measure[] = [square]
  const sides = cornerMarks(
    given.name,
    ['left corner', 'right corner', 'side corners'],
    [shape.corners.left, shape.corners.right],
    measures,
  )
  const ends = cornerMarks(
    given.name,
    ['bottom corner', 'flap corner', 'bottom and flap corners'],
    [shape.corners.bottom, shape.corners.flap],
    measures,
  )

  const span = (axis: PlaneAxis, nominal: Millimetres, marks: readonly MarkEffect[]): Dimension => {
    const making = [scoreSource(given, context, axis, 1, 1), scoreSource(given, context, axis, 2, 1)]
    if (given.made === 'printed') {
      return dimension(nominal * context.scale, [
        ...making,
        ...diagonalPrintSources(nominal),
        ...humiditySources(given, context, nominal, axis),
      ])
    }
    return betweenScores(
      given,
      context,
      axis,
      nominal,
      [...making, cutSource(given, context, axis, Math.SQRT1_2)],
      [{ measure: square, coefficient: Math.SQRT2 }, ...marks],
    )
  }
  const across: PlaneAxis = throatAlong === 'length' ? 'width' : 'length'
  const along = span(throatAlong, shape.along, sides)
  const over = span(across, shape.across, ends)
  const pocket = throatAlong === 'length' ? { length: along, width: over } : { length: over, width: along }
  const folded = foldedBaronialFlaps(shape)
  const form: EnvelopeForm = {
    kind: 'envelope',
    style: 'baronial',
    pocket: { length: Math.max(shape.along, shape.across), width: Math.min(shape.along, shape.across) },
    square: shape.square,
    corners: shape.corners,
    reach: shape.reach,
    seam: shape.seam,
    notch: shape.notch,
    throatAlong,
    layers: layerMap(folded.pocket, folded.flaps),
  }
  return envelopePiece(given, context, pocket, form, { length: shape.square, width: shape.square }, measures)
}
