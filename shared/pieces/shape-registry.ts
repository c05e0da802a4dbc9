import { bagSpec } from './bag/bag-shape.ts'
import { readBag } from './bag/read-bag.ts'
import { bandSpec } from './band/band-shape.ts'
import { readBand } from './band/read-band.ts'
import { boughtSpec } from './bought/bought-shape.ts'
import { readBought } from './bought/read-bought.ts'
import { boxSpec, lidSpec } from './box/box-shape.ts'
import { readBox } from './box/read-box.ts'
import { cardSpec } from './card/card-shape.ts'
import { readCard } from './card/read-card.ts'
import { customSpec } from './custom/custom-shape.ts'
import { readCustom } from './custom/read-custom.ts'
import { envelopeSpec } from './envelope/envelope-shape.ts'
import { readEnvelope } from './envelope/read-envelope.ts'
import type { PieceGiven, PieceKindName } from './given.ts'
import { dividerSpec, insertSpec } from './insert/insert-shape.ts'
import { readInsert } from './insert/read-insert.ts'
import type { ValueReader } from './reading/value-reader.ts'
import type { KeyShapes, MapSpec, WrittenBy } from './shape/map-spec.ts'
import { readSleeve } from './sleeve/read-sleeve.ts'
import { sleeveSpec } from './sleeve/sleeve-shape.ts'

type AnySpec = MapSpec<KeyShapes, KeyShapes>

/** Holds what is written of a piece against the spec of its kind; `null` where it differs, which has been reported. */
type Check = <M extends AnySpec>(spec: M) => WrittenBy<M> | null

/** How a kind of piece is written and read. */
export interface WrittenKind {
  /** In a sentence, as in "a card". */
  readonly noun: string
  readonly spec: AnySpec
  read(name: string, check: Check, read: ValueReader): PieceGiven | null
}

function writtenKind<M extends AnySpec>(
  noun: string,
  spec: M,
  readPiece: (name: string, written: WrittenBy<M>, read: ValueReader) => PieceGiven,
): WrittenKind {
  return {
    noun,
    spec,
    read: (name, check, read) => {
      const written = check(spec)
      return written === null ? null : readPiece(name, written, read)
    },
  }
}

/** Every kind of piece an author can write. A new kind adds its line here. */
export const writtenKinds: Readonly<Record<PieceKindName, WrittenKind>> = {
  bag: writtenKind('a bag', bagSpec, readBag),
  band: writtenKind('a band', bandSpec, readBand),
  bought: writtenKind('a bought thing', boughtSpec, readBought),
  box: writtenKind('a box', boxSpec, readBox),
  card: writtenKind('a card', cardSpec, readCard),
  custom: writtenKind('a custom piece', customSpec, readCustom),
  divider: writtenKind('a divider', dividerSpec, readInsert),
  envelope: writtenKind('an envelope', envelopeSpec, readEnvelope),
  insert: writtenKind('an insert', insertSpec, readInsert),
  lid: writtenKind('a lid', lidSpec, readBox),
  sleeve: writtenKind('a sleeve', sleeveSpec, readSleeve),
}
