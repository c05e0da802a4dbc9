import type { DataSource } from 'typeorm'

/**
 * Fills a database with copies of what it has: many versions of its one set (three in four on `main`), many sets with
 * one version each, many notices and audit entries. Fast, because the database does it.
 */
export async function multiply(
  database: DataSource,
  wanted: { readonly versions: number; readonly sets: number; readonly notices: number; readonly entries: number },
): Promise<void> {
  // In FROM the function is called once a row; in SELECT it would be once a column.
  const copy = (table: string, changes: string, from: string): string =>
    `insert into ${table} select made.* from ${from},
       lateral jsonb_populate_record(null::${table}, pattern.row || jsonb_build_object(${changes})) made`
  // Every row points at what the pattern points at: nothing to check a hundred thousand times.
  const runner = database.createQueryRunner()
  await runner.connect()
  await runner.query('set session_replication_role = replica')
  await runner.query(
    copy(
      'version',
      `'id', gen_random_uuid(), 'number', n, 'branch', case when n % 4 = 0 then 'side' else 'main' end,
       'review_state', case when n % 5000 = 0 then 'asked' else 'none' end, 'baseline_id', null,
       'created_at', now() - make_interval(mins => $1 - n)`,
      '(select to_jsonb(v) as row from version v order by number desc limit 1) pattern, generate_series(3, $1::int) n',
    ),
    [wanted.versions],
  )
  await runner.query(
    copy(
      'template_set',
      `'id', gen_random_uuid(), 'name', 'set-' || n, 'title', 'Set ' || n, 'public_key', null,
       'shown_version_id', gen_random_uuid(), 'updated_at', now() - make_interval(mins => n), 'state_rank', n % 6`,
      '(select to_jsonb(s) as row from template_set s limit 1) pattern, generate_series(1, $1::int) n',
    ),
    [wanted.sets],
  )
  await runner.query(
    copy(
      'version',
      `'id', s.shown_version_id, 'set_id', s.id, 'number', 1, 'baseline_id', null`,
      `(select to_jsonb(v) as row from version v order by number limit 1) pattern,
         (select * from template_set where name like 'set-%') s`,
    ),
  )
  await runner.query(
    copy(
      'branch_state',
      `'set_id', s.id, 'version_id', s.shown_version_id`,
      `(select to_jsonb(b) as row from branch_state b limit 1) pattern,
         (select * from template_set where name like 'set-%') s`,
    ),
  )
  await runner.query(
    `insert into version_content (version_id, team_id, text_digest, workspace_file, workspace_digest, scale, report)
     select v.id, v.team_id, c.text_digest, c.workspace_file, c.workspace_digest, 1, '{"fits": []}'
     from (select * from version order by number desc limit 30000) v, (select * from version_content limit 1) c
     where not exists (select 1 from version_content other where other.version_id = v.id)`,
  )
  await runner.query('reset session_replication_role')
  await runner.release()
  await database.query(
    `insert into notice (id, team_id, person_id, event, subject, sentence, created_at)
     select gen_random_uuid(), m.team_id, m.person_id, 'published', 'x', 'x', now() - make_interval(mins => n)
     from (select * from membership where role = 'owner' limit 1) m, generate_series(1, $1::int) n`,
    [wanted.notices],
  )
  await database.query(
    `insert into audit_entry (team_id, actor_kind, actor_name, verb, object_kind, object_name, sentence)
     select t.id, 'person', 'x', 'x', 'x', 'x', 'x' from team t, generate_series(1, $1::int) n`,
    [wanted.entries],
  )
  await database.query('analyze')
}
