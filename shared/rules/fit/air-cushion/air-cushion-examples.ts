import type { RuleExamples } from '../../rule.ts'

export const airCushionExamples: RuleExamples = {
  rule: 'fit/air-cushion',
  passing: [
    {
      title: 'A shallow lid',
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
  ],
  failing: [
    {
      title: 'A deep lid with a narrow gap',
      set: `foldgauge: 1
set: tall-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
sheet: a3
pieces:
  base: { kind: box, stock: cover, blank: 280 x 238, wall: 60 }
  lid: { kind: lid, stock: cover, blank: 261.6 x 220.2, wall: 50 }
fits:
  lid-on-base: { put: lid, over: base }
`,
      expect: { subject: 'lid-on-base', status: 'info', line: 11, column: 3 },
    },
  ],
}
