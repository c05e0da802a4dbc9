import { constant, scale } from '../../uncertainty/arithmetic.ts'
import type { Dimension } from '../../uncertainty/dimension.ts'
import type { Millimetres } from '../../units/units.ts'
import type { FoldContext, Girded } from '../fold-context.ts'
import type { FoldedPiece } from '../folded-piece.ts'
import { cutExtent, measureOf } from '../making.ts'
import { modelDefaults } from '../model-defaults.ts'
import type { BandGiven } from './band-given.ts'

/** Ribbon needed beyond the girth. */
export const tieLength = (tie: 'knot' | 'bow'): Millimetres =>
  tie === 'knot' ? modelDefaults.ribbonKnot.value : modelDefaults.ribbonBow.value

/**
 * Nominal perimeter of a tight wrap, round corners: 2(w + h) + πt. A ribbon has no caliper to speak of.
 * @see physics E (derived)
 */
export function wrapLength(around: Girded, girth: 'width' | 'length', caliper: Millimetres): Millimetres {
  const across = girth === 'width' ? around.width.nominal : around.length.nominal
  return 2 * (across + around.height.nominal) + Math.PI * caliper
}

function stripLength(given: BandGiven, context: FoldContext, caliper: Millimetres): Millimetres {
  if (given.blank !== null && given.blank !== 'fit') return given.blank.length
  const around = given.around === null ? null : context.around(given.around)
  if (around === null) throw new RangeError(`${given.name} goes round nothing and has no length`)
  const needed = wrapLength(around, given.girth, caliper) + (given.ribbon ? tieLength(given.tie) : given.overlap)
  const grid = given.ribbon ? 10 : context.ruler.cut
  return Math.ceil(needed / grid - 1e-9) * grid
}

/** A strip wrapped tight round something; a ribbon is a strip without scores. */
export function foldBand(given: BandGiven, context: FoldContext): FoldedPiece {
  const caliper: Dimension | null = given.stock === null ? null : context.caliper(given.stock)
  const nominal = stripLength(given, context, caliper?.nominal ?? 0)
  const lengthMeasure = measureOf(given.name, 'length', nominal, 'cut')
  const widthMeasure = measureOf(given.name, 'width', given.width, 'cut')
  const strip = cutExtent(given, context, 'length', nominal, [{ measure: lengthMeasure, coefficient: 1 }])
  return {
    given,
    blank: given.ribbon ? null : { length: nominal, width: given.width },
    caliper,
    outside: {
      length: strip,
      width: cutExtent(given, context, 'width', given.width, [{ measure: widthMeasure, coefficient: 1 }]),
      height: caliper === null ? constant(0) : scale(caliper, 1),
    },
    cavity: null,
    raised: null,
    isFolded: false,
    measures: given.ribbon ? [] : [lengthMeasure, widthMeasure],
    form: { kind: 'band', stripLength: strip, wrapped: given.girth, ribbon: given.ribbon },
  }
}
