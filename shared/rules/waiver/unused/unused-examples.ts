import type { RuleExamples } from '../../rule.ts'

export const unusedExamples: RuleExamples = {
  rule: 'waiver/unused',
  passing: [
    {
      title: 'A waiver that excuses a verdict',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 200 x 158, wall: 20.4 }
waivers:
  - { rule: ruler/off-grid, subject: tray, reason: the mould is made for it, until: 2027-03-31 }
`,
      expect: { subject: 'ruler/off-grid#tray', status: 'pass', line: 9, column: 5 },
    },
  ],
  failing: [
    {
      title: 'A waiver left behind',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
waivers:
  - { rule: ruler/off-grid, subject: tray, reason: the mould is made for it, until: 2027-03-31 }
`,
      expect: { subject: 'ruler/off-grid#tray', status: 'info', line: 9, column: 5 },
    },
  ],
}
