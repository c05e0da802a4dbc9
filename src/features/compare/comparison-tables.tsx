import type { JSX } from 'react'
import type { Comparison, VerdictChange } from '../../../shared/compare/comparison.ts'
import { bandIn, bareIn, lengthIn, signedIn, useUnits } from '../../lib/units.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { StateMark, type StateName } from '../../ui/state-mark.tsx'
import { compareWords } from '../../words/compare-words.ts'
import { stateWords } from '../../words/state-words.ts'

const order: readonly VerdictChange['flip'][] = [
  'newly-failing',
  'newly-warning',
  'newly-waived',
  'now-passing',
  'milder',
  'no-longer-judged',
  'added',
  'removed',
]

const flipStates: Readonly<Record<VerdictChange['flip'], StateName>> = {
  'newly-failing': 'newly-failing',
  'newly-warning': 'warn',
  'newly-waived': 'waived',
  'now-passing': 'pass',
  milder: 'better',
  'no-longer-judged': 'unchecked',
  added: 'info',
  removed: 'unchecked',
}

/** Verdicts that turned, the newly failing first, with what moved them. */
export function Flips({ changes }: { readonly changes: Comparison['changes'] }): JSX.Element {
  if (changes.length === 0) return <p className="text-sm text-soft">{compareWords.noFlips}</p>
  return (
    <ul className="space-y-3">
      {changes
        .toSorted((a, b) => order.indexOf(a.flip) - order.indexOf(b.flip))
        .map((change) => (
          <li
            key={change.fingerprint}
            className={`border-l-4 pl-3 ${change.isRegression ? 'border-fail' : 'border-hair'}`}
          >
            <p className="flex flex-wrap items-baseline gap-x-3">
              <StateMark state={flipStates[change.flip]}>{compareWords.flipNames[change.flip]}</StateMark>
              <span className="font-semibold">{change.subject}</span>
              <span className="label">
                {change.rule} · {change.before === null ? '–' : stateWords[change.before]} →{' '}
                {change.after === null ? '–' : stateWords[change.after]}
              </span>
            </p>
            <p>{change.message}</p>
            {change.causes.length === 0 ? null : (
              <p className="text-sm text-soft">{compareWords.because(change.causes.slice(0, 4))}</p>
            )}
          </li>
        ))}
    </ul>
  )
}

const goes = (binds: number, rattles: number): number => Math.round((1 - binds - rattles) * 100)

export function Margins({ comparison }: { readonly comparison: Comparison }): JSX.Element {
  const units = useUnits()
  const { noiseFloor, margins } = comparison
  return (
    <>
      {margins.length === 0 ? (
        <p className="text-sm text-soft">{compareWords.noMargins}</p>
      ) : (
        <DataTable
          caption={compareWords.margins}
          rows={margins.toSorted((a, b) => Number(b.isShrinking) - Number(a.isShrinking))}
          keyOf={(row) => `${row.fit} ${row.axis}`}
          columns={[
            { name: compareWords.fit, isHead: true, cell: (row) => compareWords.axis(row.fit, row.axis) },
            {
              name: compareWords.clearance,
              isFigure: true,
              cell: (row) => (
                <>
                  {bareIn(row.clearance.before, units)} → {lengthIn(row.clearance.after, units)}
                </>
              ),
            },
            { name: compareWords.allowed, isFigure: true, isExtra: true, cell: (row) => bandIn(row.required, units) },
            {
              name: compareWords.goes,
              isFigure: true,
              cell: (row) =>
                `${String(goes(row.binds.before, row.rattles.before))} → ${String(goes(row.binds.after, row.rattles.after))}`,
            },
            {
              name: compareWords.moved,
              cell: (row) => (
                <StateMark state={row.isShrinking ? 'worse' : 'better'}>
                  {row.isShrinking ? compareWords.shrinks : compareWords.grows}
                </StateMark>
              ),
            },
          ]}
        />
      )}
      <p className="label mt-2">
        {compareWords.noise(lengthIn(noiseFloor.mm, units), `${String(noiseFloor.share * 100)} %`)}
      </p>
    </>
  )
}

export function Dimensions({ dimensions }: { readonly dimensions: Comparison['dimensions'] }): JSX.Element {
  const units = useUnits()
  const other = units === 'mm' ? 'in' : 'mm'
  const text = (value: number | null, unit: 'mm' | 'in'): string => (value === null ? '–' : lengthIn(value, unit))
  if (dimensions.length === 0) return <p className="text-sm text-soft">{compareWords.noDimensions}</p>
  return (
    <DataTable
      caption={compareWords.dimensions}
      rows={dimensions}
      keyOf={(row) => `${row.piece} ${row.what}`}
      columns={[
        { name: compareWords.piece, isHead: true, cell: (row) => row.piece },
        { name: compareWords.what, cell: (row) => row.what },
        { name: compareWords.before, isFigure: true, cell: (row) => text(row.before, units) },
        { name: compareWords.after, isFigure: true, cell: (row) => text(row.after, units) },
        {
          name: compareWords.moved,
          isFigure: true,
          cell: (row) => <span className="font-bold">{row.delta === null ? '–' : signedIn(row.delta, units)}</span>,
        },
        {
          name: compareWords.otherUnit,
          isFigure: true,
          isExtra: true,
          cell: (row) => (row.delta === null ? '–' : signedIn(row.delta, other)),
        },
        { name: compareWords.touches, isExtra: true, cell: (row) => row.dependents.join(', ') },
      ]}
    />
  )
}

export function Matings({ comparison }: { readonly comparison: Comparison }): JSX.Element {
  const { matings, oldPiecesMate } = comparison
  if (matings.length === 0) return <p>{compareWords.mateSame}</p>
  return (
    <>
      <p className="mb-2 font-semibold">
        <StateMark state={oldPiecesMate ? 'pass' : 'fail'} />{' '}
        {oldPiecesMate ? compareWords.mateYes : compareWords.mateNo}
      </p>
      <ul className="space-y-1 text-sm">
        {matings.map((mating) => (
          <li key={`${mating.fit} ${mating.putFrom} ${mating.toFrom}`}>
            <StateMark state={mating.verdict} /> {mating.sentence}
          </li>
        ))}
      </ul>
    </>
  )
}

export function Inputs({ inputs }: { readonly inputs: Comparison['inputs'] }): JSX.Element {
  if (inputs.length === 0) return <p className="text-sm text-soft">{compareWords.noInputs}</p>
  return (
    <DataTable
      caption={compareWords.inputs}
      rows={inputs}
      keyOf={(row) => row.what}
      columns={[
        { name: compareWords.input, isHead: true, cell: (row) => row.what },
        { name: compareWords.before, cell: (row) => <span className="figure">{row.before ?? '–'}</span> },
        { name: compareWords.after, cell: (row) => <span className="figure">{row.after ?? '–'}</span> },
      ]}
    />
  )
}
