import type { RuleExamples } from '../../rule.ts'

export const seamNarrowExamples: RuleExamples = {
  rule: 'blank/seam-narrow',
  passing: [
    {
      title: 'Twelve millimetres of seam',
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
      title: 'Four millimetres of seam',
      set: `foldgauge: 1
set: envelope
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm, grain: long }
  text: { grammage: 120 gsm, caliper: 0.15 mm, grain: long }
pieces:
  envelope: { kind: envelope, stock: text, style: baronial, pocket: 156 x 112, seam: 4 }
`,
      expect: { subject: 'envelope', status: 'warn', line: 7, column: 3 },
    },
  ],
}
