import type { ReportProblem } from '../pieces/reading/report-problem.ts'
import type { Vocabulary } from '../pieces/reading/value-reader.ts'
import { checkMap } from './check-shape.ts'
import { isRawList, nameOfValue, type RawMap } from './raw-value.ts'
import { checkRule } from './read-tokens.ts'
import { waiverSpec } from './set-shape.ts'
import type { Waiver } from './template-model.ts'

const daysInMonth = (year: number, month: number): number => {
  const isLeap = (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0
  return [31, isLeap ? 29 : 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31][month - 1] ?? 0
}

/** Whether a text is a day of the calendar, written YYYY-MM-DD. */
export function isCalendarDate(text: string): boolean {
  const match = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text)
  if (match === null) return false
  const [year, month, day] = [Number(match[1]), Number(match[2]), Number(match[3])]
  return day >= 1 && day <= daysInMonth(year, month)
}

/** Reads the waivers of a set. */
export function readWaivers(
  data: RawMap,
  knownRules: readonly string[] | null,
  vocabulary: Vocabulary,
  report: ReportProblem,
): readonly Waiver[] {
  const list = data.waivers
  if (list === undefined) return []
  if (!isRawList(list)) {
    if (list === null)
      report(
        ['waivers'],
        'empty-value',
        'Nothing is written below “waivers”.',
        'Write a list of waivers, or take the key out.',
        'key',
      )
    else
      report(
        ['waivers'],
        'wrong-type',
        `“waivers” takes a list, not ${nameOfValue(list)}.`,
        'Begin each waiver with “- ”.',
        'value',
      )
    return []
  }
  return list.flatMap((raw, index) => {
    const path = ['waivers', index]
    const written = checkMap(waiverSpec, raw, path, 'a waiver', report)
    if (written === null) return []
    checkRule(written.rule, [...path, 'rule'], 'value', knownRules, vocabulary.nearest, report)
    if (written.reason.trim() === '') {
      report(
        [...path, 'reason'],
        'empty-value',
        'The waiver gives no reason.',
        'Write why the verdict may stand.',
        'value',
      )
    }
    if (!isCalendarDate(written.until)) {
      report(
        [...path, 'until'],
        'not-a-date',
        `“${written.until.slice(0, 40)}” is no day of the calendar.`,
        'Write the last day it holds as year, month and day, such as “2027-03-31”.',
        'value',
      )
    }
    return [
      { rule: written.rule, subject: written.subject ?? null, reason: written.reason, until: written.until, index },
    ]
  })
}
