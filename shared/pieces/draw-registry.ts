import { drawBag } from './bag/draw-bag.ts'
import { drawBand } from './band/draw-band.ts'
import type { GrainOf } from './blank-parts.ts'
import type { Blank } from './blank.ts'
import { drawBox } from './box/draw-box.ts'
import { drawCard } from './card/draw-card.ts'
import { drawCustom } from './custom/draw-custom.ts'
import { drawBaronial } from './envelope/draw-baronial.ts'
import { drawSquareFlap } from './envelope/draw-square-flap.ts'
import type { FoldedPiece } from './folded-piece.ts'
import { drawInsert } from './insert/draw-insert.ts'
import { drawSleeve } from './sleeve/draw-sleeve.ts'

/**
 * The flat sheets of a piece of any kind, the main one first; none for what is bought. A new kind adds its case here.
 * @param name the piece's name, which its sheets go by
 * @param grainOf grain of a stock; left out, no sheet shows a grain
 */
export function drawPiece(name: string, piece: FoldedPiece, grainOf: GrainOf = () => null): readonly Blank[] {
  const { given, form } = piece
  const context = { name, grainOf }
  switch (given.kind) {
    case 'bag':
      return drawBag(piece, context)
    case 'band':
      return drawBand(piece, given, context)
    case 'bought':
      return []
    case 'box':
    case 'lid':
      return drawBox(piece, given, context)
    case 'card':
      return drawCard(piece, given, context)
    case 'custom':
      return drawCustom(given, context)
    case 'envelope':
      if (form.kind !== 'envelope') return []
      return form.style === 'baronial' ? drawBaronial(given, form, context) : drawSquareFlap(given, form, context)
    case 'insert':
    case 'divider':
      return drawInsert(piece, context)
    case 'sleeve':
      return drawSleeve(piece, context)
  }
}
