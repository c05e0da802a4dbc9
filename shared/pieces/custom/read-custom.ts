import { readPieceBase } from '../reading/read-piece-base.ts'
import type { Path } from '../reading/report-problem.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import type { CustomGiven, CustomPoint } from './custom-given.ts'
import type { CustomWritten } from './custom-shape.ts'

const readPoint = (keys: Path, written: readonly [string, string], read: ValueReader): CustomPoint => ({
  x: read.coordinate([...keys, 0], written[0]),
  y: read.coordinate([...keys, 1], written[1]),
})

function readSpace(key: 'inside' | 'outside', written: string | undefined, read: ValueReader) {
  if (written === undefined) return null
  const [length, width, third] = read.space([key], written, { extents: '2 or 3', allowTolerance: false })
  return { length: length?.nominal ?? NaN, width: width?.nominal ?? NaN, third: third?.nominal ?? null }
}

/** Reads a piece of any other shape. */
export function readCustom(name: string, written: CustomWritten, read: ValueReader): CustomGiven {
  if (written.outline.length < 3) {
    read.report(
      ['outline'],
      'outline-short',
      `An outline of ${String(written.outline.length)} points encloses nothing.`,
      'Give three points or more, in order round the blank.',
      'value',
    )
  }
  if (written.inside === undefined && written.outside === undefined) {
    read.report(
      ['outside'],
      'missing-key',
      'A custom piece needs its “inside” or its “outside”.',
      'Write “outside” with the size it has when folded, and “inside” where something goes into it.',
    )
  }
  const inside = readSpace('inside', written.inside, read)
  const outside = readSpace('outside', written.outside, read)
  return {
    ...readPieceBase(name, written, read),
    kind: 'custom',
    stock: read.stock(['stock'], written.stock),
    outline: written.outline.map((point, index) => readPoint(['outline', index], point, read)),
    scores: (written.scores ?? []).map((score, index) => ({
      from: readPoint(['scores', index, 'from'], score.from, read),
      to: readPoint(['scores', index, 'to'], score.to, read),
      fold: score.fold ?? 'valley',
      angle: score.angle === undefined ? 90 : read.angle(['scores', index, 'angle'], score.angle, 0, 180),
    })),
    inside: inside === null ? null : { length: inside.length, width: inside.width, depth: inside.third },
    outside: outside === null ? null : { length: outside.length, width: outside.width, height: outside.third },
  }
}
