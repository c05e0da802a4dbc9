import { useInfiniteQuery, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { limits } from '../../../shared/api/limits.ts'
import { upkeepEndpoints } from '../../../shared/api/upkeep-endpoints.ts'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { TeamHead } from '../../features/team/team-head.tsx'
import { useMay } from '../../features/team/team-queries.ts'
import { useTeamAction } from '../../features/team/use-team-action.ts'
import { call } from '../../lib/api.ts'
import { momentText } from '../../lib/dates.ts'
import { csvText, saveText } from '../../lib/save-text.ts'
import { bareIn, lengthIn, readLength, useUnits } from '../../lib/units.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { usePart } from '../../lib/use-part.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Field } from '../../ui/field.tsx'
import { Empty, Failed, Waiting } from '../../ui/loaded.tsx'
import { MoreRows } from '../../ui/more-rows.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { SureButton } from '../../ui/sure-button.tsx'
import { commonWords } from '../../words/common-words.ts'
import { teamWords } from '../../words/team-words.ts'

type Paper = AnswerOf<typeof upkeepEndpoints.papers>['items'][number]
const methods = ['single-sheet', 'stack-of-ten'] as const

function PaperForm({ team }: { readonly team: string }): JSX.Element {
  const units = useUnits()
  const client = useQueryClient()
  const [stock, setStock] = useState('')
  const [method, setMethod] = useState<(typeof methods)[number]>('stack-of-ten')
  const [typed, setTyped] = useState('')
  const [note, setNote] = useState('')
  const readings = typed
    .split(/[\s;]+/)
    .filter((part) => part !== '')
    .map((part) => readLength(part, units))
  const isWrong = readings.some((reading) => reading === null || reading <= 0)
  const add = useTeamAction([['papers', team]], async () => {
    await call(upkeepEndpoints.addPaper, {
      params: { team },
      body: { stock, method, readings: readings.filter((reading) => reading !== null), note },
    })
    setTyped('')
    setNote('')
    await client.invalidateQueries({ queryKey: ['papers', team] })
  })
  return (
    <form
      className="grid gap-3 sm:grid-cols-2"
      onSubmit={(event) => {
        event.preventDefault()
        add.mutate(undefined)
      }}
    >
      <Field label={teamWords.stock}>
        {(parts) => (
          <input
            {...parts}
            required
            maxLength={limits.name}
            className="field"
            value={stock}
            onChange={({ target }) => setStock(target.value)}
          />
        )}
      </Field>
      <Field label={teamWords.method}>
        {(parts) => (
          <select
            {...parts}
            className="field"
            value={method}
            onChange={({ target }) => setMethod(methods.find((name) => name === target.value) ?? 'single-sheet')}
          >
            {methods.map((name) => (
              <option key={name} value={name}>
                {teamWords.methods[name]}
              </option>
            ))}
          </select>
        )}
      </Field>
      <Field
        label={teamWords.readings}
        hint={teamWords.readingsHint(units)}
        error={isWrong ? teamWords.readingsWrong : undefined}
      >
        {(parts) => (
          <input
            {...parts}
            required
            inputMode="decimal"
            className="field figure"
            value={typed}
            onChange={({ target }) => setTyped(target.value)}
          />
        )}
      </Field>
      <Field label={teamWords.note}>
        {(parts) => (
          <input
            {...parts}
            maxLength={limits.note}
            className="field"
            value={note}
            onChange={({ target }) => setNote(target.value)}
          />
        )}
      </Field>
      <div className="sm:col-span-2">
        <RefusalNote error={add.error} />
        <button
          type="submit"
          className="button"
          data-kind="main"
          disabled={add.isPending || isWrong || readings.length === 0}
        >
          {add.isPending ? commonWords.sending : teamWords.addPaper}
        </button>
      </div>
    </form>
  )
}

function Papers({ team, canEdit }: { readonly team: string; readonly canEdit: boolean }): JSX.Element {
  const units = useUnits()
  const { value } = useAddressFilter()
  const stock = value('stock')
  const papers = useInfiniteQuery({
    queryKey: ['papers', team, stock],
    queryFn: ({ pageParam, signal }) =>
      call(upkeepEndpoints.papers, {
        params: { team },
        query: { ...(stock === '' ? {} : { stock }), ...(pageParam === null ? {} : { cursor: pageParam }) },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  })
  const remove = useTeamAction([['papers', team]], (paper: string) =>
    call(upkeepEndpoints.removePaper, { params: { team, paper } }),
  )
  const rows = papers.data?.pages.flatMap(({ items }) => items) ?? []
  if (papers.data === undefined)
    return papers.isError ? <Failed error={papers.error} onAgain={() => void papers.refetch()} /> : <Waiting />
  if (rows.length === 0) return <Empty title={teamWords.papersEmpty}>{teamWords.papersExplain}</Empty>
  const save = (): void =>
    saveText(
      'papers.csv',
      csvText(
        ['stock', 'method', 'mean_mm', 'spread_mm', 'readings_mm', 'note', 'by', 'at'],
        rows.map((row) => [
          row.stock,
          row.method,
          row.mean,
          row.spread,
          row.readings.join(' '),
          row.note,
          row.by,
          row.at,
        ]),
      ),
    )
  return (
    <>
      <RefusalNote error={remove.error} />
      <DataTable
        caption={teamWords.papersTitle}
        rows={rows}
        keyOf={(row) => row.id}
        columns={[
          {
            name: teamWords.stock,
            isHead: true,
            cell: (row: Paper) => (
              <>
                {row.stock}
                <div className="label">{teamWords.methods[row.method]}</div>
              </>
            ),
          },
          {
            name: teamWords.mean,
            isFigure: true,
            cell: (row) => <span className="font-bold">{lengthIn(row.mean, units)}</span>,
          },
          {
            name: teamWords.spread,
            isFigure: true,
            cell: (row) => (row.spread === null ? '–' : lengthIn(row.spread, units)),
          },
          {
            name: teamWords.readings,
            isFigure: true,
            isExtra: true,
            cell: (row) => row.readings.map((reading) => bareIn(reading, units)).join('  '),
          },
          { name: teamWords.note, isExtra: true, cell: (row) => row.note },
          { name: teamWords.at, isExtra: true, cell: (row) => `${momentText(row.at)}, ${row.by}` },
          ...(canEdit
            ? [
                {
                  name: commonWords.remove,
                  cell: (row: Paper) => (
                    <SureButton
                      name={commonWords.remove}
                      label={`${commonWords.remove}: ${row.stock}`}
                      isBusy={remove.isPending}
                      onSure={() => remove.mutate(row.id)}
                    />
                  ),
                },
              ]
            : []),
        ]}
      />
      <div className="mt-3">
        <button type="button" className="button" onClick={save}>
          {commonWords.csv}
        </button>
      </div>
      <MoreRows query={papers} count={rows.length} />
    </>
  )
}

export default function PapersPage(): JSX.Element {
  const team = usePart('team')
  const canEdit = useMay(team)('papers:edit')
  const { value, choose } = useAddressFilter()
  return (
    <>
      <TeamHead team={team} title={teamWords.papersTitle} />
      <div className="space-y-5">
        <Sheet
          title={teamWords.readings}
          aside={
            <label className="flex items-center gap-2 text-sm">
              {teamWords.filterStock}
              <input
                type="search"
                className="field w-40"
                defaultValue={value('stock')}
                onBlur={({ target }) => choose({ stock: target.value.trim() })}
              />
            </label>
          }
        >
          <Papers team={team} canEdit={canEdit} />
        </Sheet>
        {canEdit ? (
          <Sheet title={teamWords.addPaper}>
            <p className="mb-3 text-sm text-soft">{teamWords.papersExplain}</p>
            <PaperForm team={team} />
          </Sheet>
        ) : null}
      </div>
    </>
  )
}
