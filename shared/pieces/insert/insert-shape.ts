import { mapSpec, type WrittenBy } from '../shape/map-spec.ts'
import { kindKey, mostPieces, pieceBaseKeys, stockShape } from '../shape/piece-base-shape.ts'
import { countShape, sizeOrFitShape } from '../shape/shape-parts.ts'

const flatNeeded = {
  stock: stockShape,
  size: () => sizeOrFitShape({ title: 'Size', description: 'Size of the flat piece, or `fit`.' }),
} as const

const flatFurther = {
  ...pieceBaseKeys,
  count: () => countShape({ title: 'Count', description: 'How many there are of it.', default: 1 }, 1, mostPieces),
} as const

/** What an author writes of an insert. */
export const insertSpec = mapSpec(
  { ...kindKey('insert'), ...flatNeeded },
  { ...flatFurther },
  'a map that describes an insert',
  {
    title: 'Insert',
    description: 'A flat piece that lies in another.',
  },
)

/** What an author writes of a divider. */
export const dividerSpec = mapSpec(
  { ...kindKey('divider'), ...flatNeeded },
  { ...flatFurther },
  'a map that describes a divider',
  {
    title: 'Divider',
    description: 'A flat piece that stands in another.',
  },
)

export type InsertWritten = WrittenBy<typeof insertSpec> | WrittenBy<typeof dividerSpec>
