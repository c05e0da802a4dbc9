import type { JSX } from 'react'
import { NavLink } from 'react-router-dom'
import { paths } from '../../app/paths.ts'
import { commonWords } from '../../words/common-words.ts'

const look = ({ isActive }: { readonly isActive: boolean }): string =>
  `inline-flex min-h-8 items-center border-b-2 text-sm no-underline text-ink ${isActive ? 'border-ink font-bold' : 'border-transparent border-dashed hover:border-stroke'}`

/** Places of one set; those of a version once one is looked at. */
export function SetNav({
  team,
  set,
  number,
}: {
  readonly team: string
  readonly set: string
  readonly number: number
}): JSX.Element {
  const { setNav } = commonWords
  const places = [
    [paths.set(team, set), setNav.set],
    [paths.version(team, set, number), `${setNav.version} ${String(number)}`],
    [paths.compare(team, set, number), setNav.compare],
    [paths.review(team, set, number), setNav.review],
    [paths.numbers(team, set, number), setNav.numbers],
    [paths.builds(team, set, number), setNav.builds],
  ] as const
  return (
    <nav aria-label={commonWords.setPlaces} className="no-print mb-3">
      <ul className="flex flex-wrap gap-x-5 gap-y-0.5">
        {places.map(([to, name]) => (
          <li key={to}>
            <NavLink end to={to} className={look}>
              {name}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  )
}
