import type { Millimetres } from '../units/units.ts'
import type { FoldedPiece } from './folded-piece.ts'

/** What a maker sets, as a name: `fold of the flap` becomes `fold-of-the-flap`. */
const asName = (words: string): string => words.toLowerCase().replace(/[^a-z0-9]+/g, '-')

/**
 * Measures of a piece by the names an author's own steps may give them, as in `{base.blank}` or `{lid.wall}`: one length,
 * or two for a size.
 */
export function pieceDimensions(piece: FoldedPiece): ReadonlyMap<string, readonly Millimetres[]> {
  const { blank, outside, cavity } = piece
  return new Map<string, readonly Millimetres[]>([
    ...piece.measures.map((measure) => [asName(measure.what), [measure.nominal]] as const),
    ...(blank === null
      ? []
      : ([
          ['blank', [blank.length, blank.width]],
          ['blank-length', [blank.length]],
          ['blank-width', [blank.width]],
        ] as const)),
    ['outside', [outside.length.nominal, outside.width.nominal]],
    ['length', [outside.length.nominal]],
    ['width', [outside.width.nominal]],
    ['height', [outside.height.nominal]],
    ...(cavity === null
      ? []
      : ([
          ['inside', [cavity.length.nominal, cavity.width.nominal]],
          ['inside-length', [cavity.length.nominal]],
          ['inside-width', [cavity.width.nominal]],
          ...(cavity.depth === null ? [] : ([['depth', [cavity.depth.nominal]]] as const)),
        ] as const)),
  ])
}
