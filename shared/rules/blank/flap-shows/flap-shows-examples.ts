import type { RuleExamples } from '../../rule.ts'

export const flapShowsExamples: RuleExamples = {
  rule: 'blank/flap-shows',
  passing: [
    {
      title: 'A pocket less than twice as long as wide',
      set: `foldgauge: 1
set: envelope
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  envelope: { kind: envelope, stock: text, style: baronial, pocket: 156 x 112 }
`,
      expect: { subject: 'envelope', status: 'pass', line: 7, column: 3 },
    },
  ],
  failing: [
    {
      title: 'A pocket more than twice as long as wide',
      set: `foldgauge: 1
set: envelope
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  envelope: { kind: envelope, stock: text, style: baronial, pocket: 220 x 100 }
`,
      expect: { subject: 'envelope', status: 'warn', line: 7, column: 3 },
    },
  ],
}
