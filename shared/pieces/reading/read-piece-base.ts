import type { PieceBase } from '../piece-base.ts'
import { mostPieces } from '../shape/piece-base-shape.ts'
import type { ValueReader } from './value-reader.ts'

/** Common keys as they are written. */
export interface BaseWritten {
  readonly made?: 'measured' | 'printed' | undefined
  readonly scored?: 'turning' | 'one-edge' | undefined
  readonly make?: string | undefined
  readonly workmanship?: string | undefined
  readonly note?: string | undefined
  readonly corner?: string | undefined
}

/** Reads what every piece may carry, but its stock. */
export function readPieceBase(name: string, written: BaseWritten, read: ValueReader): Omit<PieceBase, 'stock'> {
  return {
    name,
    made: written.made ?? 'measured',
    scored: written.scored ?? 'turning',
    make: written.make === undefined ? null : read.count(['make'], written.make, 1, mostPieces),
    workmanship: written.workmanship === undefined ? null : read.maker(['workmanship'], written.workmanship),
    note: written.note ?? null,
    corner: read.lengthOr(['corner'], written.corner, 0, { allowZero: true }),
  }
}
