import { add, dimension, scale } from '../../uncertainty/arithmetic.ts'
import type { Dimension } from '../../uncertainty/dimension.ts'
import type { Millimetres } from '../../units/units.ts'
import type { FoldContext } from '../fold-context.ts'
import type { FoldedPiece } from '../folded-piece.ts'
import { insideRightAngles, outsideRightAngles } from '../folds.ts'
import { betweenScores, cutExtent, cutSource, hingeDepth, measureOf, rightAngleHinge, scoreSource } from '../making.ts'
import { modelDefaults } from '../model-defaults.ts'
import type { SleeveGiven } from './sleeve-given.ts'

const ceilTo = (value: Millimetres, grid: Millimetres): Millimetres => Math.ceil(value / grid - 1e-9) * grid

interface SleeveSizes {
  /** Panels round the girth in order, then the lap. */
  readonly panels: readonly [Millimetres, Millimetres, Millimetres, Millimetres]
  readonly overlap: Millimetres
  readonly along: Millimetres
}

/** Panels from the blank's scores, or from what the sleeve goes round with the usual play, on the score grid. */
function sleeveSizes(given: SleeveGiven, context: FoldContext, caliper: Millimetres): SleeveSizes {
  const around = given.around === null ? null : context.around(given.around)
  if (given.blank !== null && given.blank !== 'fit') {
    const [first = 0, second = 0, third = 0, fourth = 0] = given.blank.scores
    return {
      panels: [first, second - first, third - second, fourth - third],
      overlap: given.blank.length - fourth,
      along: given.blank.width,
    }
  }
  if (around === null) throw new RangeError(`${given.name} goes round nothing and has no blank`)
  const across = given.girth === 'width' ? around.width.nominal : around.length.nominal
  const tube = given.girth === 'width' ? around.length.nominal : around.width.nominal
  const fold = 2 * modelDefaults.hingeFraction.value * caliper + modelDefaults.sleevePlay.value
  const wide = ceilTo(across + fold, context.ruler.score)
  // The lap lies inside the gap of the height: physics E (derived).
  const high = ceilTo(around.height.nominal + fold + caliper, context.ruler.score)
  return {
    panels: [wide, high, wide, high],
    overlap: given.overlap,
    along: given.width ?? ceilTo(tube, context.ruler.cut),
  }
}

/** An open tube with square corners: inside s − 2λt, the height less the lap. */
export function foldSleeve(given: SleeveGiven, context: FoldContext): FoldedPiece {
  const caliper = context.caliper(given.stock)
  const sizes = sleeveSizes(given, context, caliper.nominal)
  const hinge = hingeDepth(rightAngleHinge(context), caliper)
  const [wide, high] = sizes.panels
  const total = sizes.panels.reduce((sum, panel) => sum + panel, 0) + sizes.overlap
  const positions = sizes.panels.map((_, index) =>
    sizes.panels.slice(0, index + 1).reduce((sum, panel) => sum + panel, 0),
  )
  const scores = positions.map((position, index) =>
    measureOf(given.name, `score ${String(index + 1)}`, position, 'score'),
  )
  const length = measureOf(given.name, 'blank length', total, 'cut')
  const along = measureOf(given.name, 'width along the tube', sizes.along, 'cut')
  const panel = (from: 0 | 1, nominal: Millimetres): Dimension => {
    const near = scores[from]
    const far = scores[from + 1]
    return betweenScores(
      given,
      context,
      'length',
      nominal,
      [scoreSource(given, context, 'girth', from + 1, -1), scoreSource(given, context, 'girth', from + 2, 1)],
      near === undefined || far === undefined
        ? []
        : [
            { measure: near, coefficient: -1 },
            { measure: far, coefficient: 1 },
          ],
    )
  }
  // The panel from the first score to the second runs along the height, the next across the girth.
  const highPanel = panel(0, high)
  const widePanel = panel(1, sizes.panels[2])
  const tube = cutExtent(given, context, 'width', sizes.along, [{ measure: along, coefficient: 1 }])
  const acrossInside = insideRightAngles(widePanel, hinge)
  const acrossOutside = outsideRightAngles(widePanel, hinge, caliper)
  const isRoundWidth = given.girth === 'width'
  return {
    given,
    blank: { length: Math.max(total, sizes.along), width: Math.min(total, sizes.along) },
    caliper,
    outside: {
      length: isRoundWidth ? tube : acrossOutside,
      width: isRoundWidth ? acrossOutside : tube,
      height: add(outsideRightAngles(highPanel, hinge, caliper), caliper),
    },
    cavity: {
      shape: 'tube',
      length: isRoundWidth ? tube : acrossInside,
      width: isRoundWidth ? acrossInside : tube,
      depth: add(insideRightAngles(highPanel, hinge), scale(caliper, -1)),
      open: null,
    },
    raised: null,
    isFolded: false,
    measures: [length, along, ...scores],
    form: {
      kind: 'sleeve',
      panels: [wide, ...sizes.panels.slice(1)],
      overlap: dimension(sizes.overlap, [
        cutSource(given, context, 'length', 1),
        scoreSource(given, context, 'girth', 4, -1),
      ]),
      length: sizes.along,
      wrapped: given.girth,
    },
  }
}
