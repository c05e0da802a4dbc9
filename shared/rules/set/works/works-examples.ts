import type { RuleExamples } from '../../rule.ts'

export const worksExamples: RuleExamples = {
  rule: 'set/works',
  passing: [
    {
      title: 'A card, an envelope and a box with room',
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
  pack-in-base: { put: envelope, holding: card, count: 6, in: base }
`,
      expect: { subject: 'notes-box', status: 'pass', line: 2, column: 1 },
    },
  ],
  failing: [
    {
      title: 'Length and width each pass, and together fail too often',
      set: `foldgauge: 1
set: tight-note
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 150.5 x 107.5 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'tight-note', status: 'warn', line: 2, column: 1 },
    },
  ],
}
