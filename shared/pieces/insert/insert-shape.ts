import type * as z from 'zod/mini'
import { mostPieces, pieceBaseKeys, stockKey } from '../shape/piece-base-shape.ts'
import { countShape, lazily, mapShape, optional, sizeOrFitShape } from '../shape/shape-parts.ts'

const flatKeys = () => ({
  stock: stockKey(),
  size: sizeOrFitShape({ title: 'Size', description: 'Size of the flat piece, or `fit`.' }),
  count: optional(countShape({ title: 'Count', description: 'How many there are of it.', default: 1 }, 1, mostPieces)),
})

/** What an author writes of an insert. */
export const insertShape = lazily(() =>
  mapShape({ ...pieceBaseKeys('insert'), ...flatKeys() }, 'a map that describes an insert', {
    title: 'Insert',
    description: 'A flat piece that lies in another.',
  }),
)

/** What an author writes of a divider. */
export const dividerShape = lazily(() =>
  mapShape({ ...pieceBaseKeys('divider'), ...flatKeys() }, 'a map that describes a divider', {
    title: 'Divider',
    description: 'A flat piece that stands in another.',
  }),
)

export type InsertWritten = z.output<ReturnType<typeof insertShape>> | z.output<ReturnType<typeof dividerShape>>
