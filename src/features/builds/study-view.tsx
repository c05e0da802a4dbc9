import { useQuery } from '@tanstack/react-query'
import type { JSX, ReactNode } from 'react'
import { feels } from '../../../shared/api/shapes/build-shapes.ts'
import { bareIn, lengthIn, signedIn, useUnits } from '../../lib/units.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Empty, Loaded } from '../../ui/loaded.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark, type StateName } from '../../ui/state-mark.tsx'
import { buildWords } from '../../words/build-words.ts'
import { fitWords } from '../../words/fit-words.ts'
import { studyQuery, type Place, type Study } from './build-queries.ts'
import { StudyChart } from './study-chart.tsx'

const marks: Readonly<Record<Study['dimensions'][number]['reading'], StateName>> = {
  'too-few': 'open',
  agrees: 'pass',
  biased: 'warn',
}

function Dimensions({ study }: { readonly study: Study }): JSX.Element {
  const units = useUnits()
  const range = (span: { readonly low: number; readonly high: number } | null): string =>
    span === null ? '–' : `${bareIn(span.low, units)}…${lengthIn(span.high, units)}`
  const rows = study.dimensions.filter(({ n }) => n > 0)
  if (rows.length === 0) return <Empty title={buildWords.studyEmpty} />
  return (
    <DataTable
      caption={buildWords.study}
      rows={rows}
      keyOf={(row) => row.key}
      columns={[
        { name: buildWords.dimension, isHead: true, cell: (row) => row.what },
        { name: buildWords.predicted, cell: (row) => <StudyChart dimension={row} units={units} /> },
        { name: buildWords.n, isFigure: true, cell: (row) => row.n },
        { name: buildWords.bias, isFigure: true, cell: (row) => (row.bias === null ? '–' : signedIn(row.bias, units)) },
        { name: buildWords.interval, isFigure: true, isExtra: true, cell: (row) => range(row.interval) },
        ...(rows.some(({ deviation }) => deviation !== null)
          ? [
              {
                name: buildWords.tolerance,
                isFigure: true,
                isExtra: true,
                cell: (row: (typeof rows)[number]) => range(row.tolerance),
              },
            ]
          : []),
        {
          name: buildWords.measured,
          cell: (row) => <StateMark state={marks[row.reading]}>{buildWords.readings[row.reading]}</StateMark>,
        },
      ]}
    />
  )
}

function Fits({ study }: { readonly study: Study }): JSX.Element {
  return (
    <ul className="space-y-3">
      {study.fits.map((fit) => (
        <li key={fit.fit} className="grid gap-x-4 sm:grid-cols-[14rem_1fr]">
          <span className="font-semibold">{fit.fit}</span>
          <span className="text-sm">
            <span className="figure font-bold">{buildWords.went(fit.went, fit.n)}</span>
            {fit.atLeast === null ? '' : `, ${buildWords.atLeast(fit.atLeast)}`},{' '}
            {buildWords.predictedShare(fit.predicted)}.{' '}
            <span className="text-soft">
              {feels
                .filter((feel) => (fit.felt[feel] ?? 0) > 0)
                .map((feel) => `${String(fit.felt[feel])} ${buildWords.feels[feel]}`)
                .join(', ')}
            </span>
          </span>
        </li>
      ))}
    </ul>
  )
}

/** What was predicted against what builds measured; how much is shown depends on how many there are. */
export function StudyView({ place }: { readonly place: Place }): ReactNode {
  const study = useQuery(studyQuery(place))
  return (
    <Loaded query={study} lines={6}>
      {(data) => (
        <>
          <Sheet title={buildWords.study}>
            <p className="mb-3 text-sm text-soft">{data.policy}</p>
            <Dimensions study={data} />
          </Sheet>
          <Sheet title={buildWords.fitsStudy}>
            {data.fits.length === 0 ? <Empty title={fitWords.none} /> : <Fits study={data} />}
          </Sheet>
        </>
      )}
    </Loaded>
  )
}
