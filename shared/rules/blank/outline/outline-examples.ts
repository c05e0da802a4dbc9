import type { RuleExamples } from '../../rule.ts'

export const outlineExamples: RuleExamples = {
  rule: 'blank/outline',
  passing: [
    {
      title: 'Corners in order',
      set: `foldgauge: 1
set: flag
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  flag: { kind: custom, stock: cover, outside: 60 x 40, outline: [[0, 0], [60, 0], [60, 40], [0, 40]] }
`,
      expect: { subject: 'flag', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Two corners swapped',
      set: `foldgauge: 1
set: flag
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  flag: { kind: custom, stock: cover, outside: 60 x 40, outline: [[0, 0], [60, 40], [60, 0], [0, 40]] }
`,
      expect: { subject: 'flag', status: 'fail', line: 7, column: 3 },
    },
    {
      title: 'A score that leaves the sheet',
      set: `foldgauge: 1
set: flag
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  flag: { kind: custom, stock: cover, outside: 60 x 40, outline: [[0, 0], [60, 0], [60, 40], [0, 40]], scores: [{ from: [30, 0], to: [30, 45] }] }
`,
      expect: { subject: 'flag', status: 'fail', line: 7, column: 3 },
    },
  ],
}
