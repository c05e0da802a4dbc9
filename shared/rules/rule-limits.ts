import type { ModelDefault, Origin } from '../pieces/model-defaults.ts'

const entry = (value: number, unit: string, origin: Origin, what: string): ModelDefault => ({
  value,
  unit,
  origin,
  what,
})

/** Limits that only rules use, beside the defaults of the fit model. */
export const ruleLimits = {
  airCushionSlow: entry(
    2,
    's',
    'guess',
    'A lid that sinks more slowly than this on its cushion of air is felt as tight; the estimate is an upper bound.',
  ),
  densityLow: entry(
    0.5,
    'g/cm³',
    'from memory',
    'Papers lighter than this for their thickness are felts and blotters.',
  ),
  densityHigh: entry(1.3, 'g/cm³', 'from memory', 'Papers denser than this are glassines and filled art papers.'),
  scoreAdvised: entry(150, 'g/m²', 'published', 'Paper mills and printers advise a score from here.'),
  scoreInsisted: entry(200, 'g/m²', 'common practice', 'Cover weights crack where they are folded without a score.'),
  printMargin: entry(
    5,
    'mm',
    'published',
    'Strip along the edge that a home printer may leave white: 4 mm guaranteed by one laser printer, a quarter of an inch called safe.',
  ),
  yieldSearched: entry(
    24,
    'pieces a sheet',
    'common practice',
    'Up to here the best way of cutting is searched for; beyond it the best way in two stages is taken.',
  ),
  pinwheelSearched: entry(
    6,
    'pieces a sheet',
    'common practice',
    'Up to here a way of cutting that only a knife can follow is looked for; with more pieces it seldom gains one.',
  ),
  familySizeNear: entry(0.05, 'mm', 'common practice', 'Sizes nearer than this are one size.'),
  addsUpWithin: entry(0.05, 'mm', 'common practice', 'Measures that miss their sum by less than this add up.'),
} as const satisfies Record<string, ModelDefault>
