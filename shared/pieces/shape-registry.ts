import type * as z from 'zod/mini'
import { bagShape } from './bag/bag-shape.ts'
import { readBag } from './bag/read-bag.ts'
import { bandShape } from './band/band-shape.ts'
import { readBand } from './band/read-band.ts'
import { boughtShape } from './bought/bought-shape.ts'
import { readBought } from './bought/read-bought.ts'
import { boxShape, lidShape } from './box/box-shape.ts'
import { readBox } from './box/read-box.ts'
import { cardShape } from './card/card-shape.ts'
import { readCard } from './card/read-card.ts'
import { customShape } from './custom/custom-shape.ts'
import { readCustom } from './custom/read-custom.ts'
import { envelopeShape } from './envelope/envelope-shape.ts'
import { readEnvelope } from './envelope/read-envelope.ts'
import type { PieceGiven, PieceKindName } from './given.ts'
import { dividerShape, insertShape } from './insert/insert-shape.ts'
import { readInsert } from './insert/read-insert.ts'
import type { ValueReader } from './reading/value-reader.ts'
import { readSleeve } from './sleeve/read-sleeve.ts'
import { sleeveShape } from './sleeve/sleeve-shape.ts'

type Shape = z.core.$ZodType

/** Holds what is written of a piece against the shape of its kind; `null` where it differs, which has been reported. */
type Check = <S extends Shape>(shape: S) => z.output<S> | null

/** How a kind of piece is written and read. */
export interface WrittenKind {
  /** In a sentence, as in "a card". */
  readonly noun: string
  shape(): Shape
  read(name: string, check: Check, read: ValueReader): PieceGiven | null
}

function writtenKind<S extends Shape>(
  noun: string,
  shape: () => S,
  readPiece: (name: string, written: z.output<S>, read: ValueReader) => PieceGiven,
): WrittenKind {
  return {
    noun,
    shape,
    read: (name, check, read) => {
      const written = check(shape())
      return written === null ? null : readPiece(name, written, read)
    },
  }
}

/** Every kind of piece an author can write. A new kind adds its line here. */
export const writtenKinds: Readonly<Record<PieceKindName, WrittenKind>> = {
  bag: writtenKind('a bag', bagShape, readBag),
  band: writtenKind('a band', bandShape, readBand),
  bought: writtenKind('a bought thing', boughtShape, readBought),
  box: writtenKind('a box', boxShape, readBox),
  card: writtenKind('a card', cardShape, readCard),
  custom: writtenKind('a custom piece', customShape, readCustom),
  divider: writtenKind('a divider', dividerShape, readInsert),
  envelope: writtenKind('an envelope', envelopeShape, readEnvelope),
  insert: writtenKind('an insert', insertShape, readInsert),
  lid: writtenKind('a lid', lidShape, readBox),
  sleeve: writtenKind('a sleeve', sleeveShape, readSleeve),
}
