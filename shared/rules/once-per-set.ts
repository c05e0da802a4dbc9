import type { JudgedSet } from '../assembly/judge-set.ts'

/** Works something out once for a judged set, however many rules ask for it. */
export function oncePerSet<T>(work: (judged: JudgedSet) => T): (judged: JudgedSet) => T {
  const known = new WeakMap<JudgedSet, { readonly value: T }>()
  return (judged) => {
    const found = known.get(judged)
    if (found !== undefined) return found.value
    const value = work(judged)
    known.set(judged, { value })
    return value
  }
}
