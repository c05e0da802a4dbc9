import type { RuleExamples } from '../../rule.ts'

export const yieldExamples: RuleExamples = {
  rule: 'sheet/yield',
  passing: [
    {
      title: 'Four cards, edge to edge',
      set: `foldgauge: 1
set: inserts
units: in
stocks:
  cover: { weight: 80 lb cover, caliper: 11 pt }
sheet: 12x12in
pieces:
  insert: { kind: insert, stock: cover, size: 5 1/2 x 4 1/4 }
`,
      expect: { subject: 'insert', status: 'pass', line: 8, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A fourth one by knife only',
      set: `foldgauge: 1
set: inserts
units: in
stocks:
  cover: { weight: 80 lb cover, caliper: 11 pt }
sheet: 12x12in
pieces:
  insert: { kind: insert, stock: cover, size: 7 x 5 }
`,
      expect: { subject: 'insert', status: 'info', line: 8, column: 3 },
    },
  ],
}
