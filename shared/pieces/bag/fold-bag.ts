import type { Dimension } from '../../uncertainty/dimension.ts'
import { dimension } from '../../uncertainty/arithmetic.ts'
import type { Millimetres } from '../../units/units.ts'
import type { FoldContext } from '../fold-context.ts'
import type { FoldedPiece } from '../folded-piece.ts'
import { insideRightAngles, outsideRightAngles } from '../folds.ts'
import { betweenScores, cutSource, hingeDepth, measureOf, rightAngleHinge, scoreSource } from '../making.ts'
import { modelDefaults } from '../model-defaults.ts'
import type { BagGiven } from './bag-given.ts'

export interface BagSizes {
  readonly face: Millimetres
  readonly gusset: Millimetres
  readonly height: Millimetres
  readonly top: Millimetres
  readonly bottom: Millimetres
  readonly seam: Millimetres
}

/** Panels between scores: from the blank where it is given, else from the inside the bag must have. */
export function bagSizes(given: BagGiven, caliper: Millimetres): BagSizes {
  const top = given.top ?? modelDefaults.bagTop.value
  if (given.blank !== null) {
    const scores = given.blank.scores
    const [first = 0, second = 0, third = 0, fourth] = scores
    // Six scores name the middle of each gusset too; four leave them out.
    const afterGusset = scores.length >= 6 ? (fourth ?? third) : third
    const gusset = afterGusset - second
    const bottom = given.bottom ?? gusset / 2 + modelDefaults.bagBottom.value
    return { face: second - first, gusset, height: given.blank.height - top - bottom, top, bottom, seam: first }
  }
  if (given.inside === 'fit') throw new RangeError(`${given.name} has no size yet`)
  const fold = 2 * modelDefaults.hingeFraction.value * caliper
  const gusset = given.inside.depth + fold
  return {
    face: given.inside.width + fold,
    gusset,
    height: given.inside.height,
    top,
    bottom: given.bottom ?? gusset / 2 + modelDefaults.bagBottom.value,
    seam: given.seam ?? modelDefaults.bagSeam.value,
  }
}

/** An open gusseted bag: inside s − 2λt between its upright folds. `length` is the face, `width` the gusset. */
export function foldBag(given: BagGiven, context: FoldContext): FoldedPiece {
  const caliper = context.caliper(given.stock)
  const sizes = bagSizes(given, caliper.nominal)
  const hinge = hingeDepth(rightAngleHinge(context), caliper)
  const first = measureOf(given.name, 'seam', sizes.seam, 'score')
  const second = measureOf(given.name, 'first face', sizes.seam + sizes.face, 'score')
  const third = measureOf(given.name, 'first gusset', sizes.seam + sizes.face + sizes.gusset, 'score')
  const round = sizes.seam + 2 * (sizes.face + sizes.gusset)
  const high = sizes.top + sizes.height + sizes.bottom
  const panel = (line: 1 | 2, nominal: Millimetres, near: typeof first, far: typeof first): Dimension =>
    betweenScores(
      given,
      context,
      'length',
      nominal,
      [scoreSource(given, context, 'girth', line, -1), scoreSource(given, context, 'girth', line + 1, 1)],
      [
        { measure: near, coefficient: -1 },
        { measure: far, coefficient: 1 },
      ],
    )
  const face = panel(1, sizes.face, first, second)
  const gusset = panel(2, sizes.gusset, second, third)
  const tall = dimension(sizes.height, [
    cutSource(given, context, 'height', 1),
    scoreSource(given, context, 'height', 1, -1),
  ])
  return {
    given,
    blank: { length: Math.max(round, high), width: Math.min(round, high) },
    caliper,
    outside: {
      length: outsideRightAngles(face, hinge, caliper),
      width: outsideRightAngles(gusset, hinge, caliper),
      height: tall,
    },
    cavity: {
      shape: 'bag',
      length: insideRightAngles(face, hinge),
      width: insideRightAngles(gusset, hinge),
      depth: tall,
      open: null,
    },
    raised: null,
    isFolded: false,
    measures: [
      measureOf(given.name, 'blank length', round, 'cut'),
      measureOf(given.name, 'blank height', high, 'cut'),
      first,
      second,
      third,
    ],
    form: {
      kind: 'bag',
      panels: { face: sizes.face, gusset: sizes.gusset, height: sizes.height },
      top: sizes.top,
      bottom: sizes.bottom,
      seam: sizes.seam,
    },
  }
}
