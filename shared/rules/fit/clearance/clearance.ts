import type { JudgedAxis } from '../../../assembly/judge-axis.ts'
import type { JudgedFit } from '../../../assembly/judge-fit.ts'
import type { JudgedSet } from '../../../assembly/judge-set.ts'
import { modelDefaults } from '../../../pieces/model-defaults.ts'
import type { Finding, Rule } from '../../rule.ts'
import { acrossInWords, fitInWords, inSetUnits, madeBy, outOfHundred } from '../../wording.ts'
import { judgeAxes, missOf, needInWords, sharesInWords } from '../axis-wording.ts'

/** `lid binds on base across the width` */
const thing = (fit: JudgedFit, axis: JudgedAxis, does: string): string =>
  `${fitInWords(fit, does)} ${acrossInWords(axis.clearance.axis)}`

function giveInWords(judged: JudgedSet, fit: JudgedFit, axis: JudgedAxis): string {
  if (!axis.restsOnGive) return ''
  return fit.clearances.fitCase === 'lid'
    ? '. It can be pushed on, because its walls lean'
    : `. It goes in snug, bowed by about ${inSetUnits(judged, fit.give?.bow ?? 0)}`
}

function judgeAxisOf(judged: JudgedSet, fit: JudgedFit, axis: JudgedAxis): Pick<Finding, 'severity' | 'message'> {
  const miss = missOf(judged, axis)
  if (miss === 'binds') {
    const often = 1 - axis.binds < judged.set.tokens.floor ? '' : ' now and then'
    const what = `${thing(fit, axis, 'binds')}${often}: ${sharesInWords(judged, fit, axis, miss, 'of room')}`
    return {
      severity: axis.verdict,
      message: `${what}${giveInWords(judged, fit, axis)}. ${needInWords(judged, axis, miss)}.`,
    }
  }
  if (miss === 'rattles') {
    const what = `${thing(fit, axis, 'rattles')}: ${sharesInWords(judged, fit, axis, miss, 'of room')}`
    return { severity: axis.verdict, message: `${what}. ${needInWords(judged, axis, miss)}.` }
  }
  const has = inSetUnits(judged, axis.clearance.clearance.nominal)
  const fits = `${outOfHundred(1 - axis.binds)} of 100 ${madeBy(judged, fit)} ones fit`
  const loose = modelDefaults.lidLoose.value
  if (fit.clearances.fitCase === 'lid' && axis.clearance.clearance.nominal > loose)
    return {
      severity: 'info',
      message: `${thing(fit, axis, 'is loose')}: as drawn there is ${has}, and from ${inSetUnits(judged, loose)} a lid is called loose (${fits}).`,
    }
  return { severity: 'pass', message: `${thing(fit, axis, `has ${has}`)}: ${fits}.` }
}

export const clearanceRule: Rule = {
  id: 'fit/clearance',
  level: 'fail',
  title: 'A piece goes into, over or around the other',
  why: 'Strangers cut and score the pieces. If too many of their builds bind, paper and patience are wasted after the template is out.',
  origin: {
    kind: 'derived',
    source:
      "Clearance is the outer piece's inside less the inner piece's outside, spread by every named source of error; the required bands are published or common practice and stand with the defaults.",
  },
  remedy:
    'Move one score or cut size by a ruler mark, or use thinner paper; the report names the smallest change that passes.',
  judge: (judged) => judgeAxes(judged, ['length', 'width', 'depth'], (fit, axis) => judgeAxisOf(judged, fit, axis)),
}
