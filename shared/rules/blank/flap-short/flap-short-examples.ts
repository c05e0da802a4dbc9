import type { RuleExamples } from '../../rule.ts'

export const flapShortExamples: RuleExamples = {
  rule: 'blank/flap-short',
  passing: [
    {
      title: 'Corners that leave twelve millimetres of seam',
      set: `foldgauge: 1
set: envelope
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  envelope: { kind: envelope, stock: text, style: baronial, pocket: 156 x 112, seam: 12 }
`,
      expect: { subject: 'envelope', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A square too small for its pocket',
      set: `foldgauge: 1
set: envelope
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  envelope: { kind: envelope, stock: text, style: baronial, blank: 180 x 180, corners: { sides: 80, bottom: 90, flap: 90 } }
`,
      expect: { subject: 'envelope', status: 'fail', line: 7, column: 3 },
    },
  ],
}
