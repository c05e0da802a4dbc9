import { countShape, flagShape, lengthShape, nameShape, textShape, wordShape } from './shape-parts.ts'

export const mostPieces = 10_000

/** The key that every piece must have. */
export const kindKey = <const Kind extends string>(kind: Kind) => ({
  kind: () => wordShape([kind], { title: 'Kind of piece', description: `This piece is of the kind \`${kind}\`.` }),
})

/** The key of the stock that a piece is cut from. */
export const stockShape = () =>
  nameShape('a stock', {
    title: 'Stock',
    description: 'Name of the paper that it is cut from, listed under `stocks`.',
    examples: ['smooth-270'],
  })

/** A key that turns something on. */
export const switchShape = (title: string, description: string) => flagShape({ title, description, default: false })

/** Keys that every piece may carry. */
export const pieceBaseKeys = {
  made: () =>
    wordShape(['measured', 'printed'], {
      title: 'How it is made',
      description:
        '`measured` (the default): measures marked with a ruler. `printed`: cut and scored along lines printed true to size.',
    }),
  scored: () =>
    wordShape(['turning', 'one-edge'], {
      title: 'How scores are set',
      description: '`turning` (the default): each score from its own edge. `one-edge`: all scores from the same edge.',
    }),
  make: () =>
    countShape(
      { title: 'How many', description: 'How many to make; else reckoned from the counts of the fits.', examples: [6] },
      1,
      mostPieces,
    ),
  workmanship: () =>
    nameShape('makers', {
      title: 'Workmanship',
      description: 'Whose hands make this piece, where not those of the set.',
      examples: ['home', 'studio', 'die'],
    }),
  note: () =>
    textShape({
      title: 'Note',
      description: 'For whoever reads this file; judged by nobody.',
      examples: ['Traced from the printed page.'],
    }),
  corner: () =>
    lengthShape({
      title: 'Rounded corners',
      description: 'Radius of rounded corners; on an envelope the point of the seal flap. Square where not given.',
      examples: ['3 mm'],
    }),
} as const
