import { useQuery } from '@tanstack/react-query'
import { useState, type JSX, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { paths } from '../../app/paths.ts'
import { dayText } from '../../lib/dates.ts'
import { Empty, Loaded } from '../../ui/loaded.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { publicationWords } from '../../words/publication-words.ts'
import { ErratumForm } from './erratum-form.tsx'
import { ErratumNote } from './erratum-note.tsx'
import { publicationsQuery, type Publication } from './publication-queries.ts'
import { RecallForm } from './recall-form.tsx'

const size = (bytes: number): string =>
  bytes > 900_000 ? `${(bytes / 1e6).toFixed(1)} MB` : `${String(Math.ceil(bytes / 1000))} kB`

export function Files({ publication }: { readonly publication: Pick<Publication, 'exports' | 'files'> }): JSX.Element {
  if (publication.exports === 'pending')
    return (
      <p role="status" className="text-sm">
        {publicationWords.filesPending}
      </p>
    )
  if (publication.exports === 'failed') return <p className="text-sm text-fail">{publicationWords.filesFailed}</p>
  return (
    <ul className="columns-1 gap-6 text-sm sm:columns-2">
      {publication.files.map((file) => (
        <li key={file.name}>
          <a href={file.path} download>
            {file.name}
          </a>{' '}
          <span className="figure text-soft">{size(file.bytes)}</span>
        </li>
      ))}
    </ul>
  )
}

/** What was published of a set, with its files, corrections and recalls. */
export function Publications({
  team,
  set,
  pieces,
  canPublish,
}: {
  readonly team: string
  readonly set: string
  readonly pieces: readonly string[]
  readonly canPublish: boolean
}): ReactNode {
  const publications = useQuery(publicationsQuery(team, set))
  const [asked, setAsked] = useState<{ readonly what: 'recall' | 'erratum'; readonly label: string } | null>(null)
  const close = (): void => setAsked(null)
  return (
    <Loaded
      query={publications}
      isEmpty={({ items }) => items.length === 0}
      empty={<Empty title={publicationWords.none}>{publicationWords.noneHint}</Empty>}
    >
      {({ items }) => (
        <div className="space-y-6">
          {items.map((item) => (
            <article key={item.label} aria-label={item.label}>
              <div className="flex flex-wrap items-baseline gap-x-4 gap-y-1">
                <h3 className="figure text-lg">{item.label}</h3>
                <StateMark state={item.recalled === null ? 'published' : 'recalled'} />
                <span className="text-sm text-soft">
                  <Link to={paths.version(team, set, item.version)}>
                    {publicationWords.version} {item.version}
                  </Link>
                  , {dayText(item.publishedAt)}, {item.publishedBy}
                </span>
                {canPublish ? (
                  <span className="flex gap-2">
                    <button
                      type="button"
                      className="button"
                      data-size="small"
                      onClick={() => setAsked({ what: 'erratum', label: item.label })}
                    >
                      {publicationWords.erratum}
                    </button>
                    {item.recalled === null ? (
                      <button
                        type="button"
                        className="button"
                        data-size="small"
                        data-kind="grave"
                        onClick={() => setAsked({ what: 'recall', label: item.label })}
                      >
                        {publicationWords.recall}
                      </button>
                    ) : null}
                  </span>
                ) : null}
              </div>
              {item.recalled === null ? null : (
                <p className="mt-1 border-l-4 border-fail bg-fail-wash p-2 text-sm">
                  {publicationWords.recalled(item.recalled.by, dayText(item.recalled.at))}: {item.recalled.reason}
                </p>
              )}
              {item.notes === '' ? null : <p className="mt-1">{item.notes}</p>}
              <details className="mt-2">
                <summary className="text-sm font-semibold">{publicationWords.files}</summary>
                <div className="mt-2">
                  <Files publication={item} />
                </div>
              </details>
              {item.errata.length === 0 ? null : (
                <div className="mt-3 space-y-2">
                  {item.errata.map((erratum) => (
                    <ErratumNote key={erratum.id} erratum={erratum} />
                  ))}
                </div>
              )}
            </article>
          ))}
          <RecallForm team={team} set={set} label={asked?.what === 'recall' ? asked.label : null} onClose={close} />
          <ErratumForm
            team={team}
            set={set}
            label={asked?.what === 'erratum' ? asked.label : null}
            labels={items.map(({ label }) => label)}
            pieces={pieces}
            onClose={close}
          />
        </div>
      )}
    </Loaded>
  )
}
