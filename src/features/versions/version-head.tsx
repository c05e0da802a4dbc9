import type { JSX, ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { paths } from '../../app/paths.ts'
import { momentText } from '../../lib/dates.ts'
import { StateMark } from '../../ui/state-mark.tsx'
import { TitleBlock } from '../../ui/title-block.tsx'
import { commonWords } from '../../words/common-words.ts'
import { setWords } from '../../words/set-words.ts'
import { versionWords } from '../../words/version-words.ts'
import type { Version } from './version-queries.ts'

/** The title block of a version, the same on each of its pages. */
export function VersionHead({
  team,
  version,
  title,
  actions,
}: {
  readonly team: string
  readonly version: Version
  /** Names the page where it is not the version itself. */
  readonly title?: string
  readonly actions?: ReactNode
}): JSX.Element {
  const { report } = version
  const baseline = version.baseline.number
  return (
    <TitleBlock
      title={title ?? report.title}
      above={[version.set, versionWords.version(version.number), title === undefined ? null : report.title]
        .filter((part) => part !== null)
        .join(' · ')}
      cells={[
        { label: versionWords.verdict, value: <StateMark state={version.verdict} /> },
        {
          label: versionWords.works,
          value: <span className="figure font-bold">{versionWords.worksShare(version.works)}</span>,
        },
        { label: versionWords.branch, value: version.branch },
        {
          label: versionWords.baseline,
          value:
            baseline === null ? (
              version.baseline.sentence
            ) : (
              <Link title={version.baseline.sentence} to={paths.compare(team, version.set, version.number)}>
                {versionWords.version(baseline)}
              </Link>
            ),
        },
        { label: versionWords.review, value: <StateMark state={version.review} /> },
        {
          label: versionWords.published,
          value:
            version.label === null ? (
              setWords.notPublished
            ) : (
              <StateMark state={version.isRecalled ? 'recalled' : 'published'}>{version.label}</StateMark>
            ),
        },
        {
          label: versionWords.pushed,
          value: (
            <>
              {momentText(version.pushedAt)}, {version.pushedBy.name}
              {version.link === null ? null : (
                <>
                  {' · '}
                  <a href={version.link} rel="noreferrer">
                    {versionWords.pipeline}
                  </a>
                </>
              )}
            </>
          ),
        },
        { label: versionWords.engine, value: <span className="figure">{version.engine}</span> },
      ]}
      actions={
        actions ?? (
          <>
            <Link className="button" to={paths.tryVersion(team, version.set, version.number)}>
              {versionWords.tryIt}
            </Link>
            <Link className="button" data-kind="main" to={paths.review(team, version.set, version.number)}>
              {commonWords.setNav.review}
            </Link>
          </>
        )
      }
    />
  )
}

/** What is drawn and judged here from a stored version. */
export const textOf = (version: Version) => ({
  file: version.file,
  text: version.text,
  workspace: version.workspace,
  digest: version.content,
  asOf: version.asOf,
})
