#!/usr/bin/env node
import { readSync } from 'node:fs'
import { exitCode, worstExit, type ExitCode } from './exit-code.ts'
import { reasonOf } from './inputs/io-reasons.ts'
import type { Io } from './io.ts'
import { run, tellDefect } from './run.ts'

const localDay = (date: Date): string => {
  const part = (value: number, width: number): string => String(value).padStart(width, '0')
  return `${part(date.getFullYear(), 4)}-${part(date.getMonth() + 1, 2)}-${part(date.getDate(), 2)}`
}

/** Reads standard input at once, without the time a stream takes to set up. @returns false where there is more to wait for */
function readWaiting(chunks: Buffer[]): boolean {
  try {
    for (;;) {
      const chunk = Buffer.alloc(65_536)
      const length = readSync(0, chunk)
      if (length === 0) return true
      chunks.push(chunk.subarray(0, length))
    }
  } catch {
    return false
  }
}

async function readAll(): Promise<string> {
  const chunks: Buffer[] = []
  if (!readWaiting(chunks)) for await (const chunk of process.stdin) chunks.push(chunk as Buffer)
  return Buffer.concat(chunks).toString('utf8')
}

const codes: ExitCode[] = []
const endWith = (code: ExitCode): void => {
  codes.push(code)
  process.exitCode = worstExit(codes)
}

/** Set up when there is something to tell, which takes time. What cannot be told there can be told nowhere. */
function standardError(): NodeJS.WriteStream {
  if (process.stderr.listenerCount('error') === 0) process.stderr.on('error', () => undefined)
  return process.stderr
}

// A reader that has seen enough, such as `head`, closes the pipe: that is no error.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EPIPE') return
  io.err(`foldgauge: standard output was not written: ${reasonOf(error)}\n`)
  endWith(exitCode.unusable)
})
process.on('uncaughtException', (error) => {
  endWith(tellDefect(io, error))
})

const io: Io = {
  cwd: process.cwd(),
  env: process.env,
  today: () => localDay(new Date()),
  out: (text) => process.stdout.write(text),
  err: (text) => standardError().write(text),
  terminal: { isTerminal: process.stdout.isTTY === true, columns: process.stdout.columns || null },
  get showsProgress() {
    return process.stderr.isTTY === true && process.env['TERM'] !== 'dumb'
  },
  readStandardInput: readAll,
}

void run(process.argv.slice(2), io).then(endWith)
