import { useQuery } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { setStates } from '../../../shared/api/set-endpoints.ts'
import type { AddressFilter } from '../../lib/use-address-filter.ts'
import { Field } from '../../ui/field.tsx'
import { setsWords } from '../../words/sets-words.ts'
import { stateWords } from '../../words/state-words.ts'
import { setWordsQuery } from './set-queries.ts'

const names = ['search', 'family', 'state', 'branch', 'tag'] as const

function Choice({
  name,
  label,
  options,
  filter,
}: {
  readonly name: string
  readonly label: string
  readonly options: readonly { readonly value: string; readonly text: string }[]
  readonly filter: AddressFilter
}): JSX.Element {
  return (
    <Field label={label}>
      {(parts) => (
        <select
          {...parts}
          className="field"
          value={filter.value(name)}
          onChange={({ target }) => filter.choose({ [name]: target.value })}
        >
          <option value="">{setsWords.any}</option>
          {options.map(({ value, text }) => (
            <option key={value} value={value}>
              {text}
            </option>
          ))}
        </select>
      )}
    </Field>
  )
}

/** Filters of the list of sets; each lives in the address. */
export function SetFilters({ team, filter }: { readonly team: string; readonly filter: AddressFilter }): JSX.Element {
  const known = useQuery(setWordsQuery(team))
  const search = filter.value('search')
  const [typed, setTyped] = useState(search)
  const same = (values: readonly string[] | undefined) => (values ?? []).map((value) => ({ value, text: value }))
  const isFiltered = names.some((name) => filter.value(name) !== '')
  return (
    <form
      role="search"
      aria-label={setsWords.filters}
      className="sheet mb-5 grid items-end gap-3 p-4 sm:grid-cols-2 lg:grid-cols-[2fr_repeat(4,1fr)_auto]"
      onSubmit={(event) => {
        event.preventDefault()
        filter.choose({ search: typed.trim() })
      }}
    >
      <Field label={setsWords.search}>
        {(parts) => (
          <input
            {...parts}
            type="search"
            className="field"
            maxLength={100}
            placeholder={setsWords.searchHint}
            value={typed}
            onChange={({ target }) => setTyped(target.value)}
            onBlur={() => typed.trim() !== search && filter.choose({ search: typed.trim() })}
          />
        )}
      </Field>
      <Choice name="family" label={setsWords.family} options={same(known.data?.families)} filter={filter} />
      <Choice
        name="state"
        label={setsWords.state}
        options={setStates.map((state) => ({ value: state, text: stateWords[state] }))}
        filter={filter}
      />
      <Choice name="branch" label={setsWords.branch} options={same(known.data?.branches)} filter={filter} />
      <Choice name="tag" label={setsWords.tag} options={same(known.data?.tags)} filter={filter} />
      <button
        type="button"
        className="button min-h-10"
        disabled={!isFiltered}
        onClick={() => {
          setTyped('')
          filter.choose(Object.fromEntries(names.map((name) => [name, ''])))
        }}
      >
        {setsWords.clear}
      </button>
    </form>
  )
}
