import { mapSpec, type WrittenBy } from '../shape/map-spec.ts'
import { kindKey, pieceBaseKeys, stockShape } from '../shape/piece-base-shape.ts'
import {
  angleShape,
  lengthShape,
  listShape,
  mapShape,
  optional,
  pairShape,
  spaceShape,
  wordShape,
} from '../shape/shape-parts.ts'

const pointShape = (title: string, description: string) =>
  pairShape(lengthShape({ description: 'A coordinate.' }), 'a point of two coordinates, such as `[0, 45.5]`', {
    title,
    description,
    examples: [[0, 45.5]],
  })

/** What an author writes of any other shape. */
export const customSpec = mapSpec(
  {
    ...kindKey('custom'),
    stock: stockShape,
    outline: () =>
      listShape(
        pointShape('Point', 'A corner of the blank.'),
        'a list of points, such as `[[0, 0], [90, 0], [90, 60]]`',
        {
          title: 'Outline',
          description: 'The corners of the blank in order.',
          examples: [
            [
              [0, 0],
              [90, 0],
              [90, 60],
              [0, 60],
            ],
          ],
        },
      ),
  },
  {
    ...pieceBaseKeys,
    scores: () =>
      listShape(
        mapShape(
          {
            from: pointShape('From', 'Where the score begins.'),
            to: pointShape('To', 'Where the score ends.'),
            fold: optional(
              wordShape(['valley', 'mountain'], {
                title: 'Fold',
                description: '`valley` (the default): towards you. `mountain`: away from you.',
              }),
            ),
            angle: optional(
              angleShape({ title: 'Angle', description: 'How far it is folded, in degrees.', default: 90 }),
            ),
          },
          'a map of `from`, `to`, `fold` and `angle`',
          { title: 'Score', description: 'A line pressed for folding.' },
        ),
        'a list of scores, such as `[{ from: [45, 0], to: [45, 60], fold: valley, angle: 180 }]`',
        { title: 'Scores', description: 'The lines pressed for folding.' },
      ),
    inside: () =>
      spaceShape({
        title: 'Inside',
        description: 'Declared size inside; it is believed.',
        examples: ['88 x 58 x 20 mm'],
      }),
    outside: () =>
      spaceShape({
        title: 'Outside',
        description: 'Declared size outside; it is believed.',
        examples: ['90 x 60 x 21 mm'],
      }),
  },
  'a map that describes a piece',
  { title: 'Custom piece', description: 'Anything else: its geometry is checked, its declared sizes are believed.' },
)

export type CustomWritten = WrittenBy<typeof customSpec>
