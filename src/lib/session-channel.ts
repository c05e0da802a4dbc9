const channel = typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel('foldgauge-session')

/** Tells the other tabs of this browser that somebody signed in or out. */
export const announceSession = (): void => channel?.postMessage('changed')

export function watchSession(watcher: () => void): () => void {
  channel?.addEventListener('message', watcher)
  return () => channel?.removeEventListener('message', watcher)
}
