import { Column, Entity, Index, PrimaryColumn } from 'typeorm'

/** Where express-session's store keeps sessions; its shape is the store's. */
@Entity({ name: 'session' })
@Index('session_expire', ['expire'])
@Index('session_person', { synchronize: false })
export class Session {
  @PrimaryColumn({ type: 'character varying' }) sid!: string
  @Column({ type: 'json' }) sess!: {
    readonly passport?: { readonly user?: string }
    readonly startedAt?: string
    readonly lastSeenAt?: string
    readonly device?: string
    readonly address?: string
  }
  @Column({ type: 'timestamp without time zone', precision: 6 }) expire!: Date
}
