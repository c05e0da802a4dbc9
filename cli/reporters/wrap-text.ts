/** Breaks words at a width, every line indented; a word longer than a line stays whole. */
export function wrapText(text: string, width: number, indent: string): readonly string[] {
  const lines: string[] = []
  let line = ''
  for (const word of text.split(' ')) {
    if (line !== '' && line.length + 1 + word.length > width - indent.length) {
      lines.push(indent + line)
      line = word
    } else line = line === '' ? word : `${line} ${word}`
  }
  return line === '' ? lines : [...lines, indent + line]
}
