import type { Rule } from '../../rule.ts'
import { judgeFacts } from '../blank-facts.ts'

export const outlineRule: Rule = {
  id: 'blank/outline',
  level: 'fail',
  title: 'The outline of the blank can be cut',
  why: 'An outline that crosses itself, or a score that leaves the sheet, cannot be cut and folded, and a cutting machine follows it all the same.',
  origin: {
    kind: 'derived',
    source: 'Crossings of the cut lines of the drawn sheet, and points of its scores outside it.',
  },
  remedy: 'Put the corners in the order in which a knife would pass them, and end every score on the edge.',
  judge: (judged) =>
    judgeFacts(judged, ['outline', 'score-outside'], 'fail', (piece, fact) => ({
      pass: `The outline of ${piece} can be cut, and its scores lie on it.`,
      miss:
        fact.fact === 'outline'
          ? `The outline of ${fact.part} crosses itself in ${fact.measured === 1 ? 'one place' : `${String(fact.measured)} places`}. Put its corners in the order in which a knife would pass them.`
          : `${fact.measured === 1 ? 'A score' : `${String(fact.measured)} scores`} of ${fact.part} ${fact.measured === 1 ? 'leaves' : 'leave'} the sheet. End every score on the edge.`,
    })),
}
