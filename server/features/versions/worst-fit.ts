import type { z } from 'zod'
import type { worstFitShape } from '../../../shared/api/set-endpoints.ts'
import type { FitReport, Report } from '../../../shared/report/report.ts'

type WorstFit = z.output<typeof worstFitShape>

const order = { fail: 0, warn: 1, pass: 2 } as const

function summaryOf(fit: FitReport): WorstFit {
  const axis = fit.axes.toSorted(
    (a, b) => order[a.verdict] - order[b.verdict] || b.binds - a.binds || b.rattles - a.rattles,
  )[0]
  return {
    id: fit.id,
    axis: axis?.axis ?? null,
    closes: fit.closes,
    binds: axis?.binds ?? 0,
    rattles: axis?.rattles ?? 0,
    verdict: fit.verdict,
  }
}

/** The fit to look at first: by verdict, then by the share of builds that go together. */
export function worstFitOf(report: Report): WorstFit | null {
  const worst = report.fits.toSorted((a, b) => order[a.verdict] - order[b.verdict] || a.closes - b.closes)[0]
  return worst === undefined ? null : summaryOf(worst)
}
