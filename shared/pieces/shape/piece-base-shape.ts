import { countShape, flagShape, lengthShape, nameShape, optional, textShape, wordShape } from './shape-parts.ts'

export const mostPieces = 10_000

/** Keys that every piece may carry. */
export function pieceBaseKeys<const Kind extends string>(kind: Kind) {
  return {
    kind: wordShape([kind], { title: 'Kind of piece', description: `This piece is of the kind \`${kind}\`.` }),
    made: optional(
      wordShape(['measured', 'printed'], {
        title: 'How it is made',
        description:
          '`measured` (the default): measures marked with a ruler. `printed`: cut and scored along lines printed true to size.',
      }),
    ),
    scored: optional(
      wordShape(['turning', 'one-edge'], {
        title: 'How scores are set',
        description:
          '`turning` (the default): each score from its own edge. `one-edge`: all scores from the same edge.',
      }),
    ),
    make: optional(
      countShape(
        {
          title: 'How many',
          description: 'How many to make; else reckoned from the counts of the fits.',
          examples: [6],
        },
        1,
        mostPieces,
      ),
    ),
    workmanship: optional(
      nameShape('makers', {
        title: 'Workmanship',
        description: 'Whose hands make this piece, where not those of the set.',
        examples: ['home', 'studio', 'die'],
      }),
    ),
    note: optional(
      textShape({
        title: 'Note',
        description: 'For whoever reads this file; judged by nobody.',
        examples: ['Traced from the printed page.'],
      }),
    ),
    corner: optional(
      lengthShape({
        title: 'Rounded corners',
        description: 'Radius of rounded corners; on an envelope the point of the seal flap. Square where not given.',
        examples: ['3 mm'],
      }),
    ),
  }
}

/** The key of the stock that a piece is cut from. */
export const stockKey = () =>
  nameShape('a stock', {
    title: 'Stock',
    description: 'Name of the paper that it is cut from, listed under `stocks`.',
    examples: ['smooth-270'],
  })

/** A key that turns something on. */
export const switchKey = (title: string, description: string) =>
  optional(flagShape({ title, description, default: false }))
