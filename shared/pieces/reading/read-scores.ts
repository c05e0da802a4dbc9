import type { Millimetres } from '../../units/units.ts'
import type { ValueReader } from './value-reader.ts'

/**
 * Reads the scores of a blank, all measured from one end.
 * @param length length of the blank; NaN where it could not be read
 * @param counts how many there may be; empty for any number
 */
export function readScores(
  written: readonly string[] | undefined,
  length: Millimetres,
  counts: readonly number[],
  read: ValueReader,
): readonly Millimetres[] {
  if (written === undefined) {
    // A blank that could not be read may have been meant to be left open.
    if (counts.length > 0 && !Number.isNaN(length)) {
      read.report(
        ['scores'],
        'missing-key',
        'A “blank” needs its “scores”.',
        `Write “scores” with ${counts.join(' or ')} distances from one end.`,
      )
    }
    return []
  }
  const scores = read.lengths(['scores'], written)
  if (counts.length > 0 && !counts.includes(scores.length)) {
    read.report(
      ['scores'],
      'score-count',
      `${String(scores.length)} scores are given.`,
      `Give ${counts.join(' or ')}, all from the same end.`,
      'value',
    )
    return scores
  }
  scores.forEach((score, index) => {
    const before = scores[index - 1] ?? 0
    if (score <= before) {
      read.report(
        ['scores', index],
        'score-order',
        `Score ${String(index + 1)} does not lie beyond the one before it.`,
        'Write the scores in order, all from the same end.',
        'value',
      )
    } else if (score >= length) {
      read.report(
        ['scores', index],
        'score-outside',
        `Score ${String(index + 1)} lies off the blank.`,
        'Write distances smaller than the length of the blank.',
        'value',
      )
    }
  })
  return scores
}
