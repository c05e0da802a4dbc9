import type { RuleExamples } from '../../rule.ts'

export const mailRatioExamples: RuleExamples = {
  rule: 'mail/ratio',
  passing: [
    {
      title: 'Longer than 1.3 times its width',
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
      title: 'A square envelope',
      set: `foldgauge: 1
set: square-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
mail: usps-letter
pieces:
  card: { kind: card, stock: cover, folded: 135 x 135 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 145 x 145 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card-in-envelope', status: 'warn', line: 11, column: 3 },
    },
    {
      title: 'Right at the limit, so that half of the builds miss it',
      set: `foldgauge: 1
set: near-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
mail: usps-letter
pieces:
  card: { kind: card, stock: cover, folded: 135 x 103 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 143 x 110 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card-in-envelope', status: 'warn', line: 11, column: 3 },
    },
  ],
}
