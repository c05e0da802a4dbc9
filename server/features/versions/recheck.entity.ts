import { Entity, Index } from 'typeorm'
import type { Report } from '../../../shared/report/report.ts'
import { Id, Json, Moment, Real, Ref, Text } from '../../db/columns.ts'

/** A version judged again by a later engine; what was recorded first stays. */
@Entity({ name: 'recheck' })
@Index('recheck_engine', ['versionId', 'engine', 'rules'], { unique: true })
export class Recheck {
  @Id() id!: string
  @Ref('version') versionId!: string
  @Text() engine!: string
  @Text() rules!: string
  @Text() verdict!: Report['summary']['verdict']
  @Real() works!: number
  @Json() report!: Report
  @Moment({ default: () => 'now()' }) checkedAt!: Date
}
