import { drawFigure } from '../drawing/draw-figure.ts'
import type { ExportSet } from './export-set.ts'
import { fileName, type ExportedFile } from './exported-file.ts'
import type { Step } from './steps/step.ts'
import { writeStepsHtml, writeStepsMarkdown, writeStepsText } from './steps/write-steps.ts'
import { writeSvg } from './svg/write-svg.ts'

const stageWords = { sheet: 'cut to size', scored: 'with its scores', cut: 'cut out' } as const

/** A step's picture as SVG markup to stand in a page. */
function figureOf(set: ExportSet, one: Step): string | null {
  const { figure } = one
  const blank = set.pieces.flatMap((piece) => piece.sheets).find((sheet) => sheet.blank.name === figure?.sheet)?.blank
  if (figure === null || blank === undefined) return null
  const drawn = drawFigure(blank, figure.stage, 80, 60)
  const svg = writeSvg(
    { marks: drawn.marks },
    {
      title: `${figure.sheet}, ${stageWords[figure.stage]}`,
      description: one.sentences.join(' '),
      box: { left: 0, bottom: 0, width: drawn.width, height: drawn.height },
      layers: null,
      areDashesDrawn: false,
      colour: '#000',
    },
  )
  return svg.replace(/^<\?xml[^>]*>\n/, '')
}

/** The steps for every way of reading them: a page with pictures, Markdown, and plain text. */
export function exportSteps(set: ExportSet, steps: readonly Step[], isLarge: boolean): readonly ExportedFile[] {
  const name = fileName(set.name, 'steps', set.units, isLarge ? 'large-print' : '')
  return [
    { name: `${name}.html`, content: writeStepsHtml(set, steps, { isLarge, figureOf: (one) => figureOf(set, one) }) },
    { name: `${name}.md`, content: writeStepsMarkdown(set, steps) },
    { name: `${name}.txt`, content: writeStepsText(set, steps) },
  ]
}
