import { Entity, Index } from 'typeorm'
import { Flag, Id, Moment, Ref, Text, Texts } from '../../db/columns.ts'

/** What is wrong in something that makers have printed. */
@Entity({ name: 'erratum' })
@Index('erratum_set', ['setId', 'createdAt'])
export class Erratum {
  @Id() id!: string
  @Ref('template_set') setId!: string
  @Texts() labels!: string[]
  @Texts() pieces!: string[]
  @Texts() pages!: string[]
  @Text() symptom!: string
  @Text() wrong!: string
  @Text() right!: string
  @Text() severity!: 'cosmetic' | 'wastes-paper' | 'will-not-assemble'
  @Text() workaround!: string
  @Text({ nullable: true }) replacement!: string | null
  @Flag({ nullable: true }) oldPiecesMate!: boolean | null
  @Texts() mating!: string[]
  @Text() thanks!: string
  @Text() writtenBy!: string
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
