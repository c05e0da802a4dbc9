import type { Waiver } from '../../template/template-model.ts'

/** Name of a waiver: what it waives. */
export const waiverSubject = (waiver: Waiver): string =>
  waiver.subject === null ? waiver.rule : `${waiver.rule}#${waiver.subject}`

/** Days from one day to another, both YYYY-MM-DD; negative where the second comes first. */
export function daysBetween(from: string, to: string): number {
  const dayOf = (date: string): number => {
    const [year = 0, month = 1, day = 1] = date.split('-').map(Number)
    return Date.UTC(year, month - 1, day) / 86_400_000
  }
  return dayOf(to) - dayOf(from)
}
