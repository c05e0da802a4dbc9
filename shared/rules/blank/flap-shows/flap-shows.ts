import type { Rule } from '../../rule.ts'
import { inSetUnits } from '../../wording.ts'
import { judgeFacts } from '../blank-facts.ts'

export const flapShowsRule: Rule = {
  id: 'blank/flap-shows',
  level: 'warn',
  title: 'Folded flaps stay behind the face',
  why: 'A flap that is longer than the pocket pokes out on the other side, where it catches and shows.',
  origin: { kind: 'derived', source: 'How far a folded flap lies beyond the outline of the pocket.' },
  remedy: 'Trim the flap, or choose a pocket less than twice as long as wide.',
  judge: (judged) =>
    judgeFacts(judged, ['flap-shows'], 'warn', (piece, fact) => ({
      pass: `The flaps of ${piece} stay behind its face.`,
      miss: `The ${fact.part} of ${piece} pokes out by ${inSetUnits(judged, fact.measured)} beyond the pocket. Trim it by that, or choose other corners.`,
    })),
}
