import type { RuleExamples } from '../../rule.ts'

export const roundingExamples: RuleExamples = {
  rule: 'ruler/rounding',
  passing: [
    {
      title: 'A roomy envelope',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 158 x 115 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card-in-envelope', status: 'pass', line: 10, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A lid that eighths of an inch spoil',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 193 x 151, wall: 15 }
fits:
  lid-on-base: { put: lid, over: base }
`,
      expect: { subject: 'lid-on-base', status: 'warn', line: 10, column: 3 },
    },
  ],
}
