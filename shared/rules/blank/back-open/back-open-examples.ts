import type { RuleExamples } from '../../rule.ts'

export const backOpenExamples: RuleExamples = {
  rule: 'blank/back-open',
  passing: [
    {
      title: 'A back up to the throat',
      set: `foldgauge: 1
set: envelope
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  envelope: { kind: envelope, stock: text, style: square-flap, pocket: 156 x 112 }
`,
      expect: { subject: 'envelope', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A back and a seal flap that do not meet',
      set: `foldgauge: 1
set: envelope
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  envelope: { kind: envelope, stock: text, style: square-flap, pocket: 156 x 112, back: 50, flap: 40 }
`,
      expect: { subject: 'envelope', status: 'fail', line: 7, column: 3 },
    },
  ],
}
