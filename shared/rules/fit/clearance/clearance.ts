import type { JudgedAxis } from '../../../assembly/judge-axis.ts'
import type { JudgedFit } from '../../../assembly/judge-fit.ts'
import type { JudgedSet } from '../../../assembly/judge-set.ts'
import type { Finding, Rule } from '../../rule.ts'
import { acrossInWords, inSetUnits, madeBy, outOfHundred, putInWords } from '../../wording.ts'

const preposition = { in: 'in', over: 'over', around: 'around' } as const

function bindingMessage(judged: JudgedSet, fit: JudgedFit, axis: JudgedAxis): string {
  const { floor, target } = judged.set.tokens
  const need = inSetUnits(judged, axis.clearance.requirement.band.min ?? 0)
  const has = inSetUnits(judged, axis.clearance.clearance.nominal)
  const allowed = outOfHundred(1 - target)
  const thing = `${putInWords(fit)} binds ${preposition[fit.fit.relation]} ${fit.fit.to} ${acrossInWords(axis.clearance.axis)}`
  const share = `${outOfHundred(axis.binds)} of 100 ${madeBy(judged, fit)} ones would have less than ${need} (${allowed} allowed; as drawn it has ${has})`
  if (axis.restsOnGive) {
    const give = fit.clearances.fitCase === 'lid' ? 'its walls lean enough for it to be pushed on' : `it goes in snug, bowed ${inSetUnits(judged, fit.give?.bow ?? 0)}`
    return `${thing}: ${share}; ${give}`
  }
  return axis.binds > 1 - floor ? `${thing}: ${share}` : `${thing} now and then: ${share}`
}

function rattlingMessage(judged: JudgedSet, fit: JudgedFit, axis: JudgedAxis): string {
  const most = inSetUnits(judged, axis.clearance.requirement.band.max ?? 0)
  const has = inSetUnits(judged, axis.clearance.clearance.nominal)
  return `${putInWords(fit)} rattles ${preposition[fit.fit.relation]} ${fit.fit.to} ${acrossInWords(axis.clearance.axis)}: ${outOfHundred(axis.rattles)} of 100 ${madeBy(judged, fit)} ones would have more than ${most} (as drawn it has ${has})`
}

function judgeAxisOf(judged: JudgedSet, fit: JudgedFit, axis: JudgedAxis): Finding {
  const { target } = judged.set.tokens
  const isBinding = 1 - axis.binds < target
  const isRattling = 1 - axis.rattles < target
  const { band } = axis.clearance.requirement
  const message = isBinding
    ? bindingMessage(judged, fit, axis)
    : isRattling
      ? rattlingMessage(judged, fit, axis)
      : `${putInWords(fit)} has ${inSetUnits(judged, axis.clearance.clearance.nominal)} ${preposition[fit.fit.relation]} ${fit.fit.to} ${acrossInWords(axis.clearance.axis)}: ${outOfHundred(1 - axis.binds)} of 100 ${madeBy(judged, fit)} ones fit`
  return {
    subject: `${fit.fit.id}:${axis.clearance.axis}`,
    severity: axis.verdict,
    measure: { actual: isRattling && !isBinding ? 1 - axis.rattles : 1 - axis.binds, limit: band.min === null && band.max === null ? 0 : target, sense: 'at-least', unit: 'share' },
    message,
    path: ['fits', fit.fit.id],
  }
}

export const clearanceRule: Rule = {
  id: 'fit/clearance',
  level: 'fail',
  title: 'A piece goes into, over or around the other',
  why: 'Strangers cut and score the pieces. If too many of their builds bind, paper and patience are wasted after the template is out.',
  origin: { kind: 'derived', source: 'Clearance is the outer piece\'s inside less the inner piece\'s outside, spread by every named source of error; the required bands are published or common practice and stand with the defaults.' },
  remedy: 'Move one score or cut size by a ruler mark, or use thinner paper; the report names the smallest change that passes.',
  judge: (judged) =>
    judged.fits.flatMap((fit) =>
      fit.axes
        .filter((axis) => axis.clearance.axis !== 'headspace' && axis.clearance.axis !== 'overlap')
        .map((axis) => judgeAxisOf(judged, fit, axis)),
    ),
}
