import { useQuery } from '@tanstack/react-query'
import { lazy, Suspense, useId, type JSX, type ReactNode } from 'react'
import type { PieceReport, Report } from '../../../shared/report/report.ts'
import { lengthIn, useUnits } from '../../lib/units.ts'
import { Loaded, Waiting } from '../../ui/loaded.tsx'
import { blankWords } from '../../words/blank-words.ts'
import { blanksQuery, type VersionText } from '../engine/engine-queries.ts'
import { PieceTable } from './piece-table.tsx'
import { piecesInOrder } from './pieces-in-order.ts'

const BlankDrawing = lazy(() => import('./blank-drawing.tsx'))

function PieceFacts({ piece }: { readonly piece: PieceReport }): JSX.Element {
  const units = useUnits()
  const facts = [
    piece.kind,
    piece.stock,
    piece.caliper === null ? null : `${blankWords.caliper} ${lengthIn(piece.caliper, units)}`,
    piece.make > 1 ? `${blankWords.make} ${String(piece.make)}` : null,
    piece.kind === 'bought' ? null : blankWords.made[piece.made],
  ]
  return <p className="label mb-2">{facts.filter((fact) => fact !== null).join(' · ')}</p>
}

function Blanks({
  version,
  name,
  tableId,
}: {
  readonly version: VersionText
  readonly name: string
  readonly tableId: string
}): ReactNode {
  const blanks = useQuery(blanksQuery(version))
  return (
    <Loaded query={blanks} lines={6}>
      {(all) => {
        const own = all.get(name) ?? []
        if (own.length === 0) return <p className="text-sm text-soft">{blankWords.notDrawn}</p>
        return (
          <Suspense fallback={<Waiting lines={6} />}>
            <div className="space-y-4">
              {own.map((blank) => (
                <BlankDrawing key={blank.name} blank={blank} describedBy={tableId} />
              ))}
            </div>
          </Suspense>
        )
      }}
    </Loaded>
  )
}

/** Each piece with its blank, and the table of dimensions that says the same in figures. */
export function Pieces({
  report,
  version,
  aside,
}: {
  readonly report: Report
  readonly version: VersionText
  readonly aside?: (piece: string) => ReactNode
}): JSX.Element {
  const id = useId()
  return (
    <div className="space-y-8">
      <p className="label">{blankWords.legend}</p>
      {piecesInOrder(report, version.text).map(([name, piece]) => {
        const tableId = `${id}-${name}`
        return (
          <section key={name} id={`piece-${name}`} aria-label={name}>
            <h3 className="text-base">{name}</h3>
            <PieceFacts piece={piece} />
            <div className="grid items-start gap-5 lg:grid-cols-2">
              {piece.kind === 'bought' ? (
                <p className="text-sm text-soft">{blankWords.bought}</p>
              ) : (
                <Blanks version={version} name={name} tableId={tableId} />
              )}
              <PieceTable name={name} piece={piece} id={tableId} />
            </div>
            {aside?.(name)}
          </section>
        )
      })}
    </div>
  )
}
