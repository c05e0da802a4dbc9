import type { PieceGiven, PieceKindName } from '../pieces/given.ts'
import type { Path, ReportProblem } from '../pieces/reading/report-problem.ts'
import { createValueReader, type Vocabulary } from '../pieces/reading/value-reader.ts'
import { writtenKinds } from '../pieces/shape-registry.ts'
import { checkMap } from './check-shape.ts'
import { isRawMap, nameOfValue, type RawMap, type RawValue } from './raw-value.ts'
import { readNamedGroup } from './read-frame.ts'

const kindNames = Object.keys(writtenKinds) as readonly PieceKindName[]

const listed = kindNames.map((kind) => `“${kind}”`).join(', ')

function kindOf(raw: RawMap, path: Path, vocabulary: Vocabulary, report: ReportProblem): PieceKindName | null {
  const kind = raw.kind
  if (kind === undefined || kind === null) {
    report(
      kind === undefined ? path : [...path, 'kind'],
      kind === undefined ? 'missing-key' : 'empty-value',
      'The piece does not say of what kind it is.',
      `Write “kind” with one of ${listed}.`,
      'key',
    )
    return null
  }
  const known = kindNames.find((name) => name === kind)
  if (known !== undefined) return known
  const meant = typeof kind === 'string' ? vocabulary.nearest(kind, kindNames) : null
  report(
    [...path, 'kind'],
    'unknown-kind',
    `${nameOfValue(kind)} is no kind of piece.`.replace(/^a/, 'A'),
    meant === null ? `Write one of ${listed}.` : `Did you mean “${meant}”?`,
    'value',
  )
  return null
}

function readPiece(
  name: string,
  raw: RawValue,
  vocabulary: Vocabulary,
  report: ReportProblem,
  onOpen: (path: Path) => void,
): PieceGiven | null {
  const path = ['pieces', name]
  if (!isRawMap(raw)) {
    if (raw === null)
      report(
        path,
        'empty-value',
        `Nothing is written after “${name}”.`,
        'Write a map such as “{ kind: card, stock: …, folded: … }”.',
        'key',
      )
    else
      report(
        path,
        'wrong-type',
        `A piece is a map of keys and values, not ${nameOfValue(raw)}.`,
        'Write a map such as “{ kind: card, stock: …, folded: … }”.',
        'value',
      )
    return null
  }
  const kind = kindOf(raw, path, vocabulary, report)
  if (kind === null) return null
  const { noun, read } = writtenKinds[kind]
  return read(
    name,
    (spec) => checkMap(spec, raw, path, noun, report),
    createValueReader(path, vocabulary, report, onOpen),
  )
}

/** Reads the pieces of a set; those that cannot be read are left out, which has been reported. */
export function readPieces(
  data: RawMap,
  vocabulary: Vocabulary,
  report: ReportProblem,
  onOpen: (path: Path) => void,
): ReadonlyMap<string, PieceGiven> {
  const pieces = new Map<string, PieceGiven>()
  for (const [name, raw] of readNamedGroup(data, 'pieces', 'pieces', report)) {
    const piece = readPiece(name, raw, vocabulary, report, onOpen)
    if (piece !== null) pieces.set(name, piece)
  }
  return pieces
}
