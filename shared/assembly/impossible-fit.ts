import type { FoldedPiece } from '../pieces/folded-piece.ts'
import { ImpossiblePiece } from '../pieces/impossible-piece.ts'
import type { Fit } from '../template/template-model.ts'

/** What is told of a fit that puts something into or under a piece without an inside. */
export function holdsNothing(fit: Fit, piece: FoldedPiece): ImpossiblePiece {
  const { kind, name } = piece.given
  const hint =
    kind === 'card'
      ? `Give ${name} a “pocket”, or name the piece meant under “in”.`
      : kind === 'bought' || kind === 'custom'
        ? `Give ${name} its “inside”, or name the piece meant under “in”.`
        : `Name an envelope, box, bag or other piece with an inside in fit ${fit.id}.`
  return new ImpossiblePiece(name, `Fit ${fit.id} needs the inside of ${name}, which has none.`, hint)
}

/** What is told of a fit that puts something around another that is neither sleeve nor band. */
export function goesAroundNothing(fit: Fit, piece: FoldedPiece, inner: string): ImpossiblePiece {
  const { name } = piece.given
  return new ImpossiblePiece(
    name,
    `Fit ${fit.id} puts ${name} around ${inner}, and only a sleeve, a band or a ribbon goes around a piece.`,
    'Write “in” with the piece that holds the other, or “over” for a lid.',
  )
}

/** What is told of a fit that puts something over another that is not open below, as a lid is. */
export function goesOverNothing(fit: Fit, piece: FoldedPiece): ImpossiblePiece {
  const { name } = piece.given
  return new ImpossiblePiece(
    name,
    `Fit ${fit.id} puts ${name} over ${fit.to}, and only a lid or another piece with an inside and a depth goes over a piece.`,
    'Write “in” with the piece that holds the other, or “around” for a sleeve or band.',
  )
}
