import { useQuery } from '@tanstack/react-query'
import type { JSX } from 'react'
import { Link } from 'react-router-dom'
import { paths } from '../../app/paths.ts'
import { myBuildsQuery } from '../../features/builds/build-queries.ts'
import { dayText } from '../../lib/dates.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Empty, Loaded } from '../../ui/loaded.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { buildWords } from '../../words/build-words.ts'

const isOpen = (state: string): boolean => state !== 'revoked' && state !== 'expired'

/** What the reader is asked to build. */
export default function MyBuildsPage(): JSX.Element {
  useTitle(buildWords.mineTitle)
  const builds = useQuery(myBuildsQuery)
  return (
    <>
      <TitleBlock title={buildWords.mineTitle} />
      <Loaded
        query={builds}
        isEmpty={({ items }) => items.length === 0}
        empty={<Empty title={buildWords.mineEmpty}>{buildWords.mineEmptyHint}</Empty>}
      >
        {({ items }) => (
          <ul className="space-y-px bg-hair p-px">
            {items.map((item) => (
              <li key={item.key} className="flex flex-wrap items-center justify-between gap-3 bg-sheet p-4">
                <div className="min-w-0">
                  <h2 className="text-base">{item.title}</h2>
                  <p className="label">
                    {[
                      item.team,
                      item.stamp,
                      buildWords.states[item.state],
                      item.dueOn === null ? null : buildWords.due(dayText(item.dueOn)),
                    ]
                      .filter((part) => part !== null)
                      .join(' · ')}
                  </p>
                </div>
                {isOpen(item.state) ? (
                  <Link
                    className="button"
                    data-kind="main"
                    to={paths.testForm(item.key)}
                    aria-label={`${buildWords.openForm}: ${item.title}`}
                  >
                    {buildWords.openForm}
                  </Link>
                ) : null}
              </li>
            ))}
          </ul>
        )}
      </Loaded>
    </>
  )
}
