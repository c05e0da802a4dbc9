import type { JSX, ReactNode } from 'react'

export interface Column<Row> {
  readonly name: string
  readonly cell: (row: Row) => ReactNode
  /** Figures stand at the right. */
  readonly isFigure?: boolean
  /** The cell that names the row. */
  readonly isHead?: boolean
  /** Left out where there is little room. */
  readonly isExtra?: boolean
}

/** A real table: caption, heads with their scope, and sideways scrolling of its own where it is wide. */
export function DataTable<Row>({
  caption,
  isCaptionShown = false,
  columns,
  rows,
  keyOf,
  rowId,
}: {
  readonly caption: string
  readonly isCaptionShown?: boolean
  readonly columns: readonly Column<Row>[]
  readonly rows: readonly Row[]
  readonly keyOf: (row: Row) => string
  readonly rowId?: (row: Row) => string
}): JSX.Element {
  const look = (column: Column<Row>): string =>
    `${column.isFigure === true ? 'figure text-right whitespace-nowrap' : 'text-left'} ${column.isExtra === true ? 'hidden md:table-cell' : ''}`
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={caption}>
      <table className="w-full border-collapse text-sm">
        <caption className={isCaptionShown ? 'label pb-1 text-left' : 'sr-only'}>{caption}</caption>
        <thead>
          <tr className="border-b border-ink">
            {columns.map((column) => (
              <th
                key={column.name}
                scope="col"
                className={`label px-2 py-1.5 font-normal first:pl-0 last:pr-0 ${look(column)}`}
              >
                {column.name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={keyOf(row)} id={rowId?.(row)} className="border-b border-hair align-top">
              {columns.map((column) =>
                column.isHead === true ? (
                  <th
                    key={column.name}
                    scope="row"
                    className={`px-2 py-2 font-semibold first:pl-0 last:pr-0 ${look(column)}`}
                  >
                    {column.cell(row)}
                  </th>
                ) : (
                  <td key={column.name} className={`px-2 py-2 first:pl-0 last:pr-0 ${look(column)}`}>
                    {column.cell(row)}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
