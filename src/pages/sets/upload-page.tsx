import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useMemo, useState, type JSX } from 'react'
import { Link } from 'react-router-dom'
import { limits } from '../../../shared/api/limits.ts'
import { paths } from '../../app/paths.ts'
import { judgeText } from '../../features/engine/judge-text.ts'
import { pushSets, type Pushed } from '../../features/engine/push-sets.ts'
import { FileChoice } from '../../features/upload/file-choice.tsx'
import { findSets, type Found } from '../../features/upload/found-files.ts'
import { today } from '../../lib/dates.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { setsWords } from '../../words/sets-words.ts'
import { setWords } from '../../words/set-words.ts'

function FoundSets({ team, found }: { readonly team: string; readonly found: Found }): JSX.Element {
  const client = useQueryClient()
  const [branch, setBranch] = useState('')
  const [asOf] = useState(today)
  const judged = useMemo(
    () => found.sets.map(({ file, text }) => ({ file, report: judgeText(text, found.workspace, { file, asOf }) })),
    [found, asOf],
  )
  const push = useMutation({
    mutationFn: () => pushSets(team, found.workspace, found.sets, branch),
    onSuccess: () => client.invalidateQueries(),
  })
  const large = found.sets.find(({ text }) => text.length > limits.setText)
  if (push.data !== undefined) return <PushedSets team={team} pushed={push.data} />
  return (
    <Sheet title={setsWords.found(found.sets.length)}>
      <p className="mb-2 text-sm">
        {found.workspace === null ? setsWords.workspaceNone : setsWords.workspaceFound(found.workspace.file)}
      </p>
      {found.sets.length === 0 ? (
        <p className="text-sm text-soft">{setsWords.noSets}</p>
      ) : (
        <>
          <DataTable
            caption={setsWords.found(found.sets.length)}
            rows={judged}
            keyOf={(row) => row.file}
            columns={[
              { name: setsWords.inSet, isHead: true, cell: (row) => row.report.title },
              { name: setWords.verdict, cell: (row) => <StateMark state={row.report.summary.verdict} /> },
              { name: setWords.works, isFigure: true, cell: (row) => setWords.worksShare(row.report.summary.works) },
              {
                name: setsWords.worst,
                isExtra: true,
                cell: (row) =>
                  row.report.errors[0]?.message ??
                  row.report.verdicts.find(({ status }) => status === 'fail')?.message ??
                  '',
              },
            ]}
          />
          <form
            className="mt-4 space-y-3"
            onSubmit={(event) => {
              event.preventDefault()
              push.mutate()
            }}
          >
            <Field
              label={setsWords.branch}
              hint={setsWords.branchHint}
              error={large === undefined ? undefined : setsWords.tooLarge(large.file)}
            >
              {(parts) => (
                <input
                  {...parts}
                  maxLength={limits.branch}
                  className="field max-w-72"
                  value={branch}
                  onChange={({ target }) => setBranch(target.value)}
                />
              )}
            </Field>
            <RefusalNote error={push.error} />
            <button type="submit" className="button" data-kind="main" disabled={push.isPending || large !== undefined}>
              {push.isPending ? setsWords.pushing : setsWords.push}
            </button>
            {push.isPending ? <progress aria-label={setsWords.pushing} className="ml-3 align-middle" /> : null}
          </form>
        </>
      )}
    </Sheet>
  )
}

function PushedSets({ team, pushed }: { readonly team: string; readonly pushed: Pushed }): JSX.Element {
  return (
    <Sheet title={setsWords.pushed}>
      <div role="status">
        <DataTable
          caption={setsWords.pushed}
          rows={pushed.sets}
          keyOf={(row) => row.set}
          columns={[
            {
              name: setsWords.inSet,
              isHead: true,
              cell: (row) => (
                <Link to={paths.version(team, row.set, row.number)}>
                  {row.set} v{row.number}
                </Link>
              ),
            },
            { name: setWords.verdict, cell: (row) => <StateMark state={row.verdict} /> },
            { name: setWords.change, cell: (row) => row.change.sentence },
            { name: setWords.state, isExtra: true, cell: (row) => (row.isNew ? setsWords.isNew : setsWords.wasThere) },
          ]}
        />
        {pushed.ripple.length === 0 ? null : (
          <p className="mt-3 text-sm">
            {setsWords.ripple}: {pushed.ripple.map(({ set }) => set).join(', ')}
          </p>
        )}
      </div>
    </Sheet>
  )
}

/** Files dropped or chosen here are judged at once and pushed as the command line does. */
export default function UploadPage(): JSX.Element {
  useTitle(setsWords.uploadTitle)
  const team = usePart('team')
  const [found, setFound] = useState<{ readonly id: number; readonly found: Found } | null>(null)
  const take = (files: readonly File[]): void =>
    void findSets(files).then((next) => setFound((before) => ({ id: (before?.id ?? 0) + 1, found: next })))
  return (
    <>
      <TitleBlock title={setsWords.uploadTitle} above={<Link to={paths.sets(team)}>{setsWords.title}</Link>} />
      <div className="space-y-5">
        <FileChoice onChoose={take} />
        {found === null ? null : <FoundSets key={found.id} team={team} found={found.found} />}
      </div>
    </>
  )
}
