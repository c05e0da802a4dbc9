import { mapSpec, shapeOfMap, type WrittenBy } from '../pieces/shape/map-spec.ts'
import { mostPieces } from '../pieces/shape/piece-base-shape.ts'
import {
  countShape,
  eitherShape,
  later,
  listShape,
  mapShape,
  nameShape,
  optional,
  rangeShape,
  textShape,
  wordShape,
} from '../pieces/shape/shape-parts.ts'
import { mailPackNames } from './mail-pack-names.ts'
import { clearanceMapShape, tokenGroups, tokenKeys } from './token-shapes.ts'

const putShape = () =>
  eitherShape(
    [
      nameShape('a piece', { description: 'One piece.', examples: ['card'] }),
      later(() =>
        listShape(
          eitherShape(
            [
              textShape({ description: 'A count and a piece.', examples: ['4 card'] }),
              later(() =>
                mapShape(
                  {
                    count: optional(
                      countShape({ title: 'Count', description: 'How many.', default: 1 }, 1, mostPieces),
                    ),
                    piece: nameShape('a piece', { title: 'Piece', description: 'Which piece.' }),
                  },
                  'a map of `count` and `piece`',
                  { description: 'A count and a piece.' },
                ),
              ),
            ],
            'a count and a piece, such as `4 card`',
            { description: 'A part of the stack.' },
          ),
          'a list such as `[4 card, 4 envelope]`',
          { description: 'A mixed stack.', examples: [['4 card', '4 envelope']] },
        ),
      ),
    ],
    'the name of a piece, or a stack such as `[4 card, 4 envelope]`',
    { title: 'Put', description: 'The piece that is put in, over or around another, or a mixed stack.' },
  )

const otherPiece = (title: string, description: string) =>
  nameShape('a piece', { title, description, examples: ['base'] })

/** What an author writes of a fit. */
export const fitSpec = mapSpec(
  { put: putShape },
  {
    in: () => otherPiece('In', 'The piece that it goes into.'),
    over: () => otherPiece('Over', 'The piece that it goes over, as a lid over a box.'),
    around: () => otherPiece('Around', 'The piece that it goes round; around a lid means the closed box.'),
    stands: () =>
      wordShape(['flat', 'upright'], { title: 'Stands', description: 'How it lies in there: `flat` or `upright`.' }),
    count: () =>
      countShape({ title: 'Count', description: 'How many are put.', default: 1, examples: [6] }, 1, mostPieces),
    holding: () => otherPiece('Holding', 'The piece that is inside each of them.'),
    turn: () =>
      wordShape(['quarter', 'none'], {
        title: 'Turn',
        description: 'Whether it is turned by a quarter; else whichever binds least.',
      }),
    clearance: () =>
      eitherShape(
        [
          rangeShape({
            description: 'A named clearance, or a range along the length and the width.',
            examples: ['slip-lid', '0.2..3 mm'],
          }),
          later(clearanceMapShape),
        ],
        'the name of a clearance, a range such as `0.2..3 mm`, or a map of ranges',
        { title: 'Clearance', description: 'What must be left in all; else the default of the relation.' },
      ),
    workmanship: () =>
      nameShape('makers', {
        title: 'Workmanship',
        description: 'Whose hands this fit is judged for.',
        examples: ['studio'],
      }),
    paper: () =>
      listShape(nameShape('a stock', { description: 'A stock.' }), 'a list of stocks, such as `[text-120]`', {
        title: 'Paper',
        description: 'Stocks that the fit is also judged with.',
        examples: [['text-120']],
      }),
  },
  'a map such as `{ put: lid, over: base }`',
  { title: 'Fit', description: 'One piece put in, over or around another.' },
)

export const waiverSpec = mapSpec(
  {
    rule: () => textShape({ title: 'Rule', description: 'The rule that is waived.', examples: ['ruler/off-grid'] }),
    reason: () =>
      textShape({
        title: 'Reason',
        description: 'Why it may stand.',
        examples: ['template is traced, not measured'],
      }),
    until: () => textShape({ title: 'Until', description: 'The last day it holds.', examples: ['2027-03-31'] }),
  },
  {
    subject: () =>
      textShape({
        title: 'Subject',
        description: 'The piece, fit or `fit:axis` it is waived for; the whole set where not given.',
        examples: ['envelope', 'lid-on-base:width'],
      }),
  },
  'a map of `rule`, `subject`, `reason` and `until`',
  { title: 'Waiver', description: 'A verdict that is known and may stand for a time.' },
)

/** Keys of a set that hold one value each. */
export const setKeys = {
  set: () =>
    nameShape('this set', { title: 'Set', description: 'Name of the set; its identity.', examples: ['orchard-notes'] }),
  family: () =>
    nameShape('a family', {
      title: 'Family',
      description: 'The family that the set belongs to.',
      examples: ['orchard'],
    }),
  sheet: () =>
    textShape({
      title: 'Sheet',
      description: 'What blanks are cut from: `a3`, `a4`, `a5`, `letter`, `legal`, `tabloid`, `12x12in` or a size.',
      examples: ['a4', 'letter', '420 x 297 mm'],
    }),
  mail: () =>
    wordShape(mailPackNames, {
      title: 'Mail',
      description: 'Dated postal rules that the filled envelope should meet; advice.',
      examples: ['usps-letter'],
    }),
  steps: () =>
    eitherShape(
      [
        wordShape(['auto'], { description: 'Steps are written by Foldgauge.' }),
        later(() =>
          listShape(
            textShape({ description: 'A sentence; `{piece.dimension}` stands for a measure.' }),
            'a list of sentences',
            { description: 'Own sentences.', examples: [['Cut the base to {base.blank}.']] },
          ),
        ),
      ],
      '`auto`, or a list of sentences',
      {
        title: 'Steps',
        description: 'The maker’s steps: `auto` (the default), or own sentences, whose measures are checked.',
      },
    ),
  ...tokenKeys,
} as const

/** Keys of a set that hold entries by name; what is in `pieces` has a shape of its own for each kind. */
export const setGroups = {
  fits: {
    entry: () => shapeOfMap(fitSpec),
    words: { title: 'Fits', description: 'What goes into, over or around what, by name.' },
  },
  ...tokenGroups,
} as const

export type FitWritten = WrittenBy<typeof fitSpec>
export type WaiverWritten = WrittenBy<typeof waiverSpec>
