import type { RuleExamples } from '../../rule.ts'

export const tooLargeExamples: RuleExamples = {
  rule: 'sheet/too-large',
  passing: [
    {
      title: 'A tray from a small sheet',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
sheet: a4
pieces:
  tray: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
`,
      expect: { subject: 'tray', status: 'pass', line: 8, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A tray larger than the sheet',
      set: `foldgauge: 1
set: tray
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
sheet: a4
pieces:
  tray: { kind: box, stock: cover, blank: 300 x 215, wall: 20 }
`,
      expect: { subject: 'tray', status: 'fail', line: 8, column: 3 },
    },
    {
      title: 'A strip that goes on the sheet at an angle only',
      set: `foldgauge: 1
set: strip
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
sheet: a4
pieces:
  strip: { kind: insert, stock: cover, size: 340 x 10 }
`,
      expect: { subject: 'strip', status: 'info', line: 8, column: 3 },
    },
  ],
}
