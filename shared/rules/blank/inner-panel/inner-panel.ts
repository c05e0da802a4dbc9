import type { Rule } from '../../rule.ts'
import { inSetUnits } from '../../wording.ts'
import { judgeFacts } from '../blank-facts.ts'

export const innerPanelRule: Rule = {
  id: 'blank/inner-panel',
  level: 'fail',
  title: 'Panels that fold in are short enough',
  why: 'A panel rolled into another one buckles or creases itself where it is as long as the one it lies in.',
  origin: {
    kind: 'derived',
    source:
      'Each panel (π/2)t shorter than the one it lies in (derived), and a fold error of 1/64 in more; printers usually take 1/32 to 1/8 in.',
  },
  remedy: 'Make each inner panel shorter by a mark.',
  judge: (judged) =>
    judgeFacts(judged, ['inner-panel'], 'fail', (piece, fact) => {
      const less = inSetUnits(judged, fact.measured)
      const need = inSetUnits(judged, fact.limit)
      return {
        pass: `${fact.part} of ${piece} is ${less} shorter than the one it lies in, and needs ${need}.`,
        miss: `${fact.part} of ${piece} is ${less} shorter than the one it lies in and needs ${need}: it jams when it is rolled in. Make it ${inSetUnits(judged, fact.limit - fact.measured)} shorter.`,
      }
    }),
}
