import { useQuery } from '@tanstack/react-query'
import { useState, type JSX, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { paths } from '../../app/paths.ts'
import { holdsQuery, type Hold, type Thing } from '../../features/sets/set-queries.ts'
import { csvText, saveText } from '../../lib/save-text.ts'
import { bareIn, readLength, useUnits } from '../../lib/units.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Field } from '../../ui/field.tsx'
import { HundredStrip } from '../../ui/hundred-strip.tsx'
import { Empty, Loaded } from '../../ui/loaded.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { setsWords } from '../../words/sets-words.ts'

const parts = ['length', 'width', 'height'] as const

function SizeForm(): JSX.Element {
  const units = useUnits()
  const { value, choose } = useAddressFilter()
  const written = (name: string): string => {
    const mm = Number(value(name))
    return value(name) === '' || !Number.isFinite(mm) ? '' : bareIn(mm, units)
  }
  const [typed, setTyped] = useState(() => ({
    length: written('length'),
    width: written('width'),
    height: written('height'),
  }))
  const [isSent, setIsSent] = useState(false)
  const errorOf = (name: (typeof parts)[number]): string | undefined => {
    const isEmptyHeight = name === 'height' && typed.height.trim() === ''
    const mm = readLength(typed[name], units)
    return isSent && !isEmptyHeight && (mm === null || mm <= 0) ? setsWords.badLength(units) : undefined
  }
  return (
    <form
      role="search"
      aria-label={setsWords.holdsTitle}
      noValidate
      className="sheet mb-5 grid items-start gap-3 p-4 sm:grid-cols-[1fr_1fr_1fr_auto]"
      onSubmit={(event) => {
        event.preventDefault()
        setIsSent(true)
        const [length, width, height] = parts.map((name) => readLength(typed[name], units))
        if (length == null || width == null || (height === null && typed.height.trim() !== '')) return
        choose({ length: String(length), width: String(width), height: height == null ? '' : String(height) })
      }}
    >
      {parts.map((name) => (
        <Field
          key={name}
          label={`${setsWords[name]} (${units})`}
          hint={name === 'height' ? setsWords.heightHint : undefined}
          error={errorOf(name)}
        >
          {(control) => (
            <input
              {...control}
              inputMode="decimal"
              className="field figure"
              value={typed[name]}
              onChange={({ target }) => setTyped({ ...typed, [name]: target.value })}
            />
          )}
        </Field>
      ))}
      <button type="submit" className="button min-h-10 sm:mt-6" data-kind="main">
        {setsWords.find}
      </button>
    </form>
  )
}

function Found({ team, items }: { readonly team: string; readonly items: readonly Hold[] }): JSX.Element {
  const units = useUnits()
  const triple = (size: { readonly length: number; readonly width: number; readonly depth: number | null }): string =>
    [size.length, size.width, size.depth]
      .filter((part) => part !== null)
      .map((part) => bareIn(part, units))
      .join(' × ')
  const save = (): void =>
    saveText(
      'holds.csv',
      csvText(
        [
          'set',
          'piece',
          'kind',
          'version',
          'goes_in',
          'turned',
          'clearance_length_mm',
          'clearance_width_mm',
          'clearance_depth_mm',
        ],
        items.map((hold) => [
          hold.set,
          hold.piece,
          hold.kind,
          hold.number,
          hold.goesIn,
          hold.isTurned,
          hold.clearance.length,
          hold.clearance.width,
          hold.clearance.depth,
        ]),
      ),
    )
  return (
    <section className="sheet p-4 sm:p-5" aria-label={setsWords.holdsTitle}>
      <DataTable
        caption={setsWords.holdsTitle}
        rows={items}
        keyOf={(row) => `${row.set} ${row.piece}`}
        columns={[
          {
            name: setsWords.piece,
            isHead: true,
            cell: (row) => (
              <>
                {row.piece} <span className="label">{row.kind}</span>
                <div className="font-normal">
                  <Link to={`${paths.version(team, row.set, row.number)}#piece-${row.piece}`}>{row.title}</Link>
                </div>
              </>
            ),
          },
          { name: setsWords.goes, cell: (row) => <HundredStrip binds={1 - row.goesIn} rattles={0} isCompact /> },
          {
            name: setsWords.room,
            isFigure: true,
            cell: (row) => (
              <>
                {triple(row.clearance)}
                {row.isTurned ? <div className="font-sans text-soft">{setsWords.turned}</div> : null}
              </>
            ),
          },
          { name: setsWords.inside, isFigure: true, isExtra: true, cell: (row) => triple(row.inside) },
        ]}
      />
      <button type="button" className="button mt-3" onClick={save}>
        {commonWords.csv}
      </button>
    </section>
  )
}

function Holds({ team, thing }: { readonly team: string; readonly thing: Thing }): ReactNode {
  const holds = useQuery(holdsQuery(team, thing))
  return (
    <Loaded
      query={holds}
      lines={6}
      isEmpty={({ items }) => items.length === 0}
      empty={<Empty title={setsWords.holdsEmpty}>{setsWords.holdsEmptyHint}</Empty>}
    >
      {({ items }) => <Found team={team} items={items} />}
    </Loaded>
  )
}

/** What in the library holds a thing of this size. */
export default function HoldsPage(): JSX.Element {
  useTitle(setsWords.holdsTitle)
  const team = usePart('team')
  const units = useUnits()
  const { value } = useAddressFilter()
  const number = (name: string): number | null => {
    const mm = Number(value(name))
    return value(name) !== '' && Number.isFinite(mm) && mm > 0 ? mm : null
  }
  const [length, width, height] = [number('length'), number('width'), number('height')]
  return (
    <>
      <TitleBlock title={setsWords.holdsTitle} above={<Link to={paths.sets(team)}>{setsWords.title}</Link>} />
      <p className="mb-3 text-sm text-soft">{setsWords.holdsExplain}</p>
      <SizeForm key={units} />
      {length === null || width === null ? (
        <Empty title={setsWords.holdsBegin} />
      ) : (
        <Holds team={team} thing={{ length, width, height }} />
      )}
    </>
  )
}
