import { languageDefaults } from '../language-defaults.ts'
import { readPieceBase } from '../reading/read-piece-base.ts'
import { readScores } from '../reading/read-scores.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import type { SleeveGiven } from './sleeve-given.ts'
import type { SleeveWritten } from './sleeve-shape.ts'

function readBlank(written: SleeveWritten, read: ValueReader): SleeveGiven['blank'] {
  if (written.blank === undefined) {
    if (written.scores !== undefined)
      read.report(
        ['scores'],
        'conflicting-keys',
        '“scores” are given without a “blank”.',
        'Give the “blank” too, or take the scores out: they are reckoned.',
      )
    return null
  }
  const size = read.sizeOrFit(['blank'], written.blank)
  if (size === 'fit') return size
  return { length: size.length, width: size.width, scores: readScores(written.scores, size.length, [4], read) }
}

/** Reads a sleeve. */
export function readSleeve(name: string, written: SleeveWritten, read: ValueReader): SleeveGiven {
  const blank = readBlank(written, read)
  if (blank !== null && blank !== 'fit' && written.width !== undefined) {
    read.report(
      ['width'],
      'conflicting-keys',
      '“width” is given beside “blank”, which has it already.',
      'Keep one of them.',
    )
  }
  return {
    ...readPieceBase(name, written, read),
    kind: 'sleeve',
    stock: read.stock(['stock'], written.stock),
    around: written.around === undefined ? null : read.piece(['around'], written.around),
    width: read.lengthOr(['width'], written.width, null),
    overlap: read.lengthOr(['overlap'], written.overlap, languageDefaults.wrapOverlap.value),
    girth: written.girth ?? 'width',
    blank,
  }
}
