import { Entity, Index } from 'typeorm'
import { Flag, Id, Moment, Ref, Text, Whole } from '../../db/columns.ts'

/** A photograph of a build; its bytes lie in the object store. */
@Entity({ name: 'build_photo' })
export class BuildPhoto {
  @Id() id!: string
  @Ref('team') teamId!: string
  @Index('build_photo_build')
  @Ref('build')
  buildId!: string
  @Text() key!: string
  @Text() alt!: string
  @Flag() mayBePublished!: boolean
  @Whole() width!: number
  @Whole() height!: number
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
