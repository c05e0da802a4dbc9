import { useQuery } from '@tanstack/react-query'
import { useState, type JSX, type ReactNode } from 'react'
import {
  numberSheetQuery,
  numbersCsvAddress,
  useTick,
  type Measure,
  type NumberSheet,
  type Place,
} from '../../features/numbers/number-queries.ts'
import { NumberTable } from '../../features/numbers/number-table.tsx'
import { QueryForm } from '../../features/numbers/query-form.tsx'
import { SetNav } from '../../features/sets/set-nav.tsx'
import { useMay } from '../../features/team/team-queries.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Empty, Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { numbersWords } from '../../words/numbers-words.ts'
import { versionWords } from '../../words/version-words.ts'

const filters = ['', 'open', 'changed', 'queried', 'ticked'] as const

function Progress({ sheet }: { readonly sheet: NumberSheet }): JSX.Element {
  return (
    <div className="mb-4">
      <p role="status" className="figure text-sm font-bold">
        {numbersWords.counts(sheet.ticked, sheet.queried, sheet.open)}
      </p>
      <progress
        className="mt-1 h-2 w-full accent-pass"
        aria-label={numbersWords.progress}
        max={sheet.items.length}
        value={sheet.ticked}
      />
    </div>
  )
}

function Sheet({ place, sheet }: { readonly place: Place; readonly sheet: NumberSheet }): JSX.Element {
  const mayTick = useMay(place.team)('numbers:tick')
  const tick = useTick(place)
  const { value, choose } = useAddressFilter()
  const [queried, setQueried] = useState<Measure | null>(null)
  const state = value('state')
  const of = value('of')
  const owners = [...new Set(sheet.items.map(({ piece, fit }) => piece ?? fit ?? ''))]
  const shown = sheet.items.filter(
    (item) => (state === '' || item.state === state) && (of === '' || (item.piece ?? item.fit) === of),
  )
  const names = new Map(sheet.items.map(({ key, what }) => [key, what]))
  const open = shown.filter((item) => item.state === 'open' || item.state === 'changed')
  return (
    <section className="sheet p-4 sm:p-5" aria-label={numbersWords.title}>
      <Progress sheet={sheet} />
      <div className="mb-3 flex flex-wrap items-end gap-3">
        <label className="text-sm font-semibold">
          {numbersWords.filter}
          <select className="field" value={state} onChange={({ target }) => choose({ state: target.value })}>
            {filters.map((name) => (
              <option key={name} value={name}>
                {numbersWords.filters[name]}
              </option>
            ))}
          </select>
        </label>
        <label className="text-sm font-semibold">
          {numbersWords.piece}
          <select className="field" value={of} onChange={({ target }) => choose({ of: target.value })}>
            <option value="">{numbersWords.anyPiece}</option>
            {owners.map((name) => (
              <option key={name}>{name}</option>
            ))}
          </select>
        </label>
        {mayTick && open.length > 0 ? (
          <button
            type="button"
            className="button min-h-10"
            disabled={tick.isPending}
            onClick={() => tick.mutate({ keys: open.map(({ key }) => key), state: 'ticked' })}
          >
            {numbersWords.tickAll(open.length)}
          </button>
        ) : null}
      </div>
      {mayTick ? null : <p className="mb-2 text-sm text-soft">{numbersWords.readOnly}</p>}
      <RefusalNote error={tick.error} />
      {shown.length === 0 ? (
        <Empty title={numbersWords.empty} />
      ) : (
        <NumberTable
          items={shown}
          nameOf={(key) => names.get(key) ?? key}
          onTick={mayTick ? (item, next) => tick.mutate({ keys: [item.key], state: next }) : null}
          onQuery={setQueried}
        />
      )}
      <QueryForm
        item={queried}
        onClose={() => setQueried(null)}
        onSend={(item, note) => tick.mutate({ keys: [item.key], state: 'queried', note })}
      />
    </section>
  )
}

/** The editor's job: every measure that will be published, ticked or queried. */
export default function NumbersPage(): ReactNode {
  const place = { team: usePart('team'), set: usePart('set'), number: Number(usePart('number')) }
  useTitle(`${numbersWords.title}: ${place.set}`)
  const sheet = useQuery(numberSheetQuery(place))
  return (
    <>
      <SetNav {...place} />
      <TitleBlock
        title={numbersWords.title}
        above={`${place.set} · ${versionWords.version(place.number)}`}
        actions={
          <a className="button" href={numbersCsvAddress(place)} download>
            {commonWords.csv}
          </a>
        }
      />
      <Loaded
        query={sheet}
        lines={8}
        isEmpty={({ items }) => items.length === 0}
        empty={<Empty title={numbersWords.none} />}
      >
        {(data) => <Sheet place={place} sheet={data} />}
      </Loaded>
    </>
  )
}
