import { useInfiniteQuery } from '@tanstack/react-query'
import type { JSX } from 'react'
import { momentText } from '../../lib/dates.ts'
import { lengthIn, useUnits } from '../../lib/units.ts'
import { Empty, Failed, Waiting } from '../../ui/loaded.tsx'
import { MoreRows } from '../../ui/more-rows.tsx'
import { buildWords } from '../../words/build-words.ts'
import { buildsQuery, type BuildRow, type Place } from './build-queries.ts'

function BuildEntry({ build }: { readonly build: BuildRow }): JSX.Element {
  const units = useUnits()
  const { report } = build
  const { x, y, nominal } = report.scaleBar
  return (
    <article className="bg-sheet p-3">
      <h3 className="text-base">
        {build.tester} <span className="label">{build.stamp}</span>
      </h3>
      <p className="label">
        {[
          buildWords.sources[build.source],
          build.submittedAt === null ? buildWords.states.draft : momentText(build.submittedAt),
          report.paper.name,
          x === null && y === null
            ? null
            : `${buildWords.scaleHeading} ${[x, y].map((bar) => (bar === null ? '–' : `${((bar / nominal) * 100).toFixed(1)} %`)).join(' × ')}`,
          report.paper.thickness.length === 0
            ? null
            : lengthIn(
                report.paper.thickness.reduce((sum, reading) => sum + reading, 0) / report.paper.thickness.length,
                units,
              ),
        ]
          .filter((part) => part !== null && part !== '')
          .join(' · ')}
      </p>
      <p className="mt-1 text-sm">
        {report.fits
          .map(({ fit, felt, note }) => `${fit}: ${buildWords.feels[felt]}${note === '' ? '' : ` (${note})`}`)
          .join('; ')}
      </p>
      {report.problems.map((problem, index) => (
        <p key={index} className="mt-1 border-l-4 border-warn pl-2 text-sm">
          <span className="font-semibold">
            {problem.piece} {problem.edge}
          </span>
          : {problem.expected === '' ? '' : `${buildWords.problemExpected} ${problem.expected}, `}
          {buildWords.problemGot} {problem.got}
        </p>
      ))}
      {report.note === '' ? null : <p className="mt-1 text-sm whitespace-pre-wrap">{report.note}</p>}
      {build.photos.length === 0 ? null : (
        <ul className="mt-2 flex flex-wrap gap-2">
          {build.photos.map((photo) => (
            <li key={photo.id}>
              <a href={photo.path}>
                <img
                  src={photo.thumbnail}
                  alt={photo.alt === '' ? buildWords.photoFallback : photo.alt}
                  className="h-24 border border-hair"
                />
              </a>
            </li>
          ))}
        </ul>
      )}
    </article>
  )
}

/** Builds of a version, newest first. */
export function BuildList({ place }: { readonly place: Place }): JSX.Element {
  const builds = useInfiniteQuery(buildsQuery(place))
  const rows = builds.data?.pages.flatMap(({ items }) => items) ?? []
  if (builds.data === undefined)
    return builds.isError ? <Failed error={builds.error} onAgain={() => void builds.refetch()} /> : <Waiting />
  if (rows.length === 0) return <Empty title={buildWords.buildsEmpty}>{buildWords.buildsEmptyHint}</Empty>
  return (
    <>
      <ul className="space-y-px bg-hair p-px">
        {rows.map((build) => (
          <li key={build.id}>
            <BuildEntry build={build} />
          </li>
        ))}
      </ul>
      <MoreRows query={builds} count={rows.length} />
    </>
  )
}
