import type { RuleExamples } from '../../rule.ts'

export const clearanceExamples: RuleExamples = {
  rule: 'fit/clearance',
  passing: [
    {
      title: 'A lid with room on its base',
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
      expect: { subject: 'lid-on-base:width', status: 'pass', line: 10, column: 3 },
    },
  ],
  failing: [
    {
      title: 'The same lid scored two millimetres deeper',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 191 x 149, wall: 16 }
fits:
  lid-on-base: { put: lid, over: base }
`,
      expect: { subject: 'lid-on-base:width', status: 'fail', line: 10, column: 3 },
    },
    {
      title: 'A lid that is only loose',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 193 x 151, wall: 14 }
fits:
  lid-on-base: { put: lid, over: base }
`,
      expect: { subject: 'lid-on-base:length', status: 'info', line: 10, column: 3 },
    },
    {
      title: 'A card and an envelope as a chart on the open web pairs them',
      set: `foldgauge: 1
set: wide-card
units: in
stocks:
  cover: { weight: 100 lb cover, caliper: 12 pt }
pieces:
  card: { kind: card, stock: cover, folded: 6 1/2 x 4 7/8 }
  envelope: { kind: bought, outside: us-a6-envelope, thickness: 5 pt }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card-in-envelope:width', status: 'fail', line: 10, column: 3 },
    },
  ],
}
