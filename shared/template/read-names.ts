import type { Path, ReportProblem } from '../pieces/reading/report-problem.ts'

/** Lower-case words joined by hyphens; digits may stand in them, but a name is no number. */
const namePattern = /^(?=.*[a-z])[a-z0-9]+(-[a-z0-9]+)*$/
const longestName = 60

/** The same for editors. */
export const namePatternText = `^(?=.{1,${String(longestName)}}$)(?=.*[a-z])[a-z0-9]+(-[a-z0-9]+)*$`

export const isName = (text: string): boolean => text.length <= longestName && namePattern.test(text)

/** Nearest text that is a name: what to write instead. */
function asName(text: string): string | null {
  const name = text
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, longestName)
    .replace(/^-+|-+$/g, '')
  return isName(name) ? name : null
}

/** Reports a name that is none. Names are identities: comparisons match by them, so they are kept to one spelling. */
export function checkName(name: string, path: Path, side: 'key' | 'value', report: ReportProblem): boolean {
  if (isName(name)) return true
  const suggestion = asName(name)
  const shown = name.length > 40 ? `${name.slice(0, 39)}…` : name
  report(
    path,
    'bad-name',
    name.length > longestName ? `“${shown}” is ${String(name.length)} characters long.` : `“${shown}” is not a name.`,
    `Names are lower-case words joined by hyphens, at most ${String(longestName)} characters${suggestion === null ? '' : `, such as “${suggestion}”`}.`,
    side,
  )
  return false
}
