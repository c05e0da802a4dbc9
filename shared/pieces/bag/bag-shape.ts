import type * as z from 'zod/mini'
import { pieceBaseKeys, stockKey } from '../shape/piece-base-shape.ts'
import { lazily, lengthShape, listShape, mapShape, optional, sizeShape, spaceShape } from '../shape/shape-parts.ts'

/** What an author writes of a bag. */
export const bagShape = lazily(() =>
  mapShape(
    {
      ...pieceBaseKeys('bag'),
      stock: stockKey(),
      inside: optional(
        spaceShape({
          title: 'Inside',
          description: 'Width of the face, depth of the gusset and height of the open bag; or `fit`.',
          examples: ['180 x 80 x 220 mm', 'fit'],
        }),
      ),
      blank: optional(
        sizeShape({
          title: 'Blank',
          description: 'Length round the bag and height, with `scores`.',
          examples: ['540 x 310 mm'],
        }),
      ),
      scores: optional(
        listShape(
          lengthShape({ description: 'Distance of an upright score from the seam’s end.' }),
          'a list of lengths',
          {
            title: 'Scores',
            description: 'The upright scores from the end with the seam: four, or six with the middles of the gussets.',
            examples: [[15, 195, 275, 455]],
          },
        ),
      ),
      top: optional(lengthShape({ title: 'Top', description: 'Strip turned in at the top.', default: '30 mm' })),
      bottom: optional(
        lengthShape({
          title: 'Bottom',
          description: 'Strip folded under for the bottom; else half the depth and 20 mm.',
          examples: ['60 mm'],
        }),
      ),
      seam: optional(lengthShape({ title: 'Seam', description: 'Width of the glued seam.', default: '15 mm' })),
    },
    'a map that describes a bag',
    { title: 'Bag', description: 'A gusseted bag with a flat bottom.' },
  ),
)

export type BagWritten = z.output<ReturnType<typeof bagShape>>
