/** Where a figure comes from. `guess` waits to be calibrated by test builds. */
export type Origin = 'published' | 'derived' | 'common practice' | 'guess' | 'from memory'

export interface ModelDefault {
  readonly value: number
  readonly unit: string
  readonly origin: Origin
  /** What it is, and the source or reason, in a sentence. */
  readonly what: string
}

const entry = (value: number, unit: string, origin: Origin, what: string): ModelDefault => ({
  value,
  unit,
  origin,
  what,
})

/** Every default of the fit model, with its origin. Nothing in the model is a bare number elsewhere. */
export const modelDefaults = {
  hingeFraction: entry(
    0.5,
    'of the caliper',
    'derived',
    'How deep the hinge of a fold lies: mid-planes of the two panels meet at the score.',
  ),
  hingeHalfWidth: entry(
    0.25,
    'of the caliper',
    'guess',
    'How far the hinge of one scoring tool may lie from the middle; no measured value for hand-scored card is published.',
  ),
  tabShare: entry(
    0.5,
    'of the caliper',
    'derived',
    'Tab and wall both want the plane of the score; the wall is pushed out by between nothing and one caliper.',
  ),
  printerHalfWidth: entry(
    0.005,
    'of the length',
    'guess',
    'How far a printer stretches or shrinks a page in one direction. Makers of old laser printers allowed 2 to 3 %.',
  ),
  givenHalfWidth: entry(
    0.8,
    'mm',
    'guess',
    'Size of a bought paper thing; a converting tolerance of a sixteenth of an inch is published.',
  ),
  packCompression: entry(
    0.03,
    'of the height',
    'guess',
    'A hand-pressed pack stands higher than its calipers add up to, which are taken under pressure.',
  ),
  packCompressionHalfWidth: entry(
    0.03,
    'of the height',
    'guess',
    'Spread of that excess; no figure for hand-pressed stacks is published.',
  ),
  loft: entry(0.25, 'mm a folded unit', 'guess', 'Creases spring open a little even under a hand.'),
  loftHalfWidth: entry(
    0.25,
    'mm a folded unit',
    'guess',
    'Spread of that spring; order of magnitude from a bending estimate.',
  ),
  humidityAlong: entry(3e-5, 'a % of relative humidity', 'guess', 'Growth of paper along the grain.'),
  humidityAcross: entry(8e-5, 'a % of relative humidity', 'guess', 'Growth of paper across the grain.'),
  raisedRim: entry(10, 'mm', 'guess', 'Rim that stays flat round something stuck on a card.'),
  rollFoldError: entry(
    0.4,
    'mm',
    'published',
    "A panel that folds in is made 1/64 to 1/8 in shorter; a printer's usual least is 1/32 in with thin paper.",
  ),
  seamMinimum: entry(6, 'mm', 'common practice', 'Narrower glued strips come apart.'),
  squareFlapThroat: entry(6, 'mm', 'common practice', 'Throat left above the back of a square-flap envelope.'),
  squareFlapSide: entry(15, 'mm', 'common practice', 'Side flap of a square-flap envelope.'),
  squareFlapTaper: entry(10, 'degrees', 'common practice', "Lean of a side flap's ends."),
  squareFlapFlap: entry(0.4, 'of the width', 'common practice', 'Seal flap of a square-flap envelope.'),
  sleevePlay: entry(0.8, 'mm', 'guess', 'Play a sleeve is given where its blank is computed.'),
  ribbonKnot: entry(200, 'mm', 'guess', 'Ribbon beyond the girth for a knot.'),
  ribbonBow: entry(450, 'mm', 'guess', 'Ribbon beyond the girth for a bow.'),
  bandOverlap: entry(10, 'mm', 'common practice', 'Least overlap of a band.'),
  bagTop: entry(30, 'mm', 'common practice', 'Strip turned in at the top of a bag.'),
  bagBottom: entry(20, 'mm', 'common practice', 'Strip under the bottom of a bag beyond half its depth.'),
  bagSeam: entry(15, 'mm', 'common practice', 'Glued seam of a bag.'),
  envelopeLow: entry(
    1,
    'mm',
    'published',
    'Announcement envelopes leave an eighth of an inch in all, less the thickness.',
  ),
  envelopeHigh: entry(13, 'mm', 'published', 'Half an inch is advised for square envelopes.'),
  envelopeHighShare: entry(
    0.1,
    'of the content',
    'published',
    'An ISO C envelope is 2^(1/8), about 1.09 times the A size it holds.',
  ),
  boxLow: entry(0.5, 'mm', 'common practice', 'Room round what lies in a box.'),
  boxHigh: entry(12, 'mm', 'common practice', 'More room than this and the contents slide.'),
  dividerLow: entry(0.3, 'mm', 'guess', 'Room at the ends of a divider.'),
  dividerHigh: entry(2, 'mm', 'guess', 'More than this and a divider falls over.'),
  lidLow: entry(
    0,
    'mm',
    'published',
    'Craft rules for lids run from a sixteenth of an inch to five millimetres between score lines.',
  ),
  lidHigh: entry(6, 'mm', 'common practice', 'A lid with more room than this falls off.'),
  lidLoose: entry(4, 'mm', 'common practice', 'From here a lid is called loose.'),
  lidGive: entry(
    0.6,
    'mm',
    'guess',
    'A 25 mm wall that leans half a degree opens 0.2 mm a side (derived), in all 0.6.',
  ),
  headspaceInformation: entry(10, 'mm', 'common practice', 'More than this over the contents and they move.'),
  sleeveLow: entry(0.3, 'mm', 'guess', 'A sleeve tighter than this drags.'),
  sleeveHigh: entry(2, 'mm', 'guess', 'A sleeve looser than this slides off.'),
  bagLow: entry(2, 'mm', 'guess', 'Room to put something into a bag.'),
  bagHigh: entry(25, 'mm', 'guess', 'More than this and the bag hangs round its contents.'),
  bowSlope: entry(
    12,
    'degrees',
    'guess',
    'End slope to which a flat piece may be bowed by hand; calibrated on a pack a quarter of a millimetre too long that goes in and is called snug.',
  ),
  openingExposed: entry(5, 'mm', 'common practice', 'Base left showing below a lid so that it can be lifted.'),
  careLow: entry(0.7, 'times', 'guess', 'A careful pair of hands within a class of makers.'),
  careHigh: entry(1.4, 'times', 'guess', 'A hasty pair of hands within a class of makers.'),
  airViscosity: entry(1.81e-5, 'Pa s', 'published', 'Viscosity of air at room temperature.'),
} as const satisfies Record<string, ModelDefault>
