import type { JudgedAxis } from '../../../assembly/judge-axis.ts'
import type { JudgedFit } from '../../../assembly/judge-fit.ts'
import type { JudgedSet } from '../../../assembly/judge-set.ts'
import { modelDefaults } from '../../../pieces/model-defaults.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits, listInWords, madeBy, outOfHundred, putInWords } from '../../wording.ts'
import { judgeAxes, missOf, needInWords, sharesInWords } from '../axis-wording.ts'

/** What lies in a box, in the author's nouns. */
const contentsOf = (judged: JudgedSet, box: string): string =>
  listInWords(judged.fits.filter((fit) => fit.fit.relation === 'in' && fit.fit.to === box).map(putInWords))

function judgeHeadspace(judged: JudgedSet, fit: JudgedFit, axis: JudgedAxis): Pick<Finding, 'severity' | 'message'> {
  const miss = missOf(judged, axis)
  const contents = contentsOf(judged, fit.fit.to)
  const lid = putInWords(fit)
  if (miss === 'binds')
    return {
      severity: axis.verdict,
      message: `${contents} in ${fit.fit.to} holds ${lid} up: ${sharesInWords(judged, fit, axis, miss, 'of headspace')}. ${needInWords(judged, axis, miss)}.`,
    }
  if (miss === 'rattles')
    return {
      severity: axis.verdict,
      message: `${contents} moves under ${lid}: ${sharesInWords(judged, fit, axis, miss, 'of headspace')}. ${needInWords(judged, axis, miss)}.`,
    }
  const has = inSetUnits(judged, axis.clearance.clearance.nominal)
  const closes = `${outOfHundred(1 - axis.binds)} of 100 ${madeBy(judged, fit)} ones close`
  const most = modelDefaults.headspaceInformation.value
  if (axis.clearance.clearance.nominal > most)
    return {
      severity: 'info',
      message: `${contents} moves in ${fit.fit.to}: ${has} of headspace under ${lid}, more than ${inSetUnits(judged, most)} (${closes}).`,
    }
  return { severity: 'pass', message: `${contents} leaves ${has} of headspace under ${lid}: ${closes}.` }
}

export const headspaceRule: Rule = {
  id: 'fit/headspace',
  level: 'fail',
  title: 'What is in the box lets the lid close',
  why: 'A pack springs up and varies more in height than in the plane. Where it holds the lid up, the box gapes; where it has far too much room, it slides about.',
  origin: {
    kind: 'common practice',
    source:
      'Seated height of the lid less the floor and the contents (derived); what is required is common practice, and the loft of a hand-pressed pack is a guess.',
  },
  remedy:
    'Score the walls deeper, put in fewer, or use thinner paper; where the contents move, score shallower or add a card below.',
  judge: (judged) => judgeAxes(judged, ['headspace'], (fit, axis) => judgeHeadspace(judged, fit, axis)),
}
