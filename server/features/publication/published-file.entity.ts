import { Entity, ForeignKey, PrimaryColumn } from 'typeorm'
import { Text, Whole } from '../../db/columns.ts'

/** A kept export of a publication; its bytes lie in the object store. */
@Entity({ name: 'published_file' })
export class PublishedFile {
  @ForeignKey('publication', { onDelete: 'CASCADE' })
  @PrimaryColumn({ type: 'uuid' })
  publicationId!: string
  @PrimaryColumn({ type: 'text' }) name!: string
  @Text() type!: string
  @Whole() bytes!: number
  @Text() key!: string
}
