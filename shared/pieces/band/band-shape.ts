import type * as z from 'zod/mini'
import { pieceBaseKeys, stockKey, switchKey } from '../shape/piece-base-shape.ts'
import { lazily, lengthShape, mapShape, optional, sizeOrFitShape, wordShape } from '../shape/shape-parts.ts'
import { wrapKeys } from '../sleeve/sleeve-shape.ts'

/** What an author writes of a band or ribbon. */
export const bandShape = lazily(() =>
  mapShape(
    {
      ...pieceBaseKeys('band'),
      stock: optional(stockKey()),
      ...wrapKeys(),
      width: optional(lengthShape({ title: 'Width', description: 'Width of the strip.', examples: ['40 mm'] })),
      length: optional(
        lengthShape({ title: 'Length', description: 'Length of the strip, instead of a blank.', examples: ['900 mm'] }),
      ),
      blank: optional(
        sizeOrFitShape({
          title: 'Blank',
          description: 'Length and width of the strip; or `fit`.',
          examples: ['420 x 40 mm', 'fit'],
        }),
      ),
      ribbon: switchKey('Ribbon', 'A ribbon: no scores, length only, bought by the roll.'),
      tie: optional(
        wordShape(['bow', 'knot'], {
          title: 'Tie',
          description: 'How a ribbon is tied: in a `bow` (the default) or a `knot`.',
        }),
      ),
    },
    'a map that describes a band',
    { title: 'Band', description: 'A tight wrap of paper, or a ribbon.' },
  ),
)

export type BandWritten = z.output<ReturnType<typeof bandShape>>
