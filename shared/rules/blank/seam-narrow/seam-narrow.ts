import type { Rule } from '../../rule.ts'
import { inSetUnits } from '../../wording.ts'
import { judgeFacts } from '../blank-facts.ts'

export const seamNarrowRule: Rule = {
  id: 'blank/seam-narrow',
  level: 'warn',
  title: 'Glued seams are wide enough to hold',
  why: 'Narrow seams come apart in the post, and glue creeps out of them into the pocket.',
  origin: {
    kind: 'common practice',
    source: 'Six millimetres or a quarter of an inch is the narrowest seam people trust.',
  },
  remedy: 'Give the seam 6 mm or more; for a pointed-flap envelope that takes a larger square.',
  judge: (judged) =>
    judgeFacts(judged, ['seam-narrow'], 'warn', (piece, fact) => {
      const wide = inSetUnits(judged, fact.measured)
      const least = inSetUnits(judged, fact.limit)
      return {
        pass: `The ${fact.part} of ${piece}: ${wide} to glue, at least ${least} wanted.`,
        miss: `The ${fact.part} of ${piece}: ${wide} to glue, and less than ${least} comes apart. Give it ${inSetUnits(judged, fact.limit - fact.measured)} more.`,
      }
    }),
}
