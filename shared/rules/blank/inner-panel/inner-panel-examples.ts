import type { RuleExamples } from '../../rule.ts'

export const innerPanelExamples: RuleExamples = {
  rule: 'blank/inner-panel',
  passing: [
    {
      title: 'Each inner panel a millimetre shorter',
      set: `foldgauge: 1
set: menu
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  menu: { kind: card, stock: cover, folded: 210 x 100, style: roll, panel-widths: [100, 100, 99] }
`,
      expect: { subject: 'menu', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Three equal panels, rolled',
      set: `foldgauge: 1
set: menu
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  menu: { kind: card, stock: cover, folded: 210 x 100, style: roll, panel-widths: [100, 100, 100] }
`,
      expect: { subject: 'menu', status: 'fail', line: 7, column: 3 },
    },
  ],
}
