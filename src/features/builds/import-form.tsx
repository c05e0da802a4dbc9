import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { buildEndpoints } from '../../../shared/api/build-endpoints.ts'
import { call } from '../../lib/api.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { buildWords } from '../../words/build-words.ts'
import { commonWords } from '../../words/common-words.ts'
import { templateAddress, type Import, type Place } from './build-queries.ts'

interface Options {
  readonly separator: '' | 'comma' | 'semicolon' | 'tab'
  readonly decimal: '' | 'point' | 'comma'
  readonly units: '' | 'mm' | 'in'
}

const choices = {
  separator: ['', 'comma', 'semicolon', 'tab'],
  decimal: ['', 'point', 'comma'],
  units: ['', 'mm', 'in'],
} as const
const labels = { separator: buildWords.separator, decimal: buildWords.decimal, units: buildWords.unit } as const

function Preview({ read }: { readonly read: Import }): JSX.Element {
  return (
    <div className="space-y-3">
      <p role="status" className="font-semibold">
        {read.isStored ? buildWords.stored : ''} {buildWords.importSummary(read.rows, read.builds)}
      </p>
      {read.problems.length === 0 ? null : (
        <div role="alert" className="border-l-4 border-fail bg-fail-wash p-3 text-sm">
          <p className="font-semibold">{buildWords.importProblems}</p>
          <ul>
            {read.problems.map((problem, index) => (
              <li key={index}>
                {buildWords.line} {problem.line}
                {problem.column === '' ? '' : `, ${problem.column}`}: {problem.message}
              </li>
            ))}
          </ul>
        </div>
      )}
      <DataTable
        caption={`${buildWords.readAs}: ${buildWords.separators[read.separator]}, ${buildWords.decimals[read.decimal]}, ${read.units}`}
        isCaptionShown
        rows={read.preview}
        keyOf={(row) => `${String(row.line)} ${row.key} ${row.written} ${row.read}`}
        columns={[
          { name: buildWords.line, isFigure: true, cell: (row) => row.line },
          { name: buildWords.tester, isHead: true, cell: (row) => row.tester },
          { name: buildWords.key, cell: (row) => <span className="figure">{row.key}</span> },
          { name: buildWords.written, isFigure: true, cell: (row) => row.written },
          { name: buildWords.readIt, isFigure: true, cell: (row) => row.read },
        ]}
      />
    </div>
  )
}

/** Reads a sheet of readings: a preview first, then all of it or nothing. */
export function ImportForm({ place }: { readonly place: Place }): JSX.Element {
  const client = useQueryClient()
  const [text, setText] = useState<string | null>(null)
  const [options, setOptions] = useState<Options>({ separator: '', decimal: '', units: '' })
  const read = useMutation({
    mutationFn: ({ body, store, with: chosen }: { body: string; store: boolean; with: Options }) =>
      call(buildEndpoints.importBuilds, {
        params: place,
        query: {
          store: store ? 'true' : 'false',
          ...(chosen.separator === '' ? {} : { separator: chosen.separator }),
          ...(chosen.decimal === '' ? {} : { decimal: chosen.decimal }),
          ...(chosen.units === '' ? {} : { units: chosen.units }),
        },
        body: body as never,
      }),
    onSuccess: (answer) => (answer.isStored ? client.invalidateQueries() : undefined),
  })
  const choose = (changes: Partial<Options>): void => {
    const chosen = { ...options, ...changes }
    setOptions(chosen)
    if (text !== null) read.mutate({ body: text, store: false, with: chosen })
  }
  return (
    <div className="space-y-4">
      <p className="text-sm">
        {buildWords.importHint}{' '}
        <a href={templateAddress(place, 'mm')} download>
          {buildWords.template('mm')}
        </a>
        {', '}
        <a href={templateAddress(place, 'in')} download>
          {buildWords.template('in')}
        </a>
      </p>
      <div className="flex flex-wrap items-end gap-3">
        <label className="button relative min-h-10 has-focus-visible:outline-2">
          {read.isPending ? commonWords.sending : buildWords.chooseCsv}
          <input
            type="file"
            accept=".csv,text/csv"
            className="absolute inset-0 size-full cursor-pointer opacity-0"
            onChange={({ target }) => {
              const file = target.files?.[0]
              target.value = ''
              if (file === undefined) return
              void file.text().then((body) => {
                setText(body)
                read.mutate({ body, store: false, with: options })
              })
            }}
          />
        </label>
        {(['separator', 'decimal', 'units'] as const).map((name) => (
          <Field key={name} label={labels[name]}>
            {(parts) => (
              <select
                {...parts}
                className="field"
                value={options[name]}
                onChange={({ target }) => choose({ [name]: target.value })}
              >
                {choices[name].map((value) => (
                  <option key={value} value={value}>
                    {value === '' ? buildWords.guess : value}
                  </option>
                ))}
              </select>
            )}
          </Field>
        ))}
      </div>
      <RefusalNote error={read.error} />
      {read.data === undefined ? null : <Preview read={read.data} />}
      {read.data !== undefined && !read.data.isStored && read.data.problems.length === 0 && text !== null ? (
        <button
          type="button"
          className="button"
          data-kind="main"
          disabled={read.isPending}
          onClick={() => read.mutate({ body: text, store: true, with: options })}
        >
          {buildWords.store}
        </button>
      ) : null}
    </div>
  )
}
