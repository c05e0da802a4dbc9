import { mapSpec, type WrittenBy } from '../shape/map-spec.ts'
import { kindKey, pieceBaseKeys, stockShape, switchShape } from '../shape/piece-base-shape.ts'
import { lengthShape, sizeOrFitShape, wordShape } from '../shape/shape-parts.ts'
import { wrapKeys } from '../sleeve/sleeve-shape.ts'

/** What an author writes of a band or ribbon. */
export const bandSpec = mapSpec(
  { ...kindKey('band') },
  {
    ...pieceBaseKeys,
    stock: stockShape,
    ...wrapKeys,
    width: () => lengthShape({ title: 'Width', description: 'Width of the strip.', examples: ['40 mm'] }),
    length: () =>
      lengthShape({ title: 'Length', description: 'Length of the strip, instead of a blank.', examples: ['900 mm'] }),
    blank: () =>
      sizeOrFitShape({
        title: 'Blank',
        description: 'Length and width of the strip; or `fit`.',
        examples: ['420 x 40 mm', 'fit'],
      }),
    ribbon: () => switchShape('Ribbon', 'A ribbon: no scores, length only, bought by the roll.'),
    tie: () =>
      wordShape(['bow', 'knot'], {
        title: 'Tie',
        description: 'How a ribbon is tied: in a `bow` (the default) or a `knot`.',
      }),
  },
  'a map that describes a band',
  { title: 'Band', description: 'A tight wrap of paper, or a ribbon.' },
)

export type BandWritten = WrittenBy<typeof bandSpec>
