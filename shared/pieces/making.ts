import { constant, dimension, multiply, source } from '../uncertainty/arithmetic.ts'
import type { Dimension, Source } from '../uncertainty/dimension.ts'
import type { Millimetres } from '../units/units.ts'
import type { FoldContext } from './fold-context.ts'
import type { Measure } from './folded-piece.ts'
import type { PieceGiven } from './given.ts'
import { modelDefaults } from './model-defaults.ts'

export type PlaneAxis = 'length' | 'width'

/** A mark's coefficient: how far a dimension moves when the maker misreads that mark by a millimetre. */
export interface MarkEffect {
  readonly measure: Measure
  readonly coefficient: number
}

export const cutName = (piece: string, axis: string): string => `cut(${piece}, ${axis})`
export const scoreName = (piece: string, axis: string, line: number): string => `score(${piece}, ${axis}, ${line})`

/** Pages are held upright and blanks lie along them: a blank's length runs down the page. */
const pageDirection = (axis: PlaneAxis): 'x' | 'y' => (axis === 'length' ? 'y' : 'x')

export function cutSource(piece: PieceGiven, context: FoldContext, axis: string, coefficient: number): Source {
  return source(cutName(piece.name, axis), coefficient, context.maker.cut)
}

export function scoreSource(
  piece: PieceGiven,
  context: FoldContext,
  axis: string,
  line: number,
  coefficient: number,
): Source {
  return source(scoreName(piece.name, axis, line), coefficient, context.maker.score)
}

export function fenceSource(context: FoldContext, coefficient: number): Source {
  return source(`fence(${context.maker.name})`, coefficient, context.maker.fence)
}

/** A measure a maker sets, with the id that names it as a source. */
export function measureOf(piece: string, what: string, nominal: Millimetres, grid: 'cut' | 'score'): Measure {
  return { id: `mark(${piece}, ${what})`, piece, what, nominal, grid }
}

/** Zero-width sources for marks: they carry sensitivities and vary nothing. */
export function markSources(marks: readonly MarkEffect[]): readonly Source[] {
  return marks.map((mark) => source(mark.measure.id, mark.coefficient, 0))
}

/** What printing adds to a length on the page: the printer's stretch, and how it moves with the print scale. */
export function printSources(span: Millimetres, axis: PlaneAxis): readonly Source[] {
  return [
    source(`printer(${pageDirection(axis)})`, span, modelDefaults.printerHalfWidth.value),
    source('print-scale', span, 0),
  ]
}

/** The same for a length that runs diagonally over the page, as the pocket of a square on its corner does. */
export function diagonalPrintSources(span: Millimetres): readonly Source[] {
  const half = modelDefaults.printerHalfWidth.value
  return [source('printer(x)', span / 2, half), source('printer(y)', span / 2, half), source('print-scale', span, 0)]
}

/** Growth with humidity of a span of paper; nothing where the workspace names no range. */
export function humiditySources(
  piece: PieceGiven,
  context: FoldContext,
  span: Millimetres,
  axis: PlaneAxis,
): readonly Source[] {
  if (context.humidityHalfRange === 0 || piece.stock === null) return []
  const grain = context.stock(piece.stock).grain
  if (grain === null) return []
  const isAlong = (grain === 'long') === (axis === 'length')
  const growth = isAlong ? modelDefaults.humidityAlong.value : modelDefaults.humidityAcross.value
  return [source(`humidity(${piece.stock}, ${isAlong ? 'along' : 'across'})`, span * growth, context.humidityHalfRange)]
}

/** Extent of a flat sheet between two cut edges along one axis. */
export function cutExtent(
  piece: PieceGiven,
  context: FoldContext,
  axis: PlaneAxis,
  nominal: Millimetres,
  marks: readonly MarkEffect[],
): Dimension {
  const isPrinted = piece.made === 'printed'
  return dimension(isPrinted ? nominal * context.scale : nominal, [
    cutSource(piece, context, axis, 1),
    ...(isPrinted ? printSources(nominal, axis) : markSources(marks)),
    ...humiditySources(piece, context, nominal, axis),
  ])
}

/** Distance between two score lines of a sheet whose positions are set independently. */
export function betweenScores(
  piece: PieceGiven,
  context: FoldContext,
  axis: PlaneAxis,
  nominal: Millimetres,
  sources: readonly Source[],
  marks: readonly MarkEffect[],
): Dimension {
  const isPrinted = piece.made === 'printed'
  return dimension(isPrinted ? nominal * context.scale : nominal, [
    ...sources,
    ...(isPrinted ? printSources(nominal, axis) : markSources(marks)),
    ...humiditySources(piece, context, nominal, axis),
  ])
}

/** Hinge fraction of right-angle folds: one scoring tool, so shared by all pieces of one class of makers. */
export function rightAngleHinge(context: FoldContext): Dimension {
  return dimension(modelDefaults.hingeFraction.value, [
    source(`hinge90(${context.maker.name})`, 1, modelDefaults.hingeHalfWidth.value),
  ])
}

/** Hinge fraction of flat folds. */
export function flatHinge(context: FoldContext): Dimension {
  return dimension(modelDefaults.hingeFraction.value, [
    source(`hinge180(${context.maker.name})`, 1, modelDefaults.hingeHalfWidth.value),
  ])
}

/** Hinge depth λt, linearised at the nominal. */
export function hingeDepth(hinge: Dimension, caliper: Dimension): Dimension {
  return multiply(hinge, caliper)
}

export const none: Dimension = constant(0)
