import type { Bounds } from '../geometry/bounds.ts'
import type { Millimetres } from '../units/units.ts'
import { line, text, type Mark, type TextRole } from './drawing.ts'
import { charactersIn, clipText, textWidth, wrapText } from './text-width.ts'

/** Something that takes a height on a page and draws itself below a point. */
export interface Block {
  readonly height: Millimetres
  readonly draw: (left: Millimetres, top: Millimetres) => readonly Mark[]
  /** Does not end a page: a heading, or a line that belongs to the next. */
  readonly keepsNext: boolean
}

const block = (height: Millimetres, draw: Block['draw'], keepsNext = false): Block => ({ height, draw, keepsNext })

export const gap = (height: Millimetres): Block => block(height, () => [])

interface TextOptions {
  readonly size: Millimetres
  readonly isBold?: boolean
  readonly role?: TextRole
  readonly indent?: Millimetres
  /** Stands before the first line, out in the indent. */
  readonly bullet?: string
  readonly keepsNext?: boolean
}

/** A paragraph as one block a line, so that it may run on to the next page. */
export function paragraph(content: string, width: Millimetres, options: TextOptions): readonly Block[] {
  const { size, indent = 0 } = options
  const lines = wrapText(content, charactersIn(width - indent, size))
  return lines.map((words, index) =>
    block(
      size * 1.42,
      (left, top) => {
        const base = top - size * 1.05
        const bullet =
          index === 0 && options.bullet !== undefined
            ? [text('legend', { x: left, y: base }, options.bullet, size, { role: 'paragraph' })]
            : []
        return [
          ...bullet,
          text('legend', { x: left + indent, y: base }, words, size, {
            isBold: options.isBold ?? false,
            role: options.role ?? 'paragraph',
          }),
        ]
      },
      options.keepsNext === true || index < Math.min(1, lines.length - 1),
    ),
  )
}

export const heading = (
  content: string,
  width: Millimetres,
  size: Millimetres,
  role: TextRole = 'heading',
): readonly Block[] => [gap(size * 0.5), ...paragraph(content, width, { size, isBold: true, role, keepsNext: true })]

/**
 * A table with rules between its rows, columns as wide as their shares of the width. Where a cell does not fit its
 * column, as in large print, every row becomes a sentence of its own instead.
 */
export function table(
  head: readonly string[],
  rows: readonly (readonly string[])[],
  shares: readonly number[],
  width: Millimetres,
  size: Millimetres,
): readonly Block[] {
  const total = shares.reduce((sum, share) => sum + share, 0)
  const columnOf = (index: number): Millimetres => (width * (shares[index] ?? 1)) / total - size * 0.8
  const isTooWide = [head, ...rows].some((cells) =>
    cells.some((cell, index) => textWidth(cell, size) > columnOf(index)),
  )
  if (isTooWide && rows.length > 0) {
    return rows.flatMap((cells) => {
      const words = cells.map((cell, index) =>
        index === 0 ? `${head[0] ?? ''} ${cell}` : `${head[index] ?? ''} ${cell}`,
      )
      return paragraph(words.join(' · '), width, { size, indent: size * 1.4, bullet: '-' })
    })
  }
  const row = (cells: readonly string[], isHead: boolean): Block =>
    block(
      size * 1.7,
      (left, top) => {
        let x = left
        const marks: Mark[] = [
          line(
            'legend',
            [
              { x: left, y: top - size * 1.62 },
              { x: left + width, y: top - size * 1.62 },
            ],
            { weight: isHead ? 'wide' : 'plain' },
          ),
        ]
        cells.forEach((cell, index) => {
          const wide = (width * (shares[index] ?? 1)) / total
          marks.push(
            text('legend', { x, y: top - size * 1.15 }, clipText(cell, wide - size * 0.8, size), size, {
              isBold: isHead,
              role: 'paragraph',
            }),
          )
          x += wide
        })
        return marks
      },
      isHead,
    )
  return [row(head, true), ...rows.map((cells) => row(cells, false))]
}

/** Blocks side by side with a figure: the figure at the right, the text beside it; kept together on one page. */
export function besideFigure(
  lines: readonly Block[],
  figure: { readonly width: Millimetres; readonly height: Millimetres; readonly marks: readonly Mark[] },
  move: (marks: readonly Mark[], x: Millimetres, y: Millimetres) => readonly Mark[],
  width: Millimetres,
): Block {
  const high = lines.reduce((sum, one) => sum + one.height, 0)
  const height = Math.max(high, figure.height)
  return block(height, (left, top) => {
    let y = top
    const marks = lines.flatMap((one) => {
      const drawn = one.draw(left, y)
      y -= one.height
      return drawn
    })
    return [...marks, ...move(figure.marks, left + width - figure.width, top - figure.height)]
  })
}

/** A frame drawn round what must not be missed; without one where it would not go on a page in one piece. */
export function framed(lines: readonly Block[], width: Millimetres, most: Millimetres): readonly Block[] {
  const high = lines.reduce((sum, one) => sum + one.height, 0) + 3
  if (high > most) return lines
  const frame = block(high, (left, top) => {
    let y = top - 1
    const marks = lines.flatMap((one) => {
      const drawn = one.draw(left + 2, y)
      y -= one.height
      return drawn
    })
    const [right, bottom] = [left + width, top - high + 0.5]
    return [
      line(
        'legend',
        [
          { x: left, y: bottom },
          { x: right, y: bottom },
          { x: right, y: top },
          { x: left, y: top },
        ],
        { isClosed: true, weight: 'wide' },
      ),
      ...marks,
    ]
  })
  return [frame]
}

/** Blocks poured down one page after another. */
export function flowBlocks(blocks: readonly Block[], room: Bounds): readonly (readonly Mark[])[] {
  const pages: Mark[][] = []
  let current: Mark[] = []
  let top = room.top
  const turn = (): void => {
    pages.push(current)
    current = []
    top = room.top
  }
  for (let index = 0; index < blocks.length; index += 1) {
    let need = 0
    let last = index
    for (; last < blocks.length; last += 1) {
      need += blocks[last]?.height ?? 0
      if (blocks[last]?.keepsNext !== true) break
    }
    if (top - need < room.bottom && current.length > 0) turn()
    const one = blocks[index]
    if (one === undefined) continue
    if (current.length === 0 && one.height > 0 && top === room.top && one.draw(0, 0).length === 0) continue
    current.push(...one.draw(room.left, top))
    top -= one.height
  }
  if (current.length > 0) pages.push(current)
  return pages
}
