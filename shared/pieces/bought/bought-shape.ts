import { mapSpec, type WrittenBy } from '../shape/map-spec.ts'
import { kindKey, pieceBaseKeys } from '../shape/piece-base-shape.ts'
import { spaceShape, tolerancedShape } from '../shape/shape-parts.ts'

/** What an author writes of a bought thing. */
export const boughtSpec = mapSpec(
  { ...kindKey('bought') },
  {
    ...pieceBaseKeys,
    inside: () =>
      spaceShape({
        title: 'Inside',
        description: 'Its size inside, two extents or three; may carry tolerances.',
        examples: ['146 x 110 mm', '152 ± 0.5 x 120 ± 0.5 x 38 mm', 'us-a2-envelope'],
      }),
    outside: () =>
      spaceShape({
        title: 'Outside',
        description: 'Its size outside, two extents or three; may carry tolerances.',
        examples: ['146 x 111 mm', 'us-a2-envelope'],
      }),
    thickness: () =>
      tolerancedShape({
        title: 'Thickness',
        description:
          'Of its body; of a solid thing its height; of its wall where the inside is reckoned from the outside.',
        examples: ['0.6 mm ± 0.1 mm'],
      }),
  },
  'a map that describes a bought thing',
  {
    title: 'Bought thing',
    description: 'A thing not made from our sheets: an envelope from a shop, a photo, a tin.',
  },
)

export type BoughtWritten = WrittenBy<typeof boughtSpec>
