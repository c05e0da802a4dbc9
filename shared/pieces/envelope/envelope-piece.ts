import { add, scale } from '../../uncertainty/arithmetic.ts'
import type { Dimension } from '../../uncertainty/dimension.ts'
import type { Millimetres } from '../../units/units.ts'
import type { FoldContext } from '../fold-context.ts'
import type { EnvelopeForm, FoldedPiece, Measure } from '../folded-piece.ts'
import { insideFlatFolds, outsideFlatFolds } from '../folds.ts'
import { flatHinge, hingeDepth } from '../making.ts'
import type { EnvelopeGiven } from './envelope-given.ts'

/**
 * An envelope from its pocket between scores: flat inside s − 4λt, outside s + 2(1−2λ)t, empty thickness t·N.
 * A liner is a further layer: it thickens the envelope and takes its caliper from the room inside.
 */
export function envelopePiece(
  given: EnvelopeGiven,
  context: FoldContext,
  pocket: { readonly length: Dimension; readonly width: Dimension },
  form: EnvelopeForm,
  blank: { readonly length: Millimetres; readonly width: Millimetres },
  measures: readonly Measure[],
): FoldedPiece {
  const caliper = context.caliper(given.stock)
  const hinge = hingeDepth(flatHinge(context), caliper)
  const liner = given.liner === null ? [] : [context.caliper(given.liner)]
  const inside = (scored: Dimension): Dimension =>
    add(insideFlatFolds(scored, hinge), ...liner.map((layer) => scale(layer, -1)))
  return {
    given,
    blank,
    caliper,
    outside: {
      length: outsideFlatFolds(pocket.length, hinge, caliper),
      width: outsideFlatFolds(pocket.width, hinge, caliper),
      height: add(scale(caliper, form.layers.mean), ...liner),
    },
    cavity: { shape: 'pocket', length: inside(pocket.length), width: inside(pocket.width), depth: null, open: null },
    raised: null,
    isFolded: true,
    measures,
    form,
  }
}
