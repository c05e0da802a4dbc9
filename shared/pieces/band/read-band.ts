import { languageDefaults } from '../language-defaults.ts'
import { readPieceBase } from '../reading/read-piece-base.ts'
import { readScores } from '../reading/read-scores.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import type { Millimetres } from '../../units/units.ts'
import type { BandGiven } from './band-given.ts'
import type { BandWritten } from './band-shape.ts'

interface Strip {
  readonly width: Millimetres
  readonly blank: BandGiven['blank']
}

function readStrip(written: BandWritten, read: ValueReader): Strip {
  if (written.blank !== undefined && written.length !== undefined) {
    read.report(
      ['length'],
      'conflicting-keys',
      '“length” is given beside “blank”, which has it already.',
      'Keep one of them.',
    )
  }
  if (written.blank === undefined && written.length === undefined && written.scores !== undefined) {
    read.report(
      ['scores'],
      'conflicting-keys',
      '“scores” are given without a “blank”.',
      'Give the “blank” too, or take the scores out.',
    )
  }
  const size = written.blank === undefined ? null : read.sizeOrFit(['blank'], written.blank)
  const needsWidth = size === null || size === 'fit'
  if (needsWidth && written.width === undefined) {
    read.report(
      ['width'],
      'missing-key',
      `A ${written.ribbon === true ? 'ribbon' : 'band'} needs its “width”.`,
      'Write “width” with a length, such as “40 mm”.',
    )
  }
  if (!needsWidth && written.width !== undefined) {
    read.report(
      ['width'],
      'conflicting-keys',
      '“width” is given beside “blank”, which has it already.',
      'Keep one of them.',
    )
  }
  const width = read.lengthOr(['width'], written.width, NaN)
  if (size === 'fit') return { width, blank: size }
  if (size !== null)
    return {
      width: size.width,
      blank: { length: size.length, scores: readScores(written.scores, size.length, [], read) },
    }
  if (written.length === undefined) return { width, blank: null }
  const length = read.length(['length'], written.length)
  return { width, blank: { length, scores: readScores(written.scores, length, [], read) } }
}

/** Reads a band or a ribbon. */
export function readBand(name: string, written: BandWritten, read: ValueReader): BandGiven {
  const ribbon = written.ribbon ?? false
  if (!ribbon && written.stock === undefined) {
    read.report(
      ['stock'],
      'missing-key',
      'A band needs its “stock”.',
      'Write “stock” with the name of a paper, or “ribbon: true” for a ribbon.',
    )
  }
  if (!ribbon && written.tie !== undefined) {
    read.report(['tie'], 'conflicting-keys', 'A band of paper is not tied.', 'Take “tie” out, or write “ribbon: true”.')
  }
  if (ribbon && written.scores !== undefined) {
    read.report(['scores'], 'conflicting-keys', 'A ribbon has no scores.', 'Take “scores” out.')
  }
  return {
    ...readPieceBase(name, written, read),
    kind: 'band',
    stock: written.stock === undefined ? null : read.stock(['stock'], written.stock),
    around: written.around === undefined ? null : read.piece(['around'], written.around),
    overlap: read.lengthOr(['overlap'], written.overlap, languageDefaults.wrapOverlap.value),
    girth: written.girth ?? 'width',
    ribbon,
    tie: written.tie ?? 'bow',
    ...readStrip(written, read),
  }
}
