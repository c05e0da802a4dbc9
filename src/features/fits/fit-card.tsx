import type { JSX, ReactNode } from 'react'
import type { AxisReport, FitReport } from '../../../shared/report/report.ts'
import { sourceInWords } from '../../../shared/report/source-words.ts'
import { bandIn, lengthIn, useUnits } from '../../lib/units.ts'
import { HundredStrip } from '../../ui/hundred-strip.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { fitWords } from '../../words/fit-words.ts'

function AxisRow({ axis }: { readonly axis: AxisReport }): JSX.Element {
  const units = useUnits()
  return (
    <li className="grid gap-x-5 gap-y-1 border-t border-hair py-2.5 md:grid-cols-[7rem_minmax(0,13rem)_minmax(0,1fr)]">
      <div>
        <span className="font-semibold">{fitWords.axisName(axis.axis)}</span>
        <div>
          <StateMark state={axis.verdict} />
        </div>
      </div>
      <div className="figure text-sm">
        <span className="text-base font-bold">{lengthIn(axis.clearance.nominal, units)}</span>
        <div className="text-soft">
          {fitWords.allowed} {bandIn(axis.required, units)}
        </div>
        <div className="text-soft">{fitWords.from(axis.requirementFrom)}</div>
      </div>
      <div className="min-w-0">
        <HundredStrip binds={axis.binds} rattles={axis.rattles} />
        {axis.sources[0] === undefined ? null : (
          <p className="mt-1 text-sm text-soft">
            {fitWords.costs}:{' '}
            {axis.sources
              .slice(0, 2)
              .map(({ name, share }) => fitWords.share(share, sourceInWords(name)))
              .join('; ')}
          </p>
        )}
      </div>
    </li>
  )
}

function notesOf(fit: FitReport, units: 'mm' | 'in'): readonly string[] {
  const percent = (scale: number): string => `${String(Math.round(scale * 1000) / 10)} %`
  return [
    ...(fit.turned ? [fitWords.turned] : []),
    ...(fit.give === null ? [] : [fitWords.give(fit.give.name, fit.give.axis)]),
    ...(fit.dependsOnCare ? [fitWords.care] : []),
    ...(fit.seat === null || fit.seat.exposed <= 0 ? [] : [fitWords.exposed(lengthIn(fit.seat.exposed, units))]),
    ...(fit.scale === null ? [] : [fitWords.scales(percent(fit.scale.min), percent(fit.scale.max))]),
    ...fit.papers.map((paper) => fitWords.papers(paper.stock, paper.verdict, paper.closes)),
  ]
}

/** One fit: its verdict, each axis with its hundred builds, and what costs most. */
export function FitCard({
  fit,
  isShown,
  onPoint,
  aside,
}: {
  readonly fit: FitReport
  readonly isShown: boolean
  readonly onPoint: (fit: string | null) => void
  readonly aside?: ReactNode
}): JSX.Element {
  const units = useUnits()
  return (
    <article
      id={`fit-${fit.id}`}
      aria-label={fit.id}
      tabIndex={-1}
      onMouseEnter={() => onPoint(fit.id)}
      onMouseLeave={() => onPoint(null)}
      className={`border-l-4 pl-3 ${isShown ? 'border-link' : 'border-transparent'}`}
    >
      <div className="mb-1 flex flex-wrap items-baseline justify-between gap-x-4">
        <h3 className="text-base">{fit.id}</h3>
        <StateMark state={fit.verdict} />
      </div>
      <p className="mb-2 text-sm">
        {fitWords.what(fit.put, fit.relation, fit.to, fit.count, fit.holding)} ·{' '}
        <span className="figure font-bold">{fitWords.closes(fit.closes)}</span>
      </p>
      <ul>
        {fit.axes.map((axis) => (
          <AxisRow key={axis.axis} axis={axis} />
        ))}
      </ul>
      {notesOf(fit, units).map((note) => (
        <p key={note} className="text-sm text-soft">
          {note}
        </p>
      ))}
      {aside}
    </article>
  )
}
