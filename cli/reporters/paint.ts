/** Colours of a terminal; plain text where there are none. Words and marks carry the meaning, colour only repeats it. */
export interface Paint {
  bold(text: string): string
  quiet(text: string): string
  good(text: string): string
  wary(text: string): string
  bad(text: string): string
}

const wrap =
  (code: string) =>
  (text: string): string =>
    `\u001b[${code}m${text}\u001b[0m`

const same = (text: string): string => text

export const paintFor = (hasColour: boolean): Paint =>
  hasColour
    ? { bold: wrap('1'), quiet: wrap('2'), good: wrap('32'), wary: wrap('33'), bad: wrap('31') }
    : { bold: same, quiet: same, good: same, wary: same, bad: same }

/** Control characters of a hostile title would move the cursor: they are shown as a question mark. */
export const printable = (text: string): string =>
  text.replace(/[\u0000-\u001f\u007f-\u009f\u202a-\u202e\u2066-\u2069]/g, '?')
