import { readPieceBase } from '../reading/read-piece-base.ts'
import type { ValueReader } from '../reading/value-reader.ts'
import { mostPieces } from '../shape/piece-base-shape.ts'
import type { InsertGiven } from './insert-given.ts'
import type { InsertWritten } from './insert-shape.ts'

/** Reads an insert or a divider. */
export function readInsert(name: string, written: InsertWritten, read: ValueReader): InsertGiven {
  return {
    ...readPieceBase(name, written, read),
    kind: written.kind,
    stock: read.stock(['stock'], written.stock),
    size: read.sizeOrFit(['size'], written.size),
    count: written.count === undefined ? 1 : read.count(['count'], written.count, 1, mostPieces),
  }
}
