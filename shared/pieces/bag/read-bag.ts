import { modelDefaults } from '../model-defaults.ts'
import { readPieceBase } from '../reading/read-piece-base.ts'
import { readScores } from '../reading/read-scores.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import type { BagGiven } from './bag-given.ts'
import type { BagWritten } from './bag-shape.ts'

type Inside = Exclude<BagGiven['inside'], 'fit'>

/** What a blank makes, from score to score: the folds take their part when it is folded. */
function insideOfBlank(blank: NonNullable<BagGiven['blank']>, top: number | null, bottom: number | null): Inside {
  const [seam = NaN, face = NaN, third = NaN, fourth = NaN] = blank.scores
  const depth = (blank.scores.length >= 6 ? fourth : third) - face
  const used = (top ?? modelDefaults.bagTop.value) + (bottom ?? depth / 2 + modelDefaults.bagBottom.value)
  return { width: face - seam, depth, height: blank.height - used }
}

/** Reads a bag. */
export function readBag(name: string, written: BagWritten, read: ValueReader): BagGiven {
  const top = read.lengthOr(['top'], written.top, null, { allowZero: true })
  const bottom = read.lengthOr(['bottom'], written.bottom, null)
  const base = {
    ...readPieceBase(name, written, read),
    kind: 'bag' as const,
    stock: read.stock(['stock'], written.stock),
    top,
    bottom,
    seam: read.lengthOr(['seam'], written.seam, null),
  }
  const unread = { width: NaN, depth: NaN, height: NaN }
  if (written.blank !== undefined) {
    for (const key of ['inside', 'seam'] as const) {
      if (written[key] === undefined) continue
      read.report(
        [key],
        'conflicting-keys',
        `“${key}” has no place beside “blank” and “scores”, which say it already.`,
        'Give either “inside”, or “blank” and “scores”.',
      )
    }
    const size = read.size(['blank'], written.blank)
    const scores = readScores(written.scores, size.length, [4, 6], read)
    const blank = { length: size.length, height: size.width, scores }
    return { ...base, blank, inside: insideOfBlank(blank, top, bottom) }
  }
  if (written.scores !== undefined)
    read.report(
      ['scores'],
      'conflicting-keys',
      '“scores” are given without a “blank”.',
      'Give the “blank” too, or “inside” alone.',
    )
  if (written.inside === undefined) {
    read.report(
      ['inside'],
      'missing-key',
      'A bag needs its “inside”, or its “blank” and “scores”.',
      'Write “inside” with width x depth x height, such as “180 x 80 x 220 mm”.',
    )
    return { ...base, blank: null, inside: unread }
  }
  if (written.inside.trim() === 'fit') {
    read.leaveOpen(['inside'])
    return { ...base, blank: null, inside: 'fit' }
  }
  const [width, depth, height] = read.space(['inside'], written.inside, { extents: 3, allowTolerance: false })
  return {
    ...base,
    blank: null,
    inside: { width: width?.nominal ?? NaN, depth: depth?.nominal ?? NaN, height: height?.nominal ?? NaN },
  }
}
