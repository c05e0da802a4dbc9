import { useMemo, type JSX } from 'react'
import { drawBlank } from '../../../shared/drawing/draw-blank.ts'
import type { Blank } from '../../../shared/pieces/blank.ts'
import { useUnits } from '../../lib/units.ts'
import { DrawingView } from '../../ui/drawing-view.tsx'
import { blankWords } from '../../words/blank-words.ts'

/** Height of letters that can be read where a sheet is as wide as its column. */
export function textSizeFor(blank: Blank): number {
  const reach = Math.max(...blank.outline.flatMap(({ x, y }) => [x, y]))
  return Math.min(Math.max(reach / 46, 1.6), 7)
}

/** One flat sheet with its scores, glue, names and measures. */
export default function BlankDrawing({
  blank,
  describedBy,
}: {
  readonly blank: Blank
  readonly describedBy: string
}): JSX.Element {
  const units = useUnits()
  const drawing = useMemo(() => drawBlank(blank, { units, textSize: textSizeFor(blank) }), [blank, units])
  return <DrawingView drawing={drawing} title={blankWords.drawingOf(blank.name)} describedBy={describedBy} />
}
