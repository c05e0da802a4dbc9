import type { Report } from '../../shared/report/report.ts'
import { UsageError } from '../io.ts'

const isMap = (value: unknown): boolean => typeof value === 'object' && value !== null && !Array.isArray(value)

const isListOfMaps = (value: unknown): boolean => Array.isArray(value) && value.every(isMap)

const looksLikeReport = (value: unknown): value is Report =>
  typeof value === 'object' &&
  value !== null &&
  'format' in value &&
  'set' in value &&
  typeof value.set === 'string' &&
  'verdicts' in value &&
  isListOfMaps(value.verdicts) &&
  'fits' in value &&
  isListOfMaps(value.fits) &&
  'pieces' in value &&
  isMap(value.pieces) &&
  Object.values(value.pieces as Readonly<Record<string, unknown>>).every(isMap) &&
  'summary' in value &&
  isMap(value.summary)

/** Reports from a file that `check --report json` wrote: one object or an array. @throws UsageError */
export function readReports(text: string, shown: string): readonly Report[] {
  let value: unknown
  try {
    value = JSON.parse(text)
  } catch {
    throw new UsageError(`${shown} is not JSON`, 'A report is what foldgauge check --report json writes.')
  }
  const reports = Array.isArray(value) ? value : [value]
  for (const report of reports) {
    if (!looksLikeReport(report))
      throw new UsageError(
        `${shown} is not a Foldgauge report`,
        'A report is what foldgauge check --report json writes.',
      )
    if (report.format !== 'foldgauge-report/1')
      throw new UsageError(
        `${shown} is a report of format ${String(report.format)}`,
        'This edition reads foldgauge-report/1; check the set again.',
      )
  }
  return reports as readonly Report[]
}
