import { useId, type JSX } from 'react'
import type { RulerUnit } from '../../../shared/units/units.ts'
import { bareIn, lengthIn } from '../../lib/units.ts'
import { nestWords } from '../../words/nest-words.ts'
import type { NestGap, NestPicture, NestPoint, NestShape } from './nest-picture.ts'

const wide = 560
const margin = 10
/** Room at the right for the figures of level gaps. */
const gutter = 78
const lineHeight = 25
const tallest = 420

const levelGaps = ({ gaps }: NestPicture): number =>
  gaps.filter(({ from, to }) => Math.abs(to.x - from.x) >= Math.abs(to.y - from.y)).length

interface Frame {
  readonly x: (value: number) => number
  readonly y: (value: number) => number
  readonly height: number
}

function frameOf(picture: NestPicture): Frame {
  const { bounds } = picture
  const scale = Math.min(
    (wide - gutter - margin) / (bounds.right - bounds.left),
    tallest / (bounds.top - bounds.bottom),
  )
  return {
    x: (value) => margin + (value - bounds.left) * scale,
    y: (value) => margin + (bounds.top - value) * scale,
    height: Math.max((bounds.top - bounds.bottom) * scale + 2 * margin, levelGaps(picture) * lineHeight + 8),
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

interface Label {
  readonly left: number
  readonly top: number
  readonly width: number
  readonly text: string
}

const isUpright = (gap: NestGap): boolean => Math.abs(gap.to.y - gap.from.y) > Math.abs(gap.to.x - gap.from.x)

/** Figures of level gaps stand below one another at the right, those of upright gaps beside them. */
function labelsOf(picture: NestPicture, frame: Frame, units: RulerUnit): ReadonlyMap<NestGap, Label> {
  const labels = new Map<NestGap, Label>()
  let next = 2
  const level = picture.gaps.filter((gap) => !isUpright(gap)).toSorted((a, b) => b.from.y - a.from.y)
  for (const gap of picture.gaps) {
    if (!isUpright(gap)) continue
    const text = bareIn(gap.clearance, units)
    const middle = (frame.y(gap.from.y) + frame.y(gap.to.y)) / 2
    labels.set(gap, { left: frame.x(gap.from.x) + 7, top: middle - 10, width: text.length * 8.4 + 10, text })
  }
  for (const gap of level) {
    const text = bareIn(gap.clearance, units)
    const top = Math.max(next, frame.y(gap.from.y) - 10)
    next = top + lineHeight
    labels.set(gap, { left: wide - gutter + 16, top, width: text.length * 8.4 + 10, text })
  }
  return labels
}

/** A gap's dimension line and figure, which is also a way to its fit. */
function Gap({
  gap,
  label,
  frame,
  units,
  isShown,
  onPoint,
}: {
  readonly gap: NestGap
  readonly label: Label
  readonly frame: Frame
  readonly units: RulerUnit
  readonly isShown: boolean
  readonly onPoint: (fit: string | null) => void
}): JSX.Element {
  const [x1, y1, x2, y2] = [frame.x(gap.from.x), frame.y(gap.from.y), frame.x(gap.to.x), frame.y(gap.to.y)]
  const colour = gap.verdict === 'fail' ? 'var(--fail)' : gap.verdict === 'warn' ? 'var(--warn)' : 'var(--link)'
  const middle = label.top + 11
  return (
    <a
      href={`#fit-${gap.fit}`}
      onMouseEnter={() => onPoint(gap.fit)}
      onMouseLeave={() => onPoint(null)}
      onFocus={() => onPoint(gap.fit)}
      onBlur={() => onPoint(null)}
      aria-label={nestWords.gap(gap.fit, gap.axis, lengthIn(gap.clearance, units), gap.verdict)}
    >
      <rect x={label.left - 4} y={label.top - 2} width={label.width + 8} height={26} fill="transparent" />
      {isUpright(gap) ? null : (
        <path
          d={`M${String(Math.max(x1, x2))} ${String(y1)}L${String(label.left - 8)} ${String(middle)}H${String(label.left)}`}
          fill="none"
          stroke={colour}
          strokeWidth="1"
        />
      )}
      <path
        d={`M${String(x1)} ${String(y1)}L${String(x2)} ${String(y2)}`}
        stroke={colour}
        strokeWidth={isShown ? 3.6 : 2}
      />
      {[
        [x1, y1],
        [x2, y2],
      ].map(([x, y], index) => (
        <circle key={index} cx={x} cy={y} r={isShown ? 3.2 : 2.2} fill={colour} />
      ))}
      <rect
        x={label.left}
        y={label.top}
        width={label.width}
        height={22}
        fill="var(--sheet)"
        stroke={colour}
        strokeWidth={isShown ? 2.4 : 1.2}
      />
      <text
        x={label.left + label.width / 2}
        y={middle + 5}
        textAnchor="middle"
        fontSize="14"
        fill="var(--ink)"
        className="figure"
      >
        {label.text}
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
  const labels = labelsOf(picture, frame, units)
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
            fontSize="13"
            fill="var(--ink)"
            stroke="var(--sheet)"
            strokeWidth="4"
            paintOrder="stroke"
          >
            {text.length > 34 ? `${text.slice(0, 33)}…` : text}
          </text>
        ))}
        {picture.gaps.map((gap) => {
          const label = labels.get(gap)
          return label === undefined ? null : (
            <Gap
              key={`${gap.fit} ${gap.axis}`}
              gap={gap}
              label={label}
              frame={frame}
              units={units}
              isShown={shown === gap.fit}
              onPoint={onPoint}
            />
          )
        })}
      </svg>
      <figcaption className="label mt-1">
        {title}. {nestWords.factor(picture.kind, picture.factor)}
      </figcaption>
    </figure>
  )
}
