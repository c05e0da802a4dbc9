import type { RuleExamples } from '../../rule.ts'

export const dependsOnCareExamples: RuleExamples = {
  rule: 'set/depends-on-care',
  passing: [
    {
      title: 'A roomy envelope',
      set: `foldgauge: 1
set: plain-card
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  card: { kind: card, stock: cover, folded: 148 x 105 }
  envelope: { kind: envelope, style: baronial, stock: text, pocket: 156 x 112 }
fits:
  card-in-envelope: { put: card, in: envelope }
`,
      expect: { subject: 'card-in-envelope', status: 'pass', line: 10, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A lid for careful hands',
      set: `foldgauge: 1
set: notes-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 189.9 x 148, wall: 14 }
fits:
  lid-on-base: { put: lid, over: base }
`,
      expect: { subject: 'lid-on-base', status: 'info', line: 10, column: 3 },
    },
  ],
}
