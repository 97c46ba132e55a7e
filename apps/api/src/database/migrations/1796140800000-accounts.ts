import { MigrationInterface, QueryRunner } from 'typeorm';

export class Accounts1796140800000 implements MigrationInterface {
  name = 'Accounts1796140800000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "audit_entries" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "workshop_id" uuid, "user_id" uuid, "action" text NOT NULL, "subject_type" text NOT NULL, "subject_id" uuid, "detail" jsonb, CONSTRAINT "audit_entries_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "audit_entries_at_workshop_id_ix" ON "audit_entries"  ("workshop_id", "at") `,
    );
    await queryRunner.query(
      `CREATE TABLE "users" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "name" text NOT NULL, "email" text NOT NULL, "email_confirmed_at" TIMESTAMP WITH TIME ZONE, "password_hash" text NOT NULL, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "users_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "users_created_at_email_ix" ON "users"  ("email", "created_at") `);
    await queryRunner.query(
      `CREATE UNIQUE INDEX "users_email_pix" ON "users"  ("email") WHERE email_confirmed_at IS NOT NULL`,
    );
    await queryRunner.query(
      `CREATE TABLE "mailed_tokens" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "user_id" uuid NOT NULL, "purpose" text NOT NULL, "email" text NOT NULL, "token_hash" text NOT NULL, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "expires_at" TIMESTAMP WITH TIME ZONE NOT NULL, "used_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "mailed_tokens_token_hash_uq" UNIQUE ("token_hash"), CONSTRAINT "mailed_tokens_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "mailed_tokens_purpose_user_id_ix" ON "mailed_tokens"  ("user_id", "purpose") `,
    );
    await queryRunner.query(
      `CREATE TABLE "sessions" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "user_id" uuid NOT NULL, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "expires_at" TIMESTAMP WITH TIME ZONE NOT NULL, "ended_at" TIMESTAMP WITH TIME ZONE, "ended_because" text, CONSTRAINT "sessions_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "sessions_user_id_ix" ON "sessions"  ("user_id") `);
    await queryRunner.query(
      `CREATE TABLE "refresh_tokens" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "session_id" uuid NOT NULL, "token_hash" text NOT NULL, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "used_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "refresh_tokens_token_hash_uq" UNIQUE ("token_hash"), CONSTRAINT "refresh_tokens_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "refresh_tokens_session_id_ix" ON "refresh_tokens"  ("session_id") `,
    );
    await queryRunner.query(
      `CREATE TABLE "workshops" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "name" text NOT NULL, "telephone" text NOT NULL DEFAULT '', "paper" text NOT NULL DEFAULT 'letter', "time_zone" text NOT NULL DEFAULT 'UTC', "is_demo" boolean NOT NULL DEFAULT false, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "workshops_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "invitations" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "workshop_id" uuid NOT NULL, "email" text NOT NULL, "role" text NOT NULL, "token_hash" text NOT NULL, "invited_by_id" uuid NOT NULL, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "expires_at" TIMESTAMP WITH TIME ZONE NOT NULL, "accepted_at" TIMESTAMP WITH TIME ZONE, "withdrawn_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "invitations_token_hash_uq" UNIQUE ("token_hash"), CONSTRAINT "invitations_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE UNIQUE INDEX "invitations_email_workshop_id_pix" ON "invitations"  ("workshop_id", "email") WHERE accepted_at IS NULL AND withdrawn_at IS NULL`,
    );
    await queryRunner.query(
      `CREATE TABLE "outbox_mails" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "kind" text NOT NULL, "workshop_id" uuid, "related_id" uuid, "message_id" text NOT NULL, "to" text NOT NULL, "reply_to" text, "subject" text NOT NULL, "text" text, "html" text, "state" text NOT NULL DEFAULT 'queued', "attempts" integer NOT NULL DEFAULT '0', "queued_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "next_attempt_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "sending_at" TIMESTAMP WITH TIME ZONE, "sent_at" TIMESTAMP WITH TIME ZONE, "failed_at" TIMESTAMP WITH TIME ZONE, "perhaps_sent_at" TIMESTAMP WITH TIME ZONE, "last_fault" text, CONSTRAINT "outbox_mails_message_id_uq" UNIQUE ("message_id"), CONSTRAINT "outbox_mails_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "outbox_mails_related_id_ix" ON "outbox_mails"  ("related_id") `);
    await queryRunner.query(
      `CREATE INDEX "outbox_mails_next_attempt_at_state_ix" ON "outbox_mails"  ("state", "next_attempt_at") `,
    );
    await queryRunner.query(
      `CREATE TABLE "outbox_attachments" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "mail_id" uuid NOT NULL, "filename" text NOT NULL, "content_type" text NOT NULL, "content" bytea NOT NULL, CONSTRAINT "outbox_attachments_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "outbox_attachments_mail_id_ix" ON "outbox_attachments"  ("mail_id") `,
    );
    await queryRunner.query(
      `CREATE TABLE "memberships" ("workshop_id" uuid NOT NULL, "user_id" uuid NOT NULL, "role" text NOT NULL, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "memberships_pk" PRIMARY KEY ("workshop_id", "user_id"))`,
    );
    await queryRunner.query(`CREATE INDEX "memberships_user_id_ix" ON "memberships"  ("user_id") `);
    await queryRunner.query(
      `ALTER TABLE "mailed_tokens" ADD CONSTRAINT "mailed_tokens_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "users"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "users"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "refresh_tokens" ADD CONSTRAINT "refresh_tokens_session_id_fk" FOREIGN KEY ("session_id") REFERENCES "sessions"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "invitations" ADD CONSTRAINT "invitations_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "workshops"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "invitations" ADD CONSTRAINT "invitations_invited_by_id_fk" FOREIGN KEY ("invited_by_id") REFERENCES "users"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "outbox_attachments" ADD CONSTRAINT "outbox_attachments_mail_id_fk" FOREIGN KEY ("mail_id") REFERENCES "outbox_mails"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "memberships" ADD CONSTRAINT "memberships_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "workshops"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "memberships" ADD CONSTRAINT "memberships_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "users"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    // Not an entity: the shape is the one that rate-limiter-flexible reads and writes.
    await queryRunner.query(
      `CREATE TABLE "rate_limits" ("key" varchar(255) PRIMARY KEY, "points" integer NOT NULL DEFAULT 0, "expire" bigint)`,
    );
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`DROP TABLE "rate_limits"`);
    await queryRunner.query(`ALTER TABLE "memberships" DROP CONSTRAINT "memberships_user_id_fk"`);
    await queryRunner.query(`ALTER TABLE "memberships" DROP CONSTRAINT "memberships_workshop_id_fk"`);
    await queryRunner.query(
      `ALTER TABLE "outbox_attachments" DROP CONSTRAINT "outbox_attachments_mail_id_fk"`,
    );
    await queryRunner.query(`ALTER TABLE "invitations" DROP CONSTRAINT "invitations_invited_by_id_fk"`);
    await queryRunner.query(`ALTER TABLE "invitations" DROP CONSTRAINT "invitations_workshop_id_fk"`);
    await queryRunner.query(`ALTER TABLE "refresh_tokens" DROP CONSTRAINT "refresh_tokens_session_id_fk"`);
    await queryRunner.query(`ALTER TABLE "sessions" DROP CONSTRAINT "sessions_user_id_fk"`);
    await queryRunner.query(`ALTER TABLE "mailed_tokens" DROP CONSTRAINT "mailed_tokens_user_id_fk"`);
    await queryRunner.query(`DROP INDEX "memberships_user_id_ix"`);
    await queryRunner.query(`DROP TABLE "memberships"`);
    await queryRunner.query(`DROP INDEX "outbox_attachments_mail_id_ix"`);
    await queryRunner.query(`DROP TABLE "outbox_attachments"`);
    await queryRunner.query(`DROP INDEX "outbox_mails_next_attempt_at_state_ix"`);
    await queryRunner.query(`DROP INDEX "outbox_mails_related_id_ix"`);
    await queryRunner.query(`DROP TABLE "outbox_mails"`);
    await queryRunner.query(`DROP INDEX "invitations_email_workshop_id_pix"`);
    await queryRunner.query(`DROP TABLE "invitations"`);
    await queryRunner.query(`DROP TABLE "workshops"`);
    await queryRunner.query(`DROP INDEX "refresh_tokens_session_id_ix"`);
    await queryRunner.query(`DROP TABLE "refresh_tokens"`);
    await queryRunner.query(`DROP INDEX "sessions_user_id_ix"`);
    await queryRunner.query(`DROP TABLE "sessions"`);
    await queryRunner.query(`DROP INDEX "mailed_tokens_purpose_user_id_ix"`);
    await queryRunner.query(`DROP TABLE "mailed_tokens"`);
    await queryRunner.query(`DROP INDEX "users_email_pix"`);
    await queryRunner.query(`DROP INDEX "users_created_at_email_ix"`);
    await queryRunner.query(`DROP TABLE "users"`);
    await queryRunner.query(`DROP INDEX "audit_entries_at_workshop_id_ix"`);
    await queryRunner.query(`DROP TABLE "audit_entries"`);
  }
}
