import { bannerKey } from '../card/card-shape.ts'
import { mapSpec, type WrittenBy } from '../shape/map-spec.ts'
import { kindKey, pieceBaseKeys, stockShape, switchShape } from '../shape/piece-base-shape.ts'
import {
  later,
  angleShape,
  eitherShape,
  lengthOrFitShape,
  lengthShape,
  listShape,
  mapShape,
  nameShape,
  optional,
  pairShape,
  sizeOrFitShape,
  sizeShape,
  spaceShape,
  wordShape,
} from '../shape/shape-parts.ts'

const wallPair = (title: string, description: string) =>
  eitherShape(
    [
      lengthShape({ description: 'Both walls.' }),
      later(() =>
        pairShape(lengthShape({ description: 'One wall.' }), 'two lengths', {
          description: 'One wall and the one that faces it.',
          examples: [[20, 22]],
        }),
      ),
    ],
    'a length, or two such as `[20, 22]`',
    { title, description },
  )

const wallShape = () =>
  eitherShape(
    [
      lengthOrFitShape({ description: 'All four walls.' }),
      later(() =>
        mapShape(
          {
            length: wallPair('Along the length', 'The two walls that face each other along the length.'),
            width: wallPair('Along the width', 'The two walls that face each other along the width.'),
          },
          'a map of `length` and `width`',
          { description: 'Walls that are not all alike.' },
        ),
      ),
    ],
    'a length for all four walls, `{ length: [20, 20], width: [22, 22] }`, or `fit`',
    { title: 'Wall', description: 'How far from the edge of the blank the walls are scored.' },
  )

const tabsShape = () =>
  mapShape(
    {
      at: optional(
        wordShape(['ends', 'sides'], {
          title: 'At',
          description: 'Which walls the tabs are part of: the `ends`, the short walls (the default), or the `sides`.',
        }),
      ),
      glued: optional(
        wordShape(['inside', 'outside'], {
          title: 'Glued',
          description: 'On which side of the other walls the tabs are glued: `inside` (the default) or `outside`.',
        }),
      ),
      trim: optional(
        lengthShape({ title: 'Trim', description: 'How much shorter than the wall the tab is cut.', default: '1 mm' }),
      ),
      taper: optional(angleShape({ title: 'Taper', description: 'How far the sides of a tab lean.', default: '5°' })),
    },
    'a map of `at`, `glued`, `trim` and `taper`',
    { title: 'Tabs', description: 'The tabs that hold the corners together.' },
  )

const layerShape = () =>
  mapShape(
    {
      stock: stockShape(),
      size: sizeShape({ title: 'Size', description: 'Size of the panel.', examples: ['90 x 15 mm'] }),
      on: wordShape(['top', 'length', 'width'], {
        title: 'On',
        description:
          'Where it is glued: the `top`, or a wall that stands at the end of the `length` or of the `width`.',
      }),
      banner: bannerKey(),
    },
    'a map of `stock`, `size` and `on`',
    { title: 'Layer', description: 'A panel stuck on the outside.' },
  )

const trayKeys = {
  blank: () =>
    sizeOrFitShape({
      title: 'Blank',
      description: 'Size of the flat sheet, with `wall`; or `fit`.',
      examples: ['200 x 158 mm', 'fit'],
    }),
  wall: wallShape,
  inside: () =>
    spaceShape({
      title: 'Inside',
      description: 'Size it must have inside, length, width and depth; then its blank is reckoned. Or `fit`.',
      examples: ['160 x 118 x 20 mm', 'fit'],
    }),
  tabs: tabsShape,
  walls: () =>
    wordShape(['single', 'doubled'], {
      title: 'Walls',
      description: '`single` (the default), or `doubled`: folded over to the inside.',
    }),
  'thumb-notch': () => switchShape('Thumb notch', 'A notch in the wall, by which a lid is lifted off.'),
  covered: () =>
    nameShape('a stock', {
      title: 'Covered',
      description: 'Stock of a covering paper outside; its thickness counts.',
      examples: ['text-120'],
    }),
  layers: () =>
    listShape(layerShape(), 'a list of layers', {
      title: 'Layers',
      description: 'Panels stuck on a wall or on the top.',
    }),
} as const

/** What an author writes of a box. */
export const boxSpec = mapSpec(
  { ...kindKey('box'), stock: stockShape },
  { ...pieceBaseKeys, ...trayKeys },
  'a map that describes a box',
  {
    title: 'Box',
    description: 'A tray with four walls; the base of a box with a lid.',
  },
)

/** What an author writes of a lid: a box turned over. */
export const lidSpec = mapSpec(
  { ...kindKey('lid'), stock: stockShape },
  { ...pieceBaseKeys, ...trayKeys },
  'a map that describes a lid',
  {
    title: 'Lid',
    description: 'A tray with four walls that goes over a box.',
  },
)

export type BoxWritten = WrittenBy<typeof boxSpec> | WrittenBy<typeof lidSpec>
