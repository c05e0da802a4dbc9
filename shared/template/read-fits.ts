import type { ReportProblem } from '../pieces/reading/report-problem.ts'
import { createValueReader, type ValueReader, type Vocabulary } from '../pieces/reading/value-reader.ts'
import { mostPieces } from '../pieces/shape/piece-base-shape.ts'
import { checkMap } from './check-shape.ts'
import type { RawMap } from './raw-value.ts'
import { readClearance } from './read-clearance.ts'
import { readNamedGroup } from './read-frame.ts'
import { isName } from './read-names.ts'
import { fitSpec, type FitWritten } from './set-shape.ts'
import type { Clearance, Fit } from './template-model.ts'

const relations = ['in', 'over', 'around'] as const

type Put = Fit['put'][number]

/** A part of a stack: `4 card`, `card`, or a map of count and piece. */
function readPart(index: number, written: Exclude<FitWritten['put'], string>[number], read: ValueReader): Put {
  const keys = ['put', index]
  if (typeof written !== 'string') {
    return {
      count: written.count === undefined ? 1 : read.count([...keys, 'count'], written.count, 1, mostPieces),
      piece: read.piece([...keys, 'piece'], written.piece),
    }
  }
  const [, count, piece = written] = /^(\S+)\s+(?:[x×]\s+)?(\S+)$/.exec(written.trim()) ?? []
  return {
    count: count === undefined ? 1 : read.count(keys, count, 1, mostPieces),
    piece: read.piece(keys, piece.trim()),
  }
}

function readPut(written: FitWritten['put'], read: ValueReader): readonly Put[] {
  if (typeof written !== 'string') {
    if (written.length === 0) {
      read.report(
        ['put'],
        'empty-value',
        'The stack is empty.',
        'Write what is put, such as “[4 card, 4 envelope]”.',
        'value',
      )
    }
    return written.map((part, index) => readPart(index, part, read))
  }
  const counted = /^(\d+)\s+(?:[x×]\s+)?([a-z][a-z0-9-]*)$/.exec(written.trim())
  if (counted !== null) {
    read.report(
      ['put'],
      'put-count',
      `“${written}” is a piece with a count.`,
      `Write “put: ${counted[2] ?? ''}, count: ${counted[1] ?? ''}”, or a stack in brackets: “put: [${written}]”.`,
      'value',
    )
    return []
  }
  return [{ count: 1, piece: read.piece(['put'], written) }]
}

function readRelation(written: FitWritten, read: ValueReader): Pick<Fit, 'relation' | 'to'> {
  const given = relations.filter((relation) => written[relation] !== undefined)
  const [relation = 'in', second] = given
  if (given.length === 0) {
    read.report(
      [],
      'missing-key',
      'The fit does not say what the piece goes into, over or around.',
      'Write one of “in”, “over” and “around” with the name of the other piece.',
    )
  }
  if (second !== undefined) {
    read.report(
      [second],
      'conflicting-keys',
      `The fit says both “${relation}” and “${second}”.`,
      'Keep one; write a second fit for the other.',
    )
  }
  for (const other of given.slice(1)) read.piece([other], written[other] ?? '')
  const to = written[relation]
  return { relation, to: to === undefined ? '' : read.piece([relation], to) }
}

function readOwnClearance(
  written: FitWritten['clearance'],
  named: ReadonlyMap<string, Clearance>,
  vocabulary: Vocabulary,
  read: ValueReader,
): Clearance | null {
  if (written === undefined) return null
  if (typeof written === 'string') {
    const name = written.trim()
    if (vocabulary.clearances.has(name) || (isName(name) && !/^\d/.test(name)))
      return named.get(read.clearance(['clearance'], name)) ?? null
  }
  return readClearance(['clearance'], null, written, read)
}

function readFit(
  id: string,
  written: FitWritten,
  clearances: ReadonlyMap<string, Clearance>,
  vocabulary: Vocabulary,
  read: ValueReader,
): Fit {
  const isStack = typeof written.put !== 'string'
  if (isStack && written.holding !== undefined) {
    read.report(
      ['holding'],
      'conflicting-keys',
      'A mixed stack says itself what is in it.',
      'Take “holding” out, or put one piece with a “count”.',
    )
  }
  return {
    id,
    put: readPut(written.put, read),
    isStack,
    ...readRelation(written, read),
    stands: written.stands ?? null,
    count: written.count === undefined ? 1 : read.count(['count'], written.count, 1, mostPieces),
    holding: written.holding === undefined ? null : read.piece(['holding'], written.holding),
    turn: written.turn ?? null,
    clearance: readOwnClearance(written.clearance, clearances, vocabulary, read),
    workmanship: written.workmanship === undefined ? null : read.maker(['workmanship'], written.workmanship),
    papers: (written.paper ?? []).map((stock, index) => read.stock(['paper', index], stock)),
  }
}

/** Reads the fits of a set in the order of the file; those that cannot be read are left out, which has been reported. */
export function readFits(
  data: RawMap,
  clearances: ReadonlyMap<string, Clearance>,
  vocabulary: Vocabulary,
  report: ReportProblem,
): readonly Fit[] {
  return readNamedGroup(data, 'fits', 'fits', report).flatMap(([id, raw]) => {
    const path = ['fits', id]
    const written = checkMap(fitSpec, raw, path, 'a fit', report)
    if (written === null) return []
    return [
      readFit(
        id,
        written,
        clearances,
        vocabulary,
        createValueReader(path, vocabulary, report, () => undefined),
      ),
    ]
  })
}
