import type { Verdict } from '../../../report/report.ts'
import type { Waiver } from '../../../template/template-model.ts'
import { waives } from '../../apply-rules.ts'
import type { Rule } from '../../rule.ts'
import { waiverSubject } from '../waived-verdicts.ts'

/** Whether a waiver excuses a verdict, or would if it had not ended. */
const excuses = (waiver: Waiver, before: readonly Verdict[]): boolean =>
  before.some(
    (verdict) =>
      (verdict.status === 'waived' || verdict.status === 'warn' || verdict.status === 'fail') &&
      waives(waiver, verdict.rule, verdict.subject),
  )

export const unusedRule: Rule = {
  id: 'waiver/unused',
  level: 'info',
  title: 'Waivers excuse something',
  why: 'A waiver left behind when its cause was mended will one day hide a new fault under an old reason.',
  origin: { kind: 'common practice', source: 'The verdicts of the other rules.' },
  remedy: 'Take the waiver out.',
  judge: (judged, before) =>
    judged.set.waivers.map((waiver) => {
      const isUsed = excuses(waiver, before)
      return {
        subject: waiverSubject(waiver),
        severity: isUsed ? 'pass' : 'info',
        measure: null,
        message: isUsed
          ? `The waiver of ${waiverSubject(waiver)} excuses a verdict.`
          : `The waiver of ${waiverSubject(waiver)} excuses nothing: no verdict of ${waiver.rule}${waiver.subject === null ? '' : ` on ${waiver.subject}`} warns or fails. Take it out.`,
        path: ['waivers', waiver.index],
      }
    }),
}
