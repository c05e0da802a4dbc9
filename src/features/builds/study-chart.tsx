import type { JSX } from 'react'
import { lengthIn } from '../../lib/units.ts'
import { buildWords } from '../../words/build-words.ts'
import type { Study } from './build-queries.ts'

const wide = 360
const high = 44
const edge = 8

/** One dimension: predicted as a line with its worst case, each build a dot, from three builds their interval. */
export function StudyChart({
  dimension,
  units,
}: {
  readonly dimension: Study['dimensions'][number]
  readonly units: 'mm' | 'in'
}): JSX.Element {
  const { predicted, points, interval, what, n } = dimension
  const values = [predicted.min, predicted.max, ...points.map(({ corrected }) => corrected)]
  const low = Math.min(...values)
  const reach = Math.max(Math.max(...values) - low, 1e-6)
  const x = (value: number): number => edge + ((value - low) / reach) * (wide - 2 * edge)
  return (
    <svg
      viewBox={`0 0 ${String(wide)} ${String(high)}`}
      className="w-full max-w-md min-w-52"
      role="img"
      aria-label={buildWords.chart(what, n)}
    >
      <rect
        x={x(predicted.min)}
        y={14}
        width={x(predicted.max) - x(predicted.min)}
        height={14}
        fill="var(--info-wash)"
        stroke="var(--stroke)"
      />
      <path d={`M${String(x(predicted.nominal))} 9V33`} stroke="var(--link)" strokeWidth="2" />
      {interval === null ? null : (
        <path
          d={`M${String(x(Math.max(interval.low, low)))} 36H${String(x(Math.min(interval.high, low + reach)))}m0-3v6M${String(x(Math.max(interval.low, low)))} 33v6`}
          stroke="var(--ink)"
          strokeWidth="1.6"
          fill="none"
        />
      )}
      {points.map(({ build, corrected }, index) => (
        <circle
          key={`${build} ${String(index)}`}
          cx={x(corrected)}
          cy={21}
          r="3.6"
          fill="var(--sheet)"
          stroke="var(--ink)"
          strokeWidth="1.6"
        />
      ))}
      <text
        x={x(predicted.nominal)}
        y={8}
        textAnchor={x(predicted.nominal) > wide * 0.8 ? 'end' : x(predicted.nominal) < wide * 0.2 ? 'start' : 'middle'}
        fontSize="9.5"
        fill="var(--soft)"
        className="figure"
      >
        {lengthIn(predicted.nominal, units)}
      </text>
    </svg>
  )
}
