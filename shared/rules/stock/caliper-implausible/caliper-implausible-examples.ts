import type { RuleExamples } from '../../rule.ts'

export const caliperImplausibleExamples: RuleExamples = {
  rule: 'stock/caliper-implausible',
  passing: [
    {
      title: 'Weight and thickness of one paper',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
`,
      expect: { subject: 'cover', status: 'pass', line: 4, column: 3 },
    },
  ],
  failing: [
    {
      title: 'The thickness of ten sheets for one',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 3.2 mm }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
`,
      expect: { subject: 'cover', status: 'warn', line: 4, column: 3 },
    },
    {
      title: 'Points taken for hundredths of a millimetre',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.12 mm }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
`,
      expect: { subject: 'cover', status: 'warn', line: 4, column: 3 },
    },
  ],
}
