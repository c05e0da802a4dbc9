import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useState, type JSX } from 'react'
import { useNavigate } from 'react-router-dom'
import { teamEndpoints } from '../../../shared/api/team-endpoints.ts'
import { paths } from '../../app/paths.ts'
import { FailedWork } from '../../features/settings/failed-work.tsx'
import { GeneralForm } from '../../features/settings/general-form.tsx'
import { RetentionForm } from '../../features/settings/retention-form.tsx'
import { TeamHead } from '../../features/team/team-head.tsx'
import { teamQuery } from '../../features/team/team-queries.ts'
import { call, fileAddress } from '../../lib/api.ts'
import { usePart } from '../../lib/use-part.ts'
import { Field } from '../../ui/field.tsx'
import { Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { teamWords } from '../../words/team-words.ts'

function DeleteTeam({ team }: { readonly team: string }): JSX.Element {
  const client = useQueryClient()
  const navigate = useNavigate()
  const [typed, setTyped] = useState('')
  const remove = useMutation({
    mutationFn: () => call(teamEndpoints.deleteTeam, { params: { team }, body: { confirm: typed } }),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: ['me'] })
      void navigate(paths.account)
    },
  })
  return (
    <form
      className="max-w-md space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        remove.mutate()
      }}
    >
      <Field label={teamWords.deleteExplain(team)}>
        {(parts) => (
          <input
            {...parts}
            autoComplete="off"
            className="field figure"
            value={typed}
            onChange={({ target }) => setTyped(target.value)}
          />
        )}
      </Field>
      <RefusalNote error={remove.error} />
      <button type="submit" className="button" data-kind="grave" disabled={typed !== team || remove.isPending}>
        {teamWords.deleteIt}
      </button>
    </form>
  )
}

export default function SettingsPage(): JSX.Element {
  const slug = usePart('team')
  const team = useQuery(teamQuery(slug))
  return (
    <>
      <TeamHead team={slug} title={teamWords.settingsTitle} />
      <div className="space-y-5">
        <Sheet title={teamWords.general}>
          <Loaded query={team}>{(data) => <GeneralForm key={data.slug} team={data} />}</Loaded>
        </Sheet>
        <Sheet title={teamWords.retention}>
          <p className="mb-3 text-sm text-soft">{teamWords.retentionExplain}</p>
          <RetentionForm team={slug} />
        </Sheet>
        <Sheet title={teamWords.failedWork}>
          <FailedWork team={slug} />
        </Sheet>
        <Sheet title={teamWords.exportHeading}>
          <p className="mb-3 text-sm text-soft">{teamWords.exportExplain}</p>
          <a className="button" href={fileAddress(teamEndpoints.exportTeam, { params: { team: slug } })} download>
            {teamWords.exportIt}
          </a>
        </Sheet>
        <Sheet title={teamWords.deleteHeading}>
          <DeleteTeam team={slug} />
        </Sheet>
      </div>
    </>
  )
}
