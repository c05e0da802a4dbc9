import type { RuleExamples } from '../../rule.ts'

export const grainAcrossFoldExamples: RuleExamples = {
  rule: 'stock/grain-across-fold',
  passing: [
    {
      title: 'Folded along the long edge, as the grain runs',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105, fold: long-edge }
`,
      expect: { subject: 'card', status: 'pass', line: 6, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Folded along the short edge, across the grain',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105, fold: short-edge }
`,
      expect: { subject: 'card', status: 'info', line: 6, column: 3 },
    },
  ],
}
