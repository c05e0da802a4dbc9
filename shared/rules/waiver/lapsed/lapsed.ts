import { isInForce } from '../../apply-rules.ts'
import type { Rule } from '../../rule.ts'
import { daysBetween, waiverSubject } from '../waived-verdicts.ts'

const days = (count: number): string => (count === 1 ? '1 day' : `${String(count)} days`)

export const lapsedRule: Rule = {
  id: 'waiver/lapsed',
  level: 'warn',
  title: 'Waivers are still in force',
  why: 'A waiver that nobody looks at again hides what it once excused. After its last day it counts no more, and says so.',
  origin: { kind: 'common practice', source: 'The last day the waiver names, against the day the set is judged on.' },
  remedy: 'Mend what was waived, or decide again and write a new last day with its reason.',
  judge: (judged) =>
    judged.set.waivers.map((waiver) => {
      const left = daysBetween(judged.options.asOf, waiver.until)
      const isHolding = isInForce(waiver, judged.options.asOf)
      return {
        subject: waiverSubject(waiver),
        severity: isHolding ? 'pass' : 'warn',
        measure: { actual: left, limit: 0, sense: 'at-least', unit: 'days' },
        message: isHolding
          ? `The waiver of ${waiverSubject(waiver)} holds through ${waiver.until}, ${left === 0 ? 'its last day' : `${days(left)} more`}.`
          : `The waiver of ${waiverSubject(waiver)} ended on ${waiver.until}, ${days(-left)} ago, and counts no more. Mend what it excused (“${waiver.reason}”), or decide again and write a new last day.`,
        path: ['waivers', waiver.index],
      }
    }),
}
