import type { RuleExamples } from '../../rule.ts'

export const offFamilySizeExamples: RuleExamples = {
  rule: 'set/off-family-size',
  passing: [
    {
      title: 'A size of the family',
      workspace: `foldgauge: 1
title: Quillfern paper goods
sizes:
  note: 148 x 105
  square: 140 x 140
families:
  orchard: { title: Orchard, mark: pear, sizes: [note, square] }
`,
      set: `set: orchard-note
family: orchard
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm }
pieces:
  card: { kind: card, stock: cover, folded: note }
`,
      expect: { subject: 'card', status: 'pass', line: 6, column: 3 },
    },
  ],
  failing: [
    {
      title: 'Two millimetres off the family',
      workspace: `foldgauge: 1
title: Quillfern paper goods
sizes:
  note: 148 x 105
  square: 140 x 140
families:
  orchard: { title: Orchard, mark: pear, sizes: [note, square] }
`,
      set: `set: orchard-note
family: orchard
stocks:
  cover: { grammage: 270 gsm, caliper: 0.32 mm }
pieces:
  card: { kind: card, stock: cover, folded: 150 x 105 }
`,
      expect: { subject: 'card', status: 'warn', line: 6, column: 3 },
    },
  ],
}
