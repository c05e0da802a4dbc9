import { useSyncExternalStore } from 'react'

const listeners = new Set<() => void>()

const read = (key: string): string | null => {
  try {
    return localStorage.getItem(key)
  } catch {
    // Storage may be forbidden; then choices last as long as the page.
    return null
  }
}

export function store(key: string, value: string | null): void {
  try {
    if (value === null) localStorage.removeItem(key)
    else localStorage.setItem(key, value)
  } catch {
    // As above.
  }
  for (const listener of listeners) listener()
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener)
  window.addEventListener('storage', listener)
  return () => {
    listeners.delete(listener)
    window.removeEventListener('storage', listener)
  }
}

/** A choice kept in this browser, the same in every tab. */
export const useStored = (key: string): string | null => useSyncExternalStore(subscribe, () => read(key))

export const readStored = read
