import type { Rule } from '../../rule.ts'
import { judgeFacts } from '../blank-facts.ts'

export const backOpenRule: Rule = {
  id: 'blank/back-open',
  level: 'fail',
  title: 'The flaps close the back of the envelope',
  why: 'A gap between the flaps lets the letter show and slip out.',
  origin: { kind: 'derived', source: 'Area of the pocket that no folded flap covers.' },
  remedy: 'Cut a larger blank, or make the flaps longer.',
  judge: (judged) =>
    judgeFacts(judged, ['back-open'], 'fail', (piece, fact) => ({
      pass: `The flaps of ${piece} cover its back.`,
      miss: `The back of ${piece} stays open over ${fact.measured >= 100 ? `${(fact.measured / 100).toFixed(1)} cm²` : `${fact.measured.toFixed(1)} mm²`}. Cut a larger blank, or make the flaps longer.`,
    })),
}
