/** A seeded source of numbers from 0 up to 1 (mulberry32, public domain): the same run every time. */
export function createRandom(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)) ^ mixed
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296
  }
}

const fragments = [
  '{',
  '}',
  '[',
  ']',
  ':',
  ': ',
  ',',
  '- ',
  '"',
  "'",
  '|',
  '>',
  '#',
  ' #',
  '&a ',
  '*a',
  '*b',
  '!x ',
  '!!int ',
  '<<: *a',
  '? ',
  '%',
  '@',
  '`',
  '~',
  'null',
  'true',
  'no',
  '\n',
  '\n\n',
  '\t',
  '  ',
  '\r\n',
  '\r',
  '---\n',
  '...\n',
  '%YAML 1.1\n',
  '\uFEFF',
  '\u0000',
  '\u2028',
  '🍐',
  '\uD800',
  '__proto__',
  'constructor',
  'toString',
  'fit',
  'auto',
  'none',
  '0',
  '-1',
  '1e9',
  '0x1F',
  '0o17',
  '1/0',
  '1/',
  '/2',
  '½',
  '½ in',
  '..',
  '-0.3..4 mm',
  '± 5 %',
  '+0.03/-0.01',
  '3.2 mm / 10',
  '99999999999999999999999',
  '0.37',
  '0,37',
  'x',
  '×',
  ' x ',
  'mm',
  'in',
  'pt',
  '%',
  'NaN',
  'Infinity',
  'kind: ',
  'kind: box',
  'stock: ',
  'put: ',
  'in: ',
  'around: ',
  'a6',
  'iso-a6',
  '[4 card, 4 envelope]',
  '{ count: 2, piece: card }',
  '[[[[[[',
  '{{{{',
  '2027-02-30',
] as const

/** A text with a few random changes: cut, doubled, swapped, or with something put in. */
export function mutate(text: string, random: () => number): string {
  const at = (length: number): number => Math.floor(random() * length)
  let changed = text
  for (let changes = random() < 0.7 ? 1 : 2 + at(3); changes > 0; changes -= 1) {
    const start = at(changed.length + 1)
    const end = Math.min(changed.length, start + 1 + at(12))
    const slice = changed.slice(start, end)
    const before = changed.slice(0, start)
    const after = changed.slice(end)
    switch (at(7)) {
      case 0:
        changed = before + after
        break
      case 1:
        changed = before + slice + slice + after
        break
      case 2:
        changed = before + [...slice].reverse().join('') + after
        break
      case 3: {
        const other = at(text.length)
        changed = before + text.slice(other, other + at(40)) + after
        break
      }
      case 4:
        changed = before + slice.replace(/\d/, String(at(10))) + after
        break
      default:
        changed = before + (fragments[at(fragments.length)] ?? '') + (random() < 0.5 ? slice : '') + after
    }
  }
  return changed
}
