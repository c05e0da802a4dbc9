import { useInfiniteQuery } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { upkeepEndpoints } from '../../../shared/api/upkeep-endpoints.ts'
import { TeamHead } from '../../features/team/team-head.tsx'
import { call, fileAddress } from '../../lib/api.ts'
import { momentText } from '../../lib/dates.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { usePart } from '../../lib/use-part.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Empty, Failed, Waiting } from '../../ui/loaded.tsx'
import { MoreRows } from '../../ui/more-rows.tsx'
import { commonWords } from '../../words/common-words.ts'
import { setsWords } from '../../words/sets-words.ts'
import { teamWords } from '../../words/team-words.ts'

function Entries({ team, search }: { readonly team: string; readonly search: string }): JSX.Element {
  const audit = useInfiniteQuery({
    queryKey: ['audit', team, search],
    queryFn: ({ pageParam, signal }) =>
      call(upkeepEndpoints.audit, {
        params: { team },
        query: { ...(search === '' ? {} : { search }), ...(pageParam === null ? {} : { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  })
  const rows = audit.data?.pages.flatMap(({ items }) => items) ?? []
  if (audit.data === undefined)
    return audit.isError ? <Failed error={audit.error} onAgain={() => void audit.refetch()} /> : <Waiting lines={8} />
  if (rows.length === 0) return <Empty title={teamWords.auditEmpty} />
  return (
    <>
      <DataTable
        caption={teamWords.auditTitle}
        rows={rows}
        keyOf={(row) => row.id}
        columns={[
          { name: teamWords.at, cell: (row) => <span className="whitespace-nowrap">{momentText(row.at)}</span> },
          { name: teamWords.actor, isHead: true, cell: (row) => row.actor.name },
          { name: teamWords.did, cell: (row) => row.sentence },
        ]}
      />
      <MoreRows query={audit} count={rows.length} />
    </>
  )
}

export default function AuditPage(): JSX.Element {
  const team = usePart('team')
  const { value, choose } = useAddressFilter()
  const search = value('search')
  const [typed, setTyped] = useState(search)
  return (
    <>
      <TeamHead
        team={team}
        title={teamWords.auditTitle}
        actions={
          <a className="button" href={fileAddress(upkeepEndpoints.auditCsv, { params: { team } })} download>
            {commonWords.csv}
          </a>
        }
      />
      <section aria-label={teamWords.auditTitle} className="sheet p-4 sm:p-5">
        <form
          role="search"
          className="mb-4 flex flex-wrap items-end gap-3"
          onSubmit={(event) => {
            event.preventDefault()
            choose({ search: typed.trim() })
          }}
        >
          <label className="text-sm font-semibold">
            {teamWords.auditSearch}
            <input
              type="search"
              maxLength={100}
              className="field font-normal"
              value={typed}
              onChange={({ target }) => setTyped(target.value)}
            />
          </label>
          <button type="submit" className="button min-h-10">
            {setsWords.find}
          </button>
          <p className="basis-full text-sm text-soft">{teamWords.auditExplain}</p>
        </form>
        <Entries team={team} search={search} />
      </section>
    </>
  )
}
