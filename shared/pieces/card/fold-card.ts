import { add, dimension, scale, shift, source } from '../../uncertainty/arithmetic.ts'
import type { Dimension } from '../../uncertainty/dimension.ts'
import type { Millimetres } from '../../units/units.ts'
import type { FoldContext } from '../fold-context.ts'
import type { Cavity, FoldedPiece, Measure } from '../folded-piece.ts'
import { closedPanel, outsideFlatFolds } from '../folds.ts'
import {
  betweenScores,
  cutExtent,
  cutSource,
  flatHinge,
  hingeDepth,
  measureOf,
  scoreSource,
  type PlaneAxis,
} from '../making.ts'
import { modelDefaults } from '../model-defaults.ts'
import type { CardGiven } from './card-given.ts'
import { cardPanels, foldedLayers, foldedSize, foldPositions, panelsOfBlank, type FoldedSize } from './card-panels.ts'

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0)

/** How far glued layers reach past the card's edge along an axis, both sides together. */
function overhang(given: CardGiven, axis: PlaneAxis, size: Millimetres): Millimetres {
  const reach = given.layers.map(
    (layer) => 2 * Math.abs(axis === 'length' ? layer.at.x : layer.at.y) + layer.size[axis],
  )
  return Math.max(0, ...reach.map((extent) => extent - size))
}

/** Flat thickness: layers of the card, layers glued on, an insert, a pocket. What is raised comes on top. */
function thicknessOf(given: CardGiven, caliper: Dimension, context: FoldContext): Dimension {
  return add(
    scale(caliper, foldedLayers(given) + (given.pocket === null ? 0 : 1)),
    ...given.layers.map((layer) => context.caliper(layer.stock)),
    ...(given.insert === null ? [] : [scale(context.caliper(given.insert.stock), given.insert.folded ? 2 : 1)]),
  )
}

function pocketOf(
  given: CardGiven,
  size: FoldedSize,
  closed: { length: Dimension; width: Dimension },
  hinge: Dimension,
): Cavity | null {
  if (given.pocket === null) return null
  // The pocket is folded up from the bottom edge, which is the edge across the main fold; its mouth is parallel to it.
  const mouth: PlaneAxis = size.across ?? 'width'
  const between = shift(closed[mouth], -2 * given.pocket.side)
  const upwards = (axis: PlaneAxis): Dimension => add(closed[axis], scale(hinge, -2))
  return mouth === 'width'
    ? { shape: 'pocket', length: upwards('length'), width: between, depth: null, open: 'length' }
    : { shape: 'pocket', length: between, width: upwards('width'), depth: null, open: 'width' }
}

/** A card folded shut: closed size ℓ + (1−2λ)t across the fold, as cut along it. */
export function foldCard(given: CardGiven, context: FoldContext): FoldedPiece {
  const size = foldedSize(given)
  const caliper = context.caliper(given.stock)
  const hinge = hingeDepth(flatHinge(context), caliper)
  const measures: Measure[] = []
  const measure = (what: string, nominal: Millimetres, grid: 'cut' | 'score'): Measure => {
    const made = measureOf(given.name, what, nominal, grid)
    measures.push(made)
    return made
  }
  const flat = (axis: PlaneAxis): Dimension =>
    cutExtent(given, context, axis, size[axis], [
      { measure: measure(`blank ${axis}`, size[axis], 'cut'), coefficient: 1 },
    ])

  const across = size.across
  let panels: readonly Millimetres[] = [across === null ? size.width : size[across]]
  let length: Dimension
  let width: Dimension
  let blank = { length: size.length, width: size.width }
  if (across === null) {
    length = flat('length')
    width = flat('width')
  } else {
    const along: PlaneAxis = across === 'width' ? 'length' : 'width'
    panels = cardPanels(given, size[across], caliper.nominal, context.ruler.score)
    if (given.blank !== null && given.panelWidths === null) {
      const sides = [given.blank.length, given.blank.width] as const
      const isFirstAlong = Math.abs(sides[0] - size[along]) <= Math.abs(sides[1] - size[along])
      panels = panelsOfBlank(panels, isFirstAlong ? sides[1] : sides[0])
    }
    const total = sum(panels)
    const widest = Math.max(...panels)
    const blankAcross = measure('blank across the fold', total, 'cut')
    const folds = foldPositions(given, panels).map((position, index, all) =>
      measure(all.length === 1 ? 'fold' : `fold ${String(index + 1)}`, position, 'score'),
    )
    const [first, second] = folds
    const closed =
      given.style === 'gate' && first !== undefined && second !== undefined
        ? // The middle of a gate lies between two folds, as the face of an envelope does.
          outsideFlatFolds(
            betweenScores(
              given,
              context,
              across,
              widest,
              [scoreSource(given, context, across, 1, -1), scoreSource(given, context, across, 2, 1)],
              [
                { measure: first, coefficient: -1 },
                { measure: second, coefficient: 1 },
              ],
            ),
            hinge,
            caliper,
          )
        : closedPanel(
            betweenScores(
              given,
              context,
              across,
              widest,
              [
                cutSource(given, context, across, given.made === 'printed' ? 0.5 : 1 / panels.length),
                scoreSource(given, context, across, 1, 1),
              ],
              [
                { measure: blankAcross, coefficient: 1 },
                ...(first === undefined ? [] : [{ measure: first, coefficient: 1 }]),
              ],
            ),
            hinge,
            caliper,
          )
    const plain = flat(along)
    length = across === 'length' ? closed : plain
    width = across === 'width' ? closed : plain
    const flatSides = { [along]: size[along], [across]: total } as Record<PlaneAxis, number>
    blank = { length: flatSides.length, width: flatSides.width }
  }
  const closed = {
    length: shift(length, overhang(given, 'length', size.length)),
    width: shift(width, overhang(given, 'width', size.width)),
  }
  const pocket = given.pocket
  if (pocket !== null)
    blank =
      size.across === 'length'
        ? { ...blank, width: blank.width + pocket.depth }
        : { ...blank, length: blank.length + pocket.depth }
  return {
    given,
    blank,
    caliper,
    outside: { ...closed, height: thicknessOf(given, caliper, context) },
    cavity: pocketOf(given, size, { length, width }, hinge),
    raised:
      given.raised === null
        ? null
        : {
            height: dimension(
              given.raised.nominal,
              given.raised.halfWidth ? [source(`given(${given.name}, raised)`, 1, given.raised.halfWidth)] : [],
            ),
            rim: given.raisedToEdge ? 0 : modelDefaults.raisedRim.value,
          },
    isFolded: across !== null,
    measures,
    form: { kind: 'card', panels, layers: foldedLayers(given) },
  }
}
