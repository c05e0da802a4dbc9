import type { MigrationInterface, QueryRunner } from 'typeorm'

/** Indexes over expressions and parts of tables, which entities cannot say. */
export class FirstHandWritten1796134561510 implements MigrationInterface {
  readonly name = 'FirstHandWritten1796134561510'

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`create index session_person on session ((sess -> 'passport' ->> 'user'))`)
    await runner.query(`create index notice_digest on notice (person_id, team_id) where is_waiting`)
    await runner.query(`create index template_set_list on template_set (team_id, state_rank, updated_at desc, id)`)
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`drop index template_set_list`)
    await runner.query(`drop index notice_digest`)
    await runner.query(`drop index session_person`)
  }
}
