import { commonWords } from './common-words.ts'

type Axis = keyof typeof commonWords.axes

/** Words of clearances across versions. */
export const trendWords = {
  heading: 'Trend',
  none: 'Two versions of a branch are needed before anything can be seen to move.',
  fit: 'Fit and axis',
  option: (fit: string, axis: Axis) => `${fit}, ${commonWords.axes[axis]}`,
  title: (fit: string, axis: Axis) => `Clearance of ${fit} along the ${commonWords.axes[axis]}, version by version`,
  clearance: 'Clearance',
  band: 'Allowed',
  goes: 'Of a hundred go',
  version: 'Version',
  date: 'Pushed',
  table: 'The same as a table',
  key: 'Dot: as meant. Bar: worst case. Band between dashes: what is allowed. Below: of a hundred builds, how many go.',
} as const
