/** The part of a source's name in brackets, split at its commas. */
const partsOf = (name: string): { readonly kind: string; readonly parts: readonly string[] } => {
  const match = /^([a-z0-9-]+)\((.*)\)$/.exec(name)
  return match === null ? { kind: name, parts: [] } : { kind: match[1] ?? name, parts: (match[2] ?? '').split(', ') }
}

/** A source of variation in plain words: `cut(lid, length)` is “how exactly the length of lid is cut”. */
export function sourceInWords(name: string): string {
  const { kind, parts } = partsOf(name)
  const [first = '', second = '', third = ''] = parts
  switch (kind) {
    case 'caliper':
      return `how thick ${first} really is`
    case 'hinge90':
      return 'how deep a right-angle fold hinges'
    case 'hinge180':
      return 'how deep a flat fold hinges'
    case 'fence':
      return 'how exactly the fence is set for scoring'
    case 'printer':
      return `how far the printer stretches the page ${first === 'x' ? 'across' : 'along'}`
    case 'cut':
      return `how exactly the ${second} of ${first} is cut`
    case 'score':
      return second === 'girth' || second === 'height'
        ? `how exactly score ${third} of ${first} is placed`
        : `how exactly score ${third} across the ${second} of ${first} is placed`
    case 'tab':
      return `how far the tabs push the walls of ${first} out`
    case 'given':
      return `how true the ${second} of ${first} is`
    case 'pack-compression':
      return 'how far the pack presses together'
    case 'loft':
      return 'how far the folds spring open'
    case 'humidity':
      return `how far ${first} grows ${second} the grain with damp`
    default:
      return name
  }
}
