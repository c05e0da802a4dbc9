import type { RuleExamples } from '../../rule.ts'

export const scoreNeededExamples: RuleExamples = {
  rule: 'stock/score-needed',
  passing: [
    {
      title: 'A scored card',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
`,
      expect: { subject: 'card', status: 'pass', line: 6, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A band of cover paper without scores',
      set: `foldgauge: 1
set: stiff-band
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 191 x 149, wall: 14 }
  band: { kind: band, stock: cover, around: lid, width: 40 }
fits:
  lid-on-base: { put: lid, over: base }
  band-on-box: { put: band, around: lid }
`,
      expect: { subject: 'band', status: 'info', line: 9, column: 3 },
    },
  ],
}
