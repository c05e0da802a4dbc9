import { useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { useDeferredValue, useEffect, useMemo, useState, type JSX, type ReactNode } from 'react'
import type { WorkspaceText } from '../../features/engine/judge-text.ts'
import { tryText, type Trial, type Tried } from '../../features/engine/try-text.ts'
import { NestAndFits } from '../../features/fits/nest-and-fits.tsx'
import { Nest } from '../../features/nest/nest.tsx'
import { setsQuery } from '../../features/sets/set-queries.ts'
import { useMay } from '../../features/team/team-queries.ts'
import { PushText } from '../../features/try/push-text.tsx'
import { TextEditor } from '../../features/try/text-editor.tsx'
import { TrialControls } from '../../features/try/trial-controls.tsx'
import { versionQuery } from '../../features/versions/version-queries.ts'
import { RulesTable } from '../../features/versions/rules-table.tsx'
import { today } from '../../lib/dates.ts'
import { readStored, store } from '../../lib/stored.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Loaded } from '../../ui/loaded.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { tryWords } from '../../words/try-words.ts'
import { versionWords } from '../../words/version-words.ts'

const untouched: Trial = { paper: null, maker: null, scale: 1, thickness: null }

interface Start {
  readonly key: string
  readonly text: string
  readonly file: string
  readonly workspace: WorkspaceText | null
}

function Outcome({ tried }: { readonly tried: Tried }): JSX.Element {
  const { report, took } = tried
  const passing = report.fits.filter(({ verdict }) => verdict === 'pass').length
  return (
    <div role="status" className="flex flex-wrap items-baseline gap-x-4">
      <StateMark state={report.summary.verdict} isLarge />
      {report.summary.verdict === 'invalid' ? null : (
        <>
          <span className="figure font-bold">{tryWords.survive(passing, report.fits.length)}</span>
          <span className="figure text-sm">{tryWords.works(report.summary.works)}</span>
        </>
      )}
      <span className="label" aria-hidden="true" data-took={took.toFixed(2)}>
        {tryWords.judged(took)}
      </span>
    </div>
  )
}

function Trying({ team, start }: { readonly team: string; readonly start: Start }): JSX.Element {
  const mayPush = useMay(team)('push')
  const kept = `foldgauge-try-${team}-${start.key}`
  const [initial, setInitial] = useState(() => readStored(kept) ?? start.text)
  const [text, setText] = useState(initial)
  const [trial, setTrial] = useState<Trial>(untouched)
  const [asOf] = useState(today)
  const shownText = useDeferredValue(text)
  const shownTrial = useDeferredValue(trial)
  const tried = useMemo(
    () => tryText(shownText, start.workspace, start.file, asOf, shownTrial),
    [shownText, shownTrial, start.workspace, start.file, asOf],
  )
  useEffect(() => store(kept, text === start.text ? null : text), [kept, text, start.text])
  const { report } = tried
  const isTried = trial !== untouched
  return (
    <div className="space-y-5">
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <div>
          <TextEditor key={initial} initial={initial} label={tryWords.editor} report={report} onChange={setText} />
          <div className="mt-2 flex flex-wrap items-center justify-between gap-2">
            <p className="label">{start.workspace === null ? tryWords.alone : tryWords.workspace}</p>
            {text === start.text ? null : (
              <button
                type="button"
                className="button"
                data-size="small"
                onClick={() => {
                  setInitial(start.text)
                  setText(start.text)
                }}
              >
                {tryWords.discard}
              </button>
            )}
          </div>
        </div>
        <div className="space-y-5">
          <div className="sheet p-4">
            <Outcome tried={tried} />
            {report.errors.length === 0 ? null : (
              <ul className="mt-3 space-y-2">
                {report.errors.map((problem, index) => (
                  <li key={index} className="border-l-4 border-fail pl-3 text-sm">
                    <span className="label">{versionWords.line(problem.at.line)}</span> {problem.message} {problem.hint}
                  </li>
                ))}
              </ul>
            )}
          </div>
          <section aria-label={tryWords.title} className="sheet p-4">
            <TrialControls trial={trial} tried={tried} onChange={setTrial} />
            <button
              type="button"
              className="button mt-4"
              data-size="small"
              disabled={!isTried}
              onClick={() => setTrial(untouched)}
            >
              {tryWords.reset}
            </button>
          </section>
        </div>
      </div>
      {report.summary.verdict === 'invalid' ? null : (
        <>
          <NestAndFits
            report={report}
            nest={(shown, point) => <Nest report={report} shown={shown} onPoint={point} />}
          />
          <Sheet title={tryWords.verdicts}>
            <RulesTable set={report.set} verdicts={report.verdicts} onAccept={null} />
          </Sheet>
        </>
      )}
      {mayPush ? (
        <Sheet title={tryWords.push}>
          <PushText team={team} file={start.file} text={text} workspace={start.workspace} />
        </Sheet>
      ) : null}
    </div>
  )
}

function FromVersion({
  team,
  set,
  number,
}: {
  readonly team: string
  readonly set: string
  readonly number: number
}): ReactNode {
  const version = useQuery(versionQuery(team, set, number))
  return (
    <Loaded query={version} lines={8}>
      {({ text, file, workspace }) => (
        <Trying
          key={`${set} ${String(number)}`}
          team={team}
          start={{ key: `${set}-${String(number)}`, text, file, workspace }}
        />
      )}
    </Loaded>
  )
}

/** Try changes out, here and now, without storing anything. */
export default function TryPage(): JSX.Element {
  useTitle(tryWords.title)
  const team = usePart('team')
  const { value, choose } = useAddressFilter()
  const sets = useInfiniteQuery(setsQuery(team, { search: '', family: '', state: '', branch: '', tag: '' }))
  const rows = sets.data?.pages.flatMap(({ items }) => items) ?? []
  const set = value('set')
  const latest = rows.find(({ name }) => name === set)?.latest.number
  const number = /^\d+$/.test(value('version')) ? Number(value('version')) : latest
  return (
    <>
      <TitleBlock
        title={tryWords.title}
        above={tryWords.explain}
        actions={
          <label className="flex flex-wrap items-center gap-2 text-sm font-semibold">
            {tryWords.begin}
            <select
              className="field w-auto max-w-72"
              value={set}
              onChange={({ target }) => choose({ set: target.value, version: '' })}
            >
              <option value="">{tryWords.blank}</option>
              {set !== '' && latest === undefined ? <option value={set}>{set}</option> : null}
              {rows.map(({ name }) => (
                <option key={name}>{name}</option>
              ))}
            </select>
          </label>
        }
      />
      {set === '' ? (
        <Trying
          key="new"
          team={team}
          start={{ key: 'new', text: tryWords.starter, file: 'sets/first-box.yaml', workspace: null }}
        />
      ) : number === undefined ? null : (
        <FromVersion team={team} set={set} number={number} />
      )}
    </>
  )
}
