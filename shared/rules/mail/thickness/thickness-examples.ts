import type { RuleExamples } from '../../rule.ts'

export const mailThicknessExamples: RuleExamples = {
  rule: 'mail/thickness',
  passing: [
    {
      title: 'A flat card',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
mail: usps-letter
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 156 x 112 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card-in-envelope', status: 'pass', line: 11, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Something thick stuck on',
      set: `foldgauge: 1
set: lumpy-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
mail: usps-letter
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105, raised: 6 mm }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 160 x 118 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card-in-envelope', status: 'warn', line: 11, column: 3 },
    },
  ],
}
