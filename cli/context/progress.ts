import type { Io } from '../io.ts'

/** Fewer sets than this are done before anyone could read a line about them. */
const worthShowing = 20

export interface Progress {
  step(index: number, name: string): void
  done(): void
}

/** A line on standard error that counts sets, on a terminal and only where there are many. */
export function progressOf(io: Io, total: number): Progress {
  if (total < worthShowing || !io.showsProgress) return { step: () => undefined, done: () => undefined }
  return {
    step(index, name) {
      if (index % 10 === 0) io.err(`\r\u001b[2K${String(index)} of ${String(total)}  ${name.slice(0, 60)}`)
    },
    done() {
      io.err('\r\u001b[2K')
    },
  }
}
