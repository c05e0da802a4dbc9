/** Lets the browser save a text as a file. */
export function saveText(name: string, text: string, type = 'text/csv'): void {
  const address = URL.createObjectURL(new Blob([text], { type }))
  const link = document.createElement('a')
  link.href = address
  link.download = name
  link.click()
  URL.revokeObjectURL(address)
}

type Cell = string | number | boolean | null

/** CSV as spreadsheets read it; cells they would run as formulas are quoted. */
export function csvText(titles: readonly string[], rows: readonly (readonly Cell[])[]): string {
  const cell = (value: Cell): string => {
    if (value === null) return ''
    if (typeof value !== 'string') return String(value)
    const safe = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value
    return /[",\n\r;]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
  }
  return [titles, ...rows].map((row) => row.map(cell).join(',')).join('\r\n') + '\r\n'
}
