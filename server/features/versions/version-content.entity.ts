import { Entity, ForeignKey, Index, PrimaryColumn } from 'typeorm'
import type { Report } from '../../../shared/report/report.ts'
import { Json, Real, Ref, Text } from '../../db/columns.ts'

/** Texts and report of a version. */
@Entity({ name: 'version_content' })
@Index('version_content_workspace', ['teamId', 'workspaceDigest'])
@Index('version_content_text', ['teamId', 'textDigest'])
export class VersionContent {
  @ForeignKey('version', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  versionId!: string
  @Ref('team') teamId!: string
  @Text() textDigest!: string
  @Text({ nullable: true }) workspaceFile!: string | null
  @Text({ nullable: true }) workspaceDigest!: string | null
  @Text({ nullable: true }) workmanship!: string | null
  @Text({ nullable: true }) paper!: string | null
  @Real({ default: 1 }) scale!: number
  @Json() report!: Report
}
