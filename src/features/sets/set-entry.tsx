import type { JSX } from 'react'
import { Link } from 'react-router-dom'
import { momentText } from '../../lib/dates.ts'
import { HundredStrip } from '../../ui/hundred-strip.tsx'
import { Sparkline } from '../../ui/sparkline.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { setsWords } from '../../words/sets-words.ts'
import type { SetRow } from './set-queries.ts'

/** The finished sample, or a blank sheet with crossed corners where there is no photograph. */
export function SamplePhoto({ photo, title }: { readonly photo: string | null; readonly title: string }): JSX.Element {
  if (photo !== null)
    return (
      <img
        src={photo}
        alt={setsWords.photoOf(title)}
        loading="lazy"
        className="aspect-[4/3] w-full border border-hair object-cover"
      />
    )
  return (
    <svg
      viewBox="0 0 80 60"
      className="aspect-[4/3] w-full border border-hair"
      role="img"
      aria-label={setsWords.noPhoto}
    >
      <path d="M8 14V8h6M66 8h6v6M72 46v6h-6M14 52H8v-6" fill="none" stroke="var(--stroke)" />
      <path d="M22 40V24h36v16M26 22v14h28V22" fill="none" stroke="var(--hair)" strokeWidth="1.5" />
    </svg>
  )
}

/** One set in the list: its state first, then its worst fit and how it went lately. */
export function SetEntry({ row, to }: { readonly row: SetRow; readonly to: string }): JSX.Element {
  return (
    <article
      className={`grid gap-x-5 gap-y-3 border-l-4 bg-sheet p-3 sm:grid-cols-[7.5rem_minmax(0,1fr)] lg:grid-cols-[7.5rem_minmax(0,1fr)_19rem] ${row.state === 'newly-failing' ? 'border-fail' : 'border-transparent'}`}
    >
      <div className="hidden sm:block">
        <SamplePhoto photo={row.photo} title={row.title} />
      </div>
      <div className="min-w-0">
        <StateMark state={row.state} />
        <h2 className="line-clamp-3 text-base">
          <Link to={to} className="text-ink">
            {row.title === '' ? row.name : row.title}
          </Link>
        </h2>
        <p className="label mt-1">
          {[row.name, row.family, setsWords.latest(row.latest.number, row.latest.branch)]
            .filter((part) => part !== null)
            .join(' · ')}
        </p>
        <p className="mt-1 text-sm text-soft">
          {[
            row.published === null ? null : setsWords.published(row.published),
            row.knownFailures === 0 ? null : setsWords.known(row.knownFailures),
            row.builds === 0 ? null : setsWords.builds(row.builds),
            `${setsWords.updated} ${momentText(row.updatedAt)}`,
          ]
            .filter((part) => part !== null)
            .join(' · ')}
        </p>
        {row.tags.length === 0 ? null : (
          <p className="mt-1.5 flex flex-wrap gap-1.5">
            {row.tags.map((tag) => (
              <span key={tag} className="label border border-hair px-1.5">
                {tag}
              </span>
            ))}
          </p>
        )}
      </div>
      <div className="min-w-0 sm:col-start-2 lg:col-start-3">
        <p className="label">
          {setsWords.worst}: {row.worstFit?.id ?? setsWords.noFit}
        </p>
        {row.worstFit === null ? null : <HundredStrip binds={row.worstFit.binds} rattles={row.worstFit.rattles} />}
        <p className="mt-1 flex items-center gap-3">
          <Sparkline shares={row.trend} title={setsWords.trendOf(row.trend)} />
          <span className="figure text-sm font-bold">{setsWords.works(row.latest.works)}</span>
        </p>
      </div>
    </article>
  )
}
