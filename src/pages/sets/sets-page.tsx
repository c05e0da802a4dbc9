import { useInfiniteQuery } from '@tanstack/react-query'
import type { JSX } from 'react'
import { Link } from 'react-router-dom'
import { paths } from '../../app/paths.ts'
import { SetEntry } from '../../features/sets/set-entry.tsx'
import { SetFilters } from '../../features/sets/set-filters.tsx'
import { setsCsvAddress, setsQuery, type SetRow } from '../../features/sets/set-queries.ts'
import { useMay } from '../../features/team/team-queries.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { StripLegend } from '../../ui/hundred-strip.tsx'
import { Empty, Failed, Waiting } from '../../ui/loaded.tsx'
import { MoreRows } from '../../ui/more-rows.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { setsWords } from '../../words/sets-words.ts'

/** Which sets need me: newly failing first. */
export default function SetsPage(): JSX.Element {
  useTitle(setsWords.title)
  const team = usePart('team')
  const may = useMay(team)
  const address = useAddressFilter()
  const filter = {
    search: address.value('search'),
    family: address.value('family'),
    state: address.value('state'),
    branch: address.value('branch'),
    tag: address.value('tag'),
  }
  const sets = useInfiniteQuery(setsQuery(team, filter))
  const rows: readonly SetRow[] = sets.data?.pages.flatMap(({ items }) => items) ?? []
  const needing = rows.filter(({ state }) => state === 'newly-failing').length
  const isFiltered = Object.values(filter).some((value) => value !== '')
  return (
    <>
      <TitleBlock
        title={setsWords.title}
        above={sets.data === undefined ? commonWords.loading : setsWords.sentence(needing, rows.length)}
        actions={
          <>
            <Link className="button" to={paths.holds(team)}>
              {setsWords.holds}
            </Link>
            <a className="button" href={setsCsvAddress(team, filter)} download>
              {commonWords.csv}
            </a>
            {may('push') ? (
              <Link className="button" data-kind="main" to={paths.upload(team)}>
                {setsWords.upload}
              </Link>
            ) : null}
          </>
        }
      />
      <SetFilters team={team} filter={address} />
      {sets.data === undefined ? (
        sets.isError ? (
          <Failed error={sets.error} onAgain={() => void sets.refetch()} />
        ) : (
          <Waiting lines={8} />
        )
      ) : rows.length === 0 ? (
        isFiltered ? (
          <Empty title={setsWords.emptyFilter}>{setsWords.emptyFilterHint}</Empty>
        ) : (
          <Empty title={setsWords.emptyTitle}>{setsWords.empty}</Empty>
        )
      ) : (
        <>
          <div className="mb-2">
            <StripLegend />
          </div>
          <ul className="space-y-px bg-hair p-px">
            {rows.map((row) => (
              <li key={row.name}>
                <SetEntry row={row} to={paths.set(team, row.name)} />
              </li>
            ))}
          </ul>
          <MoreRows query={sets} count={rows.length} />
        </>
      )}
    </>
  )
}
