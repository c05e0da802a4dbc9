/** Bytes of a text of ASCII characters only; all that a PDF is written in besides packed data. */
export function asciiBytes(text: string): Uint8Array {
  const bytes = new Uint8Array(text.length)
  for (let index = 0; index < text.length; index += 1) bytes[index] = text.charCodeAt(index) & 0x7f
  return bytes
}
