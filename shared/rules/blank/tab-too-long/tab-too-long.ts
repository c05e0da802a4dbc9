import type { Rule } from '../../rule.ts'
import { inSetUnits } from '../../wording.ts'
import { judgeFacts } from '../blank-facts.ts'

export const tabTooLongRule: Rule = {
  id: 'blank/tab-too-long',
  level: 'warn',
  title: 'Tabs stay within the wall they are glued to',
  why: 'A tab that is taller than its wall stands out over the rim, where it shows and catches the lid.',
  origin: {
    kind: 'derived',
    source: 'Depth of the walls that carry tabs against the shallowest wall they are glued to.',
  },
  remedy: 'Put the tabs on the shallower walls, or trim them.',
  judge: (judged) =>
    judgeFacts(judged, ['tab-too-long'], 'warn', (piece, fact) => {
      const tall = inSetUnits(judged, fact.measured)
      const wall = inSetUnits(judged, fact.limit)
      return {
        pass: `The tabs of ${piece} are ${tall} tall on walls of ${wall}.`,
        miss: `The tabs of ${piece} are ${tall} tall and the wall they are glued to is ${wall}: they stand out over the rim. Put the tabs on the shallower walls (tabs: { at: … }), or trim them by ${inSetUnits(judged, fact.measured - fact.limit)}.`,
      }
    }),
}
