import { plural } from './plural.ts'

/** Words of the editor's sheet of numbers. */
export const numbersWords = {
  title: 'Number sheet',
  counts: (ticked: number, queried: number, open: number) =>
    `${String(ticked)} ticked, ${plural(queried, 'query', 'queries')}, ${String(open)} open`,
  progress: 'Ticked so far',
  filter: 'Show',
  filters: { '': 'every measure', open: 'open', changed: 'changed since ticked', queried: 'queried', ticked: 'ticked' },
  piece: 'Piece or fit',
  anyPiece: 'all',
  measure: 'Measure',
  value: 'Value',
  ruler: { mm: 'On a mm ruler', in: 'On an inch ruler' },
  from: 'Where it comes from',
  sum: (parts: readonly string[]) => `adds up from ${parts.join(', ')}`,
  line: (line: number) => `line ${String(line)}`,
  state: 'State',
  tick: 'Tick',
  untick: 'Untick',
  query: 'Query',
  queryTitle: (what: string) => `Query: ${what}`,
  queryNote: 'What is doubtful about it',
  tickAll: (count: number) => `Tick the ${plural(count, 'measure', 'measures')} shown`,
  carried: (version: number) => `carried over from version ${String(version)}`,
  empty: 'No measure like that',
  none: 'This version has no measure to publish.',
  readOnly: 'Your role reads this sheet; it does not tick it.',
  by: (name: string) => `by ${name}`,
} as const
