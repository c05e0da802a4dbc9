import type { RuleExamples } from '../../rule.ts'

export const caliperMissingExamples: RuleExamples = {
  rule: 'stock/caliper-missing',
  passing: [
    {
      title: 'Ten sheets measured together',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 3.2 mm / 10 }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
`,
      expect: { subject: 'cover', status: 'pass', line: 4, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Only the weight is known',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
`,
      expect: { subject: 'cover', status: 'warn', line: 4, column: 3 },
    },
  ],
}
