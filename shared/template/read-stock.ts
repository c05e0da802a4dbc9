import type { ValueReader } from '../pieces/reading/value-reader.ts'
import { parseWeight } from '../stock/parse-weight.ts'
import { readSheet } from './read-sheet.ts'
import type { Stock } from './template-model.ts'
import type { StockWritten } from './token-shapes.ts'

function readGrammage(written: StockWritten, read: ValueReader): number | null {
  if (written.grammage !== undefined && written.weight !== undefined) {
    read.report(
      ['weight'],
      'conflicting-keys',
      'The weight of this paper is given twice.',
      'Keep one of “grammage” and “weight”.',
    )
  }
  if (written.grammage !== undefined) return read.parse(['grammage'], written.grammage, parseWeight)
  return written.weight === undefined ? null : read.parse(['weight'], written.weight, parseWeight)
}

/** Reads a paper. */
export function readStock(name: string, written: StockWritten, read: ValueReader): Stock {
  if (written.caliper === undefined && written.grammage === undefined && written.weight === undefined) {
    read.report(
      [],
      'missing-key',
      `Nothing is said of how thick “${name}” is.`,
      'Write its “caliper”, such as “0.32 mm”, or at least its “grammage”, such as “270 gsm”.',
    )
  }
  const caliper =
    written.caliper === undefined ? null : read.toleranced(['caliper'], written.caliper, { allowStack: true })
  return {
    name,
    title: written.title ?? null,
    grammage: readGrammage(written, read),
    caliper: caliper?.nominal ?? null,
    caliperHalfWidth: caliper?.halfWidth ?? null,
    grain: written.grain ?? null,
    sheet: written.sheet === undefined ? null : readSheet(['sheet'], written.sheet, read),
  }
}
