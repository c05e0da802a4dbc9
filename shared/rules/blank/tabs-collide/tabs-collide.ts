import type { Rule } from '../../rule.ts'
import { inSetUnits } from '../../wording.ts'
import { judgeFacts } from '../blank-facts.ts'

export const tabsCollideRule: Rule = {
  id: 'blank/tabs-collide',
  level: 'fail',
  title: 'Two tabs on one wall leave each other room',
  why: 'Tabs that meet on a wall lie on one another, add a layer there and keep the corner from closing.',
  origin: { kind: 'derived', source: 'Reach of the two tabs glued to one wall against the room between the corners.' },
  remedy: 'Trim the tabs, score the walls they are part of shallower, or put the tabs on the other pair of walls.',
  judge: (judged) =>
    judgeFacts(judged, ['tabs-collide'], 'fail', (piece, fact) => {
      const reach = inSetUnits(judged, fact.measured)
      const room = inSetUnits(judged, fact.limit)
      return {
        pass: `The tabs on ${fact.part} of ${piece} reach ${reach} of ${room}.`,
        miss: `The two tabs on ${fact.part} of ${piece} reach ${reach} together and have ${room}: they lie on one another. Trim each by ${inSetUnits(judged, (fact.measured - fact.limit) / 2)}, or put the tabs on the other walls (tabs: { at: … }).`,
      }
    }),
}
