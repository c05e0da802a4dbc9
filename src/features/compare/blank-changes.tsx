import { useQuery } from '@tanstack/react-query'
import { lazy, Suspense, type ReactNode } from 'react'
import type { Blank } from '../../../shared/pieces/blank.ts'
import { Loaded, Waiting } from '../../ui/loaded.tsx'
import { blankWords } from '../../words/blank-words.ts'
import { compareWords } from '../../words/compare-words.ts'
import { blanksQuery, type VersionText } from '../engine/engine-queries.ts'
import { pairLines } from './moved-lines.ts'

const BlankOverlay = lazy(() => import('./blank-overlay.tsx'))

type Blanks = ReadonlyMap<string, readonly Blank[]>

interface Change {
  readonly name: string
  readonly before: Blank | null
  readonly after: Blank | null
}

function changesOf(before: Blanks, after: Blanks): readonly Change[] {
  const all = (blanks: Blanks) => new Map([...blanks.values()].flat().map((blank) => [blank.name, blank]))
  const [old, now] = [all(before), all(after)]
  return [...new Set([...old.keys(), ...now.keys()])]
    .map((name) => ({ name, before: old.get(name) ?? null, after: now.get(name) ?? null }))
    .filter(
      (change) =>
        change.before === null ||
        change.after === null ||
        pairLines(change.before, change.after).some(({ isMoved }) => isMoved),
    )
}

/** Blanks that differ between two versions, both drawn by the present engine. */
export function BlankChanges({
  before,
  after,
}: {
  readonly before: VersionText
  readonly after: VersionText
}): ReactNode {
  const old = useQuery(blanksQuery(before))
  const now = useQuery(blanksQuery(after))
  return (
    <Loaded query={old} lines={6}>
      {(was) => (
        <Loaded query={now} lines={6}>
          {(is) => {
            const changes = changesOf(was, is)
            if (changes.length === 0) return <p className="text-sm text-soft">{compareWords.noDrawings}</p>
            return (
              <Suspense fallback={<Waiting lines={6} />}>
                <div className="grid gap-6 lg:grid-cols-2">
                  {changes.map((change) =>
                    change.before === null || change.after === null ? (
                      <p key={change.name} className="text-sm">
                        <span className="font-semibold">{change.name}</span>:{' '}
                        {change.before === null ? blankWords.onlyAfter : blankWords.onlyBefore}
                      </p>
                    ) : (
                      <BlankOverlay key={change.name} before={change.before} after={change.after} />
                    ),
                  )}
                </div>
              </Suspense>
            )
          }}
        </Loaded>
      )}
    </Loaded>
  )
}
