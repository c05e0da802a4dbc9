import { useId, type JSX } from 'react'
import type { RulerUnit } from '../../../shared/units/units.ts'
import { lengthIn } from '../../lib/units.ts'
import { nestWords } from '../../words/nest-words.ts'
import type { NestGap, NestPicture, NestPoint, NestShape } from './nest-picture.ts'

const wide = 460
const margin = 14

interface Frame {
  readonly x: (value: number) => number
  readonly y: (value: number) => number
  readonly height: number
}

function frameOf({ bounds }: NestPicture): Frame {
  const scale = (wide - 2 * margin) / (bounds.right - bounds.left)
  return {
    x: (value) => margin + (value - bounds.left) * scale,
    y: (value) => margin + (bounds.top - value) * scale,
    height: (bounds.top - bounds.bottom) * scale + 2 * margin,
  }
}

const pathOf = (points: readonly NestPoint[], frame: Frame): string =>
  `M${points.map(({ x, y }) => `${frame.x(x).toFixed(2)} ${frame.y(y).toFixed(2)}`).join('L')}Z`

function Shape({
  shape,
  frame,
  hatch,
}: {
  readonly shape: NestShape
  readonly frame: Frame
  readonly hatch: string
}): JSX.Element {
  const d = pathOf(shape.outline, frame)
  if (shape.look === 'body') return <path d={d} fill="var(--shade)" stroke="var(--ink)" strokeWidth="0.8" />
  if (shape.look === 'clash') return <path d={d} fill="var(--fail)" stroke="var(--fail)" strokeWidth="1.5" />
  return (
    <>
      <path d={d} fill="var(--sheet)" />
      <path d={d} fill={`url(#${hatch}${shape.slant === 1 ? 'a' : 'b'})`} stroke="var(--ink)" strokeWidth="1" />
    </>
  )
}

/** A gap's dimension line and figure, which is also a way to its fit. */
function Gap({
  gap,
  frame,
  units,
  isShown,
  onPoint,
}: {
  readonly gap: NestGap
  readonly frame: Frame
  readonly units: RulerUnit
  readonly isShown: boolean
  readonly onPoint: (fit: string | null) => void
}): JSX.Element {
  const [x1, y1, x2, y2] = [frame.x(gap.from.x), frame.y(gap.from.y), frame.x(gap.to.x), frame.y(gap.to.y)]
  const text = lengthIn(gap.clearance, units).replace(/ (mm|in)$/, '')
  const isUpright = Math.abs(y2 - y1) > Math.abs(x2 - x1)
  const width = text.length * 7.4 + 8
  // Beside an upright gap, above a level one, always inside the picture.
  const left = isUpright ? Math.max(x1, x2) + 6 : Math.min(Math.max((x1 + x2) / 2 - width - 8, 2), wide - width - 2)
  const top = isUpright ? (y1 + y2) / 2 - 9 : (y1 + y2) / 2 - 9
  const colour = gap.verdict === 'fail' ? 'var(--fail)' : gap.verdict === 'warn' ? 'var(--warn)' : 'var(--link)'
  return (
    <a
      href={`#fit-${gap.fit}`}
      onMouseEnter={() => onPoint(gap.fit)}
      onMouseLeave={() => onPoint(null)}
      onFocus={() => onPoint(gap.fit)}
      onBlur={() => onPoint(null)}
      aria-label={nestWords.gap(gap.fit, gap.axis, lengthIn(gap.clearance, units), gap.verdict)}
    >
      <rect x={left - 3} y={top - 4} width={width + 6} height={26} fill="transparent" />
      <path
        d={`M${String(x1)} ${String(y1)}L${String(x2)} ${String(y2)}`}
        stroke={colour}
        strokeWidth={isShown ? 3.2 : 1.8}
      />
      {[
        [x1, y1],
        [x2, y2],
      ].map(([x, y], index) => (
        <circle key={index} cx={x} cy={y} r={isShown ? 3 : 2} fill={colour} />
      ))}
      <rect
        x={left}
        y={top}
        width={width}
        height={18}
        fill="var(--sheet)"
        stroke={colour}
        strokeWidth={isShown ? 2.2 : 1}
      />
      <text x={left + width / 2} y={top + 13.2} textAnchor="middle" fontSize="12" fill="var(--ink)" className="figure">
        {text}
      </text>
    </a>
  )
}

/** One picture of the nest. Its gaps are also listed beside it, so nothing is said by the drawing alone. */
export function NestView({
  picture,
  units,
  shown,
  onPoint,
}: {
  readonly picture: NestPicture
  readonly units: RulerUnit
  readonly shown: string | null
  readonly onPoint: (fit: string | null) => void
}): JSX.Element {
  const hatch = useId().replaceAll(/[^a-zA-Z0-9]/g, '')
  const frame = frameOf(picture)
  const title = nestWords.title(picture.kind, picture.along, picture.id)
  return (
    <figure className="min-w-0">
      <svg
        viewBox={`0 0 ${String(wide)} ${frame.height.toFixed(1)}`}
        className="w-full"
        role="group"
        aria-label={title}
      >
        <defs>
          {(['a', 'b'] as const).map((slant) => (
            <pattern
              key={slant}
              id={`${hatch}${slant}`}
              width="4"
              height="4"
              patternUnits="userSpaceOnUse"
              patternTransform={`rotate(${slant === 'a' ? '45' : '-45'})`}
            >
              <path d="M0 0v4" stroke="var(--ink)" strokeWidth="1.6" />
            </pattern>
          ))}
        </defs>
        {picture.shapes.map((shape, index) => (
          <Shape key={index} shape={shape} frame={frame} hatch={hatch} />
        ))}
        {picture.names.map(({ text, at }) => (
          <text
            key={text}
            x={frame.x(at.x)}
            y={frame.y(at.y) + 4}
            textAnchor="middle"
            fontSize="12"
            fill="var(--ink)"
            stroke="var(--sheet)"
            strokeWidth="4"
            paintOrder="stroke"
          >
            {text.length > 34 ? `${text.slice(0, 33)}…` : text}
          </text>
        ))}
        {picture.gaps.map((gap) => (
          <Gap
            key={`${gap.fit} ${gap.axis}`}
            gap={gap}
            frame={frame}
            units={units}
            isShown={shown === gap.fit}
            onPoint={onPoint}
          />
        ))}
      </svg>
      <figcaption className="label mt-1">
        {title}. {nestWords.factor(picture.kind, picture.factor)}
      </figcaption>
    </figure>
  )
}
