import { useQuery } from '@tanstack/react-query'
import type { JSX, ReactNode } from 'react'
import { NavLink } from 'react-router-dom'
import type { Action } from '../../../shared/api/permissions.ts'
import { commonWords } from '../../words/common-words.ts'
import { teamWords } from '../../words/team-words.ts'
import { TitleBlock } from '../../ui/title-block.tsx'
import { useTitle } from '../../lib/use-title.ts'
import { teamQuery, useMay } from './team-queries.ts'

const parts: readonly (readonly [keyof typeof teamWords.parts, Action])[] = [
  ['team', 'team:read'],
  ['papers', 'sets:read'],
  ['tokens', 'tokens:own'],
  ['notices', 'notices:choose'],
  ['webhooks', 'webhooks:manage'],
  ['audit', 'audit:read'],
  ['settings', 'team:manage'],
]

const look = ({ isActive }: { readonly isActive: boolean }): string =>
  `inline-flex min-h-8 items-center border-b-2 text-sm no-underline text-ink ${isActive ? 'border-ink font-bold' : 'border-transparent border-dashed hover:border-stroke'}`

/** The head of the team's pages, with the parts the reader may see. */
export function TeamHead({
  team,
  title,
  actions,
}: {
  readonly team: string
  readonly title: string
  readonly actions?: ReactNode
}): JSX.Element {
  const may = useMay(team)
  const { data } = useQuery(teamQuery(team))
  useTitle(title)
  return (
    <>
      <nav aria-label={commonWords.teamPlaces} className="no-print mb-3">
        <ul className="flex flex-wrap gap-x-5 gap-y-0.5">
          {parts
            .filter(([, action]) => may(action))
            .map(([part]) => (
              <li key={part}>
                <NavLink end to={`/teams/${team}/${part}`} className={look}>
                  {teamWords.parts[part]}
                </NavLink>
              </li>
            ))}
        </ul>
      </nav>
      <TitleBlock title={title} above={data?.name ?? ''} actions={actions} />
    </>
  )
}
