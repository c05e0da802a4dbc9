import { useMemo, useState, type JSX } from 'react'
import type { Blank } from '../../../shared/pieces/blank.ts'
import { blankWords } from '../../words/blank-words.ts'
import { enlarged, pairLines, type Line } from './moved-lines.ts'

type Shown = 'both' | 'before' | 'after'
const choices = [1, 5, 10] as const

function Drawn({ line, look }: { readonly line: Line; readonly look: 'old' | 'kept' | 'moved' }): JSX.Element {
  const dash = line.kind === 'score' ? '7 4' : undefined
  return (
    <path
      d={`M${line.from.x.toFixed(3)} ${(-line.from.y).toFixed(3)}L${line.to.x.toFixed(3)} ${(-line.to.y).toFixed(3)}`}
      stroke={look === 'old' ? 'var(--stroke)' : look === 'moved' ? 'var(--fail)' : 'var(--ink)'}
      strokeWidth={look === 'moved' ? 2.6 : look === 'old' ? 1.4 : 1.5}
      strokeDasharray={look === 'old' ? '1.5 3' : dash}
      vectorEffect="non-scaling-stroke"
    />
  )
}

function Choice<T extends string | number>({
  legend,
  options,
  chosen,
  nameOf,
  onChoose,
}: {
  readonly legend: string
  readonly options: readonly T[]
  readonly chosen: T
  readonly nameOf: (option: T) => string
  readonly onChoose: (option: T) => void
}): JSX.Element {
  return (
    <fieldset className="flex flex-wrap items-center gap-1">
      <legend className="label float-left mr-2">{legend}</legend>
      {options.map((option) => (
        <button
          key={option}
          type="button"
          className="button"
          data-size="small"
          data-kind={option === chosen ? 'main' : undefined}
          aria-pressed={option === chosen}
          onClick={() => onChoose(option)}
        >
          {nameOf(option)}
        </button>
      ))}
    </fieldset>
  )
}

/** Old and new blank over each other; what moved is thick and may be drawn several times as far. Never flashes by itself. */
export default function BlankOverlay({
  before,
  after,
}: {
  readonly before: Blank
  readonly after: Blank
}): JSX.Element {
  const [shown, setShown] = useState<Shown>('both')
  const [factor, setFactor] = useState<(typeof choices)[number]>(5)
  const pairs = useMemo(() => pairLines(before, after), [before, after])
  const moved = pairs.filter(({ isMoved }) => isMoved).length
  const points = pairs.flatMap((pair) =>
    [pair.before, enlarged(pair, factor)].flatMap((line) => (line === null ? [] : [line.from, line.to])),
  )
  const xs = points.map(({ x }) => x)
  const ys = points.map(({ y }) => -y)
  const air = 4
  const [left, top] = [Math.min(...xs) - air, Math.min(...ys) - air]
  const names = { both: blankWords.both, before: blankWords.before, after: blankWords.after }
  return (
    <figure>
      <div className="no-print mb-2 flex flex-wrap gap-x-6 gap-y-2">
        <Choice
          legend={blankWords.show}
          options={['both', 'before', 'after']}
          chosen={shown}
          nameOf={(name) => names[name]}
          onChoose={setShown}
        />
        <Choice
          legend={blankWords.enlarge}
          options={choices}
          chosen={factor}
          nameOf={blankWords.enlarged}
          onChoose={setFactor}
        />
      </div>
      <svg
        viewBox={`${String(left)} ${String(top)} ${String(Math.max(...xs) + air - left)} ${String(Math.max(...ys) + air - top)}`}
        className="max-h-[30rem] w-full"
        role="img"
        aria-label={`${blankWords.overlayOf(after.name)}; ${blankWords.moved(moved)}`}
      >
        {shown === 'after'
          ? null
          : pairs.map(({ before: line, isMoved }, index) =>
              line === null || (shown === 'both' && !isMoved) ? null : (
                <Drawn key={index} line={line} look={shown === 'both' ? 'old' : 'kept'} />
              ),
            )}
        {shown === 'before'
          ? null
          : pairs.map((pair, index) => {
              const line = enlarged(pair, shown === 'both' ? factor : 1)
              return line === null ? null : <Drawn key={index} line={line} look={pair.isMoved ? 'moved' : 'kept'} />
            })}
      </svg>
      <figcaption className="label mt-1">
        {after.name}: {blankWords.moved(moved)}
        {shown === 'both' && factor !== 1 ? `, ${blankWords.enlarged(factor)}` : ''}. {blankWords.overlayLegend}
      </figcaption>
    </figure>
  )
}
