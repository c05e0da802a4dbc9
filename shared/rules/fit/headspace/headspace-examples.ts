import type { RuleExamples } from '../../rule.ts'

export const headspaceExamples: RuleExamples = {
  rule: 'fit/headspace',
  passing: [
    {
      title: 'Nine cards in their envelopes',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 191 x 149, wall: 14 }
  card: { kind: card, stock: cover, folded: 148 x 105 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 156 x 112 }
fits:
  lid-on-base: { put: lid, over: base }
  pack-in-base: { put: envelope, holding: card, count: 9, in: base }
`,
      expect: { subject: 'lid-on-base:headspace', status: 'pass', line: 12, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Sixteen in the same box hold the lid up',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 191 x 149, wall: 14 }
  card: { kind: card, stock: cover, folded: 148 x 105 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 156 x 112 }
fits:
  lid-on-base: { put: lid, over: base }
  pack-in-base: { put: envelope, holding: card, count: 16, in: base }
`,
      expect: { subject: 'lid-on-base:headspace', status: 'fail', line: 12, column: 3 },
    },
    {
      title: 'One card alone moves about',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 191 x 149, wall: 14 }
  card: { kind: card, stock: cover, folded: 148 x 105 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 156 x 112 }
fits:
  lid-on-base: { put: lid, over: base }
  card-in-envelope: { put: card, in: envelope }
  one-in-base: { put: envelope, holding: card, in: base }
`,
      expect: { subject: 'lid-on-base:headspace', status: 'info', line: 12, column: 3 },
    },
  ],
}
