import { useQuery } from '@tanstack/react-query'
import type { JSX, ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { paths } from '../../app/paths.ts'
import { PublishForm } from '../../features/publication/publish-form.tsx'
import { Comments } from '../../features/review/comments.tsx'
import { Decisions } from '../../features/review/decisions.tsx'
import { reviewQuery } from '../../features/review/review-queries.ts'
import { SetNav } from '../../features/sets/set-nav.tsx'
import { useMay } from '../../features/team/team-queries.ts'
import { VersionHead } from '../../features/versions/version-head.tsx'
import { versionQuery, type Version } from '../../features/versions/version-queries.ts'
import { usePart } from '../../lib/use-part.ts'
import { useTitle } from '../../lib/use-title.ts'
import { Loaded } from '../../ui/loaded.tsx'
import { Sheet } from '../../ui/sheet.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { commonWords } from '../../words/common-words.ts'
import { publicationWords } from '../../words/publication-words.ts'
import { reviewWords } from '../../words/review-words.ts'

function ReviewContent({ team, version }: { readonly team: string; readonly version: Version }): JSX.Element {
  const may = useMay(team)
  const { set, number } = version
  const place = { team, set, number }
  const review = useQuery(reviewQuery(team, set, number))
  return (
    <>
      <SetNav {...place} />
      <VersionHead
        team={team}
        version={version}
        title={reviewWords.title}
        actions={
          <Link className="button" to={paths.compare(team, set, number)}>
            {commonWords.setNav.compare}
          </Link>
        }
      />
      <p className="mb-4">
        <StateMark state={version.change.state} /> {version.change.sentence}
      </p>
      <div className="grid items-start gap-5 lg:grid-cols-[3fr_2fr]">
        <Sheet title={reviewWords.comments} id="comments">
          <Loaded query={review}>
            {(data) => (
              <Comments place={place} review={data} report={version.report} canComment={may('review:comment')} />
            )}
          </Loaded>
        </Sheet>
        <div className="space-y-5">
          <Sheet title={reviewWords.decisions}>
            <Loaded query={review}>
              {(data) => (
                <Decisions
                  place={place}
                  review={data}
                  content={version.content}
                  canAsk={may('review:ask')}
                  canDecide={may('review:decide')}
                />
              )}
            </Loaded>
          </Sheet>
          <Sheet title={publicationWords.publishTitle}>
            <PublishForm place={place} canPublish={may('publish')} />
          </Sheet>
        </div>
      </div>
    </>
  )
}

/** What was said about a version, what is unresolved, and deciding. */
export default function ReviewPage(): ReactNode {
  const team = usePart('team')
  const set = usePart('set')
  const number = Number(usePart('number'))
  useTitle(`${reviewWords.title}: ${set}`)
  const version = useQuery(versionQuery(team, set, number))
  return (
    <Loaded query={version} lines={8}>
      {(data) => <ReviewContent team={team} version={data} />}
    </Loaded>
  )
}
