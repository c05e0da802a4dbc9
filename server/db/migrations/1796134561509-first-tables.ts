import type { MigrationInterface, QueryRunner } from 'typeorm'

export class FirstTables1796134561509 implements MigrationInterface {
  readonly name = 'FirstTables1796134561509'

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(
      `CREATE TABLE "account_link" ("id" uuid NOT NULL, "person_id" uuid NOT NULL, "purpose" text NOT NULL, "secret_hash" bytea, "email" text, "change_id" uuid, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "expires_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL, "used_at" TIMESTAMP(3) WITH TIME ZONE, CONSTRAINT "PK_1af91112f0eef7205c6b0abcbfa" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "account_link_person" ON "account_link"  ("person_id") `)
    await runner.query(`CREATE UNIQUE INDEX "account_link_secret" ON "account_link"  ("secret_hash") `)
    await runner.query(
      `CREATE TABLE "person" ("id" uuid NOT NULL, "email" text NOT NULL, "name" text NOT NULL, "password_hash" text NOT NULL, "digest_hour" integer NOT NULL DEFAULT '7', "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_5fdaf670315c4b7e70cce85daa3" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE UNIQUE INDEX "person_email" ON "person"  ("email") `)
    await runner.query(
      `CREATE TABLE "session" ("sid" character varying NOT NULL, "sess" json NOT NULL, "expire" TIMESTAMP(6) NOT NULL, CONSTRAINT "PK_7575923e18b495ed2307ae629ae" PRIMARY KEY ("sid"))`,
    )
    await runner.query(`CREATE INDEX "session_expire" ON "session"  ("expire") `)
    await runner.query(
      `CREATE TABLE "build_invitation" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "version_id" uuid NOT NULL, "tester" integer NOT NULL, "email" text NOT NULL, "name" text NOT NULL, "note" text NOT NULL, "secret_hash" bytea, "due_on" date, "inviter_id" uuid, "invited_by" text NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "expires_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL, "opened_at" TIMESTAMP(3) WITH TIME ZONE, "revoked_at" TIMESTAMP(3) WITH TIME ZONE, CONSTRAINT "PK_6bd90c3881af7e0f6e45a56a9b8" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "build_invitation_email" ON "build_invitation"  ("email") `)
    await runner.query(`CREATE UNIQUE INDEX "build_invitation_secret" ON "build_invitation"  ("secret_hash") `)
    await runner.query(`CREATE UNIQUE INDEX "build_invitation_stamp" ON "build_invitation"  ("version_id", "tester") `)
    await runner.query(
      `CREATE TABLE "build_photo" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "build_id" uuid NOT NULL, "key" text NOT NULL, "alt" text NOT NULL, "may_be_published" boolean NOT NULL, "width" integer NOT NULL, "height" integer NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_fa8ca59b18f927245534bbea628" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "build_photo_build" ON "build_photo"  ("build_id") `)
    await runner.query(
      `CREATE TABLE "build" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "version_id" uuid NOT NULL, "invitation_id" uuid, "stamp" text NOT NULL, "tester" text NOT NULL, "source" text NOT NULL, "report" jsonb NOT NULL, "started_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "submitted_at" TIMESTAMP(3) WITH TIME ZONE, CONSTRAINT "PK_5625549365ffbf46dd1c7ff342d" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE UNIQUE INDEX "build_invitation_build" ON "build"  ("invitation_id") `)
    await runner.query(`CREATE INDEX "build_version" ON "build"  ("version_id", "started_at", "id") `)
    await runner.query(
      `CREATE TABLE "delivery" ("id" uuid NOT NULL, "webhook_id" uuid NOT NULL, "event" text NOT NULL, "payload" jsonb NOT NULL, "attempts" integer NOT NULL DEFAULT '0', "status" integer, "state" text NOT NULL DEFAULT 'waiting', "error" text, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "delivered_at" TIMESTAMP(3) WITH TIME ZONE, CONSTRAINT "PK_ffad7bf84e68716cd9af89003b0" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "delivery_list" ON "delivery"  ("webhook_id", "created_at", "id") `)
    await runner.query(
      `CREATE TABLE "notice_choice" ("team_id" uuid NOT NULL, "person_id" uuid NOT NULL, "event" text NOT NULL, "mode" text NOT NULL, CONSTRAINT "PK_65a6e9e53e13b9af71123c7502b" PRIMARY KEY ("team_id", "person_id", "event"))`,
    )
    await runner.query(
      `CREATE TABLE "notice" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "person_id" uuid NOT NULL, "event" text NOT NULL, "subject" text NOT NULL, "sentence" text NOT NULL, "page" text, "is_waiting" boolean NOT NULL DEFAULT false, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_705062b14410ff1a04998f86d72" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "notice_list" ON "notice"  ("person_id", "team_id", "created_at", "id") `)
    await runner.query(
      `CREATE TABLE "webhook" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "url" text NOT NULL, "events" text array NOT NULL, "is_on" boolean NOT NULL DEFAULT true, "failures" integer NOT NULL DEFAULT '0', "stopped_why" text, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_e6765510c2d078db49632b59020" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "webhook_team" ON "webhook"  ("team_id") `)
    await runner.query(
      `CREATE TABLE "number_tick" ("version_id" uuid NOT NULL, "key" text NOT NULL, "value" double precision NOT NULL, "state" text NOT NULL, "note" text NOT NULL, "ticked_by" text NOT NULL, "ticked_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "carried_from" integer, CONSTRAINT "PK_6c6be6ca145c4b66ccc1742fb07" PRIMARY KEY ("version_id", "key"))`,
    )
    await runner.query(
      `CREATE TABLE "erratum" ("id" uuid NOT NULL, "set_id" uuid NOT NULL, "labels" text array NOT NULL, "pieces" text array NOT NULL, "pages" text array NOT NULL, "symptom" text NOT NULL, "wrong" text NOT NULL, "right" text NOT NULL, "severity" text NOT NULL, "workaround" text NOT NULL, "replacement" text, "old_pieces_mate" boolean, "mating" text array NOT NULL, "thanks" text NOT NULL, "written_by" text NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_5c59946697a6bb032f0183c4d5d" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "erratum_set" ON "erratum"  ("set_id", "created_at") `)
    await runner.query(
      `CREATE TABLE "publication" ("id" uuid NOT NULL, "set_id" uuid NOT NULL, "version_id" uuid NOT NULL, "number" integer NOT NULL, "label" text NOT NULL, "notes" text NOT NULL, "licence" text NOT NULL, "override_reason" text, "published_by" text NOT NULL, "published_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "exports" text NOT NULL DEFAULT 'pending', "recalled_at" TIMESTAMP(3) WITH TIME ZONE, "recall_reason" text, "recalled_by" text, CONSTRAINT "PK_8aea8363d5213896a78d8365fab" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "publication_list" ON "publication"  ("set_id", "published_at") `)
    await runner.query(`CREATE UNIQUE INDEX "publication_version" ON "publication"  ("version_id") `)
    await runner.query(`CREATE UNIQUE INDEX "publication_label" ON "publication"  ("set_id", "label") `)
    await runner.query(
      `CREATE TABLE "published_file" ("publication_id" uuid NOT NULL, "name" text NOT NULL, "type" text NOT NULL, "bytes" integer NOT NULL, "key" text NOT NULL, CONSTRAINT "PK_7bf4b88d23ad6183b7522d2cc93" PRIMARY KEY ("publication_id", "name"))`,
    )
    await runner.query(
      `CREATE TABLE "push_version" ("push_id" uuid NOT NULL, "version_id" uuid NOT NULL, "is_new" boolean NOT NULL, "origin" text NOT NULL DEFAULT 'push', CONSTRAINT "PK_0a490f31f741b79f7e91acd033f" PRIMARY KEY ("push_id", "version_id"))`,
    )
    await runner.query(`CREATE INDEX "push_version_version" ON "push_version"  ("version_id") `)
    await runner.query(
      `CREATE TABLE "push" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "content_key" text NOT NULL, "branch" text NOT NULL, "commit" text, "ancestors" text array NOT NULL DEFAULT '{}', "merge_base" text, "link" text, "engine" text NOT NULL, "workspace_file" text, "workspace_digest" text, "actor_kind" text NOT NULL, "actor_name" text NOT NULL, "person_id" uuid, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_ddc3812b04a238cbf8606c12ea6" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "push_list" ON "push"  ("team_id", "created_at", "id") `)
    await runner.query(`CREATE INDEX "push_commit" ON "push"  ("team_id", "commit") `)
    await runner.query(`CREATE UNIQUE INDEX "push_content" ON "push"  ("team_id", "content_key") `)
    await runner.query(
      `CREATE TABLE "comment" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "version_id" uuid NOT NULL, "number" integer NOT NULL, "anchor_kind" text NOT NULL, "anchor_name" text, "body" text NOT NULL, "person_id" uuid, "written_by" text NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "resolved_at" TIMESTAMP(3) WITH TIME ZONE, "resolved_by" text, CONSTRAINT "PK_0b0e4bbc8415ec426f87f3a88e2" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "comment_version" ON "comment"  ("version_id", "created_at") `)
    await runner.query(
      `CREATE TABLE "decision" ("id" uuid NOT NULL, "set_id" uuid NOT NULL, "version_id" uuid NOT NULL, "number" integer NOT NULL, "content" text NOT NULL, "decision" text NOT NULL, "note" text NOT NULL, "is_own" boolean NOT NULL, "override_reason" text, "person_id" uuid, "decided_by" text NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_fa4cbd6abf1215054f13c27df5a" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "decision_version" ON "decision"  ("version_id") `)
    await runner.query(`CREATE INDEX "decision_content" ON "decision"  ("set_id", "content", "created_at") `)
    await runner.query(
      `CREATE TABLE "known_failure" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "set_id" uuid NOT NULL, "fingerprint" text NOT NULL, "reason" text NOT NULL, "until" date NOT NULL, "accepted_by" text NOT NULL, "accepted_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "ended_at" TIMESTAMP(3) WITH TIME ZONE, "warned_at" TIMESTAMP(3) WITH TIME ZONE, CONSTRAINT "PK_3bca2efc8d00cca9cde95d5b04c" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "known_failure_until" ON "known_failure"  ("until") `)
    await runner.query(`CREATE INDEX "known_failure_set" ON "known_failure"  ("set_id", "accepted_at") `)
    await runner.query(
      `CREATE TABLE "review_request" ("id" uuid NOT NULL, "version_id" uuid NOT NULL, "note" text NOT NULL, "person_id" uuid, "asked_by" text NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_d733798466b3d8663a13a96781c" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "review_request_version" ON "review_request"  ("version_id", "created_at") `)
    await runner.query(
      `CREATE TABLE "library_piece" ("set_id" uuid NOT NULL, "piece" text NOT NULL, "team_id" uuid NOT NULL, "number" integer NOT NULL, "kind" text NOT NULL, "longer" double precision NOT NULL, "shorter" double precision NOT NULL, "inside" jsonb NOT NULL, CONSTRAINT "PK_f079289203a0ac137b3c5ca0d87" PRIMARY KEY ("set_id", "piece"))`,
    )
    await runner.query(`CREATE INDEX "library_piece_inside" ON "library_piece"  ("team_id", "longer", "shorter") `)
    await runner.query(
      `CREATE TABLE "template_set" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "name" text NOT NULL, "title" text NOT NULL, "family" text, "tags" text array NOT NULL DEFAULT '{}', "state" text NOT NULL DEFAULT 'passing', "state_rank" integer NOT NULL DEFAULT '9', "last_number" integer NOT NULL DEFAULT '0', "shown_version_id" uuid, "pinned_version_id" uuid, "pin_note" text, "pinned_by" text, "is_public" boolean NOT NULL DEFAULT false, "public_key" text, "photo_key" text, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "updated_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_2a5b1472bd84185e17ccf05e0e9" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE UNIQUE INDEX "template_set_public" ON "template_set"  ("public_key") `)
    await runner.query(`CREATE UNIQUE INDEX "template_set_name" ON "template_set"  ("team_id", "name") `)
    await runner.query(
      `CREATE TABLE "invitation" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "email" text NOT NULL, "role" text NOT NULL, "secret_hash" bytea, "invited_by" text NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "expires_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL, "accepted_at" TIMESTAMP(3) WITH TIME ZONE, "revoked_at" TIMESTAMP(3) WITH TIME ZONE, CONSTRAINT "PK_beb994737756c0f18a1c1f8669c" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE UNIQUE INDEX "invitation_secret" ON "invitation"  ("secret_hash") `)
    await runner.query(`CREATE INDEX "invitation_team" ON "invitation"  ("team_id", "created_at") `)
    await runner.query(
      `CREATE TABLE "membership" ("team_id" uuid NOT NULL, "person_id" uuid NOT NULL, "role" text NOT NULL, "joined_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_a4ad9142bbf1511e20083cb9c68" PRIMARY KEY ("team_id", "person_id"))`,
    )
    await runner.query(`CREATE INDEX "membership_person" ON "membership"  ("person_id") `)
    await runner.query(
      `CREATE TABLE "team" ("id" uuid NOT NULL, "slug" text NOT NULL, "name" text NOT NULL, "main_branch" text NOT NULL DEFAULT 'main', "licence" text NOT NULL DEFAULT '', "choices" jsonb NOT NULL DEFAULT '{}', "main_days" integer, "branch_days" integer, "branch_versions" integer, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_f57d8293406df4af348402e4b74" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE UNIQUE INDEX "team_slug" ON "team"  ("slug") `)
    await runner.query(
      `CREATE TABLE "api_token" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "name" text NOT NULL, "prefix" text NOT NULL, "secret_hash" bytea NOT NULL, "last_four" text NOT NULL, "scopes" text array NOT NULL, "created_by" uuid, "creator_name" text NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "expires_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL, "last_used_at" TIMESTAMP(3) WITH TIME ZONE, "revoked_at" TIMESTAMP(3) WITH TIME ZONE, "warned_at" TIMESTAMP(3) WITH TIME ZONE, CONSTRAINT "PK_d862311c568d175c26f41bc6f98" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE UNIQUE INDEX "api_token_prefix" ON "api_token"  ("prefix") `)
    await runner.query(`CREATE INDEX "api_token_team" ON "api_token"  ("team_id", "created_at") `)
    await runner.query(
      `CREATE TABLE "audit_entry" ("id" bigint GENERATED ALWAYS AS IDENTITY NOT NULL, "team_id" uuid NOT NULL, "at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), "actor_kind" text NOT NULL, "actor_name" text NOT NULL, "verb" text NOT NULL, "object_kind" text NOT NULL, "object_name" text NOT NULL, "sentence" text NOT NULL, CONSTRAINT "PK_58a130a4b9da189f46ba2a01801" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "audit_entry_list" ON "audit_entry"  ("team_id", "id") `)
    await runner.query(
      `CREATE TABLE "paper_reading" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "stock" text NOT NULL, "method" text NOT NULL, "readings" double precision array NOT NULL, "note" text NOT NULL, "measured_by" text NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_92f6af536801bddef6a9b01ed45" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "paper_reading_list" ON "paper_reading"  ("team_id", "created_at", "id") `)
    await runner.query(
      `CREATE TABLE "throttle" ("key" character varying(255) NOT NULL, "points" integer NOT NULL DEFAULT '0', "expire" bigint, CONSTRAINT "PK_37c6a0c495b370c855a99f75b1c" PRIMARY KEY ("key"))`,
    )
    await runner.query(
      `CREATE TABLE "branch_state" ("set_id" uuid NOT NULL, "branch" text NOT NULL, "team_id" uuid NOT NULL, "version_id" uuid NOT NULL, "told_failing" text array NOT NULL DEFAULT '{}', "workspace_file" text, "workspace_digest" text, "updated_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_aa3028a4905998f462555589baf" PRIMARY KEY ("set_id", "branch"))`,
    )
    await runner.query(`CREATE INDEX "branch_state_team" ON "branch_state"  ("team_id", "branch") `)
    await runner.query(
      `CREATE TABLE "recheck" ("id" uuid NOT NULL, "version_id" uuid NOT NULL, "engine" text NOT NULL, "rules" text NOT NULL, "verdict" text NOT NULL, "works" double precision NOT NULL, "report" jsonb NOT NULL, "checked_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_84d1120183210bdd2bdb70ef261" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE UNIQUE INDEX "recheck_engine" ON "recheck"  ("version_id", "engine", "rules") `)
    await runner.query(
      `CREATE TABLE "source_text" ("team_id" uuid NOT NULL, "digest" text NOT NULL, "text" text NOT NULL, CONSTRAINT "PK_e385360198d76e170c707beb9fd" PRIMARY KEY ("team_id", "digest"))`,
    )
    await runner.query(
      `CREATE TABLE "version_comparison" ("before_id" uuid NOT NULL, "after_id" uuid NOT NULL, "engine" text NOT NULL, "is_rechecked" boolean NOT NULL, "sentence" text NOT NULL, "comparison" jsonb NOT NULL, "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_46a8744b5cec5b666df516e1b21" PRIMARY KEY ("before_id", "after_id", "engine"))`,
    )
    await runner.query(`CREATE INDEX "version_comparison_after" ON "version_comparison"  ("after_id") `)
    await runner.query(
      `CREATE TABLE "version_content" ("version_id" uuid NOT NULL, "team_id" uuid NOT NULL, "text_digest" text NOT NULL, "workspace_file" text, "workspace_digest" text, "workmanship" text, "paper" text, "scale" double precision NOT NULL DEFAULT '1', "report" jsonb NOT NULL, CONSTRAINT "PK_a1c140e5bc29e7042fac4a34089" PRIMARY KEY ("version_id"))`,
    )
    await runner.query(`CREATE INDEX "version_content_text" ON "version_content"  ("team_id", "text_digest") `)
    await runner.query(
      `CREATE INDEX "version_content_workspace" ON "version_content"  ("team_id", "workspace_digest") `,
    )
    await runner.query(
      `CREATE TABLE "version" ("id" uuid NOT NULL, "team_id" uuid NOT NULL, "set_id" uuid NOT NULL, "number" integer NOT NULL, "branch" text NOT NULL, "commit" text, "link" text, "origin" text NOT NULL, "file" text NOT NULL, "title" text NOT NULL, "family" text, "units" text NOT NULL, "digest" text NOT NULL, "content" text NOT NULL, "identity" text NOT NULL, "engine" text NOT NULL, "rules" text NOT NULL, "as_of" date NOT NULL, "verdict" text NOT NULL, "works" double precision NOT NULL, "counts" jsonb NOT NULL, "worst_fit" jsonb, "failing" text array NOT NULL, "differs" text, "sender_engine" text NOT NULL, "sender_digest" text, "sender_verdict" text, "actor_kind" text NOT NULL, "actor_name" text NOT NULL, "person_id" uuid, "baseline_id" uuid, "baseline_number" integer, "baseline_reason" text NOT NULL, "baseline_sentence" text NOT NULL, "baseline_by" text, "change_state" text NOT NULL DEFAULT 'pending', "change_sentence" text NOT NULL DEFAULT '', "newly_failing" integer NOT NULL DEFAULT '0', "now_passing" integer NOT NULL DEFAULT '0', "review_state" text NOT NULL DEFAULT 'none', "created_at" TIMESTAMP(3) WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "PK_4fb5fbb15a43da9f35493107b1d" PRIMARY KEY ("id"))`,
    )
    await runner.query(`CREATE INDEX "version_baseline" ON "version"  ("baseline_id") `)
    await runner.query(`CREATE INDEX "version_team_age" ON "version"  ("team_id", "created_at") `)
    await runner.query(`CREATE INDEX "version_content_digest" ON "version"  ("set_id", "content") `)
    await runner.query(`CREATE INDEX "version_review" ON "version"  ("set_id", "review_state", "number") `)
    await runner.query(`CREATE INDEX "version_branch" ON "version"  ("set_id", "branch", "number") `)
    await runner.query(`CREATE UNIQUE INDEX "version_number" ON "version"  ("set_id", "number") `)
    await runner.query(
      `ALTER TABLE "account_link" ADD CONSTRAINT "FK_90e237cd2f6574c335805093cb0" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "build_invitation" ADD CONSTRAINT "FK_6cd84cdfe66609a733934f24722" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "build_invitation" ADD CONSTRAINT "FK_a2c9fd484a1f531b74ddb9d3646" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "build_photo" ADD CONSTRAINT "FK_bf975e70e553410f4337cd0ee88" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "build_photo" ADD CONSTRAINT "FK_0095fbaa911c37a2be4c463ab18" FOREIGN KEY ("build_id") REFERENCES "build"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "build" ADD CONSTRAINT "FK_db7c6861028b6e0b035e4f8a332" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "build" ADD CONSTRAINT "FK_e39fa8b6447bf4a6b093ca3f2c0" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "build" ADD CONSTRAINT "FK_6bd90c3881af7e0f6e45a56a9b8" FOREIGN KEY ("invitation_id") REFERENCES "build_invitation"("id") ON DELETE SET NULL ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "delivery" ADD CONSTRAINT "FK_498828e0ce39ad45b5f9dcbf56b" FOREIGN KEY ("webhook_id") REFERENCES "webhook"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "notice_choice" ADD CONSTRAINT "FK_a935a40529acf79b72e75591964" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "notice_choice" ADD CONSTRAINT "FK_2c1c25dd6ae1a1a277a07ea67be" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "notice" ADD CONSTRAINT "FK_c7f73fce3de21264d8a517b5454" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "notice" ADD CONSTRAINT "FK_6ca4d1340d19ba946cb58565012" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "webhook" ADD CONSTRAINT "FK_3be3e7ff34909384915b9fe8c70" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "number_tick" ADD CONSTRAINT "FK_b4b69e182858b9841ae1c20737e" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "erratum" ADD CONSTRAINT "FK_55bc0666fecc689a83b6e5d04ae" FOREIGN KEY ("set_id") REFERENCES "template_set"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "publication" ADD CONSTRAINT "FK_753fc09b6d2e7bc3d5038836168" FOREIGN KEY ("set_id") REFERENCES "template_set"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "publication" ADD CONSTRAINT "FK_dd843c27158a155b20aa99269ff" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "published_file" ADD CONSTRAINT "FK_87124e6c596014dcf496c4ddeb5" FOREIGN KEY ("publication_id") REFERENCES "publication"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "push_version" ADD CONSTRAINT "FK_c15e3f4f0da92066183d92dcf3c" FOREIGN KEY ("push_id") REFERENCES "push"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "push_version" ADD CONSTRAINT "FK_decbcf07d5e6d44dc88d79a1abb" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "push" ADD CONSTRAINT "FK_7464bf529efb814bf58605dbe3f" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "comment" ADD CONSTRAINT "FK_207193a27fbbe230ebc6c21dfa8" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "comment" ADD CONSTRAINT "FK_a2d7c4189b6b70677ac5790cc01" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "decision" ADD CONSTRAINT "FK_80fc73befe51219bcc7e93bacd2" FOREIGN KEY ("set_id") REFERENCES "template_set"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "decision" ADD CONSTRAINT "FK_a279dcac36002043e0cf3e271a3" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "known_failure" ADD CONSTRAINT "FK_a34820f190265b45a3aff6950d2" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "known_failure" ADD CONSTRAINT "FK_6bbaf51a5b28049033c2222748a" FOREIGN KEY ("set_id") REFERENCES "template_set"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "review_request" ADD CONSTRAINT "FK_1578b7580be2206e93b2a8ccc0c" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "library_piece" ADD CONSTRAINT "FK_9cf708436cb6acd1e7893381c46" FOREIGN KEY ("set_id") REFERENCES "template_set"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "library_piece" ADD CONSTRAINT "FK_8302bcea5e5eec58e799bb5d589" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "template_set" ADD CONSTRAINT "FK_8a8e820bbd4c863e07dcb4ed11b" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "invitation" ADD CONSTRAINT "FK_e252ae8906b8e70c59c65e4dcbe" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "membership" ADD CONSTRAINT "FK_b03fe5cd64dbd43afdc8ee69e61" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "membership" ADD CONSTRAINT "FK_6fc5e2153171bbeb54f4fda6595" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "api_token" ADD CONSTRAINT "FK_e5d8f4ce25e0e568f3c1a069f44" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "api_token" ADD CONSTRAINT "FK_d291af9bf080ecd5ce9f429c415" FOREIGN KEY ("created_by") REFERENCES "person"("id") ON DELETE SET NULL ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "paper_reading" ADD CONSTRAINT "FK_44a8d9666c8cbc7aad4129561c5" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "branch_state" ADD CONSTRAINT "FK_ecf367c9810df9f18e9c555e5fb" FOREIGN KEY ("set_id") REFERENCES "template_set"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "branch_state" ADD CONSTRAINT "FK_9a437adbdf5e78b9c756a7eb6f6" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "branch_state" ADD CONSTRAINT "FK_f8dda561e90fefb3d35051be111" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "recheck" ADD CONSTRAINT "FK_1a7d72364aa7c6d5a55e8cbde24" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "source_text" ADD CONSTRAINT "FK_97307b323a648fef3a18d0dcd43" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "version_comparison" ADD CONSTRAINT "FK_d4d86e959ad8a27fde95749906c" FOREIGN KEY ("before_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "version_comparison" ADD CONSTRAINT "FK_808c903cb493d345d636f107428" FOREIGN KEY ("after_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "version_content" ADD CONSTRAINT "FK_a1c140e5bc29e7042fac4a34089" FOREIGN KEY ("version_id") REFERENCES "version"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "version_content" ADD CONSTRAINT "FK_d1c8bd3a705c853f3267da7219d" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "version" ADD CONSTRAINT "FK_508bd3586227759cec0294a78ef" FOREIGN KEY ("team_id") REFERENCES "team"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "version" ADD CONSTRAINT "FK_b260bdaf3596e4b91daf45f6fce" FOREIGN KEY ("set_id") REFERENCES "template_set"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    )
    await runner.query(
      `ALTER TABLE "version" ADD CONSTRAINT "FK_42e5729ed8555914985f75c2ac6" FOREIGN KEY ("baseline_id") REFERENCES "version"("id") ON DELETE SET NULL ON UPDATE NO ACTION`,
    )
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`ALTER TABLE "version" DROP CONSTRAINT "FK_42e5729ed8555914985f75c2ac6"`)
    await runner.query(`ALTER TABLE "version" DROP CONSTRAINT "FK_b260bdaf3596e4b91daf45f6fce"`)
    await runner.query(`ALTER TABLE "version" DROP CONSTRAINT "FK_508bd3586227759cec0294a78ef"`)
    await runner.query(`ALTER TABLE "version_content" DROP CONSTRAINT "FK_d1c8bd3a705c853f3267da7219d"`)
    await runner.query(`ALTER TABLE "version_content" DROP CONSTRAINT "FK_a1c140e5bc29e7042fac4a34089"`)
    await runner.query(`ALTER TABLE "version_comparison" DROP CONSTRAINT "FK_808c903cb493d345d636f107428"`)
    await runner.query(`ALTER TABLE "version_comparison" DROP CONSTRAINT "FK_d4d86e959ad8a27fde95749906c"`)
    await runner.query(`ALTER TABLE "source_text" DROP CONSTRAINT "FK_97307b323a648fef3a18d0dcd43"`)
    await runner.query(`ALTER TABLE "recheck" DROP CONSTRAINT "FK_1a7d72364aa7c6d5a55e8cbde24"`)
    await runner.query(`ALTER TABLE "branch_state" DROP CONSTRAINT "FK_f8dda561e90fefb3d35051be111"`)
    await runner.query(`ALTER TABLE "branch_state" DROP CONSTRAINT "FK_9a437adbdf5e78b9c756a7eb6f6"`)
    await runner.query(`ALTER TABLE "branch_state" DROP CONSTRAINT "FK_ecf367c9810df9f18e9c555e5fb"`)
    await runner.query(`ALTER TABLE "paper_reading" DROP CONSTRAINT "FK_44a8d9666c8cbc7aad4129561c5"`)
    await runner.query(`ALTER TABLE "api_token" DROP CONSTRAINT "FK_d291af9bf080ecd5ce9f429c415"`)
    await runner.query(`ALTER TABLE "api_token" DROP CONSTRAINT "FK_e5d8f4ce25e0e568f3c1a069f44"`)
    await runner.query(`ALTER TABLE "membership" DROP CONSTRAINT "FK_6fc5e2153171bbeb54f4fda6595"`)
    await runner.query(`ALTER TABLE "membership" DROP CONSTRAINT "FK_b03fe5cd64dbd43afdc8ee69e61"`)
    await runner.query(`ALTER TABLE "invitation" DROP CONSTRAINT "FK_e252ae8906b8e70c59c65e4dcbe"`)
    await runner.query(`ALTER TABLE "template_set" DROP CONSTRAINT "FK_8a8e820bbd4c863e07dcb4ed11b"`)
    await runner.query(`ALTER TABLE "library_piece" DROP CONSTRAINT "FK_8302bcea5e5eec58e799bb5d589"`)
    await runner.query(`ALTER TABLE "library_piece" DROP CONSTRAINT "FK_9cf708436cb6acd1e7893381c46"`)
    await runner.query(`ALTER TABLE "review_request" DROP CONSTRAINT "FK_1578b7580be2206e93b2a8ccc0c"`)
    await runner.query(`ALTER TABLE "known_failure" DROP CONSTRAINT "FK_6bbaf51a5b28049033c2222748a"`)
    await runner.query(`ALTER TABLE "known_failure" DROP CONSTRAINT "FK_a34820f190265b45a3aff6950d2"`)
    await runner.query(`ALTER TABLE "decision" DROP CONSTRAINT "FK_a279dcac36002043e0cf3e271a3"`)
    await runner.query(`ALTER TABLE "decision" DROP CONSTRAINT "FK_80fc73befe51219bcc7e93bacd2"`)
    await runner.query(`ALTER TABLE "comment" DROP CONSTRAINT "FK_a2d7c4189b6b70677ac5790cc01"`)
    await runner.query(`ALTER TABLE "comment" DROP CONSTRAINT "FK_207193a27fbbe230ebc6c21dfa8"`)
    await runner.query(`ALTER TABLE "push" DROP CONSTRAINT "FK_7464bf529efb814bf58605dbe3f"`)
    await runner.query(`ALTER TABLE "push_version" DROP CONSTRAINT "FK_decbcf07d5e6d44dc88d79a1abb"`)
    await runner.query(`ALTER TABLE "push_version" DROP CONSTRAINT "FK_c15e3f4f0da92066183d92dcf3c"`)
    await runner.query(`ALTER TABLE "published_file" DROP CONSTRAINT "FK_87124e6c596014dcf496c4ddeb5"`)
    await runner.query(`ALTER TABLE "publication" DROP CONSTRAINT "FK_dd843c27158a155b20aa99269ff"`)
    await runner.query(`ALTER TABLE "publication" DROP CONSTRAINT "FK_753fc09b6d2e7bc3d5038836168"`)
    await runner.query(`ALTER TABLE "erratum" DROP CONSTRAINT "FK_55bc0666fecc689a83b6e5d04ae"`)
    await runner.query(`ALTER TABLE "number_tick" DROP CONSTRAINT "FK_b4b69e182858b9841ae1c20737e"`)
    await runner.query(`ALTER TABLE "webhook" DROP CONSTRAINT "FK_3be3e7ff34909384915b9fe8c70"`)
    await runner.query(`ALTER TABLE "notice" DROP CONSTRAINT "FK_6ca4d1340d19ba946cb58565012"`)
    await runner.query(`ALTER TABLE "notice" DROP CONSTRAINT "FK_c7f73fce3de21264d8a517b5454"`)
    await runner.query(`ALTER TABLE "notice_choice" DROP CONSTRAINT "FK_2c1c25dd6ae1a1a277a07ea67be"`)
    await runner.query(`ALTER TABLE "notice_choice" DROP CONSTRAINT "FK_a935a40529acf79b72e75591964"`)
    await runner.query(`ALTER TABLE "delivery" DROP CONSTRAINT "FK_498828e0ce39ad45b5f9dcbf56b"`)
    await runner.query(`ALTER TABLE "build" DROP CONSTRAINT "FK_6bd90c3881af7e0f6e45a56a9b8"`)
    await runner.query(`ALTER TABLE "build" DROP CONSTRAINT "FK_e39fa8b6447bf4a6b093ca3f2c0"`)
    await runner.query(`ALTER TABLE "build" DROP CONSTRAINT "FK_db7c6861028b6e0b035e4f8a332"`)
    await runner.query(`ALTER TABLE "build_photo" DROP CONSTRAINT "FK_0095fbaa911c37a2be4c463ab18"`)
    await runner.query(`ALTER TABLE "build_photo" DROP CONSTRAINT "FK_bf975e70e553410f4337cd0ee88"`)
    await runner.query(`ALTER TABLE "build_invitation" DROP CONSTRAINT "FK_a2c9fd484a1f531b74ddb9d3646"`)
    await runner.query(`ALTER TABLE "build_invitation" DROP CONSTRAINT "FK_6cd84cdfe66609a733934f24722"`)
    await runner.query(`ALTER TABLE "account_link" DROP CONSTRAINT "FK_90e237cd2f6574c335805093cb0"`)
    await runner.query(`DROP INDEX "public"."version_number"`)
    await runner.query(`DROP INDEX "public"."version_branch"`)
    await runner.query(`DROP INDEX "public"."version_review"`)
    await runner.query(`DROP INDEX "public"."version_content_digest"`)
    await runner.query(`DROP INDEX "public"."version_team_age"`)
    await runner.query(`DROP INDEX "public"."version_baseline"`)
    await runner.query(`DROP TABLE "version"`)
    await runner.query(`DROP INDEX "public"."version_content_workspace"`)
    await runner.query(`DROP INDEX "public"."version_content_text"`)
    await runner.query(`DROP TABLE "version_content"`)
    await runner.query(`DROP INDEX "public"."version_comparison_after"`)
    await runner.query(`DROP TABLE "version_comparison"`)
    await runner.query(`DROP TABLE "source_text"`)
    await runner.query(`DROP INDEX "public"."recheck_engine"`)
    await runner.query(`DROP TABLE "recheck"`)
    await runner.query(`DROP INDEX "public"."branch_state_team"`)
    await runner.query(`DROP TABLE "branch_state"`)
    await runner.query(`DROP TABLE "throttle"`)
    await runner.query(`DROP INDEX "public"."paper_reading_list"`)
    await runner.query(`DROP TABLE "paper_reading"`)
    await runner.query(`DROP INDEX "public"."audit_entry_list"`)
    await runner.query(`DROP TABLE "audit_entry"`)
    await runner.query(`DROP INDEX "public"."api_token_team"`)
    await runner.query(`DROP INDEX "public"."api_token_prefix"`)
    await runner.query(`DROP TABLE "api_token"`)
    await runner.query(`DROP INDEX "public"."team_slug"`)
    await runner.query(`DROP TABLE "team"`)
    await runner.query(`DROP INDEX "public"."membership_person"`)
    await runner.query(`DROP TABLE "membership"`)
    await runner.query(`DROP INDEX "public"."invitation_team"`)
    await runner.query(`DROP INDEX "public"."invitation_secret"`)
    await runner.query(`DROP TABLE "invitation"`)
    await runner.query(`DROP INDEX "public"."template_set_name"`)
    await runner.query(`DROP INDEX "public"."template_set_public"`)
    await runner.query(`DROP TABLE "template_set"`)
    await runner.query(`DROP INDEX "public"."library_piece_inside"`)
    await runner.query(`DROP TABLE "library_piece"`)
    await runner.query(`DROP INDEX "public"."review_request_version"`)
    await runner.query(`DROP TABLE "review_request"`)
    await runner.query(`DROP INDEX "public"."known_failure_set"`)
    await runner.query(`DROP INDEX "public"."known_failure_until"`)
    await runner.query(`DROP TABLE "known_failure"`)
    await runner.query(`DROP INDEX "public"."decision_content"`)
    await runner.query(`DROP INDEX "public"."decision_version"`)
    await runner.query(`DROP TABLE "decision"`)
    await runner.query(`DROP INDEX "public"."comment_version"`)
    await runner.query(`DROP TABLE "comment"`)
    await runner.query(`DROP INDEX "public"."push_content"`)
    await runner.query(`DROP INDEX "public"."push_commit"`)
    await runner.query(`DROP INDEX "public"."push_list"`)
    await runner.query(`DROP TABLE "push"`)
    await runner.query(`DROP INDEX "public"."push_version_version"`)
    await runner.query(`DROP TABLE "push_version"`)
    await runner.query(`DROP TABLE "published_file"`)
    await runner.query(`DROP INDEX "public"."publication_label"`)
    await runner.query(`DROP INDEX "public"."publication_version"`)
    await runner.query(`DROP INDEX "public"."publication_list"`)
    await runner.query(`DROP TABLE "publication"`)
    await runner.query(`DROP INDEX "public"."erratum_set"`)
    await runner.query(`DROP TABLE "erratum"`)
    await runner.query(`DROP TABLE "number_tick"`)
    await runner.query(`DROP INDEX "public"."webhook_team"`)
    await runner.query(`DROP TABLE "webhook"`)
    await runner.query(`DROP INDEX "public"."notice_list"`)
    await runner.query(`DROP TABLE "notice"`)
    await runner.query(`DROP TABLE "notice_choice"`)
    await runner.query(`DROP INDEX "public"."delivery_list"`)
    await runner.query(`DROP TABLE "delivery"`)
    await runner.query(`DROP INDEX "public"."build_version"`)
    await runner.query(`DROP INDEX "public"."build_invitation_build"`)
    await runner.query(`DROP TABLE "build"`)
    await runner.query(`DROP INDEX "public"."build_photo_build"`)
    await runner.query(`DROP TABLE "build_photo"`)
    await runner.query(`DROP INDEX "public"."build_invitation_stamp"`)
    await runner.query(`DROP INDEX "public"."build_invitation_secret"`)
    await runner.query(`DROP INDEX "public"."build_invitation_email"`)
    await runner.query(`DROP TABLE "build_invitation"`)
    await runner.query(`DROP INDEX "public"."session_expire"`)
    await runner.query(`DROP TABLE "session"`)
    await runner.query(`DROP INDEX "public"."person_email"`)
    await runner.query(`DROP TABLE "person"`)
    await runner.query(`DROP INDEX "public"."account_link_secret"`)
    await runner.query(`DROP INDEX "public"."account_link_person"`)
    await runner.query(`DROP TABLE "account_link"`)
  }
}
