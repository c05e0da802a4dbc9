import type { Millimetres } from '../units/units.ts'

/** Every character of the design's font is six tenths of its body wide (measured in the font: 600 of 1000 units). */
const advance = 0.6

/** Height of capitals and descent below the base line, as shares of the body (measured in the font: 730 and 300 of 1000). */
export const capHeight = 0.73
export const descent = 0.3

/** Width of a line of text; what the font draws in one cell counts as one, however many code units it takes. */
export const textWidth = (content: string, size: Millimetres): Millimetres => [...content].length * advance * size

/** Characters that fit into a width. */
export const charactersIn = (width: Millimetres, size: Millimetres): number =>
  Math.max(1, Math.floor(width / (advance * size) + 1e-9))

/** Text cut to a width, an ellipsis in place of what is lost. */
export function clipText(content: string, width: Millimetres, size: Millimetres): string {
  const characters = [...content]
  const room = charactersIn(width, size)
  return characters.length <= room ? content : `${characters.slice(0, Math.max(1, room - 1)).join('')}…`
}

/** Text broken into lines of at most so many characters, at spaces where there are any. */
export function wrapText(content: string, room: number): readonly string[] {
  const lines: string[] = []
  let current = ''
  for (const word of content.split(/\s+/u)) {
    let rest = [...word]
    if (current !== '' && [...current].length + 1 + rest.length > room) {
      lines.push(current)
      current = ''
    }
    while (rest.length > room) {
      if (current !== '') {
        lines.push(current)
        current = ''
      }
      lines.push(rest.slice(0, room).join(''))
      rest = rest.slice(room)
    }
    current = current === '' ? rest.join('') : `${current} ${rest.join('')}`
  }
  if (current !== '' || lines.length === 0) lines.push(current)
  return lines
}
