import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'
import { Flag, Text } from '../../db/columns.ts'

/** Which versions the sets of a push are; several pushes share a version where nothing changed. */
@Entity({ name: 'push_version' })
@Index('push_version_version', ['versionId'])
export class PushVersion {
  @ForeignKey('push', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  pushId!: string
  @ForeignKey('version', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  versionId!: string
  @Flag() isNew!: boolean
  @Text({ default: 'push' }) origin!: 'push' | 'ripple'
}
