import type { JSX } from 'react'
import { bareIn } from '../../lib/units.ts'
import { trendWords } from '../../words/trend-words.ts'
import type { TrendPoint } from './trend-queries.ts'

const wide = 720
const high = 250
const edge = { left: 62, right: 16, top: 16, bottom: 66 } as const

/** Clearance and yield of one axis across versions, with the band it must lie in. */
export function TrendChart({
  points,
  units,
  title,
}: {
  readonly points: readonly TrendPoint[]
  readonly units: 'mm' | 'in'
  readonly title: string
}): JSX.Element {
  const lows = points.flatMap(({ clearance, required }) => [clearance.min, required.min ?? clearance.min])
  const highs = points.map(({ clearance, required }) =>
    Math.max(clearance.max, Math.min(required.max ?? clearance.max, clearance.max * 1.6 + 1)),
  )
  const low = Math.min(...lows, 0)
  const top = Math.max(...highs)
  const step = (wide - edge.left - edge.right) / Math.max(points.length, 1)
  const x = (index: number): number => edge.left + step * (index + 0.5)
  const y = (value: number): number =>
    edge.top + ((top - value) / Math.max(top - low, 1e-6)) * (high - edge.top - edge.bottom)
  const floor = high - edge.bottom
  const labels = [...new Set([low, 0, top])]
  const every = Math.ceil(points.length / 14)
  return (
    <svg viewBox={`0 0 ${String(wide)} ${String(high)}`} className="w-full min-w-[34rem]" role="img" aria-label={title}>
      {points.map(({ number, required }, index) => (
        <g key={number}>
          <rect
            x={x(index) - step / 2}
            width={step}
            y={y(Math.min(required.max ?? top, top))}
            height={Math.max(y(required.min ?? low) - y(Math.min(required.max ?? top, top)), 0)}
            fill="var(--pass-wash)"
          />
          {[required.min, required.max].map((end) =>
            end === null || end > top ? null : (
              <path
                key={end}
                d={`M${String(x(index) - step / 2)} ${String(y(end))}h${String(step)}`}
                stroke="var(--pass)"
                strokeWidth="1.4"
                strokeDasharray="6 3"
              />
            ),
          )}
        </g>
      ))}
      {labels.map((value) => (
        <g key={value}>
          <path d={`M${String(edge.left)} ${String(y(value))}H${String(wide - edge.right)}`} stroke="var(--hair)" />
          <text x={edge.left - 6} y={y(value) + 4} textAnchor="end" fontSize="12" fill="var(--soft)" className="figure">
            {bareIn(value, units)}
          </text>
        </g>
      ))}
      <polyline
        points={points.map(({ clearance }, index) => `${String(x(index))},${String(y(clearance.nominal))}`).join(' ')}
        fill="none"
        stroke="var(--soft)"
      />
      {points.map(({ number, clearance, required, binds, rattles }, index) => {
        const isOut = clearance.nominal < (required.min ?? -Infinity) || clearance.nominal > (required.max ?? Infinity)
        const goes = Math.round((1 - binds - rattles) * 100)
        return (
          <g key={number}>
            <path
              d={`M${String(x(index))} ${String(y(clearance.min))}V${String(y(clearance.max))}m-4 0h8M${String(x(index) - 4)} ${String(y(clearance.min))}h8`}
              stroke="var(--ink)"
              strokeWidth="1.3"
            />
            {isOut ? (
              <rect x={x(index) - 5} y={y(clearance.nominal) - 5} width="10" height="10" fill="var(--fail)" />
            ) : (
              <circle cx={x(index)} cy={y(clearance.nominal)} r="4.5" fill="var(--ink)" />
            )}
            {index % every === 0 || index === points.length - 1 ? (
              <>
                <text
                  x={x(index)}
                  y={floor + 22}
                  textAnchor="middle"
                  fontSize="12"
                  fill="var(--soft)"
                  className="figure"
                >
                  v{number}
                </text>
                <text
                  x={x(index)}
                  y={floor + 42}
                  textAnchor="middle"
                  fontSize="13"
                  fontWeight="700"
                  fill="var(--ink)"
                  className="figure"
                >
                  {goes}
                </text>
              </>
            ) : null}
          </g>
        )
      })}
      <text x={2} y={floor + 42} fontSize="11" fill="var(--soft)">
        {trendWords.goes.split(' ').slice(-2).join(' ')}/100
      </text>
    </svg>
  )
}
