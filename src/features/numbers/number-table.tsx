import type { JSX } from 'react'
import { lengthIn, useUnits } from '../../lib/units.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { StateMark } from '../../ui/state-mark.tsx'
import { numbersWords } from '../../words/numbers-words.ts'
import type { Measure } from './number-queries.ts'

/** Every measure with where it comes from and what it adds up to; what is open or changed stands out. */
export function NumberTable({
  items,
  nameOf,
  onTick,
  onQuery,
}: {
  readonly items: readonly Measure[]
  readonly nameOf: (key: string) => string
  /** Null where the reader may not tick. */
  readonly onTick: ((item: Measure, state: 'ticked' | 'open') => void) | null
  readonly onQuery: (item: Measure) => void
}): JSX.Element {
  const units = useUnits()
  return (
    <DataTable
      caption={numbersWords.title}
      rows={items}
      keyOf={(item) => item.key}
      columns={[
        {
          name: numbersWords.state,
          cell: (item) => (
            <>
              <StateMark state={item.state === 'changed' ? 'moved' : item.state} />
              <div className="label">
                {item.by === null ? '' : numbersWords.by(item.by)}
                {item.carriedFrom === null ? '' : `, ${numbersWords.carried(item.carriedFrom)}`}
              </div>
            </>
          ),
        },
        {
          name: numbersWords.measure,
          isHead: true,
          cell: (item) => (
            <span className={item.state === 'open' || item.state === 'changed' ? 'border-b-2 border-warn' : ''}>
              {item.what}
            </span>
          ),
        },
        {
          name: numbersWords.value,
          isFigure: true,
          cell: (item) => <span className="text-base font-bold">{lengthIn(item.value, units)}</span>,
        },
        { name: numbersWords.ruler.mm, isFigure: true, isExtra: true, cell: (item) => item.marks.mm },
        { name: numbersWords.ruler.in, isFigure: true, isExtra: true, cell: (item) => item.marks.in },
        {
          name: numbersWords.from,
          cell: (item) => (
            <>
              {item.from}
              {item.sum.length === 0 ? null : <div className="text-soft">{numbersWords.sum(item.sum.map(nameOf))}</div>}
              {item.note === '' ? null : <div className="font-semibold text-warn">{item.note}</div>}
              {item.line === null ? null : <div className="label">{numbersWords.line(item.line)}</div>}
            </>
          ),
        },
        ...(onTick === null
          ? []
          : [
              {
                name: numbersWords.tick,
                cell: (item: Measure) => (
                  <div className="flex flex-wrap gap-1.5">
                    <button
                      type="button"
                      className="button"
                      data-size="small"
                      aria-label={`${item.state === 'ticked' ? numbersWords.untick : numbersWords.tick}: ${item.what}`}
                      onClick={() => onTick(item, item.state === 'ticked' ? 'open' : 'ticked')}
                    >
                      {item.state === 'ticked' ? numbersWords.untick : numbersWords.tick}
                    </button>
                    <button
                      type="button"
                      className="button"
                      data-size="small"
                      aria-label={numbersWords.queryTitle(item.what)}
                      onClick={() => onQuery(item)}
                    >
                      {numbersWords.query}
                    </button>
                  </div>
                ),
              },
            ]),
      ]}
    />
  )
}
