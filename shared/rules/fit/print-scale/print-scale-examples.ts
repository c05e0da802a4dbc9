import type { RuleExamples } from '../../rule.ts'

export const printScaleExamples: RuleExamples = {
  rule: 'fit/print-scale',
  passing: [
    {
      title: 'A printed liner with room in a bought frame',
      set: `foldgauge: 1
set: frame-liner
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  liner: { kind: insert, stock: cover, size: 105 x 75, made: printed }
  frame: { kind: bought, inside: 108 ± 0.2 x 78 ± 0.2 mm }
fits:
  liner-in-frame: { put: liner, in: frame }
`,
      expect: { subject: 'liner-in-frame', status: 'pass', line: 10, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A printed liner that fills the frame',
      set: `foldgauge: 1
set: frame-liner
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  liner: { kind: insert, stock: cover, size: 106.2 x 76.2, made: printed }
  frame: { kind: bought, inside: 108 ± 0.2 x 78 ± 0.2 mm }
fits:
  liner-in-frame: { put: liner, in: frame }
`,
      expect: { subject: 'liner-in-frame', status: 'info', line: 10, column: 3 },
    },
  ],
}
