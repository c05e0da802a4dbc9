import type { RuleExamples } from '../../rule.ts'

export const unusedPieceExamples: RuleExamples = {
  rule: 'set/unused-piece',
  passing: [
    {
      title: 'Every piece in a fit',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 156 x 112 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A tag that nothing holds',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 156 x 112 }
  tag: { kind: insert, stock: cover, size: 90 x 50 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'tag', status: 'warn', line: 9, column: 3 },
    },
  ],
}
