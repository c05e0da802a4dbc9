import type { RuleExamples } from '../../rule.ts'

export const openingExamples: RuleExamples = {
  rule: 'fit/opening',
  passing: [
    {
      title: 'A lid that shows six millimetres of the base',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 191 x 149, wall: 14 }
fits:
  lid-on-base: { put: lid, over: base }
`,
      expect: { subject: 'lid-on-base', status: 'pass', line: 10, column: 3 },
    },
    {
      title: 'A full lid with a thumb notch',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 203 x 161, wall: 20, thumb-notch: true }
fits:
  lid-on-base: { put: lid, over: base }
`,
      expect: { subject: 'lid-on-base', status: 'pass', line: 10, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A lid that reaches the table',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 203 x 161, wall: 20 }
fits:
  lid-on-base: { put: lid, over: base }
`,
      expect: { subject: 'lid-on-base', status: 'warn', line: 10, column: 3 },
    },
  ],
}
