import { useQuery } from '@tanstack/react-query'
import type { JSX, ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { paths } from '../../app/paths.ts'
import { Publications } from '../../features/publication/publications.tsx'
import { KnownFailures } from '../../features/review/known-failures.tsx'
import { SetAbout } from '../../features/sets/set-about.tsx'
import { SetNav } from '../../features/sets/set-nav.tsx'
import { setQuery, type TemplateSet } from '../../features/sets/set-queries.ts'
import { useMay } from '../../features/team/team-queries.ts'
import { Trend } from '../../features/trend/trend.tsx'
import { versionQuery } from '../../features/versions/version-queries.ts'
import { VersionsTable } from '../../features/versions/versions-table.tsx'
import { momentText } from '../../lib/dates.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Loaded } from '../../ui/loaded.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { publicationWords } from '../../words/publication-words.ts'
import { setWords } from '../../words/set-words.ts'
import { trendWords } from '../../words/trend-words.ts'

function Branches({ team, set }: { readonly team: string; readonly set: TemplateSet }): JSX.Element {
  return (
    <ul className="grid gap-3 sm:grid-cols-2 lg:grid-cols-3">
      {set.branches.map((branch) => (
        <li key={branch.branch} className="border border-hair p-3">
          <p className="flex flex-wrap items-baseline justify-between gap-2">
            <Link className="font-semibold" to={paths.version(team, set.name, branch.number)}>
              {branch.branch} <span className="figure">v{branch.number}</span>
            </Link>
            <StateMark state={branch.verdict} />
          </p>
          <p className="mt-1 text-sm">
            <StateMark state={branch.change.state} />
          </p>
          <p className="text-sm text-soft">{branch.change.sentence}</p>
          <p className="label mt-1">{momentText(branch.pushedAt)}</p>
        </li>
      ))}
    </ul>
  )
}

function SetContent({ team, set }: { readonly team: string; readonly set: TemplateSet }): JSX.Element {
  const may = useMay(team)
  const { value } = useAddressFilter()
  useTitle(set.title)
  const latest = useQuery(versionQuery(team, set.name, set.latest.number))
  return (
    <>
      <SetNav team={team} set={set.name} number={set.latest.number} />
      <TitleBlock
        title={set.title === '' ? set.name : set.title}
        above={set.name}
        cells={[
          { label: setWords.state, value: <StateMark state={set.state} /> },
          { label: setWords.published, value: set.published ?? setWords.notPublished },
          { label: setWords.family, value: set.family ?? setWords.noFamily },
          { label: setWords.works, value: <span className="figure">{setWords.worksShare(set.latest.works)}</span> },
          {
            label: setWords.builds,
            value: <Link to={paths.builds(team, set.name, set.latest.number)}>{setWords.buildCount(set.builds)}</Link>,
          },
        ]}
        actions={
          <Link className="button" data-kind="main" to={paths.version(team, set.name, set.latest.number)}>
            {setWords.newest} v{set.latest.number}
          </Link>
        }
      />
      <div className="space-y-5">
        <Sheet title={setWords.branches}>
          <Branches team={team} set={set} />
        </Sheet>
        <Sheet title={trendWords.heading}>
          <Trend team={team} set={set.name} branch={value('branch')} />
        </Sheet>
        <Sheet title={setWords.versions}>
          <VersionsTable team={team} set={set.name} branches={set.branches.map(({ branch }) => branch)} />
        </Sheet>
        <Sheet title={publicationWords.heading}>
          <Publications
            team={team}
            set={set.name}
            pieces={Object.keys(latest.data?.report.pieces ?? {})}
            canPublish={may('publish')}
          />
        </Sheet>
        <Sheet title={setWords.failures}>
          <KnownFailures team={team} set={set.name} canEnd={may('failures:accept')} />
        </Sheet>
        <Sheet title={setWords.about}>
          <SetAbout key={set.name} team={team} set={set} canEdit={may('sets:edit')} />
        </Sheet>
      </div>
    </>
  )
}

/** A set: its branches, its trend, its versions, and what was published of it. */
export default function SetPage(): ReactNode {
  const team = usePart('team')
  const name = usePart('set')
  const set = useQuery(setQuery(team, name))
  return (
    <Loaded query={set} lines={8}>
      {(data) => <SetContent team={team} set={data} />}
    </Loaded>
  )
}
