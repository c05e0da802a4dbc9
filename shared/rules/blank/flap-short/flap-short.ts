import type { Rule } from '../../rule.ts'
import { inSetUnits } from '../../wording.ts'
import { judgeFacts } from '../blank-facts.ts'

export const flapShortRule: Rule = {
  id: 'blank/flap-short',
  level: 'fail',
  title: 'Flaps reach what they are glued to',
  why: 'A flap that ends short of the paper below it has nothing to stick to, and the envelope stays open.',
  origin: { kind: 'derived', source: 'Reach of the folded flap past the edge of what it is glued to.' },
  remedy: 'Cut a larger blank, or make the flap longer.',
  judge: (judged) =>
    judgeFacts(judged, ['flap-short'], 'fail', (piece, fact) => ({
      pass: `The ${fact.part} of ${piece} reaches its glue by ${inSetUnits(judged, fact.measured)}.`,
      miss: `The ${fact.part} of ${piece} ends ${inSetUnits(judged, Math.abs(fact.measured))} short of what it is glued to. Make it longer by that and a seam, or cut a larger blank.`,
    })),
}
