#!/usr/bin/env node
import { run } from './run.ts'
import type { Io } from './io.ts'

const localDay = (date: Date): string => {
  const part = (value: number, width: number): string => String(value).padStart(width, '0')
  return `${part(date.getFullYear(), 4)}-${part(date.getMonth() + 1, 2)}-${part(date.getDate(), 2)}`
}

async function readAll(): Promise<string> {
  const chunks: Buffer[] = []
  for await (const chunk of process.stdin) chunks.push(chunk as Buffer)
  return Buffer.concat(chunks).toString('utf8')
}

// A reader that has seen enough, such as `head`, closes the pipe: that is no error.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EPIPE') process.exitCode = process.exitCode ?? 0
  else throw error
})

const io: Io = {
  cwd: process.cwd(),
  env: process.env,
  today: () => localDay(new Date()),
  out: (text) => process.stdout.write(text),
  err: (text) => process.stderr.write(text),
  terminal: { isTerminal: process.stdout.isTTY === true, columns: process.stdout.columns ?? null },
  showsProgress: process.stderr.isTTY === true && process.env['TERM'] !== 'dumb',
  readStandardInput: readAll,
}

process.exitCode = await run(process.argv.slice(2), io)
