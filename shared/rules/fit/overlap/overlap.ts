import type { JudgedAxis } from '../../../assembly/judge-axis.ts'
import type { JudgedFit } from '../../../assembly/judge-fit.ts'
import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { Finding, Rule } from '../../rule.ts'
import { inSetUnits, madeBy, outOfHundred, putInWords } from '../../wording.ts'
import { judgeAxes, missOf, needInWords, sharesInWords } from '../axis-wording.ts'

function judgeOverlap(judged: JudgedSet, fit: JudgedFit, axis: JudgedAxis): Pick<Finding, 'severity' | 'message'> {
  const miss = missOf(judged, axis)
  const thing = `${putInWords(fit)} around ${fit.fit.to}`
  const isTied = fit.clearances.fitCase === 'ribbon-bow' || fit.clearances.fitCase === 'ribbon-knot'
  const what = isTied ? `to tie a ${fit.clearances.fitCase === 'ribbon-bow' ? 'bow' : 'knot'}` : 'to lap'
  if (miss === 'binds') {
    const short = axis.verdict === 'fail' ? 'does not close' : `is short of length ${what}`
    return {
      severity: axis.verdict,
      message: `${thing} ${short}: ${sharesInWords(judged, fit, axis, miss, what)}. ${needInWords(judged, axis, miss)}.`,
    }
  }
  if (miss === 'rattles')
    return {
      severity: axis.verdict,
      message: `${thing} laps too far: ${sharesInWords(judged, fit, axis, miss, what)}. ${needInWords(judged, axis, miss)}.`,
    }
  const has = inSetUnits(judged, axis.clearance.clearance.nominal)
  const goes = `${outOfHundred(1 - axis.binds)} of 100 ${madeBy(judged, fit)} ones have enough`
  return { severity: 'pass', message: `${thing} has ${has} ${what}: ${goes}.` }
}

export const overlapRule: Rule = {
  id: 'fit/overlap',
  level: 'fail',
  title: 'A band closes and a ribbon can be tied',
  why: 'Rules of thumb for bands leave out how thick the thing is: twice the width and an inch closes round one card and not round twelve.',
  origin: {
    kind: 'common practice',
    source:
      'Strip less a tight wrap of 2(w + h) + πt (derived). Ten millimetres of lap are common practice; what a knot or a bow takes is a guess.',
  },
  remedy: 'Cut the strip longer, or leave its length out and let it be reckoned from what it goes round.',
  judge: (judged) => judgeAxes(judged, ['overlap'], (fit, axis) => judgeOverlap(judged, fit, axis)),
}
