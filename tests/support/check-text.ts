import type { CheckOptions } from '../../shared/check-options.ts'
import { checkTemplate } from '../../shared/check-template.ts'
import type { FitReport, Report } from '../../shared/report/report.ts'
import { emptyWorkspace } from '../../shared/template/read-workspace.ts'

/** Checks a set that stands alone, and fails loudly where it cannot be read. */
export function checkText(text: string, options: Partial<CheckOptions> = {}): Report {
  const report = checkTemplate(text, emptyWorkspace(), { file: 'set.yaml', asOf: '2026-12-01', ...options })
  const [problem] = report.errors
  if (problem !== undefined)
    throw new Error(`${String(problem.at.line)}:${String(problem.at.column)} ${problem.message}; ${problem.hint}`)
  return report
}

/** A fit of a report by its name. */
export function fitOf(report: Report, id: string): FitReport {
  const fit = report.fits.find((candidate) => candidate.id === id)
  if (fit === undefined) throw new Error(`no fit ${id}`)
  return fit
}
