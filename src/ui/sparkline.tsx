import type { JSX } from 'react'

/** Shares between 0 and 1 as a small line on the lines of 0 and 1; what falls is seen by its shape. */
export function Sparkline({
  shares,
  title,
}: {
  readonly shares: readonly number[]
  readonly title: string
}): JSX.Element {
  const wide = 96
  const high = 26
  const x = (index: number): number => 4 + (shares.length < 2 ? 0.5 : index / (shares.length - 1)) * (wide - 8)
  const y = (share: number): number => 4 + (1 - share) * (high - 8)
  const last = shares.at(-1)
  return (
    <svg viewBox={`0 0 ${String(wide)} ${String(high)}`} className="h-7 w-24" role="img" aria-label={title}>
      <path d={`M0 4H${String(wide)}M0 ${String(high - 4)}H${String(wide)}`} stroke="var(--hair)" />
      <polyline
        points={shares.map((share, index) => `${x(index).toFixed(1)},${y(share).toFixed(1)}`).join(' ')}
        fill="none"
        stroke="var(--ink)"
        strokeWidth="1.5"
      />
      {shares.map((share, index) => (
        <circle key={index} cx={x(index)} cy={y(share)} r="1.6" fill="var(--ink)" />
      ))}
      {last === undefined ? null : (
        <rect x={x(shares.length - 1) - 3} y={y(last) - 3} width="6" height="6" fill="var(--ink)" />
      )}
    </svg>
  )
}
