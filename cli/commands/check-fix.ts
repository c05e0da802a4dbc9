import { checkTemplate } from '../../shared/check-template.ts'
import type { CheckOptions } from '../../shared/check-options.ts'
import type { Fix, Report } from '../../shared/report/report.ts'
import { replaceValueAt } from '../../shared/template/edit-text.ts'
import type { SetInput } from '../inputs/find-sets.ts'
import { writeWhole } from '../inputs/write-file.ts'
import type { Io } from '../io.ts'

/** More changes than this to one set mean that it needs an author, not a remedy. */
const mostChanges = 12

const firstFix = (report: Report): Fix | null =>
  report.verdicts
    .filter((verdict) => verdict.fix !== null && verdict.fix.path[0] === 'pieces')
    .toSorted((a, b) => Number(b.status === 'fail') - Number(a.status === 'fail'))[0]?.fix ?? null

/** Applies the reported smallest changes one after the other, each judged anew; the file is written once, whole. */
export function applyFixes(io: Io, input: SetInput, options: Omit<CheckOptions, 'file'>): SetInput {
  let text = input.text
  const made: string[] = []
  for (let change = 0; change < mostChanges; change += 1) {
    const report = checkTemplate(text, input.found.workspace, { ...options, file: input.file, fixes: true })
    const fix = firstFix(report)
    const next = fix === null ? null : replaceValueAt(text, fix.path, fix.to)
    if (fix === null || next === null || next === text) break
    text = next
    made.push(`${fix.path.join('.')}: ${fix.from.trim()} → ${fix.to}`)
  }
  if (made.length === 0) return input
  if (input.path !== null) writeWhole(input.path, text)
  io.err(`${input.file}: changed ${made.join('; ')}\n`)
  return { ...input, text }
}
