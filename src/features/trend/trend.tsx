import { useQuery } from '@tanstack/react-query'
import type { JSX } from 'react'
import { momentText } from '../../lib/dates.ts'
import { bandIn, lengthIn, useUnits } from '../../lib/units.ts'
import { useAddressFilter } from '../../lib/use-address-filter.ts'
import { DataTable } from '../../ui/data-table.tsx'
import { Field } from '../../ui/field.tsx'
import { Empty, Loaded } from '../../ui/loaded.tsx'
import { trendWords } from '../../words/trend-words.ts'
import { TrendChart } from './trend-chart.tsx'
import { trendQuery, type TrendPoint } from './trend-queries.ts'

const keyOf = ({ fit, axis }: TrendPoint): string => `${fit}:${axis}`

/** The axis that binds most in any of the versions: what somebody looks for first. */
const worstOf = (items: readonly TrendPoint[]): string => {
  const worst = items.toSorted((a, b) => b.binds + b.rattles - (a.binds + a.rattles))[0]
  return worst === undefined ? '' : keyOf(worst)
}

function TrendOf({ items }: { readonly items: readonly TrendPoint[] }): JSX.Element {
  const units = useUnits()
  const { value, choose } = useAddressFilter()
  const keys = [...new Map(items.map((item) => [keyOf(item), item])).values()]
  const wanted = value('trend')
  const chosen = keys.some((item) => keyOf(item) === wanted) ? wanted : worstOf(items)
  const points = items.filter((item) => keyOf(item) === chosen)
  const [first] = points
  if (first === undefined) return <Empty title={trendWords.none} />
  return (
    <>
      <div className="mb-3 max-w-sm">
        <Field label={trendWords.fit}>
          {(parts) => (
            <select
              {...parts}
              className="field"
              value={chosen}
              onChange={({ target }) => choose({ trend: target.value })}
            >
              {keys.map((item) => (
                <option key={keyOf(item)} value={keyOf(item)}>
                  {trendWords.option(item.fit, item.axis)}
                </option>
              ))}
            </select>
          )}
        </Field>
      </div>
      <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={trendWords.heading}>
        <TrendChart points={points} units={units} title={trendWords.title(first.fit, first.axis)} />
      </div>
      <p className="label mt-1">{trendWords.key}</p>
      <details className="mt-3">
        <summary className="text-sm font-semibold">{trendWords.table}</summary>
        <div className="mt-2">
          <DataTable
            caption={trendWords.title(first.fit, first.axis)}
            rows={points}
            keyOf={(point) => String(point.number)}
            columns={[
              { name: trendWords.version, isHead: true, cell: (point) => `v${String(point.number)}` },
              { name: trendWords.clearance, isFigure: true, cell: (point) => lengthIn(point.clearance.nominal, units) },
              { name: trendWords.band, isFigure: true, cell: (point) => bandIn(point.required, units) },
              {
                name: trendWords.goes,
                isFigure: true,
                cell: (point) => Math.round((1 - point.binds - point.rattles) * 100),
              },
              { name: trendWords.date, isExtra: true, cell: (point) => momentText(point.pushedAt) },
            ]}
          />
        </div>
      </details>
    </>
  )
}

export function Trend({
  team,
  set,
  branch,
}: {
  readonly team: string
  readonly set: string
  readonly branch: string
}): React.ReactNode {
  const trend = useQuery(trendQuery(team, set, branch))
  return (
    <Loaded query={trend} isEmpty={({ items }) => items.length === 0} empty={<Empty title={trendWords.none} />}>
      {({ items }) => <TrendOf items={items} />}
    </Loaded>
  )
}
