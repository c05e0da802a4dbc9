import { mapSpec, type WrittenBy } from '../shape/map-spec.ts'
import { kindKey, pieceBaseKeys, stockShape, switchShape } from '../shape/piece-base-shape.ts'
import {
  later,
  countShape,
  eitherShape,
  lengthShape,
  listShape,
  mapShape,
  optional,
  pairShape,
  sizeOrFitShape,
  sizeShape,
  tolerancedShape,
  wordShape,
} from '../shape/shape-parts.ts'

export const bannerKey = () =>
  optional(
    mapShape(
      {
        depth: lengthShape({
          title: 'Depth',
          description: 'How deep the point or notch at the end is.',
          examples: ['12 mm'],
        }),
        point: wordShape(['in', 'out'], {
          title: 'Point',
          description: '`in`: a notch is cut into the end. `out`: the end runs to a point.',
        }),
      },
      'a map of `depth` and `point`',
      { title: 'Banner', description: 'The panel is a flag; its point or notch lies in the middle by construction.' },
    ),
  )

const layerShape = () =>
  mapShape(
    {
      stock: stockShape(),
      size: sizeShape({
        title: 'Size',
        description: 'Size of the panel, first its extent along the length of the card.',
        examples: ['90 x 60 mm'],
      }),
      at: optional(
        eitherShape(
          [
            wordShape(['centre'], { description: 'In the middle of the card.' }),
            later(() =>
              pairShape(
                lengthShape({
                  description: 'Distance of its middle from the middle of the card; left and down are negative.',
                }),
                'two distances',
                {
                  description:
                    'Distance of its middle from the middle of the card, along the length and along the width.',
                  examples: [[0, 20]],
                },
              ),
            ),
          ],
          '`centre` or two distances from the middle, such as `[0, 20]`',
          {
            title: 'Place',
            description: '`centre` (the default), or how far its middle lies from the middle of the card.',
          },
        ),
      ),
      banner: bannerKey(),
      on: optional(
        wordShape(['front', 'inside'], {
          title: 'Side',
          description: 'What it is glued on: the `front` (the default) or the `inside`.',
        }),
      ),
      inside: optional(switchShape('Inside', 'The same as `on: inside`.')),
    },
    'a map of `stock`, `size` and `at`',
    { title: 'Layer', description: 'A panel or flag glued on the card; its thickness counts.' },
  )

/** What an author writes of a card. */
export const cardSpec = mapSpec(
  {
    ...kindKey('card'),
    stock: stockShape,
    folded: () =>
      sizeOrFitShape({
        title: 'Size when folded',
        description: 'Size of the card folded shut, or of an unfolded one; a size, a name, or `fit`.',
      }),
  },
  {
    ...pieceBaseKeys,
    fold: () =>
      wordShape(['long-edge', 'short-edge', 'none'], {
        title: 'Fold',
        description:
          'Which edge the fold lies along: `long-edge` (the default), `short-edge`, or `none` for a flat card.',
      }),
    panels: () =>
      countShape({ title: 'Panels', description: 'How many panels the sheet is folded into.', examples: [3] }, 2, 6),
    style: () =>
      wordShape(['single', 'roll', 'accordion', 'gate'], {
        title: 'Style of folding',
        description:
          '`single` (the default): once. `roll`: each panel into the next. `accordion`: to and fro. `gate`: two leaves that meet in the middle.',
      }),
    blank: () =>
      sizeShape({
        title: 'Blank',
        description: 'Size of the flat sheet, where it is not what the folded size asks for.',
      }),
    'panel-widths': () =>
      listShape(
        lengthShape({ description: 'Width of one panel across the fold.' }),
        'a list of lengths, such as `[105, 104, 103]`',
        {
          title: 'Panel widths',
          description: 'Widths of the panels across the fold, the outermost first.',
          examples: [[105, 104, 103]],
        },
      ),
    raised: () =>
      tolerancedShape({
        title: 'Raised',
        description: 'Height of what is stuck on the card, taken as lying in the middle with a rim of 10 mm.',
        examples: ['0.8 mm', '3 mm ± 0.5 mm'],
      }),
    'raised-to-edge': () => switchShape('Raised to the edge', 'What is stuck on reaches the edge of the card.'),
    layers: () =>
      listShape(layerShape(), 'a list of layers', {
        title: 'Layers',
        description: 'Panels and flags glued on, placed from the centre of the card.',
      }),
    insert: () =>
      mapShape(
        {
          stock: stockShape(),
          loose: optional(switchShape('Loose', 'It lies in the card and is not glued.')),
          folded: optional(switchShape('Folded', 'It is folded with the card, so it counts twice.')),
        },
        'a map with a `stock`',
        { title: 'Insert', description: 'A sheet that lies inside the card.' },
      ),
    pocket: () =>
      mapShape(
        {
          depth: lengthShape({
            title: 'Depth',
            description: 'How far the panel is folded up from the bottom edge.',
            examples: ['50 mm'],
          }),
          side: optional(
            lengthShape({
              title: 'Side',
              description: 'Width of the strip that is glued at each end.',
              default: '10 mm',
            }),
          ),
        },
        'a map with a `depth`',
        { title: 'Pocket', description: 'A panel folded up from the bottom edge that holds another piece.' },
      ),
  },
  'a map that describes a card',
  { title: 'Card', description: 'A folded card, or a flat one where `fold` is `none`.' },
)

export type CardWritten = WrittenBy<typeof cardSpec>
