import type { RuleExamples } from '../../rule.ts'

export const wallTooDeepExamples: RuleExamples = {
  rule: 'blank/wall-too-deep',
  passing: [
    {
      title: 'Walls that leave a bottom',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 100 x 80, wall: 20 }
`,
      expect: { subject: 'tray', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Walls scored at half the blank',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 100 x 60, wall: 30 }
`,
      expect: { subject: 'tray', status: 'fail', line: 7, column: 3 },
    },
  ],
}
