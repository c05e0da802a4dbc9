import type { RuleExamples } from '../../rule.ts'

export const overlapExamples: RuleExamples = {
  rule: 'fit/overlap',
  passing: [
    {
      title: 'A band reckoned from the closed box',
      set: `foldgauge: 1
set: banded-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 191 x 149, wall: 14 }
  band: { kind: band, stock: text, around: lid, width: 40, overlap: 20 }
fits:
  lid-on-base: { put: lid, over: base }
  band-on-box: { put: band, around: lid }
`,
      expect: { subject: 'band-on-box:overlap', status: 'pass', line: 12, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Twice the width and an inch, which forgets the height',
      set: `foldgauge: 1
set: banded-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 191 x 149, wall: 14 }
  band: { kind: band, stock: text, around: lid, blank: 264 x 40 }
fits:
  lid-on-base: { put: lid, over: base }
  band-on-box: { put: band, around: lid }
`,
      expect: { subject: 'band-on-box:overlap', status: 'fail', line: 12, column: 3 },
    },
    {
      title: 'A ribbon too short for a bow',
      set: `foldgauge: 1
set: tied-box
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  base: { kind: box, stock: cover, blank: 200 x 158, wall: 20 }
  lid: { kind: lid, stock: cover, blank: 191 x 149, wall: 14 }
  ribbon: { kind: band, ribbon: true, around: lid, length: 600, tie: bow, width: 10 }
fits:
  lid-on-base: { put: lid, over: base }
  ribbon-on-box: { put: ribbon, around: lid }
`,
      expect: { subject: 'ribbon-on-box:overlap', status: 'warn', line: 12, column: 3 },
    },
  ],
}
