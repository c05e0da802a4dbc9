export interface RunningPostgres {
  readonly id: number
  readonly port: number
  readonly url: string
  readonly folder: string
  stop(): Promise<void>
}
export function startPostgres(options?: {
  readonly folder?: string
  readonly isLasting?: boolean
  readonly port?: number
}): Promise<RunningPostgres>
export function stopPostgres(folder?: string): Promise<void>
export function removePostgres(folder?: string): void
export function runningPostgres(folder?: string): Omit<RunningPostgres, 'folder' | 'stop'> | null
export function postgresPrograms(): string
