import { useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { useState, type JSX, type ReactNode } from 'react'
import type { AnswerOf } from '../../../shared/api/endpoint.ts'
import { noticeEndpoints, noticeEvents, type NoticeEvent } from '../../../shared/api/notice-endpoints.ts'
import { TeamHead } from '../../features/team/team-head.tsx'
import { useTeamAction } from '../../features/team/use-team-action.ts'
import { call } from '../../lib/api.ts'
import { momentText } from '../../lib/dates.ts'
import { usePart } from '../../lib/use-part.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Field } from '../../ui/field.tsx'
import { Empty, Failed, Loaded, Waiting } from '../../ui/loaded.tsx'
import { MoreRows } from '../../ui/more-rows.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { SecretNote } from '../../ui/secret-note.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { SureButton } from '../../ui/sure-button.tsx'
import { commonWords } from '../../words/common-words.ts'
import { teamWords } from '../../words/team-words.ts'

type Webhook = AnswerOf<typeof noticeEndpoints.webhooks>['items'][number]

function WebhookForm({
  team,
  onMade,
}: {
  readonly team: string
  readonly onMade: (secret: string) => void
}): JSX.Element {
  const [url, setUrl] = useState('')
  const [chosen, setChosen] = useState<ReadonlySet<NoticeEvent>>(new Set(['newly-failing', 'published', 'recalled']))
  const add = useTeamAction([['webhooks', team]], async () => {
    const made = await call(noticeEndpoints.addWebhook, { params: { team }, body: { url, events: [...chosen] } })
    setUrl('')
    onMade(made.secret)
  })
  return (
    <form
      className="space-y-3"
      onSubmit={(event) => {
        event.preventDefault()
        add.mutate(undefined)
      }}
    >
      <Field label={teamWords.url}>
        {(parts) => (
          <input
            {...parts}
            type="url"
            required
            placeholder="https://"
            className="field figure"
            value={url}
            onChange={({ target }) => setUrl(target.value)}
          />
        )}
      </Field>
      <fieldset>
        <legend className="text-sm font-semibold">{teamWords.eventsLabel}</legend>
        <div className="grid gap-x-5 sm:grid-cols-2 lg:grid-cols-3">
          {noticeEvents.map((event) => (
            <label key={event} className="flex items-center gap-2 py-1">
              <input
                type="checkbox"
                checked={chosen.has(event)}
                onChange={({ target }) =>
                  setChosen(
                    (before) =>
                      new Set(target.checked ? [...before, event] : [...before].filter((other) => other !== event)),
                  )
                }
              />
              {teamWords.events[event]}
            </label>
          ))}
        </div>
      </fieldset>
      <RefusalNote error={add.error} />
      <button type="submit" className="button" data-kind="main" disabled={add.isPending || chosen.size === 0}>
        {add.isPending ? commonWords.sending : teamWords.addWebhook}
      </button>
    </form>
  )
}

function Deliveries({ team, webhook }: { readonly team: string; readonly webhook: string }): JSX.Element {
  const log = useInfiniteQuery({
    queryKey: ['deliveries', team, webhook],
    queryFn: ({ pageParam, signal }) =>
      call(noticeEndpoints.deliveries, {
        params: { team, webhook },
        query: pageParam === null ? {} : { cursor: pageParam },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  })
  const rows = log.data?.pages.flatMap(({ items }) => items) ?? []
  if (log.data === undefined) return log.isError ? <Failed error={log.error} /> : <Waiting lines={2} />
  if (rows.length === 0) return <p className="text-sm text-soft">{teamWords.deliveriesEmpty}</p>
  return (
    <>
      <DataTable
        caption={teamWords.deliveries}
        rows={rows}
        keyOf={(row) => row.id}
        columns={[
          { name: teamWords.at, isHead: true, cell: (row) => momentText(row.createdAt) },
          { name: teamWords.eventsLabel, cell: (row) => row.event },
          { name: teamWords.state, cell: (row) => teamWords.deliveryStates[row.state] },
          { name: teamWords.answer, isFigure: true, cell: (row) => row.status ?? '–' },
          { name: teamWords.attempts, isFigure: true, cell: (row) => row.attempts },
          { name: teamWords.reason, isExtra: true, cell: (row) => row.error ?? '' },
        ]}
      />
      <MoreRows query={log} count={rows.length} />
    </>
  )
}

function WebhookEntry({ team, webhook }: { readonly team: string; readonly webhook: Webhook }): JSX.Element {
  const [isOpen, setIsOpen] = useState(false)
  const params = { team, webhook: webhook.id }
  const change = useTeamAction([['webhooks', team]], (isOn: boolean) =>
    call(noticeEndpoints.changeWebhook, { params, body: { isOn } }),
  )
  const remove = useTeamAction([['webhooks', team]], () => call(noticeEndpoints.removeWebhook, { params }))
  const isOn = webhook.state === 'active'
  return (
    <li className="bg-sheet p-3">
      <h3 className="figure text-sm break-all">{webhook.url}</h3>
      <p className="text-sm">
        <StateMark state={isOn ? 'active' : webhook.state === 'stopped' ? 'fail' : 'ended'}>
          {teamWords.webhookStates[webhook.state]}
        </StateMark>{' '}
        {webhook.why}
      </p>
      <p className="text-sm text-soft">{webhook.events.map((event) => teamWords.events[event]).join(', ')}</p>
      <RefusalNote error={change.error ?? remove.error} />
      <div className="mt-2 flex flex-wrap gap-2">
        <button
          type="button"
          className="button"
          data-size="small"
          disabled={change.isPending}
          onClick={() => change.mutate(!isOn)}
        >
          {isOn ? teamWords.switchOff : teamWords.switchOn}
        </button>
        <SureButton
          name={commonWords.remove}
          label={`${commonWords.remove}: ${webhook.url}`}
          isBusy={remove.isPending}
          onSure={() => remove.mutate(undefined)}
        />
      </div>
      <details className="mt-2" onToggle={({ currentTarget }) => setIsOpen(currentTarget.open)}>
        <summary className="text-sm font-semibold">{teamWords.deliveries}</summary>
        {isOpen ? <Deliveries team={team} webhook={webhook.id} /> : null}
      </details>
    </li>
  )
}

function Webhooks({ team }: { readonly team: string }): ReactNode {
  const webhooks = useQuery({
    queryKey: ['webhooks', team],
    queryFn: ({ signal }) => call(noticeEndpoints.webhooks, { params: { team }, signal }),
  })
  return (
    <Loaded
      query={webhooks}
      isEmpty={({ items }) => items.length === 0}
      empty={<Empty title={teamWords.webhooksEmpty}>{teamWords.webhooksExplain}</Empty>}
    >
      {({ items }) => (
        <ul className="space-y-px bg-hair p-px">
          {items.map((webhook) => (
            <WebhookEntry key={webhook.id} team={team} webhook={webhook} />
          ))}
        </ul>
      )}
    </Loaded>
  )
}

export default function WebhooksPage(): JSX.Element {
  const team = usePart('team')
  const [secret, setSecret] = useState<string | null>(null)
  return (
    <>
      <TeamHead team={team} title={teamWords.webhooksTitle} />
      {secret === null ? null : (
        <SecretNote key={secret} title={teamWords.secretTitle} explain={teamWords.webhooksExplain} secret={secret} />
      )}
      <div className="space-y-5">
        <Sheet title={teamWords.parts.webhooks}>
          <Webhooks team={team} />
        </Sheet>
        <Sheet title={teamWords.addWebhook}>
          <WebhookForm team={team} onMade={setSecret} />
        </Sheet>
      </div>
    </>
  )
}
