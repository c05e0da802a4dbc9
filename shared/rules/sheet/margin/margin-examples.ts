import type { RuleExamples } from '../../rule.ts'

export const marginExamples: RuleExamples = {
  rule: 'sheet/margin',
  passing: [
    {
      title: 'Printed lines clear of the edge',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
sheet: a4
pieces:
  tray: { kind: box, stock: cover, blank: 200 x 158, wall: 20, made: printed }
`,
      expect: { subject: 'tray', status: 'pass', line: 8, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Printed up to the edge of the page',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
sheet: a4
pieces:
  tray: { kind: box, stock: cover, blank: 290 x 206, wall: 20, made: printed }
`,
      expect: { subject: 'tray', status: 'warn', line: 8, column: 3 },
    },
  ],
}
