import type { Blank } from '../pieces/blank.ts'
import { drawPiece } from '../pieces/draw-registry.ts'
import { oncePerSet } from './once-per-set.ts'

/** The flat sheets of every piece, by its name; what is bought has none. */
export const drawnBlanks = oncePerSet((judged): ReadonlyMap<string, readonly Blank[]> => {
  const grainOf = (stock: string): 'long' | 'short' | null => judged.set.tokens.stocks.get(stock)?.grain ?? null
  return new Map([...judged.pieces].map(([name, piece]) => [name, drawPiece(name, piece, grainOf)]))
})
