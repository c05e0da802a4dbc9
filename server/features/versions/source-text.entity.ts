import { Entity, ForeignKey, PrimaryColumn } from 'typeorm'
import { Text } from '../../db/columns.ts'

/** A text kept once however many versions share it. */
@Entity({ name: 'source_text' })
export class SourceText {
  @ForeignKey('team', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  teamId!: string
  @PrimaryColumn({ type: 'text' }) digest!: string
  @Text() text!: string
}
