import { useInfiniteQuery, useQuery } from '@tanstack/react-query'
import type { JSX, ReactNode } from 'react'
import { BlankChanges } from '../../features/compare/blank-changes.tsx'
import { Dimensions, Flips, Inputs, Margins, Matings } from '../../features/compare/comparison-tables.tsx'
import { TextChanges } from '../../features/compare/text-changes.tsx'
import { SetNav } from '../../features/sets/set-nav.tsx'
import { textOf } from '../../features/versions/version-head.tsx'
import {
  comparisonQuery,
  versionQuery,
  versionsQuery,
  type VersionComparison,
} from '../../features/versions/version-queries.ts'
import { isMissing } from '../../lib/refusals.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Empty, Failed, Loaded, Waiting } from '../../ui/loaded.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { compareWords } from '../../words/compare-words.ts'
import { versionWords } from '../../words/version-words.ts'

interface Place {
  readonly team: string
  readonly set: string
  readonly number: number
}

function OtherChoice({ team, set, number }: Place): JSX.Element {
  const { value, choose } = useAddressFilter()
  const versions = useInfiniteQuery(versionsQuery(team, set, ''))
  const others = versions.data?.pages.flatMap(({ items }) => items).filter((row) => row.number !== number) ?? []
  const chosen = value('with')
  return (
    <label className="flex flex-wrap items-center gap-2 text-sm font-semibold">
      {compareWords.with}
      <select
        className="field w-auto max-w-full"
        value={chosen}
        onChange={({ target }) => choose({ with: target.value })}
      >
        <option value="">{compareWords.usual}</option>
        {chosen !== '' && others.every((row) => String(row.number) !== chosen) ? (
          <option value={chosen}>v{chosen}</option>
        ) : null}
        {others.map((row) => (
          <option key={row.number} value={row.number}>
            {compareWords.versionOption(row.number, row.branch, row.label)}
          </option>
        ))}
      </select>
    </label>
  )
}

function Drawings({
  team,
  set,
  answer,
}: {
  readonly team: string
  readonly set: string
  readonly answer: VersionComparison
}): ReactNode {
  const before = useQuery(versionQuery(team, set, answer.before))
  const after = useQuery(versionQuery(team, set, answer.after))
  return (
    <Loaded query={before} lines={6}>
      {(old) => (
        <Loaded query={after} lines={6}>
          {(now) => <BlankChanges before={textOf(old)} after={textOf(now)} />}
        </Loaded>
      )}
    </Loaded>
  )
}

function Compared({
  team,
  set,
  answer,
}: {
  readonly team: string
  readonly set: string
  readonly answer: VersionComparison
}): JSX.Element {
  const { comparison } = answer
  return (
    <div className="space-y-5">
      <div className="sheet p-4 sm:p-5">
        <p className="text-lg font-semibold" data-verdict-line>
          {comparison.sentence}
        </p>
        <p className="text-sm text-soft">{answer.sentence}</p>
        {answer.isRechecked ? <p className="mt-1 text-sm">{compareWords.rechecked}</p> : null}
        {comparison.isComparable ? (
          <p className="mt-1 text-sm">
            <span className="font-semibold">{compareWords.label}:</span> {compareWords.steps[comparison.proposal.step]},{' '}
            {comparison.proposal.why}
          </p>
        ) : null}
      </div>
      {comparison.isComparable ? (
        <>
          <Sheet title={compareWords.flips}>
            <Flips changes={comparison.changes} />
          </Sheet>
          <Sheet title={compareWords.margins}>
            <Margins comparison={comparison} />
          </Sheet>
        </>
      ) : null}
      <Sheet title={compareWords.dimensions}>
        <Dimensions dimensions={comparison.dimensions} />
      </Sheet>
      {comparison.isComparable ? (
        <Sheet title={compareWords.matings}>
          <Matings comparison={comparison} />
        </Sheet>
      ) : null}
      <Sheet title={compareWords.drawings}>
        <Drawings team={team} set={set} answer={answer} />
      </Sheet>
      <Sheet title={compareWords.inputs}>
        <Inputs inputs={comparison.inputs} />
      </Sheet>
      <Sheet title={compareWords.text}>
        <details>
          <summary className="text-sm font-semibold">{compareWords.textTitle}</summary>
          <div className="mt-2">
            <TextChanges before={answer.texts.before} after={answer.texts.after} />
          </div>
        </details>
      </Sheet>
    </div>
  )
}

/** Two versions of a set: what turned first, the texts last. */
export default function ComparePage(): JSX.Element {
  const place = { team: usePart('team'), set: usePart('set'), number: Number(usePart('number')) }
  const { value } = useAddressFilter()
  const other = /^\d+$/.test(value('with')) ? Number(value('with')) : null
  const answer = useQuery(comparisonQuery(place.team, place.set, place.number, other))
  const title = `${compareWords.title}: ${place.set}, ${versionWords.version(place.number)}`
  useTitle(title)
  const hasNone = other === null && isMissing(answer.error)
  return (
    <>
      <SetNav {...place} />
      <TitleBlock
        title={compareWords.title}
        above={`${place.set} · ${versionWords.version(place.number)}`}
        actions={<OtherChoice {...place} />}
      />
      {answer.data !== undefined ? (
        <Compared team={place.team} set={place.set} answer={answer.data} />
      ) : hasNone ? (
        <Empty title={compareWords.noneTitle}>{compareWords.none}</Empty>
      ) : answer.isError ? (
        <Failed error={answer.error} onAgain={() => void answer.refetch()} />
      ) : (
        <Waiting lines={8} />
      )}
    </>
  )
}
