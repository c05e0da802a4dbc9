import type { JSX } from 'react'
import { lineChanges, type LineChange } from '../../lib/line-changes.ts'
import { compareWords } from '../../words/compare-words.ts'

const around = 3

/** Lines that changed with a few around them; `null` stands for what is left out. */
function shown(lines: readonly LineChange[]): readonly (LineChange | null)[] {
  const keep = lines.map((_, index) =>
    lines.slice(Math.max(0, index - around), index + around + 1).some(({ kind }) => kind !== 'same'),
  )
  return lines.flatMap((line, index) => (keep[index] === true ? [line] : keep[index - 1] === true ? [null] : []))
}

const signs = { same: ' ', removed: '−', added: '+' } as const
const looks = { same: '', removed: 'bg-fail-wash', added: 'bg-pass-wash' } as const

/** Two texts line by line: a sign at each line says what happened to it. */
export function TextChanges({ before, after }: { readonly before: string; readonly after: string }): JSX.Element {
  if (before === after) return <p className="text-sm text-soft">{compareWords.sameText}</p>
  const lines = lineChanges(before, after)
  const count = (kind: LineChange['kind']): number => lines.filter((line) => line.kind === kind).length
  return (
    <>
      <p className="label mb-1">{compareWords.lines(count('added'), count('removed'))}</p>
      <div
        className="overflow-x-auto border border-hair"
        tabIndex={0}
        role="region"
        aria-label={compareWords.textTitle}
      >
        <ol className="figure min-w-max text-[0.82rem] leading-6">
          {shown(lines).map((line, index) =>
            line === null ? (
              <li key={index} className="px-3 text-soft" aria-hidden="true">
                ⋯
              </li>
            ) : (
              <li key={index} className={`flex ${looks[line.kind]}`}>
                <span className="w-10 shrink-0 text-right text-soft" aria-hidden="true">
                  {line.after ?? line.before}
                </span>
                <span className="w-7 shrink-0 text-center font-bold" aria-hidden="true">
                  {signs[line.kind]}
                </span>
                {line.kind === 'same' ? null : (
                  <span className="sr-only">
                    {line.kind === 'removed' ? compareWords.removed : compareWords.added}:{' '}
                  </span>
                )}
                <code className="whitespace-pre pr-4">{line.text === '' ? ' ' : line.text}</code>
              </li>
            ),
          )}
        </ol>
      </div>
    </>
  )
}
