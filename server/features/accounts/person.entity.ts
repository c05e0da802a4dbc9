import { Entity, Index } from 'typeorm'
import { Id, Moment, Text, Whole } from '../../db/columns.ts'

/** Somebody with an account. The address is kept in small letters. */
@Entity({ name: 'person' })
export class Person {
  @Id() id!: string
  @Index('person_email', { unique: true })
  @Text()
  email!: string
  @Text() name!: string
  /** argon2id in its usual text form. */
  @Text() passwordHash!: string
  @Whole({ default: 7 }) digestHour!: number
  @Moment({ default: () => 'now()' }) createdAt!: Date
}
