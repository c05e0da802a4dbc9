import type { JSX } from 'react'
import { hundredBuilds } from '../../shared/report/hundred-builds.ts'
import { stripWords } from '../words/strip-words.ts'

const pitch = 6
const perRow = 50
const rowHeight = 21

/** Binds stand high, a build that goes is a plain stroke through the middle, what rattles lies low as a ring. */
function mark(index: number, binds: number, rattles: number): JSX.Element {
  const x = (index % perRow) * pitch + pitch / 2
  const y = Math.floor(index / perRow) * rowHeight
  if (index < binds)
    return <path key={index} d={`M${String(x)} ${String(y + 1)}v9m-2.2 0h4.4`} stroke="var(--fail)" strokeWidth="2" />
  if (index >= 100 - rattles)
    return <circle key={index} cx={x} cy={y + 16.5} r={2} fill="var(--sheet)" stroke="var(--warn)" strokeWidth="1.3" />
  return <path key={index} d={`M${String(x)} ${String(y + 6)}v8`} stroke="var(--ink)" strokeWidth="1.4" />
}

/** A hundred builds of one fit: how many bind, go and rattle, told by place and shape, with the number beside it. */
export function HundredStrip({
  binds,
  rattles,
  isCompact = false,
}: {
  readonly binds: number
  readonly rattles: number
  readonly isCompact?: boolean
}): JSX.Element {
  const counts = hundredBuilds(binds, rattles)
  return (
    <span className={`inline-flex max-w-full items-center gap-2 ${isCompact ? 'w-56' : 'w-full max-w-md'}`}>
      <svg
        viewBox={`0 0 ${String(perRow * pitch)} ${String(2 * rowHeight)}`}
        className="min-w-0 flex-1"
        role="img"
        aria-label={stripWords.sentence(counts.binds, counts.goes, counts.rattles)}
      >
        <path
          d={`M0 10h${String(perRow * pitch)}M0 ${String(rowHeight + 10)}h${String(perRow * pitch)}`}
          stroke="var(--hair)"
        />
        {Array.from({ length: 100 }, (_, index) => mark(index, counts.binds, counts.rattles))}
      </svg>
      <span className="figure shrink-0 text-sm" aria-hidden="true">
        {counts.goes}
        <span className="text-soft">/100</span>
      </span>
    </span>
  )
}

/** What the three marks of a strip mean. */
export function StripLegend(): JSX.Element {
  return (
    <p className="label flex flex-wrap gap-x-4 gap-y-1">
      <span className="inline-flex items-center gap-1">
        <svg viewBox="0 0 8 20" className="h-4 w-2" aria-hidden="true">
          <path d="M4 0v9m-1.6 0h3.2" stroke="var(--fail)" strokeWidth="1.8" />
        </svg>
        {stripWords.binds}
      </span>
      <span className="inline-flex items-center gap-1">
        <svg viewBox="0 0 8 20" className="h-4 w-2" aria-hidden="true">
          <path d="M4 6v8" stroke="var(--ink)" strokeWidth="1.4" />
        </svg>
        {stripWords.goes}
      </span>
      <span className="inline-flex items-center gap-1">
        <svg viewBox="0 0 8 20" className="h-4 w-2" aria-hidden="true">
          <circle cx={4} cy={16} r={2} fill="none" stroke="var(--warn)" strokeWidth="1.2" />
        </svg>
        {stripWords.rattles}
      </span>
    </p>
  )
}
