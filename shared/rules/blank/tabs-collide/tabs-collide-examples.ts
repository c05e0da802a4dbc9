import type { RuleExamples } from '../../rule.ts'

export const tabsCollideExamples: RuleExamples = {
  rule: 'blank/tabs-collide',
  passing: [
    {
      title: 'Short tabs on a long wall',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 160 x 140, wall: 30 }
`,
      expect: { subject: 'tray', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Deep walls round a small bottom',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 150 x 140, wall: 40 }
`,
      expect: { subject: 'tray', status: 'fail', line: 7, column: 3 },
    },
  ],
}
