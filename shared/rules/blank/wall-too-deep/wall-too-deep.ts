import type { Rule } from '../../rule.ts'
import { inSetUnits } from '../../wording.ts'
import { judgeFacts } from '../blank-facts.ts'

export const wallTooDeepRule: Rule = {
  id: 'blank/wall-too-deep',
  level: 'fail',
  title: 'The walls leave a bottom',
  why: 'Two walls scored deeper than half the blank leave nothing between them.',
  origin: { kind: 'derived', source: 'Blank less the two walls that face each other.' },
  remedy: 'Score the walls shallower or cut a larger blank.',
  judge: (judged) =>
    judgeFacts(judged, ['wall-too-deep'], 'fail', (piece, fact) => {
      const both = inSetUnits(judged, fact.measured)
      const blank = inSetUnits(judged, fact.limit)
      return {
        pass: `The ${fact.part} of ${piece} take ${both} of ${blank}.`,
        miss: `The ${fact.part} of ${piece} take ${both} and the blank has ${blank}: no bottom is left. Score them shallower than ${inSetUnits(judged, fact.limit / 2)}, or cut a larger blank.`,
      }
    }),
}
