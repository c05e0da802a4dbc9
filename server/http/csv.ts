type Cell = string | number | boolean | null | undefined

/** Cells that begin so would be run as formulas by spreadsheets. */
const isFormula = (text: string): boolean => /^[=+\-@\t\r]/.test(text)

function cell(value: Cell): string {
  if (value === null || value === undefined) return ''
  if (typeof value === 'number' || typeof value === 'boolean') return String(value)
  const safe = isFormula(value) ? `'${value}` : value
  return /[",\n\r;]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
}

/** CSV as spreadsheets read it: comma, quotes, CR LF. */
export const writeCsv = (titles: readonly string[], rows: readonly (readonly Cell[])[]): string =>
  [titles, ...rows].map((row) => row.map(cell).join(',')).join('\r\n') + '\r\n'
