import { useInfiniteQuery, useQuery } from '@tanstack/react-query'
import type { JSX, ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { noticeEndpoints, noticeEvents, noticeModes } from '../../../shared/api/notice-endpoints.ts'
import { TeamHead } from '../../features/team/team-head.tsx'
import { useTeamAction } from '../../features/team/use-team-action.ts'
import { call } from '../../lib/api.ts'
import { momentText } from '../../lib/dates.ts'
import { usePart } from '../../lib/use-part.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Empty, Failed, Loaded, Waiting } from '../../ui/loaded.tsx'
import { MoreRows } from '../../ui/more-rows.tsx'
import { RefusalNote } from '../../ui/refusal-note.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { commonWords } from '../../words/common-words.ts'
import { teamWords } from '../../words/team-words.ts'

type Choices = Record<(typeof noticeEvents)[number], (typeof noticeModes)[number]>

function ChoiceTable({ team }: { readonly team: string }): ReactNode {
  const choices = useQuery({
    queryKey: ['notice-choices', team],
    queryFn: ({ signal }) => call(noticeEndpoints.noticeChoices, { params: { team }, signal }),
  })
  const choose = useTeamAction([['notice-choices', team]], (body: Choices) =>
    call(noticeEndpoints.chooseNotices, { params: { team }, body }),
  )
  return (
    <Loaded query={choices} lines={8}>
      {(data) => {
        const shown = choose.isPending ? choose.variables : data
        return (
          <>
            <RefusalNote error={choose.error} />
            <p role="status" className="label">
              {choose.isPending ? commonWords.saving : choose.isSuccess ? commonWords.saved : ''}
            </p>
            <DataTable
              caption={teamWords.choices}
              rows={noticeEvents}
              keyOf={(event) => event}
              columns={[
                {
                  name: teamWords.eventsLabel,
                  isHead: true,
                  cell: (event) => <span className="font-normal">{teamWords.events[event]}</span>,
                },
                {
                  name: teamWords.choices,
                  cell: (event) => (
                    <select
                      className="field w-auto"
                      aria-label={teamWords.events[event]}
                      value={shown[event]}
                      onChange={({ target }) => {
                        const mode = noticeModes.find((name) => name === target.value)
                        if (mode !== undefined) choose.mutate({ ...data, [event]: mode })
                      }}
                    >
                      {noticeModes.map((mode) => (
                        <option key={mode} value={mode}>
                          {teamWords.modes[mode]}
                        </option>
                      ))}
                    </select>
                  ),
                },
              ]}
            />
          </>
        )
      }}
    </Loaded>
  )
}

function NoticeList({ team }: { readonly team: string }): JSX.Element {
  const notices = useInfiniteQuery({
    queryKey: ['notices', team],
    queryFn: ({ pageParam, signal }) =>
      call(noticeEndpoints.notices, {
        params: { team },
        query: pageParam === null ? {} : { cursor: pageParam },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  })
  const rows = notices.data?.pages.flatMap(({ items }) => items) ?? []
  if (notices.data === undefined)
    return notices.isError ? <Failed error={notices.error} onAgain={() => void notices.refetch()} /> : <Waiting />
  if (rows.length === 0) return <Empty title={teamWords.noticesEmpty}>{teamWords.noticesExplain}</Empty>
  return (
    <>
      <ul className="space-y-3">
        {rows.map((notice) => (
          <li key={notice.id}>
            {notice.page === null ? notice.sentence : <Link to={notice.page}>{notice.sentence}</Link>}
            <p className="label">{momentText(notice.at)}</p>
          </li>
        ))}
      </ul>
      <MoreRows query={notices} count={rows.length} />
    </>
  )
}

export default function NoticesPage(): JSX.Element {
  const team = usePart('team')
  return (
    <>
      <TeamHead team={team} title={teamWords.noticesTitle} />
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <Sheet title={teamWords.parts.notices}>
          <NoticeList team={team} />
        </Sheet>
        <Sheet title={teamWords.choices}>
          <p className="mb-2 text-sm text-soft">{teamWords.noticesExplain}</p>
          <ChoiceTable team={team} />
        </Sheet>
      </div>
    </>
  )
}
