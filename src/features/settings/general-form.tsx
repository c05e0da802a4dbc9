import { useState, type JSX } from 'react'
import { limits } from '../../../shared/api/limits.ts'
import { teamEndpoints } from '../../../shared/api/team-endpoints.ts'
import { call } from '../../lib/api.ts'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { teamWords } from '../../words/team-words.ts'
import type { Team } from '../team/team-queries.ts'
import { useTeamAction } from '../team/use-team-action.ts'

const choices = ['authorsPublish', 'authorMayApproveAlone', 'wordsKeepApproval'] as const

/** Name, main branch, licence and the choices that widen what roles may do. */
export function GeneralForm({ team }: { readonly team: Team }): JSX.Element {
  const [name, setName] = useState<string>(team.name)
  const [mainBranch, setMainBranch] = useState<string>(team.mainBranch)
  const [licence, setLicence] = useState(team.licence)
  const [chosen, setChosen] = useState(team.choices)
  const save = useTeamAction([['team', team.slug], ['me']], () =>
    call(teamEndpoints.changeTeam, {
      params: { team: team.slug },
      body: { name, mainBranch, licence, choices: chosen },
    }),
  )
  return (
    <form
      className="space-y-4"
      onSubmit={(event) => {
        event.preventDefault()
        save.mutate(undefined)
      }}
    >
      <div className="grid gap-3 sm:grid-cols-2">
        <Field label={teamWords.teamName}>
          {(parts) => (
            <input
              {...parts}
              required
              maxLength={limits.name}
              className="field"
              value={name}
              onChange={({ target }) => setName(target.value)}
            />
          )}
        </Field>
        <Field label={teamWords.mainBranch}>
          {(parts) => (
            <input
              {...parts}
              required
              maxLength={limits.branch}
              className="field"
              value={mainBranch}
              onChange={({ target }) => setMainBranch(target.value)}
            />
          )}
        </Field>
      </div>
      <Field label={teamWords.licence} hint={teamWords.licenceHint}>
        {(parts) => (
          <textarea
            {...parts}
            rows={4}
            maxLength={limits.licence}
            className="field"
            value={licence}
            onChange={({ target }) => setLicence(target.value)}
          />
        )}
      </Field>
      <div>
        {choices.map((choice) => (
          <label key={choice} className="flex items-center gap-2 py-1">
            <input
              type="checkbox"
              checked={chosen[choice]}
              onChange={({ target }) => setChosen({ ...chosen, [choice]: target.checked })}
            />
            {teamWords.choiceNames[choice]}
          </label>
        ))}
      </div>
      <RefusalNote error={save.error} />
      <div className="flex items-center gap-3">
        <button type="submit" className="button" data-kind="main" disabled={save.isPending}>
          {save.isPending ? commonWords.saving : commonWords.save}
        </button>
        <span role="status">{save.isSuccess ? commonWords.saved : ''}</span>
      </div>
    </form>
  )
}
