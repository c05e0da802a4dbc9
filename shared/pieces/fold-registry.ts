import { foldBag } from './bag/fold-bag.ts'
import { foldBand } from './band/fold-band.ts'
import { foldBought } from './bought/fold-bought.ts'
import { foldBox } from './box/fold-box.ts'
import { foldCard } from './card/fold-card.ts'
import { foldCustom } from './custom/fold-custom.ts'
import { foldBaronial } from './envelope/fold-baronial.ts'
import { foldSquareFlap } from './envelope/fold-square-flap.ts'
import type { FoldContext } from './fold-context.ts'
import type { FoldedPiece } from './folded-piece.ts'
import type { PieceGiven } from './given.ts'
import { foldInsert } from './insert/fold-insert.ts'
import { foldSleeve } from './sleeve/fold-sleeve.ts'

/** Folds a piece of any kind. A new kind adds its case here. */
export function foldPiece(given: PieceGiven, context: FoldContext): FoldedPiece {
  switch (given.kind) {
    case 'bag':
      return foldBag(given, context)
    case 'band':
      return foldBand(given, context)
    case 'bought':
      return foldBought(given)
    case 'box':
    case 'lid':
      return foldBox(given, context)
    case 'card':
      return foldCard(given, context)
    case 'custom':
      return foldCustom(given, context)
    case 'envelope':
      return given.style === 'baronial' ? foldBaronial(given, context) : foldSquareFlap(given, context)
    case 'insert':
    case 'divider':
      return foldInsert(given, context)
    case 'sleeve':
      return foldSleeve(given, context)
  }
}
