import type { MigrationInterface } from 'typeorm'
import { FirstTables1796134561509 } from './1796134561509-first-tables.ts'
import { FirstHandWritten1796134561510 } from './1796134561510-first-hand-written.ts'

type MigrationClass = new () => MigrationInterface

/** Migrations in the order of their times. */
export const migrations: readonly MigrationClass[] = [FirstTables1796134561509, FirstHandWritten1796134561510]
