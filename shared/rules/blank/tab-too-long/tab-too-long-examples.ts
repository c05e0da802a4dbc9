import type { RuleExamples } from '../../rule.ts'

export const tabTooLongExamples: RuleExamples = {
  rule: 'blank/tab-too-long',
  passing: [
    {
      title: 'Tabs on the shallower walls',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 160 x 140, wall: { length: [20, 20], width: [30, 30] } }
`,
      expect: { subject: 'tray', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Tabs on the deeper walls',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 160 x 140, wall: { length: [30, 30], width: [20, 20] } }
`,
      expect: { subject: 'tray', status: 'warn', line: 7, column: 3 },
    },
  ],
}
