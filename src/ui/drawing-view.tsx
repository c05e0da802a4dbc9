import type { JSX } from 'react'
import type { Drawing, Mark } from '../../shared/drawing/drawing.ts'
import { lineStyles } from '../../shared/drawing/line-styles.ts'

export interface DrawnBounds {
  readonly left: number
  readonly bottom: number
  readonly right: number
  readonly top: number
}

const pointsOf = (mark: Mark): readonly { readonly x: number; readonly y: number }[] => {
  if (mark.kind === 'line') return mark.points
  if (mark.kind === 'fill') return mark.polygon
  // A line of text is about six tenths of its height wide per letter; it may stand at any angle.
  const reach = mark.text.length * mark.size * (mark.anchor === 'middle' ? 0.3 : 0.6)
  const isUpright = Math.abs((((mark.angle % 180) + 180) % 180) - 90) < 45
  const [wide, high] = isUpright ? [mark.size, reach] : [reach, mark.size]
  return [
    { x: mark.at.x - wide, y: mark.at.y - high },
    { x: mark.at.x + wide, y: mark.at.y + high },
  ]
}

/** The least rectangle that holds drawings, with a little air. */
export function boundsOfMarks(marks: readonly Mark[]): DrawnBounds {
  const points = marks.flatMap(pointsOf)
  const xs = points.map(({ x }) => x)
  const ys = points.map(({ y }) => y)
  const air = 3
  return {
    left: Math.min(...xs) - air,
    bottom: Math.min(...ys) - air,
    right: Math.max(...xs) + air,
    top: Math.max(...ys) + air,
  }
}

/** Screen widths of the two kinds of line, and how long dashes are there. */
const widths = { wide: 2, narrow: 1.1 } as const
const dashScale = 2.4

function MarkView({ mark }: { readonly mark: Mark }): JSX.Element {
  if (mark.kind === 'fill')
    return (
      <path
        d={`M${mark.polygon.map(({ x, y }) => `${x.toFixed(2)} ${(-y).toFixed(2)}`).join('L')}Z`}
        fill={mark.layer === 'dimension' ? 'var(--soft)' : 'var(--ink)'}
      />
    )
  if (mark.kind === 'text') {
    const { x, y } = mark.at
    return (
      <text
        x={x}
        y={-y}
        fontSize={mark.size}
        textAnchor={mark.anchor}
        transform={mark.angle === 0 ? undefined : `rotate(${String(-mark.angle)} ${String(x)} ${String(-y)})`}
        fill="var(--ink)"
        fontWeight={mark.isBold ? 700 : 400}
        className="figure"
      >
        {mark.text}
      </text>
    )
  }
  const style = lineStyles[mark.layer]
  const isPlain = mark.weight === 'plain'
  const isWide = mark.weight === 'wide' || (!isPlain && (mark.layer === 'cut' || mark.layer === 'perforate'))
  return (
    <path
      d={`M${mark.points.map(({ x, y }) => `${x.toFixed(3)} ${(-y).toFixed(3)}`).join('L')}${mark.isClosed ? 'Z' : ''}`}
      fill="none"
      stroke={mark.layer === 'glue' || mark.layer === 'dimension' ? 'var(--stroke)' : 'var(--ink)'}
      strokeWidth={isWide ? widths.wide : widths.narrow}
      strokeDasharray={
        isPlain || style.dash.length === 0 ? undefined : style.dash.map((part) => part * dashScale).join(' ')
      }
      strokeLinecap={style.isRoundEnded ? 'round' : 'butt'}
      vectorEffect="non-scaling-stroke"
    />
  )
}

/** Marks of a drawing inside an `<svg>` whose y axis points down. */
export function Marks({ marks }: { readonly marks: readonly Mark[] }): JSX.Element {
  return (
    <>
      {marks.map((mark, index) => (
        <MarkView key={index} mark={mark} />
      ))}
    </>
  )
}

/** A drawing as a picture. What it shows stands in a table beside it, which `describedBy` names. */
export function DrawingView({
  drawing,
  title,
  describedBy,
}: {
  readonly drawing: Drawing
  readonly title: string
  readonly describedBy?: string | undefined
}): JSX.Element {
  const { left, bottom, right, top } = boundsOfMarks(drawing.marks)
  return (
    <svg
      viewBox={`${String(left)} ${String(-top)} ${String(right - left)} ${String(top - bottom)}`}
      className="max-h-[34rem] w-full"
      role="img"
      aria-label={title}
      aria-describedby={describedBy}
    >
      <Marks marks={drawing.marks} />
    </svg>
  )
}
