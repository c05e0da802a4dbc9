import { useQuery } from '@tanstack/react-query'
import { useState, type JSX, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import type { Verdict } from '../../../shared/report/report.ts'
import { paths } from '../../app/paths.ts'
import { Pieces } from '../../features/blank/pieces.tsx'
import { NestAndFits } from '../../features/fits/nest-and-fits.tsx'
import { Nest } from '../../features/nest/nest.tsx'
import { AcceptFailureForm } from '../../features/review/accept-failure-form.tsx'
import { reviewQuery } from '../../features/review/review-queries.ts'
import { SetNav } from '../../features/sets/set-nav.tsx'
import { useMay } from '../../features/team/team-queries.ts'
import { Downloads } from '../../features/versions/downloads.tsx'
import { EngineNotes } from '../../features/versions/engine-notes.tsx'
import { RulesTable } from '../../features/versions/rules-table.tsx'
import { SourceView } from '../../features/versions/source-view.tsx'
import { textOf, VersionHead } from '../../features/versions/version-head.tsx'
import { versionQuery, type Version } from '../../features/versions/version-queries.ts'
import { WhatToChange } from '../../features/versions/what-to-change.tsx'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Loaded } from '../../ui/loaded.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { blankWords } from '../../words/blank-words.ts'
import { versionWords } from '../../words/version-words.ts'

/** A link to the comments on a fit or piece, with how many are open. */
function CommentLink({
  team,
  version,
  kind,
  name,
}: {
  readonly team: string
  readonly version: Version
  readonly kind: 'fit' | 'piece'
  readonly name: string
}): JSX.Element {
  const review = useQuery(reviewQuery(team, version.set, version.number))
  const own =
    review.data?.comments.filter(
      ({ anchor, resolvedAt }) => anchor.kind === kind && anchor.name === name && resolvedAt === null,
    ).length ?? 0
  return (
    <Link
      className="label no-print"
      to={`${paths.review(team, version.set, version.number)}?about=${encodeURIComponent(`${kind}:${name}`)}#comments`}
      aria-label={`${own === 0 ? versionWords.comment : versionWords.comments(own)}: ${name}`}
    >
      {own === 0 ? versionWords.comment : versionWords.comments(own)}
    </Link>
  )
}

function VersionContent({ team, version }: { readonly team: string; readonly version: Version }): JSX.Element {
  const may = useMay(team)
  const [accepting, setAccepting] = useState<Verdict | null>(null)
  const { report } = version
  const text = textOf(version)
  useTitle(`${report.title}, ${versionWords.version(version.number)}`)
  const isInvalid = report.summary.verdict === 'invalid'
  return (
    <>
      <SetNav team={team} set={version.set} number={version.number} />
      <VersionHead team={team} version={version} />
      <div className="space-y-5">
        <div className="sheet p-4 sm:p-5">
          <p className="text-lg font-semibold">
            <StateMark state={version.verdict} isLarge />{' '}
            {versionWords.sentence(version.verdict, version.works, report.summary, report.workmanship)}
          </p>
          <p className="mt-1 flex flex-wrap items-center gap-x-3">
            <StateMark state={version.change.state} />
            <Link to={paths.compare(team, version.set, version.number)}>{version.change.sentence}</Link>
          </p>
        </div>
        <EngineNotes team={team} version={version} canRecheck={may('sets:edit')} />
        {report.summary.fail + report.summary.crashed === 0 ? null : (
          <Sheet title={versionWords.failing}>
            <WhatToChange report={report} version={text} />
          </Sheet>
        )}
        {isInvalid ? (
          <Sheet title={versionWords.problems}>
            <ul className="space-y-2">
              {report.errors.map((problem, index) => (
                <li key={index} className="border-l-4 border-fail pl-3">
                  <p>{problem.message}</p>
                  <p className="text-sm">{problem.hint}</p>
                  <a className="label" href={`#line-${String(problem.at.line)}`}>
                    {problem.at.file}, {versionWords.line(problem.at.line)}
                  </a>
                </li>
              ))}
            </ul>
          </Sheet>
        ) : (
          <>
            <NestAndFits
              report={report}
              nest={(shown, point) => <Nest report={report} shown={shown} onPoint={point} />}
              aside={(fit) => <CommentLink team={team} version={version} kind="fit" name={fit} />}
            />
            <Sheet title={blankWords.heading}>
              <Pieces
                report={report}
                version={text}
                aside={(piece) => <CommentLink team={team} version={version} kind="piece" name={piece} />}
              />
            </Sheet>
            <Sheet title={versionWords.rules}>
              <RulesTable
                set={version.set}
                verdicts={report.verdicts}
                onAccept={may('failures:accept') ? setAccepting : null}
              />
            </Sheet>
          </>
        )}
        <Sheet title={versionWords.source}>
          <SourceView
            text={version.text}
            file={version.file}
            title={versionWords.sourceOf(version.file)}
            verdicts={report.verdicts}
            errors={report.errors}
          />
        </Sheet>
        <Sheet title={versionWords.downloads}>
          <Downloads version={version} />
        </Sheet>
      </div>
      <AcceptFailureForm team={team} set={version.set} verdict={accepting} onClose={() => setAccepting(null)} />
    </>
  )
}

/** A version: does it pass, what would change that, and how everything goes together. */
export default function VersionPage(): ReactNode {
  const team = usePart('team')
  const set = usePart('set')
  const number = Number(usePart('number'))
  const version = useQuery(versionQuery(team, set, number))
  return (
    <Loaded query={version} lines={8}>
      {(data) => <VersionContent key={data.number} team={team} version={data} />}
    </Loaded>
  )
}
