import { Column, Entity, PrimaryColumn } from 'typeorm'

/** Counters of attempts, shared by every server process; its shape is the limiter's. */
@Entity({ name: 'throttle' })
export class Throttle {
  @PrimaryColumn({ type: 'character varying', length: 255 }) key!: string
  @Column({ type: 'integer', default: 0 }) points!: number
  @Column({ type: 'bigint', nullable: true }) expire!: string | null
}
