import type { JSX } from 'react'
import type { PieceReport, Quantity } from '../../../shared/report/report.ts'
import { bareIn, lengthIn, markIn, useUnits } from '../../lib/units.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { blankWords } from '../../words/blank-words.ts'

interface Row {
  readonly name: string
  readonly value: number
  readonly isMark: boolean
  readonly note: string
  readonly range: readonly [number, number] | null
}

interface Mark {
  readonly what: string
  readonly nominal: number
  readonly grid: 'cut' | 'score'
}

const isQuantity = (value: unknown): value is Quantity =>
  typeof value === 'object' && value !== null && 'nominal' in value

const axes = ['length', 'width', 'depth', 'height'] as const

function rowsOf(piece: PieceReport): readonly Row[] {
  const marks = Array.isArray(piece['measures']) ? (piece['measures'] as readonly Mark[]) : []
  const sides = [
    [blankWords.inside, piece.inside],
    [blankWords.outside, piece.outside],
  ] as const
  return [
    ...marks.map(({ what, nominal, grid }) => ({
      name: what,
      value: nominal,
      isMark: true,
      note: blankWords.grids[grid],
      range: null,
    })),
    ...sides.flatMap(([side, sizes]) =>
      axes.flatMap((axis) => {
        const size: unknown = sizes === null ? undefined : (sizes as Readonly<Record<string, unknown>>)[axis]
        return isQuantity(size)
          ? [
              {
                name: `${side} ${axis}`,
                value: size.nominal,
                isMark: false,
                note: '',
                range: [size.min, size.max] as const,
              },
            ]
          : []
      }),
    ),
  ]
}

/** Every dimension of a piece: what its drawing shows, in figures. */
export function PieceTable({
  name,
  piece,
  id,
}: {
  readonly name: string
  readonly piece: PieceReport
  readonly id: string
}): JSX.Element {
  const units = useUnits()
  const other = units === 'mm' ? 'in' : 'mm'
  const text = (row: Row, unit: 'mm' | 'in'): string =>
    row.isMark ? markIn(row.value, unit) : lengthIn(row.value, unit)
  return (
    <div id={id}>
      <DataTable
        caption={blankWords.tableOf(name)}
        isCaptionShown
        rows={rowsOf(piece)}
        keyOf={(row) => row.name}
        columns={[
          { name: blankWords.measure, isHead: true, cell: (row) => row.name },
          { name: blankWords.value, isFigure: true, cell: (row) => text(row, units) },
          {
            name: blankWords.other,
            isFigure: true,
            cell: (row) => <span className="text-soft">{text(row, other)}</span>,
          },
          {
            name: blankWords.worst,
            isFigure: true,
            isExtra: true,
            cell: (row) =>
              row.range === null ? row.note : `${bareIn(row.range[0], units)}…${lengthIn(row.range[1], units)}`,
          },
        ]}
      />
    </div>
  )
}
