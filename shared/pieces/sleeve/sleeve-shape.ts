import { mapSpec, type WrittenBy } from '../shape/map-spec.ts'
import { kindKey, pieceBaseKeys, stockShape } from '../shape/piece-base-shape.ts'
import { lengthShape, listShape, nameShape, sizeOrFitShape, wordShape } from '../shape/shape-parts.ts'

/** Keys of whatever goes round something. */
export const wrapKeys = {
  around: () =>
    nameShape('a piece', {
      title: 'Around',
      description: 'The piece that it goes round; else the one that a fit says.',
      examples: ['lid'],
    }),
  overlap: () =>
    lengthShape({ title: 'Overlap', description: 'How far the ends lap over one another.', default: '15 mm' }),
  girth: () =>
    wordShape(['width', 'length'], {
      title: 'Girth',
      description:
        'Which girth it goes round: over the `width` and the height (the default, the shorter), or over the `length` and the height.',
    }),
  scores: () =>
    listShape(
      lengthShape({ description: 'Distance of a score from one end.' }),
      'a list of lengths, such as `[80, 100, 180, 200]`',
      {
        title: 'Scores',
        description: 'The scores of a blank, all from the same end.',
        examples: [[80, 100, 180, 200]],
      },
    ),
} as const

/** What an author writes of a sleeve. */
export const sleeveSpec = mapSpec(
  { ...kindKey('sleeve'), stock: stockShape },
  {
    ...pieceBaseKeys,
    ...wrapKeys,
    width: () =>
      lengthShape({
        title: 'Width',
        description: 'Extent along the tube; else it covers what it goes round.',
        examples: ['60 mm'],
      }),
    blank: () =>
      sizeOrFitShape({
        title: 'Blank',
        description: 'Length round the girth and width along the tube, with four `scores`; or `fit`.',
        examples: ['300 x 60 mm', 'fit'],
      }),
  },
  'a map that describes a sleeve',
  { title: 'Sleeve', description: 'An open tube with square corners round a box.' },
)

export type SleeveWritten = WrittenBy<typeof sleeveSpec>
