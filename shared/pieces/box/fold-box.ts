import { add, dimension, scale, source } from '../../uncertainty/arithmetic.ts'
import type { Dimension, Source } from '../../uncertainty/dimension.ts'
import type { Millimetres } from '../../units/units.ts'
import type { FoldContext } from '../fold-context.ts'
import type { FoldedPiece, Measure } from '../folded-piece.ts'
import { insideRightAngles, outsideRightAngles, wallDepth, wallHeight } from '../folds.ts'
import {
  betweenScores,
  cutSource,
  fenceSource,
  hingeDepth,
  humiditySources,
  markSources,
  measureOf,
  printSources,
  rightAngleHinge,
  scoreSource,
  type MarkEffect,
  type PlaneAxis,
} from '../making.ts'
import { modelDefaults } from '../model-defaults.ts'
import type { BoxGiven } from './box-given.ts'
import { boxSizes, tabbedAxis, type BoxSizes } from './box-sizes.ts'

interface Wall {
  readonly axis: PlaneAxis
  readonly line: 1 | 2
  readonly measure: Measure
}

/** The measure each wall's score is set by: one for all where all four are alike. */
function wallMeasures(given: BoxGiven, sizes: BoxSizes): readonly Wall[] {
  const walls = (['length', 'width'] as const).flatMap((axis) =>
    ([1, 2] as const).map((line) => ({ axis, line, nominal: sizes.walls[axis][line - 1] ?? 0 })),
  )
  const isAlike = walls.every((wall) => Math.abs(wall.nominal - (walls[0]?.nominal ?? 0)) < 1e-9)
  const common = measureOf(given.name, 'wall', walls[0]?.nominal ?? 0, 'score')
  return walls.map(({ axis, line, nominal }) => ({
    axis,
    line,
    measure:
      given.scored === 'one-edge' && line === 2
        ? measureOf(given.name, `far score across the ${axis}`, sizes.blank[axis] - nominal, 'score')
        : isAlike
          ? common
          : measureOf(given.name, `${axis === 'length' ? 'end' : 'side'} wall ${String(line)}`, nominal, 'score'),
  }))
}

/** Distance between the two opposite scores of an axis: how it varies depends on which edges they are set from. */
function scoredDimension(
  given: BoxGiven,
  context: FoldContext,
  axis: PlaneAxis,
  sizes: BoxSizes,
  blank: Measure,
  walls: readonly Wall[],
): Dimension {
  const pair = walls.filter((wall) => wall.axis === axis)
  // A score set from its own edge moves inwards when it is set too deep; the far one set from the near edge moves outwards.
  const isFromOneEdge = given.scored === 'one-edge' && given.made === 'measured'
  const lines = [scoreSource(given, context, axis, 1, -1), scoreSource(given, context, axis, 2, isFromOneEdge ? 1 : -1)]
  const span = (sources: readonly Source[], marks: readonly MarkEffect[]): Dimension =>
    betweenScores(given, context, axis, sizes.scored[axis], sources, marks)
  if (given.made === 'printed') return span(lines, [])
  if (isFromOneEdge)
    return span(
      lines,
      pair.map((wall) => ({ measure: wall.measure, coefficient: wall.line === 1 ? -1 : 1 })),
    )
  const marks = mergeMarks([
    { measure: blank, coefficient: 1 },
    ...pair.map((wall) => ({ measure: wall.measure, coefficient: -1 })),
  ])
  return span([cutSource(given, context, axis, 1), ...lines, fenceSource(context, -2)], marks)
}

const mergeMarks = (marks: readonly MarkEffect[]): MarkEffect[] =>
  marks.reduce<MarkEffect[]>((merged, mark) => {
    const index = merged.findIndex((other) => other.measure.id === mark.measure.id)
    const found = merged[index]
    if (found === undefined) return [...merged, mark]
    return merged.with(index, { measure: mark.measure, coefficient: found.coefficient + mark.coefficient })
  }, [])

/** Distance from a wall's score to its cut edge. */
function wallDimension(
  given: BoxGiven,
  context: FoldContext,
  wall: Wall,
  nominal: Millimetres,
  blank: Measure,
): Dimension {
  const score = (sign: 1 | -1): Source => scoreSource(given, context, wall.axis, wall.line, sign)
  const sources: readonly Source[] =
    given.made === 'printed'
      ? [score(1), cutSource(given, context, wall.axis, 0.5), ...printSources(nominal, wall.axis)]
      : given.scored === 'one-edge' && wall.line === 2
        ? [
            score(-1),
            cutSource(given, context, wall.axis, 1),
            fenceSource(context, -1),
            ...markSources([
              { measure: wall.measure, coefficient: -1 },
              { measure: blank, coefficient: 1 },
            ]),
          ]
        : [score(1), fenceSource(context, 1), ...markSources([{ measure: wall.measure, coefficient: 1 }])]
  return dimension(given.made === 'printed' ? nominal * context.scale : nominal, [
    ...sources,
    ...humiditySources(given, context, nominal, wall.axis),
  ])
}

/** A tray folded up: inside and outside at the corners, where tabs lie. @see physics C (derived; the split ω is geometry) */
export function foldBox(given: BoxGiven, context: FoldContext): FoldedPiece {
  const caliper = context.caliper(given.stock)
  const sizes = boxSizes(given, caliper.nominal)
  const hinge = hingeDepth(rightAngleHinge(context), caliper)
  const tabShare = modelDefaults.tabShare.value
  // ω: the centre moves with the caliper, the split within it is the piece's own, both ends alike.
  const pushed = add(
    scale(caliper, tabShare),
    dimension(0, [source(`tab(${given.name})`, 1, caliper.nominal * (1 - tabShare))]),
  )
  const blankMeasures = {
    length: measureOf(given.name, 'blank length', sizes.blank.length, 'cut'),
    width: measureOf(given.name, 'blank width', sizes.blank.width, 'cut'),
  }
  const walls = wallMeasures(given, sizes)
  const doubled = given.walls === 'doubled' ? scale(caliper, -2) : null
  const covered = given.covered === null ? null : context.caliper(given.covered)
  const stuckOn = (axis: PlaneAxis): readonly Dimension[] =>
    given.layers.filter((layer) => layer.on === axis).map((layer) => context.caliper(layer.stock))

  const planeSizes = (axis: PlaneAxis): { inside: Dimension; outside: Dimension } => {
    const scored = scoredDimension(given, context, axis, sizes, blankMeasures[axis], walls)
    const plainInside = insideRightAngles(scored, hinge)
    const plainOutside = outsideRightAngles(scored, hinge, caliper)
    const isTabbed = axis === tabbedAxis(given)
    const inside = !isTabbed
      ? plainInside
      : given.tabs.glued === 'inside'
        ? add(plainInside, scale(caliper, -2), scale(pushed, 2))
        : add(plainInside, scale(pushed, -2))
    const outside = !isTabbed
      ? plainOutside
      : given.tabs.glued === 'inside'
        ? add(plainOutside, scale(pushed, 2))
        : add(plainOutside, scale(caliper, 2), scale(pushed, -2))
    return {
      inside: doubled === null ? inside : add(inside, doubled),
      outside: add(outside, ...(covered === null ? [] : [scale(covered, 2)]), ...stuckOn(axis)),
    }
  }
  const length = planeSizes('length')
  const width = planeSizes('width')
  const wallNominal = (wall: Wall): Millimetres => sizes.walls[wall.axis][wall.line - 1] ?? 0
  const byDepth = walls.toSorted((a, b) => wallNominal(a) - wallNominal(b))
  const shallowest = byDepth[0] ?? walls[0]
  const tallest = byDepth.at(-1) ?? walls[0]
  if (shallowest === undefined || tallest === undefined) throw new RangeError(`${given.name} has no walls`)
  const wallOf = (wall: Wall): Dimension =>
    wallDimension(given, context, wall, wallNominal(wall), blankMeasures[wall.axis])
  const depth = wallDepth(wallOf(shallowest), hinge)
  const height = wallHeight(wallOf(tallest), hinge, caliper)
  const onTop = given.layers.filter((layer) => layer.on === 'top').map((layer) => context.caliper(layer.stock))
  return {
    given,
    blank: sizes.blank,
    caliper,
    outside: {
      length: length.outside,
      width: width.outside,
      height: add(height, ...(covered === null ? [] : [covered]), ...onTop),
    },
    cavity: { shape: 'tray', length: length.inside, width: width.inside, depth, open: null },
    raised: null,
    isFolded: false,
    measures: [
      blankMeasures.length,
      blankMeasures.width,
      ...new Map(walls.map((wall) => [wall.measure.id, wall.measure])).values(),
    ],
    form: { kind: 'box', scored: sizes.scored, walls: sizes.walls, tabbedAxis: tabbedAxis(given) },
  }
}
