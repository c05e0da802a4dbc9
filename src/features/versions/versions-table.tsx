import { useInfiniteQuery } from '@tanstack/react-query'
import type { JSX } from 'react'
import { Link } from 'react-router-dom'
import { paths } from '../../app/paths.ts'
import { momentText } from '../../lib/dates.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Empty, Failed, Waiting } from '../../ui/loaded.tsx'
import { MoreRows } from '../../ui/more-rows.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { commonWords } from '../../words/common-words.ts'
import { setWords } from '../../words/set-words.ts'
import { versionsCsvAddress, versionsQuery } from './version-queries.ts'

/** Versions of a set, newest first, of one branch or of all. */
export function VersionsTable({
  team,
  set,
  branches,
}: {
  readonly team: string
  readonly set: string
  readonly branches: readonly string[]
}): JSX.Element {
  const { value, choose } = useAddressFilter()
  const branch = value('branch')
  const versions = useInfiniteQuery(versionsQuery(team, set, branch))
  const rows = versions.data?.pages.flatMap(({ items }) => items) ?? []
  return (
    <>
      <div className="mb-3 flex flex-wrap items-center gap-3">
        <label className="flex items-center gap-2 text-sm font-semibold">
          {setWords.branch}
          <select className="field w-auto" value={branch} onChange={({ target }) => choose({ branch: target.value })}>
            <option value="">{setWords.branchAll}</option>
            {branches.map((name) => (
              <option key={name}>{name}</option>
            ))}
          </select>
        </label>
        <a className="button" href={versionsCsvAddress(team, set, branch)} download>
          {commonWords.csv}
        </a>
      </div>
      {versions.data === undefined ? (
        versions.isError ? (
          <Failed error={versions.error} onAgain={() => void versions.refetch()} />
        ) : (
          <Waiting lines={6} />
        )
      ) : rows.length === 0 ? (
        <Empty title={setWords.emptyVersions} />
      ) : (
        <>
          <DataTable
            caption={setWords.versions}
            rows={rows}
            keyOf={(row) => String(row.number)}
            columns={[
              {
                name: setWords.version,
                isHead: true,
                cell: (row) => (
                  <Link className="figure" to={paths.version(team, set, row.number)}>
                    v{row.number}
                  </Link>
                ),
              },
              { name: setWords.verdict, cell: (row) => <StateMark state={row.verdict} /> },
              {
                name: setWords.change,
                cell: (row) => (
                  <>
                    <StateMark state={row.change.state} />
                    <div className="text-soft">{row.change.sentence}</div>
                  </>
                ),
              },
              { name: setWords.works, isFigure: true, cell: (row) => setWords.worksShare(row.works) },
              { name: setWords.branch, isExtra: true, cell: (row) => row.branch },
              {
                name: setWords.label,
                cell: (row) =>
                  row.label === null ? (
                    <span className="text-soft">–</span>
                  ) : (
                    <StateMark state={row.isRecalled ? 'recalled' : 'published'}>{row.label}</StateMark>
                  ),
              },
              { name: setWords.review, isExtra: true, cell: (row) => <StateMark state={row.review} /> },
              {
                name: setWords.pushed,
                isExtra: true,
                cell: (row) => (
                  <>
                    {momentText(row.pushedAt)}
                    <div className="text-soft">{commonWords.by(row.pushedBy.name)}</div>
                  </>
                ),
              },
            ]}
          />
          <MoreRows query={versions} count={rows.length} />
        </>
      )}
    </>
  )
}
