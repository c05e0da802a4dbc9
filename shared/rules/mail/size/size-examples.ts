import type { RuleExamples } from '../../rule.ts'

export const mailSizeExamples: RuleExamples = {
  rule: 'mail/size',
  passing: [
    {
      title: 'Large enough for a letter',
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
      title: 'Narrower than a letter may be',
      set: `foldgauge: 1
set: gift-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
mail: usps-letter
pieces:
  card: { kind: card, stock: cover, folded: 120 x 80 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 128 x 86 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card-in-envelope', status: 'warn', line: 11, column: 3 },
    },
  ],
}
