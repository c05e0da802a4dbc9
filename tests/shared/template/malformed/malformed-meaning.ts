import { below, card, fits, malformed, pieces, type MalformedCase } from './malformed-case.ts'

const waiver = (keys: string): string => below('waivers:', `  - { ${keys} }`)

/** What is written rightly and means nothing. */
export const malformedMeaning: readonly MalformedCase[] = [
  malformed('a fit without its other piece', 'missing-key', fits('«a»: { put: card }'), 'over'),
  malformed('a fit that puts nothing', 'missing-key', fits('«a»: { in: cover }'), 'put'),
  malformed('a fit with two relations', 'conflicting-keys', fits('a: { put: lid, in: cover, «over»: base }')),
  malformed('a fit of a piece there is none of', 'unknown-piece', fits('a: { put: «crad», in: cover }'), 'card'),
  malformed('a fit into a piece there is none of', 'unknown-piece', fits('a: { put: card, in: «drawer» }'), 'pieces'),
  malformed(
    'a fit holding a piece there is none of',
    'unknown-piece',
    fits('a: { put: cover, holding: «cards», in: base }'),
    'card',
  ),
  malformed(
    'a stack of a piece there is none of',
    'unknown-piece',
    fits('a: { put: [4 card, «4 envelope»], in: base }'),
  ),
  malformed('a stack with a count of nothing', 'not-a-number', fits('a: { put: [«0 card»], in: base }')),
  malformed('an empty stack', 'empty-value', fits('a: { put: «[]», in: base }')),
  malformed(
    'a stack that holds something',
    'conflicting-keys',
    fits('a: { put: [4 cover], «holding»: card, in: base }'),
  ),
  malformed('a count glued to its piece', 'put-count', fits('a: { put: «4 card», in: base }'), 'count: 4'),
  malformed(
    'a clearance nearly written right',
    'unknown-clearance',
    below(
      'clearances: { slip-lid: { sides: 0.2..3 } }',
      'fits:',
      '  a: { put: lid, over: base, clearance: «slip-ldi» }',
    ),
    'slip-lid',
  ),
  malformed('a paper there is none of', 'unknown-stock', fits('a: { put: lid, over: base, paper: [thin, «thick»] }')),
  malformed('a paper that is no list', 'wrong-type', fits('a: { put: lid, over: base, paper: «thin» }'), '[text-120]'),
  malformed('a piece inside itself', 'containment-cycle', fits('«a»: { put: card, in: card }'), 'itself'),
  malformed(
    'two pieces inside each other',
    'containment-cycle',
    fits('a: { put: card, in: cover }', '«b»: { put: cover, in: card }'),
  ),
  malformed(
    'a round of three',
    'containment-cycle',
    fits('a: { put: card, in: cover }', 'b: { put: cover, in: base }', '«c»: { put: base, in: card }'),
    'base',
    'cover',
  ),
  malformed(
    'a lid inside the base it covers',
    'containment-cycle',
    fits('a: { put: lid, over: base }', '«b»: { put: lid, in: base }'),
  ),
  malformed(
    'a round closed by what is held',
    'containment-cycle',
    fits('a: { put: cover, in: card }', '«b»: { put: cover, holding: card, in: base }'),
  ),
  malformed(
    'a band around a band around it',
    'containment-cycle',
    pieces(
      'one: { kind: band, stock: thin, width: 40, around: two }',
      'two: { kind: band, stock: thin, width: 40, «around»: one }',
    ),
  ),
  malformed(
    'a band around nothing',
    'missing-key',
    pieces('«band»: { kind: band, stock: thin, width: 40 }'),
    'goes round',
  ),
  malformed(
    'a band around a piece there is none of',
    'unknown-piece',
    pieces('band: { kind: band, stock: thin, width: 40, around: «lid» }'),
  ),
  malformed(
    'a band without a width',
    'missing-key',
    pieces('«band»: { kind: band, stock: thin, length: 400 }'),
    'width',
  ),
  malformed('a band of no stock', 'missing-key', pieces('«band»: { kind: band, width: 40, length: 400 }'), 'ribbon'),
  malformed(
    'a band that is tied',
    'conflicting-keys',
    pieces('band: { kind: band, stock: thin, width: 40, length: 400, «tie»: knot }'),
  ),
  malformed(
    'a ribbon with scores',
    'conflicting-keys',
    pieces('band: { kind: band, ribbon: true, width: 10, length: 900, «scores»: [100] }'),
  ),
  malformed(
    'a sleeve with three scores',
    'score-count',
    pieces('sleeve: { kind: sleeve, stock: smooth, blank: 300 x 60, scores: «[80, 100, 180]» }'),
    '4',
  ),
  malformed(
    'a sleeve with scores out of order',
    'score-order',
    pieces('sleeve: { kind: sleeve, stock: smooth, blank: 300 x 60, scores: [80, 100, «90», 200] }'),
  ),
  malformed(
    'a sleeve with a score off its blank',
    'score-outside',
    pieces('sleeve: { kind: sleeve, stock: smooth, blank: 300 x 60, scores: [80, 100, 180, «310»] }'),
  ),
  malformed(
    'a sleeve with a blank and no scores',
    'missing-key',
    pieces('«sleeve»: { kind: sleeve, stock: smooth, blank: 300 x 60 }'),
    'scores',
  ),
  malformed(
    'scores without a blank',
    'conflicting-keys',
    pieces(
      'sleeve: { kind: sleeve, stock: smooth, «scores»: [80, 100, 180, 200], around: base }',
      'base: { kind: box, stock: smooth, blank: 200 x 158, wall: 20 }',
    ),
  ),
  malformed('a box without a size', 'missing-key', pieces('«base»: { kind: box, stock: smooth }'), 'inside'),
  malformed(
    'a box without a wall',
    'missing-key',
    pieces('«base»: { kind: box, stock: smooth, blank: 200 x 158 }'),
    'wall',
  ),
  malformed('a box without a blank', 'missing-key', pieces('«base»: { kind: box, stock: smooth, wall: 20 }'), 'blank'),
  malformed(
    'a box given twice',
    ['conflicting-keys', 'conflicting-keys'],
    pieces('base: { kind: box, stock: smooth, «blank»: 200 x 158, «wall»: 20, inside: 160 x 118 x 20 }'),
  ),
  malformed(
    'an envelope without a style',
    'missing-key',
    pieces('«e»: { kind: envelope, stock: thin, pocket: 156 x 112 }'),
    'baronial',
  ),
  malformed(
    'an envelope without a pocket',
    'missing-key',
    pieces('«e»: { kind: envelope, style: baronial, stock: thin }'),
    'corners',
  ),
  malformed(
    'an envelope from what is no square',
    'not-square',
    pieces(
      'e: { kind: envelope, style: baronial, stock: thin, blank: «210 x 200», corners: { sides: 101, bottom: 126, flap: 126 } }',
    ),
    '210 x 210',
  ),
  malformed(
    'an envelope by its blank without corners',
    'missing-key',
    pieces('«e»: { kind: envelope, style: baronial, stock: thin, blank: 210 x 210 }'),
    'corners',
  ),
  malformed(
    'an envelope given twice',
    'conflicting-keys',
    pieces(
      'e: { kind: envelope, style: baronial, stock: thin, «pocket»: 156 x 112, blank: 210 x 210, corners: { sides: 101, bottom: 126, flap: 126 } }',
    ),
  ),
  malformed(
    'a back on pointed flaps',
    'conflicting-keys',
    pieces('e: { kind: envelope, style: baronial, stock: thin, pocket: 156 x 112, «back»: 100 }'),
    'square-flap',
  ),
  malformed(
    'a seam on square flaps',
    'conflicting-keys',
    pieces('e: { kind: envelope, style: square-flap, stock: thin, pocket: 156 x 112, «seam»: 12 }'),
  ),
  malformed(
    'panels of a card that is not folded',
    'conflicting-keys',
    card('folded: 148 x 105, fold: none, «panels»: 3'),
  ),
  malformed('three panels without a style', 'missing-key', card('folded: 148 x 105, «panels»: 3'), 'accordion'),
  malformed('a gate of four panels', 'conflicting-keys', card('folded: 148 x 105, style: gate, «panels»: 4')),
  malformed(
    'fewer widths than panels',
    'conflicting-keys',
    card('folded: 148 x 105, style: roll, panels: 3, «panel-widths»: [105, 104]'),
  ),
  malformed('a bag of nothing', 'missing-key', pieces('«bag»: { kind: bag, stock: thin }'), 'inside'),
  malformed(
    'a bag given twice',
    'conflicting-keys',
    pieces('bag: { kind: bag, stock: thin, «inside»: 180 x 80 x 220, blank: 540 x 310, scores: [15, 195, 275, 455] }'),
  ),
  malformed('a bought thing of no size', 'missing-key', pieces('«photo»: { kind: bought, thickness: 0.3 }'), 'outside'),
  malformed(
    'an outline of two points',
    'outline-short',
    pieces('tag: { kind: custom, stock: smooth, outline: «[[0, 0], [90, 0]]», outside: 90 x 60 }'),
  ),
  malformed(
    'a custom piece of no declared size',
    'missing-key',
    pieces('«tag»: { kind: custom, stock: smooth, outline: [[0, 0], [90, 0], [90, 60]] }'),
  ),
  malformed(
    'a waiver without a reason',
    'missing-key',
    waiver('«rule: ruler/off-grid, until: 2027-03-31»').replace('{ «', '«{ ').replace('» }', ' }»'),
    'reason',
  ),
  malformed(
    'a waiver with an empty reason',
    'empty-value',
    waiver('rule: ruler/off-grid, reason: «" "», until: 2027-03-31'),
  ),
  malformed(
    'a waiver without an end',
    'missing-key',
    waiver('«rule: ruler/off-grid, reason: traced»').replace('{ «', '«{ ').replace('» }', ' }»'),
    'until',
  ),
  malformed(
    'a waiver until a day there is none of',
    'not-a-date',
    waiver('rule: ruler/off-grid, reason: traced, until: «2027-02-29»'),
  ),
  malformed(
    'a waiver until a date in another order',
    'not-a-date',
    waiver('rule: ruler/off-grid, reason: traced, until: «31.03.2027»'),
    '2027-03-31',
  ),
  malformed(
    'a waiver of no rule',
    'unknown-rule',
    waiver('rule: «grid», reason: traced, until: 2027-03-31'),
    'fit/clearance',
  ),
  malformed('steps that are a sentence', 'wrong-type', below('steps: «Cut the base.»'), 'auto'),
  malformed(
    'mistakes in many places at once',
    ['unknown-stock', 'length-zero', 'unknown-key', 'unknown-piece'],
    pieces(
      'card: { kind: card, stock: «smoth», folded: 148 x 105 }',
      'base: { kind: box, stock: smooth, blank: 200 x 158, wall: «0» }',
    ) + '«shet»: a4\nfits:\n  a: { put: card, in: «bsae» }\n',
  ),
]
