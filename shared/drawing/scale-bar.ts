import type { Point } from '../geometry/shapes.ts'
import { millimetresPerInch as inch } from '../units/format-length.ts'
import type { Millimetres } from '../units/units.ts'
import { line, text, type Mark } from './drawing.ts'
import { placeDrawing } from './place-drawing.ts'

/** Lengths of a bar that carries both scales: millimetres above the line, inches below. */
export interface BarLengths {
  readonly mm: Millimetres
  readonly inches: number
}

/** The longest bar between 100 and 250 mm in whole centimetres and whole inches; shorter only where the page is. */
export function barLengths(room: Millimetres): BarLengths {
  const mm = Math.min(250, Math.floor(room / 10 + 1e-9) * 10)
  return { mm, inches: Math.floor(Math.min(mm, room) / inch + 1e-9) }
}

/** Heights of ticks and of the figures beside them. */
export const barHeight: Millimetres = 8

/** A bar to lay a ruler on, along x from a point or, turned, along y. */
export function scaleBar(at: Point, lengths: BarLengths, direction: 'x' | 'y'): readonly Mark[] {
  const marks: Mark[] = [
    line(
      'legend',
      [
        { x: 0, y: 0 },
        { x: lengths.mm, y: 0 },
      ],
      { weight: 'plain' },
    ),
  ]
  for (let mm = 0; mm <= lengths.mm; mm += 10) {
    const isMain = mm % 50 === 0 || mm === lengths.mm
    marks.push(
      line(
        'legend',
        [
          { x: mm, y: 0 },
          { x: mm, y: isMain ? 2.6 : 1.4 },
        ],
        { weight: 'plain' },
      ),
    )
    if (isMain && (mm === lengths.mm || lengths.mm - mm > 15)) {
      const isLast = mm === lengths.mm
      marks.push(
        text('legend', { x: mm, y: 2.9 }, isLast ? `${String(mm)} mm` : String(mm), 2, {
          anchor: mm === 0 ? 'start' : isLast ? 'end' : 'middle',
        }),
      )
    }
  }
  for (let inches = 0; inches <= lengths.inches; inches += 1) {
    const x = inches * inch
    const isLast = inches === lengths.inches
    marks.push(
      line(
        'legend',
        [
          { x, y: 0 },
          { x, y: -2 },
        ],
        { weight: 'plain' },
      ),
    )
    marks.push(
      text('legend', { x, y: -4 }, isLast ? `${String(inches)} in` : String(inches), 2, {
        anchor: inches === 0 ? 'start' : isLast ? 'end' : 'middle',
      }),
    )
  }
  return placeDrawing({ marks }, { x: at.x, y: at.y, turn: direction === 'x' ? 0 : 90, scale: 1 })
}

/** Print scales between which a set's fits hold. */
export interface PrintWindow {
  readonly min: number
  readonly max: number
}

/** Beyond a fiftieth the figures printed on a page are no longer true to what it shows (guess), whatever the fits bear. */
const widest = 0.02

export const narrowWindow = (window: PrintWindow): PrintWindow => ({
  min: Math.max(window.min, 1 - widest),
  max: Math.min(window.max, 1 + widest),
})

const mmText = (value: number): string => value.toFixed(1)

/** What the bars must measure, in words. */
export function windowText(lengths: BarLengths, window: PrintWindow | null): string {
  if (window === null) return `Must measure exactly ${String(lengths.mm)} mm; else measure, do not trace.`
  const { min, max } = narrowWindow(window)
  return `Must measure ${mmText(lengths.mm * min)} to ${mmText(lengths.mm * max)} mm, in both directions.`
}

/** Measured bar and the percentage to print at instead: 100 divided by what came out (derived). */
export function correctionRows(
  lengths: BarLengths,
): readonly { readonly measured: string; readonly printAt: string }[] {
  return [0.94, 0.96, 0.97, 0.98, 0.99, 1.01, 1.02, 1.03, 1.04, 1.06].map((ratio) => ({
    measured: mmText(lengths.mm * ratio),
    printAt: (100 / ratio).toFixed(1),
  }))
}

/** The table on one line, for the foot of a page. */
export function correctionLine(lengths: BarLengths, room: number): string {
  const rows = correctionRows(lengths)
  const nearest = [...rows].sort((a, b) => Math.abs(Number(a.printAt) - 100) - Math.abs(Number(b.printAt) - 100))
  for (let count = rows.length; count > 0; count -= 1) {
    const shown = nearest.slice(0, count).sort((a, b) => Number(a.measured) - Number(b.measured))
    const content = `If it measures (mm) print at (%): ${shown.map((row) => `${row.measured}: ${row.printAt}`).join(', ')}`
    if (content.length <= room) return content
  }
  return ''
}
