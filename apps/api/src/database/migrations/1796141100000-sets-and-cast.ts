import type { MigrationInterface, QueryRunner } from 'typeorm';

export class SetsAndCast1796141100000 implements MigrationInterface {
  name = 'SetsAndCast1796141100000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`
            CREATE TABLE "productions" (
                "id" uuid NOT NULL DEFAULT gen_random_uuid(),
                "workshop_id" uuid NOT NULL,
                "name" text NOT NULL,
                "summary" text NOT NULL,
                "units" text NOT NULL,
                "round_to" smallint NOT NULL,
                "archived_at" TIMESTAMP WITH TIME ZONE,
                "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                "updated_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                CONSTRAINT "productions_pk" PRIMARY KEY ("id")
            )
        `);
    await queryRunner.query(`
            CREATE INDEX "productions_name_workshop_id_ix" ON "productions" ("workshop_id", "name")
        `);
    await queryRunner.query(`
            CREATE TABLE "cast_members" (
                "id" uuid NOT NULL DEFAULT gen_random_uuid(),
                "production_id" uuid NOT NULL,
                "name" text NOT NULL,
                "role" text NOT NULL,
                "body_data" text NOT NULL,
                "stature_mm" double precision,
                "stature_source" text NOT NULL,
                "weight_kg" double precision,
                "measured" jsonb NOT NULL,
                "shoe_mm" double precision NOT NULL,
                "clothing" text NOT NULL,
                "notes" text NOT NULL,
                "colour" smallint NOT NULL,
                "removed_at" TIMESTAMP WITH TIME ZONE,
                "removed_number" integer,
                "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                "updated_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                CONSTRAINT "cast_members_pk" PRIMARY KEY ("id")
            )
        `);
    await queryRunner.query(`
            CREATE INDEX "cast_members_name_production_id_ix" ON "cast_members" ("production_id", "name")
        `);
    await queryRunner.query(`
            CREATE TABLE "sets" (
                "id" uuid NOT NULL DEFAULT gen_random_uuid(),
                "production_id" uuid NOT NULL,
                "name" text NOT NULL,
                "draft_number" integer NOT NULL,
                "archived_at" TIMESTAMP WITH TIME ZONE,
                "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                "updated_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                CONSTRAINT "sets_pk" PRIMARY KEY ("id")
            )
        `);
    await queryRunner.query(`
            CREATE INDEX "sets_name_production_id_ix" ON "sets" ("production_id", "name")
        `);
    await queryRunner.query(`
            CREATE TABLE "built_parts" (
                "set_id" uuid NOT NULL,
                "part_id" text NOT NULL,
                "built_by_id" uuid NOT NULL,
                "built_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                CONSTRAINT "built_parts_pk" PRIMARY KEY ("set_id", "part_id")
            )
        `);
    await queryRunner.query(`
            CREATE TABLE "set_revisions" (
                "id" uuid NOT NULL DEFAULT gen_random_uuid(),
                "set_id" uuid NOT NULL,
                "ordinal" integer NOT NULL,
                "letter" text NOT NULL,
                "draft_number" integer NOT NULL,
                "document" jsonb NOT NULL,
                "fit_sheet" jsonb NOT NULL,
                "counts" jsonb NOT NULL,
                "note" text NOT NULL,
                "issued_by_id" uuid NOT NULL,
                "issued_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                CONSTRAINT "set_revisions_ordinal_set_id_uq" UNIQUE ("set_id", "ordinal"),
                CONSTRAINT "set_revisions_letter_set_id_uq" UNIQUE ("set_id", "letter"),
                CONSTRAINT "set_revisions_pk" PRIMARY KEY ("id")
            )
        `);
    await queryRunner.query(`
            CREATE TABLE "revision_approvals" (
                "id" uuid NOT NULL DEFAULT gen_random_uuid(),
                "revision_id" uuid NOT NULL,
                "decision" text NOT NULL,
                "comment" text NOT NULL,
                "decided_by_id" uuid NOT NULL,
                "decided_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                CONSTRAINT "revision_approvals_pk" PRIMARY KEY ("id")
            )
        `);
    await queryRunner.query(`
            CREATE INDEX "revision_approvals_decided_at_revision_id_ix" ON "revision_approvals" ("revision_id", "decided_at")
        `);
    await queryRunner.query(`
            CREATE TABLE "set_drafts" (
                "set_id" uuid NOT NULL,
                "number" integer NOT NULL,
                "document" jsonb NOT NULL,
                "counts" jsonb,
                "counted_at" TIMESTAMP WITH TIME ZONE NOT NULL,
                "saved_by_id" uuid NOT NULL,
                "saved_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                CONSTRAINT "set_drafts_pk" PRIMARY KEY ("set_id", "number")
            )
        `);
    await queryRunner.query(`
            CREATE TABLE "set_notes" (
                "id" uuid NOT NULL DEFAULT gen_random_uuid(),
                "set_id" uuid NOT NULL,
                "kind" text NOT NULL,
                "text" text NOT NULL,
                "piece_id" text,
                "created_by_id" uuid NOT NULL,
                "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(),
                "resolved_at" TIMESTAMP WITH TIME ZONE,
                "resolved_by_id" uuid,
                CONSTRAINT "set_notes_pk" PRIMARY KEY ("id")
            )
        `);
    await queryRunner.query(`
            CREATE INDEX "set_notes_created_at_set_id_ix" ON "set_notes" ("set_id", "created_at")
        `);
    await queryRunner.query(`
            ALTER TABLE "productions"
            ADD CONSTRAINT "productions_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "workshops"("id") ON DELETE CASCADE ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "cast_members"
            ADD CONSTRAINT "cast_members_production_id_fk" FOREIGN KEY ("production_id") REFERENCES "productions"("id") ON DELETE CASCADE ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "sets"
            ADD CONSTRAINT "sets_production_id_fk" FOREIGN KEY ("production_id") REFERENCES "productions"("id") ON DELETE CASCADE ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "built_parts"
            ADD CONSTRAINT "built_parts_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "sets"("id") ON DELETE CASCADE ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "built_parts"
            ADD CONSTRAINT "built_parts_built_by_id_fk" FOREIGN KEY ("built_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "set_revisions"
            ADD CONSTRAINT "set_revisions_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "sets"("id") ON DELETE CASCADE ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "set_revisions"
            ADD CONSTRAINT "set_revisions_issued_by_id_fk" FOREIGN KEY ("issued_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "revision_approvals"
            ADD CONSTRAINT "revision_approvals_revision_id_fk" FOREIGN KEY ("revision_id") REFERENCES "set_revisions"("id") ON DELETE CASCADE ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "revision_approvals"
            ADD CONSTRAINT "revision_approvals_decided_by_id_fk" FOREIGN KEY ("decided_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "set_drafts"
            ADD CONSTRAINT "set_drafts_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "sets"("id") ON DELETE CASCADE ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "set_drafts"
            ADD CONSTRAINT "set_drafts_saved_by_id_fk" FOREIGN KEY ("saved_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "set_notes"
            ADD CONSTRAINT "set_notes_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "sets"("id") ON DELETE CASCADE ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "set_notes"
            ADD CONSTRAINT "set_notes_created_by_id_fk" FOREIGN KEY ("created_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            ALTER TABLE "set_notes"
            ADD CONSTRAINT "set_notes_resolved_by_id_fk" FOREIGN KEY ("resolved_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION
        `);
    await queryRunner.query(`
            CREATE FUNCTION set_revisions_stay() RETURNS trigger LANGUAGE plpgsql AS $$
            BEGIN
                IF TG_OP = 'DELETE' THEN
                    -- Deeper than the statement itself: the set goes, and its revisions with it.
                    IF pg_trigger_depth() > 1 THEN
                        RETURN OLD;
                    END IF;
                    RAISE EXCEPTION 'an issued revision cannot be deleted' USING ERRCODE = 'restrict_violation';
                END IF;
                IF current_setting('settlewright.erasing', true) = 'on'
                    AND (to_jsonb(NEW) - 'fit_sheet') = (to_jsonb(OLD) - 'fit_sheet') THEN
                    RETURN NEW;
                END IF;
                RAISE EXCEPTION 'an issued revision cannot be changed' USING ERRCODE = 'restrict_violation';
            END
            $$
        `);
    await queryRunner.query(`
            CREATE TRIGGER set_revisions_stay BEFORE UPDATE OR DELETE ON "set_revisions"
            FOR EACH ROW EXECUTE FUNCTION set_revisions_stay()
        `);
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`DROP TRIGGER set_revisions_stay ON "set_revisions"`);
    await queryRunner.query(`DROP FUNCTION set_revisions_stay()`);
    await queryRunner.query(`
            ALTER TABLE "set_notes" DROP CONSTRAINT "set_notes_resolved_by_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "set_notes" DROP CONSTRAINT "set_notes_created_by_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "set_notes" DROP CONSTRAINT "set_notes_set_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "set_drafts" DROP CONSTRAINT "set_drafts_saved_by_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "set_drafts" DROP CONSTRAINT "set_drafts_set_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "revision_approvals" DROP CONSTRAINT "revision_approvals_decided_by_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "revision_approvals" DROP CONSTRAINT "revision_approvals_revision_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "set_revisions" DROP CONSTRAINT "set_revisions_issued_by_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "set_revisions" DROP CONSTRAINT "set_revisions_set_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "built_parts" DROP CONSTRAINT "built_parts_built_by_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "built_parts" DROP CONSTRAINT "built_parts_set_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "sets" DROP CONSTRAINT "sets_production_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "cast_members" DROP CONSTRAINT "cast_members_production_id_fk"
        `);
    await queryRunner.query(`
            ALTER TABLE "productions" DROP CONSTRAINT "productions_workshop_id_fk"
        `);
    await queryRunner.query(`
            DROP INDEX "public"."set_notes_created_at_set_id_ix"
        `);
    await queryRunner.query(`
            DROP TABLE "set_notes"
        `);
    await queryRunner.query(`
            DROP TABLE "set_drafts"
        `);
    await queryRunner.query(`
            DROP INDEX "public"."revision_approvals_decided_at_revision_id_ix"
        `);
    await queryRunner.query(`
            DROP TABLE "revision_approvals"
        `);
    await queryRunner.query(`
            DROP TABLE "set_revisions"
        `);
    await queryRunner.query(`
            DROP TABLE "built_parts"
        `);
    await queryRunner.query(`
            DROP INDEX "public"."sets_name_production_id_ix"
        `);
    await queryRunner.query(`
            DROP TABLE "sets"
        `);
    await queryRunner.query(`
            DROP INDEX "public"."cast_members_name_production_id_ix"
        `);
    await queryRunner.query(`
            DROP TABLE "cast_members"
        `);
    await queryRunner.query(`
            DROP INDEX "public"."productions_name_workshop_id_ix"
        `);
    await queryRunner.query(`
            DROP TABLE "productions"
        `);
  }
}
