import { Entity, ForeignKey, PrimaryColumn } from 'typeorm'
import type { NoticeEvent, NoticeMode } from '../../../shared/api/notice-endpoints.ts'
import { Text } from '../../db/columns.ts'

/** How a person wants to be told of one kind of event; absent is the usual. */
@Entity({ name: 'notice_choice' })
export class NoticeChoice {
  @ForeignKey('team', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  teamId!: string
  @ForeignKey('person', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  personId!: string
  @PrimaryColumn({ type: 'text' }) event!: NoticeEvent
  @Text() mode!: NoticeMode
}
