import type { RuleExamples } from '../../rule.ts'

export const panelsUnequalExamples: RuleExamples = {
  rule: 'blank/panels-unequal',
  passing: [
    {
      title: 'Folded at half of the blank',
      set: `foldgauge: 1
set: tall-card
units: in
stocks:
  cover: { weight: 100 lb cover, caliper: 12 pt }
pieces:
  card: { kind: card, stock: cover, folded: 7 7/8 x 5 1/4, blank: 10 1/2 x 7 7/8 }
`,
      expect: { subject: 'card', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'The published slip: a blank of 10 1/2 in folded at 5 in',
      set: `foldgauge: 1
set: tall-card
units: in
stocks:
  cover: { weight: 100 lb cover, caliper: 12 pt }
pieces:
  card: { kind: card, stock: cover, folded: 7 7/8 x 5 1/2, blank: 10 1/2 x 7 7/8, panel-widths: [5, 5 1/2] }
`,
      expect: { subject: 'card', status: 'warn', line: 7, column: 3 },
    },
  ],
}
