import type * as z from 'zod/mini'
import { mapSpec, shapeOfMap, type WrittenBy } from '../pieces/shape/map-spec.ts'
import {
  eitherShape,
  flagShape,
  later,
  lazily,
  lengthShape,
  mapShape,
  nameShape,
  optional,
  rangeShape,
  sizeShape,
  textShape,
  tolerancedShape,
  wordShape,
} from '../pieces/shape/shape-parts.ts'

export const stockSpec = mapSpec(
  {},
  {
    title: () => textShape({ title: 'Title', description: 'What the paper is called.', examples: ['Smooth cover'] }),
    grammage: () => textShape({ title: 'Grammage', description: 'Weight of a square metre.', examples: ['270 gsm'] }),
    weight: () =>
      textShape({
        title: 'Basis weight',
        description: 'Weight of a ream of the basic size, with its kind.',
        examples: ['80 lb cover', '110 lb index'],
      }),
    caliper: () =>
      tolerancedShape({
        title: 'Caliper',
        description:
          'Thickness of one sheet, best measured: ten sheets together, divided by ten. Reckoned from the weight where not given, with a warning.',
        examples: ['0.32 mm ± 6 %', '3.2 mm / 10', '13 pt'],
      }),
    grain: () =>
      wordShape(['long', 'short'], { title: 'Grain', description: 'Which edge of the sheet the grain runs along.' }),
    sheet: () =>
      textShape({
        title: 'Sheet',
        description: 'What this paper is bought in.',
        examples: ['a4', 'letter', '12x12in', '700 x 500 mm'],
      }),
  },
  'a map of `grammage`, `caliper` and so on',
  { title: 'Stock', description: 'A paper.' },
)

const axisRange = (title: string, description: string) => optional(rangeShape({ title, description }))

/** What a fit must leave, each axis by itself. */
export const clearanceMapShape = lazily(() =>
  mapShape(
    {
      sides: axisRange('Sides', 'Along the length and along the width.'),
      length: axisRange('Length', 'Along the length.'),
      width: axisRange('Width', 'Along the width.'),
      depth: axisRange('Depth', 'Along the depth of a box without a lid.'),
      headspace: axisRange('Headspace', 'Between the contents and a seated lid.'),
      overlap: axisRange('Overlap', 'How far the ends of a band lap.'),
      strict: optional(
        flagShape({ title: 'Strict', description: 'Too loose counts as much as too tight.', default: false }),
      ),
    },
    'a map of ranges, such as `{ sides: 0.2..3 mm, headspace: 0.5.. mm }`',
    { title: 'Clearance', description: 'What must be left in all, along each axis.' },
  ),
)

export const makerSpec = mapSpec(
  {
    cut: () =>
      lengthShape({
        title: 'Cut',
        description: 'How far a cut may lie from its mark (half-width).',
        examples: ['0.3 mm'],
      }),
    score: () =>
      lengthShape({
        title: 'Score',
        description: 'How far a score may lie from its mark (half-width).',
        examples: ['0.2 mm'],
      }),
  },
  {
    fence: () =>
      lengthShape({
        title: 'Fence',
        description: 'How far the stop of a scoring board may be off (half-width); else as for `home`.',
        examples: ['0.25 mm'],
      }),
  },
  'a map of `cut` and `score`',
  { title: 'Maker', description: 'How exactly a class of makers works.' },
)

const rulerShape = () =>
  eitherShape(
    [
      lengthShape({ description: 'For cutting and for scoring.', examples: ['1 mm', '1/16 in'] }),
      later(() =>
        mapShape(
          {
            cut: lengthShape({ title: 'Cut', description: 'Finest mark for cutting.', examples: ['1/16 in'] }),
            score: lengthShape({ title: 'Score', description: 'Finest mark for scoring.', examples: ['1/8 in'] }),
          },
          'a map of `cut` and `score`',
          { description: 'One for cutting and one for scoring.' },
        ),
      ),
    ],
    'a length, or `{ cut, score }`',
    {
      title: 'Ruler',
      description:
        'The finest mark makers are asked to find; 1 mm where not given, in inches 1/16 for cutting and 1/8 for scoring.',
    },
  )

export const clearanceShape = lazily(() =>
  eitherShape(
    [rangeShape({ description: 'Along the length and along the width.' }), later(clearanceMapShape)],
    'a range such as `0.2..3 mm`, or a map of ranges',
    { title: 'Clearance', description: 'What must be left in all, along each axis.' },
  ),
)

export const namedSizeShape = lazily(() => sizeShape({ title: 'Size', description: 'A finished size.' }))

export const levelShape = lazily(() =>
  wordShape(['off', 'info', 'warn', 'fail'], {
    title: 'Level',
    description: 'The most that a failing verdict of the rule counts.',
  }),
)

/** Keys of a workspace and of a set that hold one value each. */
export const tokenKeys = {
  foldgauge: () => textShape({ title: 'Format', description: 'Version of this format: 1.', examples: [1] }),
  title: () => textShape({ title: 'Title', description: 'What people call it.', examples: ['Quillfern paper goods'] }),
  units: () =>
    wordShape(['mm', 'in'], {
      title: 'Units',
      description: 'Unit of every length that has none: `mm` (the default) or `in`.',
    }),
  ruler: rulerShape,
  workmanship: () =>
    nameShape('makers', {
      title: 'Workmanship',
      description: 'Whose hands sets are judged for; `home` where not given.',
      examples: ['home', 'studio', 'die'],
    }),
  target: () =>
    textShape({
      title: 'Target',
      description: 'Share of builds that must go together for a pass.',
      examples: ['95 %'],
      default: '95 %',
    }),
  floor: () =>
    textShape({
      title: 'Floor',
      description: 'Share of builds below which a fit fails; between it and the target it warns.',
      examples: ['85 %'],
      default: '85 %',
    }),
  humidity: () =>
    textShape({
      title: 'Humidity',
      description: 'Range of relative humidity that the pieces will meet.',
      examples: ['40..60 %'],
    }),
} as const

/** Keys of a workspace and of a set that hold entries by name. */
export const tokenGroups = {
  stocks: { entry: () => shapeOfMap(stockSpec), words: { title: 'Stocks', description: 'The papers, by name.' } },
  sizes: {
    entry: namedSizeShape,
    words: {
      title: 'Sizes',
      description: 'Finished sizes shared by sets, by name.',
      examples: [{ note: '148 x 105 mm' }],
    },
  },
  clearances: {
    entry: clearanceShape,
    words: { title: 'Clearances', description: 'Named requirements, in all along an axis.' },
  },
  makers: {
    entry: () => shapeOfMap(makerSpec),
    words: { title: 'Makers', description: 'Classes of makers beside `home`, `studio` and `die`.' },
  },
  checks: {
    entry: levelShape,
    words: { title: 'Checks', description: 'Levels of rules.', examples: [{ 'mail/ratio': 'off' }] },
  },
} as const

export type StockWritten = WrittenBy<typeof stockSpec>
export type MakerWritten = WrittenBy<typeof makerSpec>
export type RulerWritten = z.output<ReturnType<typeof rulerShape>>
export type ClearanceWritten = z.output<ReturnType<typeof clearanceShape>>
