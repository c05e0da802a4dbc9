import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { JSX, ReactNode } from 'react'
import { Link, NavLink, useLocation, useNavigate } from 'react-router-dom'
import { accountEndpoints } from '../../shared/api/account-endpoints.ts'
import { meQuery, type Me } from '../features/session/session-queries.ts'
import { call } from '../lib/api.ts'
import { announceSession } from '../lib/session-channel.ts'
import { chooseTheme, themes, useTheme } from '../lib/theme.ts'
import { chooseUnits, useUnits } from '../lib/units.ts'
import { commonWords } from '../words/common-words.ts'
import { paths } from './paths.ts'

const tab = ({ isActive }: { readonly isActive: boolean }): string =>
  `inline-flex min-h-9 items-center border-b-[3px] px-0.5 text-sm font-semibold no-underline text-ink ${isActive ? 'border-ink' : 'border-transparent hover:border-hair'}`

export interface Place {
  readonly to: string
  readonly name: string
  /** Further addresses that belong to the place. */
  readonly also?: RegExp
}

/** Links to places as the tabs of a folder; the one that is open is underlined like a cut. */
export function PlaceNav({
  label,
  places,
}: {
  readonly label: string
  readonly places: readonly Place[]
}): JSX.Element {
  const { pathname } = useLocation()
  return (
    <nav aria-label={label} className="min-w-0">
      <ul className="flex flex-wrap gap-x-5">
        {places.map(({ to, name, also }) => {
          const isOpen = also?.test(pathname) === true
          return (
            <li key={to}>
              <NavLink
                to={to}
                className={({ isActive }) => tab({ isActive: isActive || isOpen })}
                {...(isOpen ? { 'aria-current': 'page' } : {})}
              >
                {name}
              </NavLink>
            </li>
          )
        })}
      </ul>
    </nav>
  )
}

function UnitChoice(): JSX.Element {
  const units = useUnits()
  return (
    <fieldset className="flex">
      <legend className="sr-only">{commonWords.units}</legend>
      {(['mm', 'in'] as const).map((unit) => (
        <label
          key={unit}
          className={`figure relative inline-flex h-8 min-w-9 cursor-pointer items-center justify-center border border-ink px-2 text-sm has-focus-visible:outline-2 has-focus-visible:outline-offset-2 ${units === unit ? 'bg-ink text-on-ink' : 'bg-sheet'}`}
        >
          <input
            type="radio"
            name="units"
            className="absolute inset-0 size-full cursor-pointer opacity-0"
            checked={units === unit}
            onChange={() => chooseUnits(unit)}
            aria-label={unit === 'mm' ? commonWords.millimetres : commonWords.inches}
          />
          {unit}
        </label>
      ))}
    </fieldset>
  )
}

function ThemeChoice(): JSX.Element {
  const theme = useTheme()
  return (
    <select
      aria-label={commonWords.theme}
      className="h-8 max-w-28 border border-stroke bg-sheet px-1 text-sm"
      value={theme}
      onChange={({ target }) => chooseTheme(themes.find((name) => name === target.value) ?? 'system')}
    >
      {themes.map((name) => (
        <option key={name} value={name}>
          {commonWords.themes[name]}
        </option>
      ))}
    </select>
  )
}

function SignOut(): JSX.Element {
  const client = useQueryClient()
  const navigate = useNavigate()
  const leave = useMutation({
    mutationFn: () => call(accountEndpoints.signOut),
    onSettled: () => {
      client.clear()
      client.setQueryData(meQuery.queryKey, null)
      announceSession()
      void navigate(paths.signIn)
    },
  })
  return (
    <button type="button" className="button" data-size="small" onClick={() => leave.mutate()}>
      {commonWords.signOut}
    </button>
  )
}

/** The head of every page: the mark, places, units, theme, and who is signed in. */
export function PageHead({ me, children }: { readonly me: Me | null; readonly children?: ReactNode }): JSX.Element {
  return (
    <header className="no-print border-b border-hair bg-sheet">
      <a href="#page" className="absolute -top-20 left-2 z-50 bg-ink px-3 py-2 text-on-ink focus:top-2">
        {commonWords.skip}
      </a>
      <div className="mx-auto flex max-w-[84rem] flex-wrap items-center gap-x-6 gap-y-1 px-4 pt-2">
        <Link
          to={paths.home}
          className="figure inline-flex items-center gap-2 text-[1.05rem] font-bold text-ink no-underline"
        >
          <svg viewBox="0 0 24 24" className="size-6" aria-hidden="true">
            <path d="M3 6v14h18V6" fill="none" stroke="var(--ink)" strokeWidth="2.4" />
            <path d="M6.5 4v12.5h11V4" fill="none" stroke="var(--link)" strokeWidth="1.6" strokeDasharray="3 1.6" />
          </svg>
          {commonWords.product}
        </Link>
        <div className="order-last w-full min-w-0 lg:order-none lg:w-auto lg:flex-1">{children}</div>
        <div className="ml-auto flex flex-wrap items-center gap-2 py-1">
          <UnitChoice />
          <ThemeChoice />
          {me === null ? null : (
            <>
              <NavLink to={paths.account} className={tab}>
                <span className="max-w-32 truncate">{me.name}</span>
              </NavLink>
              <SignOut />
            </>
          )}
        </div>
      </div>
      <div className="rule-edge" aria-hidden="true" />
    </header>
  )
}
