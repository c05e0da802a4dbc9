import { Entity, Index } from 'typeorm'
import { Id, Moment, Reals, Ref, Text } from '../../db/columns.ts'

/** Measured thickness of a paper, millimetres per sheet. */
@Entity({ name: 'paper_reading' })
@Index('paper_reading_list', ['teamId', 'createdAt', 'id'])
export class PaperReading {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Text() stock!: string
  @Text() method!: 'single-sheet' | 'stack-of-ten'
  @Reals() readings!: number[]
  @Text() note!: string
  @Text() measuredBy!: string
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
