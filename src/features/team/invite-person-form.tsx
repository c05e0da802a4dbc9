import { useState, type JSX } from 'react'
import { roles, type Role } from '../../../shared/api/permissions.ts'
import { teamEndpoints } from '../../../shared/api/team-endpoints.ts'
import { call } from '../../lib/api.ts'
import { Dialog } from '../../ui/dialog.tsx'
import { Field } from '../../ui/field.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { commonWords } from '../../words/common-words.ts'
import { teamWords } from '../../words/team-words.ts'
import { useTeamAction } from './use-team-action.ts'

/** Invites somebody into the team by mail. */
export function InvitePersonForm({
  team,
  isOpen,
  onClose,
}: {
  readonly team: string
  readonly isOpen: boolean
  readonly onClose: () => void
}): JSX.Element {
  const [email, setEmail] = useState('')
  const [role, setRole] = useState<Role>('viewer')
  const invite = useTeamAction([['invitations', team]], async () => {
    await call(teamEndpoints.invite, { params: { team }, body: { email, role } })
    setEmail('')
    onClose()
  })
  return (
    <Dialog title={teamWords.inviteTitle} isOpen={isOpen} onClose={onClose}>
      <form
        className="space-y-4"
        onSubmit={(event) => {
          event.preventDefault()
          invite.mutate(undefined)
        }}
      >
        <Field label={teamWords.email}>
          {(parts) => (
            <input
              {...parts}
              type="email"
              required
              className="field"
              value={email}
              onChange={({ target }) => setEmail(target.value)}
            />
          )}
        </Field>
        <Field label={teamWords.role}>
          {(parts) => (
            <select
              {...parts}
              className="field"
              value={role}
              onChange={({ target }) => setRole(roles.find((name) => name === target.value) ?? 'viewer')}
            >
              {roles.map((name) => (
                <option key={name} value={name}>
                  {teamWords.roles[name]}
                </option>
              ))}
            </select>
          )}
        </Field>
        <RefusalNote error={invite.error} />
        <div className="flex gap-3">
          <button type="submit" className="button" data-kind="main" disabled={invite.isPending}>
            {invite.isPending ? commonWords.sending : teamWords.invite}
          </button>
          <button type="button" className="button" onClick={onClose}>
            {commonWords.cancel}
          </button>
        </div>
      </form>
    </Dialog>
  )
}
