import type { JSX } from 'react'
import type { ReportProblem, Verdict } from '../../../shared/report/report.ts'
import { StateMark, type StateName } from '../../ui/state-mark.tsx'

interface Note {
  readonly state: StateName
  readonly text: string
}

const loud: readonly Verdict['status'][] = ['fail', 'warn', 'waived', 'crashed', 'unchecked']

function notesByLine(
  verdicts: readonly Verdict[],
  errors: readonly ReportProblem[],
): ReadonlyMap<number, readonly Note[]> {
  const notes = new Map<number, Note[]>()
  const add = (line: number, note: Note): void => void notes.set(line, [...(notes.get(line) ?? []), note])
  for (const { at, message, hint } of errors) add(at.line, { state: 'fail', text: `${message} ${hint}` })
  for (const { at, status, message } of verdicts)
    if (loud.includes(status)) add(at.line, { state: status, text: message })
  return notes
}

/** A text with its verdicts under the lines they are about. */
export function SourceView({
  text,
  file,
  title,
  verdicts,
  errors,
}: {
  readonly text: string
  readonly file: string
  readonly title: string
  readonly verdicts: readonly Verdict[]
  readonly errors: readonly ReportProblem[]
}): JSX.Element {
  const notes = notesByLine(
    verdicts.filter(({ at }) => at.file === file),
    errors.filter(({ at }) => at.file === file),
  )
  return (
    <div className="overflow-x-auto border border-hair" tabIndex={0} role="region" aria-label={title}>
      <ol className="figure min-w-max text-[0.82rem] leading-6">
        {text.split('\n').map((line, index) => {
          const own = notes.get(index + 1) ?? []
          return (
            <li
              key={index}
              id={`line-${String(index + 1)}`}
              className={own.length > 0 ? 'bg-shade' : 'target:bg-info-wash'}
            >
              <div className="flex">
                <span className="w-11 shrink-0 select-none pr-3 text-right text-soft" aria-hidden="true">
                  {index + 1}
                </span>
                <code className="whitespace-pre pr-4">{line === '' ? ' ' : line}</code>
              </div>
              {own.map((note) => (
                <p
                  key={note.text}
                  className="sticky left-0 max-w-[min(46rem,86vw)] py-0.5 pr-3 pl-11 font-sans whitespace-normal"
                >
                  <StateMark state={note.state} /> {note.text}
                </p>
              ))}
            </li>
          )
        })}
      </ol>
    </div>
  )
}
