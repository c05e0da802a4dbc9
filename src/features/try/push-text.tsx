import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { Link } from 'react-router-dom'
import { limits } from '../../../shared/api/limits.ts'
import { paths } from '../../app/paths.ts'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { tryWords } from '../../words/try-words.ts'
import { setsWords } from '../../words/sets-words.ts'
import { pushSets } from '../engine/push-sets.ts'
import type { WorkspaceText } from '../engine/judge-text.ts'

/** Stores the text as a new version: what the command line’s push does. */
export function PushText({
  team,
  file,
  text,
  workspace,
}: {
  readonly team: string
  readonly file: string
  readonly text: string
  readonly workspace: WorkspaceText | null
}): JSX.Element {
  const client = useQueryClient()
  const [branch, setBranch] = useState('')
  const push = useMutation({
    mutationFn: () => pushSets(team, workspace, [{ file, text }], branch),
    onSuccess: () => client.invalidateQueries(),
  })
  const pushed = push.data?.sets[0]
  return (
    <form
      className="space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        push.mutate()
      }}
    >
      <p className="text-sm text-soft">{tryWords.pushNote}</p>
      <Field label={tryWords.branch} hint={tryWords.branchHint}>
        {(parts) => (
          <input
            {...parts}
            className="field max-w-72"
            maxLength={limits.branch}
            value={branch}
            onChange={({ target }) => setBranch(target.value)}
          />
        )}
      </Field>
      <RefusalNote error={push.error} />
      <div role="status">
        {pushed === undefined ? null : (
          <p>
            {pushed.isNew ? tryWords.pushed(pushed.number) : tryWords.wasThere(pushed.number)}{' '}
            <StateMark state={pushed.verdict} />{' '}
            <Link to={paths.version(team, pushed.set, pushed.number)}>{tryWords.open}</Link>
          </p>
        )}
      </div>
      <button type="submit" className="button" data-kind="main" disabled={push.isPending}>
        {push.isPending ? setsWords.pushing : tryWords.push}
      </button>
    </form>
  )
}
