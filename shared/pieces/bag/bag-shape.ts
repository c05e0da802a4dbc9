import { mapSpec, type WrittenBy } from '../shape/map-spec.ts'
import { kindKey, pieceBaseKeys, stockShape } from '../shape/piece-base-shape.ts'
import { lengthShape, listShape, sizeShape, spaceShape } from '../shape/shape-parts.ts'

/** What an author writes of a bag. */
export const bagSpec = mapSpec(
  { ...kindKey('bag'), stock: stockShape },
  {
    ...pieceBaseKeys,
    inside: () =>
      spaceShape({
        title: 'Inside',
        description: 'Width of the face, depth of the gusset and height of the open bag; or `fit`.',
        examples: ['180 x 80 x 220 mm', 'fit'],
      }),
    blank: () =>
      sizeShape({
        title: 'Blank',
        description: 'Length round the bag and height, with `scores`.',
        examples: ['540 x 310 mm'],
      }),
    scores: () =>
      listShape(
        lengthShape({ description: 'Distance of an upright score from the seam’s end.' }),
        'a list of lengths',
        {
          title: 'Scores',
          description: 'The upright scores from the end with the seam: four, or six with the middles of the gussets.',
          examples: [[15, 195, 275, 455]],
        },
      ),
    top: () => lengthShape({ title: 'Top', description: 'Strip turned in at the top.', default: '30 mm' }),
    bottom: () =>
      lengthShape({
        title: 'Bottom',
        description: 'Strip folded under for the bottom; else half the depth and 20 mm.',
        examples: ['60 mm'],
      }),
    seam: () => lengthShape({ title: 'Seam', description: 'Width of the glued seam.', default: '15 mm' }),
  },
  'a map that describes a bag',
  { title: 'Bag', description: 'A gusseted bag with a flat bottom.' },
)

export type BagWritten = WrittenBy<typeof bagSpec>
