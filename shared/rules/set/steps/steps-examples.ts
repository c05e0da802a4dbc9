import type { RuleExamples } from '../../rule.ts'

export const stepsExamples: RuleExamples = {
  rule: 'set/steps',
  passing: [
    {
      title: 'Sentences that name measures of the pieces',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
steps:
  - Cut the tray to {tray.blank}.
  - Score it {tray.wall} from every edge.
`,
      expect: { subject: 'tray', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A sentence with a measure that is none',
      set: `foldgauge: 1
set: open-tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  tray: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
steps:
  - Cut the tray to {tray.blank}.
  - Score it {tray.walls} from every edge.
`,
      expect: { subject: 'open-tray', status: 'fail', line: 10, column: 5 },
    },
    {
      title: 'Panels that do not make the blank',
      set: `foldgauge: 1
set: menu
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  menu: { kind: card, stock: cover, folded: 210 x 100, style: roll, panel-widths: [100, 100, 98], blank: 210 x 300 }
`,
      expect: { subject: 'menu', status: 'fail', line: 7, column: 3 },
    },
  ],
}
