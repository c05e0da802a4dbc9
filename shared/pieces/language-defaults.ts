import type { ModelDefault, Origin } from './model-defaults.ts'

const entry = (value: number, unit: string, origin: Origin, what: string): ModelDefault => ({
  value,
  unit,
  origin,
  what,
})

/** What a template means where its author leaves a measure out. */
export const languageDefaults = {
  baronialSeam: entry(
    12,
    'mm',
    'common practice',
    'Seams of an envelope with pointed flaps: twice the least that holds.',
  ),
  tabTrim: entry(
    1,
    'mm',
    'common practice',
    'How much shorter than its wall a corner tab is cut, so that it does not show.',
  ),
  tabTaper: entry(
    5,
    'degrees',
    'common practice',
    'How far the sides of a corner tab lean, so that it slides past the corner.',
  ),
  wrapOverlap: entry(
    15,
    'mm',
    'common practice',
    'How far the ends of a band or sleeve lap where its blank is reckoned.',
  ),
  cardPocketSide: entry(10, 'mm', 'common practice', 'Strip glued at each end of a pocket folded up from a card.'),
  targetShare: entry(0.95, 'of builds', 'common practice', 'Share of builds that must go together for a pass.'),
  floorShare: entry(0.85, 'of builds', 'common practice', 'Share of builds below which a fit fails.'),
  rulerMetric: entry(1, 'mm', 'common practice', 'Finest mark that makers with a metric ruler are asked to find.'),
  rulerInchCut: entry(25.4 / 16, 'mm', 'common practice', 'Finest mark for cutting on an inch ruler: a sixteenth.'),
  rulerInchScore: entry(25.4 / 8, 'mm', 'common practice', 'Finest mark on most inch scoring boards: an eighth.'),
  homeCut: entry(0.35, 'mm', 'guess', 'How far a cut made at home lies from its mark (half-width).'),
  homeScore: entry(0.25, 'mm', 'guess', 'How far a score made at home lies from its mark (half-width).'),
  homeFence: entry(0.25, 'mm', 'guess', 'How far the stop of a scoring board at home is off (half-width).'),
  studioCut: entry(0.2, 'mm', 'guess', 'How far a cut made in a studio lies from its mark (half-width).'),
  studioScore: entry(0.15, 'mm', 'guess', 'How far a score made in a studio lies from its mark (half-width).'),
  studioFence: entry(0.15, 'mm', 'guess', 'How far the stop in a studio is off (half-width).'),
  dieCut: entry(0.25, 'mm', 'guess', 'How far a die-cut edge lies from its place (half-width).'),
  dieScore: entry(0.2, 'mm', 'guess', 'How far a die-made score lies from its place (half-width).'),
  dieFence: entry(0.05, 'mm', 'guess', 'How far a whole die is off (half-width).'),
} as const satisfies Record<string, ModelDefault>
