import { mapSpec, type WrittenBy } from '../shape/map-spec.ts'
import { kindKey, pieceBaseKeys, stockShape } from '../shape/piece-base-shape.ts'
import {
  later,
  eitherShape,
  lengthShape,
  mapShape,
  nameShape,
  pairShape,
  sizeOrFitShape,
  sizeShape,
  wordShape,
} from '../shape/shape-parts.ts'

const seamShape = () =>
  eitherShape(
    [
      lengthShape({ description: 'Width of all seams.', examples: [12] }),
      later(() =>
        mapShape(
          {
            bottom: lengthShape({
              title: 'Bottom',
              description: 'Width of the seams of the bottom flap.',
              examples: [12],
            }),
            top: lengthShape({ title: 'Top', description: 'Width of the seams of the seal flap.', examples: [15] }),
          },
          'a map of `bottom` and `top`',
          { description: 'Widths of the seams at the bottom and at the top.' },
        ),
      ),
    ],
    'a length, or `{ bottom, top }`',
    {
      title: 'Seam',
      description: 'How far the flaps lap over one another, at right angles to their edges.',
      default: '12 mm',
    },
  )

const cornersShape = () =>
  mapShape(
    {
      sides: eitherShape(
        [
          lengthShape({ description: 'Both side corners.', examples: [101] }),
          later(() =>
            pairShape(lengthShape({ description: 'One side corner.' }), 'two lengths, left and right', {
              description: 'Left and right corner.',
              examples: [[101, 100]],
            }),
          ),
        ],
        'a length, or two for left and right',
        { title: 'Sides', description: 'How far from the side corners the folds cut both edges.' },
      ),
      bottom: lengthShape({
        title: 'Bottom',
        description: 'How far from the bottom corner its fold cuts both edges.',
        examples: [126],
      }),
      flap: lengthShape({
        title: 'Flap',
        description: 'How far from the corner of the seal flap its fold cuts both edges.',
        examples: [126],
      }),
    },
    'a map of `sides`, `bottom` and `flap`',
    {
      title: 'Corners',
      description: 'Where each fold of a square standing on a corner cuts the two edges that meet there.',
    },
  )

/** What an author writes of an envelope. */
export const envelopeSpec = mapSpec(
  {
    ...kindKey('envelope'),
    stock: stockShape,
    style: () =>
      wordShape(['baronial', 'square-flap'], {
        title: 'Style',
        description:
          '`baronial`: pointed flaps folded from a square. `square-flap`: a face with side flaps, a back and a square seal flap.',
      }),
  },
  {
    ...pieceBaseKeys,
    pocket: () =>
      sizeOrFitShape({
        title: 'Pocket',
        description: 'Size of the pocket from score to score, or `fit`.',
        examples: ['156 x 112 mm', 'fit'],
      }),
    seam: seamShape,
    blank: () =>
      sizeShape({
        title: 'Blank',
        description: 'The square that a baronial envelope is folded from, with `corners`.',
        examples: ['210 x 210 mm'],
      }),
    corners: cornersShape,
    back: () =>
      lengthShape({
        title: 'Back',
        description: 'Height of the back of a square-flap envelope; else the pocket less 6 mm.',
        examples: ['100 mm'],
      }),
    'side-flap': () =>
      lengthShape({
        title: 'Side flap',
        description: 'Width of the side flaps of a square-flap envelope; else 15 mm.',
        examples: ['15 mm'],
      }),
    flap: () =>
      lengthShape({
        title: 'Seal flap',
        description: 'Depth of the seal flap of a square-flap envelope; else 0.4 of the pocket’s width.',
        examples: ['45 mm'],
      }),
    liner: () =>
      nameShape('a stock', {
        title: 'Liner',
        description: 'Stock of a liner; its thickness counts.',
        examples: ['text-120'],
      }),
  },
  'a map that describes an envelope',
  { title: 'Envelope', description: 'An envelope made from one sheet.' },
)

export type EnvelopeWritten = WrittenBy<typeof envelopeSpec>
