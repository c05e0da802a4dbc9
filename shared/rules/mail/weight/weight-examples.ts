import type { RuleExamples } from '../../rule.ts'

export const mailWeightExamples: RuleExamples = {
  rule: 'mail/weight',
  passing: [
    {
      title: 'A light letter',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
mail: deutsche-post-standard
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
      title: 'Two layers make it too heavy',
      set: `foldgauge: 1
set: layered-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
sheet: a3
mail: deutsche-post-standard
pieces:
  card: { kind: card, stock: cover, folded: 210 x 105, layers: [{ stock: cover, size: 190 x 90 }, { stock: cover, size: 170 x 80 }] }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 220 x 114 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card-in-envelope', status: 'info', line: 12, column: 3 },
    },
  ],
}
