import type { RuleExamples } from '../../rule.ts'

export const offGridExamples: RuleExamples = {
  rule: 'ruler/off-grid',
  passing: [
    {
      title: 'Whole millimetres',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
`,
      expect: { subject: 'tray', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A measure between two marks',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 200 x 158, wall: 20.4 }
`,
      expect: { subject: 'tray', status: 'warn', line: 7, column: 3 },
    },
  ],
}
