import { MigrationInterface, QueryRunner } from 'typeorm';

const TEXTS_TOO = `(to_jsonb(NEW) - ARRAY['fit_sheet', 'document', 'note']) = (to_jsonb(OLD) - ARRAY['fit_sheet', 'document', 'note'])`;
const SHEET_ONLY = `(to_jsonb(NEW) - 'fit_sheet') = (to_jsonb(OLD) - 'fit_sheet')`;

/** Taking a person out of an issued revision reaches what people typed into it, too. */
export class ErasedNames1796158800000 implements MigrationInterface {
  name = 'ErasedNames1796158800000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(keepRevisions(TEXTS_TOO));
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(keepRevisions(SHEET_ONLY));
  }
}

const keepRevisions = (unchanged: string) => `
  CREATE OR REPLACE FUNCTION set_revisions_stay() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
      IF TG_OP = 'DELETE' THEN
          -- Deeper than the statement itself: the set goes, and its revisions with it.
          IF pg_trigger_depth() > 1 THEN
              RETURN OLD;
          END IF;
          RAISE EXCEPTION 'an issued revision cannot be deleted' USING ERRCODE = 'restrict_violation';
      END IF;
      IF current_setting('settlewright.erasing', true) = 'on' AND ${unchanged} THEN
          RETURN NEW;
      END IF;
      RAISE EXCEPTION 'an issued revision cannot be changed' USING ERRCODE = 'restrict_violation';
  END
  $$`;
