import type { FoldContext } from '../fold-context.ts'
import type { FoldedPiece } from '../folded-piece.ts'
import { cutExtent, measureOf } from '../making.ts'
import type { InsertGiven } from './insert-given.ts'

/** A flat piece as cut. @throws never for a sized insert; an open size must be sized first */
export function foldInsert(given: InsertGiven, context: FoldContext): FoldedPiece {
  if (given.size === 'fit') throw new RangeError(`${given.name} has no size yet`)
  const length = Math.max(given.size.length, given.size.width)
  const width = Math.min(given.size.length, given.size.width)
  const lengthMeasure = measureOf(given.name, 'length', length, 'cut')
  const widthMeasure = measureOf(given.name, 'width', width, 'cut')
  return {
    given,
    blank: { length, width },
    caliper: context.caliper(given.stock),
    outside: {
      length: cutExtent(given, context, 'length', length, [{ measure: lengthMeasure, coefficient: 1 }]),
      width: cutExtent(given, context, 'width', width, [{ measure: widthMeasure, coefficient: 1 }]),
      height: context.caliper(given.stock),
    },
    cavity: null,
    raised: null,
    isFolded: false,
    measures: [lengthMeasure, widthMeasure],
    form: { kind: 'insert', standing: given.kind === 'divider' },
  }
}
