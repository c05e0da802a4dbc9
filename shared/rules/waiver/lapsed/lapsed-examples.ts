import type { RuleExamples } from '../../rule.ts'

export const lapsedExamples: RuleExamples = {
  rule: 'waiver/lapsed',
  passing: [
    {
      title: 'A waiver in force',
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
      title: 'A waiver past its last day',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 200 x 158, wall: 20.4 }
waivers:
  - { rule: ruler/off-grid, subject: tray, reason: the mould is made for it, until: 2026-11-30 }
`,
      expect: { subject: 'ruler/off-grid#tray', status: 'warn', line: 9, column: 5 },
    },
  ],
}
