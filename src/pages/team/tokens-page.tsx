import { useQuery } from '@tanstack/react-query'
import { useState, type JSX, type ReactNode } from 'react'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { limits } from '../../../shared/api/limits.ts'
import { tokenEndpoints } from '../../../shared/api/token-endpoints.ts'
import { TeamHead } from '../../features/team/team-head.tsx'
import { useTeamAction } from '../../features/team/use-team-action.ts'
import { call } from '../../lib/api.ts'
import { dayText, momentText } from '../../lib/dates.ts'
import { usePart } from '../../lib/use-part.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Field } from '../../ui/field.tsx'
import { Empty, Loaded } from '../../ui/loaded.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { SecretNote } from '../../ui/secret-note.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark, type StateName } from '../../ui/state-mark.tsx'
import { SureButton } from '../../ui/sure-button.tsx'
import { commonWords } from '../../words/common-words.ts'
import { teamWords } from '../../words/team-words.ts'

type Token = AnswerOf<typeof tokenEndpoints.tokens>['items'][number]

const marks: Readonly<Record<Token['state'], StateName>> = {
  active: 'active',
  'expires-soon': 'lapses-soon',
  expired: 'lapsed',
  revoked: 'ended',
}

function TokenForm({
  team,
  onMade,
}: {
  readonly team: string
  readonly onMade: (secret: string) => void
}): JSX.Element {
  const [name, setName] = useState('')
  const [canRead, setCanRead] = useState(true)
  const [canPush, setCanPush] = useState(true)
  const [days, setDays] = useState('90')
  const make = useTeamAction([['tokens', team]], async () => {
    const made = await call(tokenEndpoints.createToken, {
      params: { team },
      body: {
        name,
        scopes: [...(canPush ? ['push' as const] : []), ...(canRead ? ['read' as const] : [])],
        days: Number(days),
      },
    })
    setName('')
    onMade(made.secret)
  })
  return (
    <form
      className="grid items-end gap-3 sm:grid-cols-[2fr_1fr_1fr_auto]"
      onSubmit={(event) => {
        event.preventDefault()
        make.mutate(undefined)
      }}
    >
      <Field label={teamWords.name}>
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
      <fieldset>
        <legend className="text-sm font-semibold">{teamWords.scopes}</legend>
        <div className="flex min-h-10 items-center gap-4">
          <label className="flex items-center gap-2">
            <input type="checkbox" checked={canPush} onChange={({ target }) => setCanPush(target.checked)} />
            {teamWords.scopeNames.push}
          </label>
          <label className="flex items-center gap-2">
            <input type="checkbox" checked={canRead} onChange={({ target }) => setCanRead(target.checked)} />
            {teamWords.scopeNames.read}
          </label>
        </div>
      </fieldset>
      <Field label={teamWords.days}>
        {(parts) => (
          <input
            {...parts}
            type="number"
            min={1}
            max={366}
            required
            className="field figure"
            value={days}
            onChange={({ target }) => setDays(target.value)}
          />
        )}
      </Field>
      <button
        type="submit"
        className="button min-h-10"
        data-kind="main"
        disabled={make.isPending || (!canRead && !canPush)}
      >
        {make.isPending ? commonWords.sending : teamWords.createToken}
      </button>
      <div className="sm:col-span-4">
        <RefusalNote error={make.error} />
      </div>
    </form>
  )
}

function Tokens({ team, onMade }: { readonly team: string; readonly onMade: (secret: string) => void }): ReactNode {
  const tokens = useQuery({
    queryKey: ['tokens', team],
    queryFn: ({ signal }) => call(tokenEndpoints.tokens, { params: { team }, signal }),
  })
  const rotate = useTeamAction([['tokens', team]], async (token: string) => {
    const made = await call(tokenEndpoints.rotateToken, { params: { team, token }, body: {} })
    onMade(made.secret)
  })
  const revoke = useTeamAction([['tokens', team]], (token: string) =>
    call(tokenEndpoints.revokeToken, { params: { team, token } }),
  )
  return (
    <Loaded query={tokens} isEmpty={({ items }) => items.length === 0} empty={<Empty title={teamWords.tokensEmpty} />}>
      {({ items }) => (
        <>
          <RefusalNote error={rotate.error ?? revoke.error} />
          <DataTable
            caption={teamWords.tokensTitle}
            rows={items}
            keyOf={(row) => row.id}
            columns={[
              {
                name: teamWords.name,
                isHead: true,
                cell: (row) => (
                  <>
                    {row.name}
                    <div className="figure font-normal text-soft">{row.hint}</div>
                  </>
                ),
              },
              {
                name: teamWords.state,
                cell: (row) => <StateMark state={marks[row.state]}>{teamWords.tokenStates[row.state]}</StateMark>,
              },
              {
                name: teamWords.scopes,
                cell: (row) => row.scopes.map((scope) => teamWords.scopeNames[scope]).join(', '),
              },
              { name: teamWords.expires, cell: (row) => dayText(row.expiresAt) },
              {
                name: teamWords.lastUsed,
                isExtra: true,
                cell: (row) => (row.lastUsedAt === null ? teamWords.never : momentText(row.lastUsedAt)),
              },
              { name: teamWords.by, isExtra: true, cell: (row) => row.createdBy },
              {
                name: teamWords.revoke,
                cell: (row) =>
                  row.state === 'revoked' ? null : (
                    <span className="flex flex-wrap gap-2">
                      <SureButton
                        name={teamWords.rotate}
                        label={`${teamWords.rotate}: ${row.name}`}
                        isBusy={rotate.isPending}
                        onSure={() => rotate.mutate(row.id)}
                      />
                      <SureButton
                        name={teamWords.revoke}
                        label={`${teamWords.revoke}: ${row.name}`}
                        isBusy={revoke.isPending}
                        onSure={() => revoke.mutate(row.id)}
                      />
                    </span>
                  ),
              },
            ]}
          />
        </>
      )}
    </Loaded>
  )
}

export default function TokensPage(): JSX.Element {
  const team = usePart('team')
  const [secret, setSecret] = useState<string | null>(null)
  return (
    <>
      <TeamHead team={team} title={teamWords.tokensTitle} />
      {secret === null ? null : (
        <SecretNote key={secret} title={teamWords.secretTitle} explain={teamWords.secretExplain} secret={secret} />
      )}
      <div className="space-y-5">
        <Sheet title={teamWords.createToken}>
          <p className="mb-3 text-sm text-soft">{teamWords.tokensExplain}</p>
          <TokenForm team={team} onMade={setSecret} />
        </Sheet>
        <Sheet title={teamWords.parts.tokens}>
          <Tokens team={team} onMade={setSecret} />
        </Sheet>
      </div>
    </>
  )
}
