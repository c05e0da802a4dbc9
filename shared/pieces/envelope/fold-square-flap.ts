import type { Millimetres } from '../../units/units.ts'
import type { FoldContext } from '../fold-context.ts'
import type { FoldedPiece } from '../folded-piece.ts'
import { betweenScores, measureOf, scoreSource, type MarkEffect, type PlaneAxis } from '../making.ts'
import { modelDefaults } from '../model-defaults.ts'
import type { Dimension } from '../../uncertainty/dimension.ts'
import { envelopePiece } from './envelope-piece.ts'
import type { SquareFlapGiven } from './envelope-given.ts'
import { layerMap } from './layer-map.ts'
import { foldedSquareFlaps } from './square-flap-geometry.ts'

/** Sizes of a square-flap envelope with the model's defaults filled in. */
export function squareFlapSizes(given: SquareFlapGiven): {
  readonly along: Millimetres
  readonly across: Millimetres
  readonly back: Millimetres
  readonly sideFlap: Millimetres
  readonly flap: Millimetres
  readonly taper: number
} {
  if (given.pocket === 'fit') throw new RangeError(`${given.name} has no size yet`)
  const { length: along, width: across } = given.pocket
  return {
    along,
    across,
    back: given.back ?? across - modelDefaults.squareFlapThroat.value,
    sideFlap: given.sideFlap ?? modelDefaults.squareFlapSide.value,
    flap: given.flap ?? modelDefaults.squareFlapFlap.value * across,
    taper: modelDefaults.squareFlapTaper.value,
  }
}

/** A square-flap envelope: face, back hinged on the bottom score, side flaps under it, seal flap at the throat. */
export function foldSquareFlap(given: SquareFlapGiven, context: FoldContext): FoldedPiece {
  const sizes = squareFlapSizes(given)
  const throatAlong: PlaneAxis = sizes.along >= sizes.across ? 'length' : 'width'
  const across: PlaneAxis = throatAlong === 'length' ? 'width' : 'length'
  const blankAlong = sizes.along + 2 * sizes.sideFlap
  const blankAcross = sizes.back + sizes.across + sizes.flap
  const measures = [
    measureOf(given.name, 'blank along the throat', blankAlong, 'cut'),
    measureOf(given.name, 'side flap', sizes.sideFlap, 'score'),
    measureOf(given.name, 'blank across the throat', blankAcross, 'cut'),
    measureOf(given.name, 'back', sizes.back, 'score'),
    measureOf(given.name, 'flap', sizes.flap, 'score'),
  ] as const
  const mark = (index: 0 | 1 | 2 | 3 | 4, coefficient: number): MarkEffect => ({
    measure: measures[index],
    coefficient,
  })
  const span = (axis: PlaneAxis, nominal: Millimetres, marks: readonly MarkEffect[]): Dimension =>
    betweenScores(
      given,
      context,
      axis,
      nominal,
      [scoreSource(given, context, axis, 1, 1), scoreSource(given, context, axis, 2, 1)],
      marks,
    )
  const alongSpan = span(throatAlong, sizes.along, [mark(0, 1), mark(1, -2)])
  const acrossSpan = span(across, sizes.across, [mark(2, 1), mark(3, -1), mark(4, -1)])
  const pocket =
    throatAlong === 'length' ? { length: alongSpan, width: acrossSpan } : { length: acrossSpan, width: alongSpan }
  const folded = foldedSquareFlaps(sizes)
  return envelopePiece(
    given,
    context,
    pocket,
    {
      kind: 'envelope',
      style: 'square-flap',
      pocket: { length: Math.max(sizes.along, sizes.across), width: Math.min(sizes.along, sizes.across) },
      back: sizes.back,
      sideFlap: sizes.sideFlap,
      flap: sizes.flap,
      taper: sizes.taper,
      throatAlong,
      layers: layerMap(folded.pocket, folded.flaps),
    },
    { length: Math.max(blankAlong, blankAcross), width: Math.min(blankAlong, blankAcross) },
    measures,
  )
}
