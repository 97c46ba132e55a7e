import { MigrationInterface, QueryRunner } from 'typeorm';

/** What every sheet was made with before a workshop could set its own. */
const BEFORE = 0.9;

export class ConfidenceOfAWorkshop1796157600000 implements MigrationInterface {
  name = 'ConfidenceOfAWorkshop1796157600000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "workshops" ADD "confidence" double precision`);
    await queryRunner.query(`ALTER TABLE "workshops" ADD "confidence_set_at" TIMESTAMP WITH TIME ZONE`);
    await rewriteSheets(queryRunner, `fit_sheet || '{"confidence": ${BEFORE}}'`);
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await rewriteSheets(queryRunner, `fit_sheet - 'confidence'`);
    await queryRunner.query(`ALTER TABLE "workshops" DROP COLUMN "confidence_set_at"`);
    await queryRunner.query(`ALTER TABLE "workshops" DROP COLUMN "confidence"`);
  }
}

/** Issued revisions let nothing but the erasure of a person touch their sheets. */
async function rewriteSheets(queryRunner: QueryRunner, sheet: string): Promise<void> {
  await queryRunner.query(`SELECT set_config('settlewright.erasing', 'on', true)`);
  await queryRunner.query(`UPDATE "set_revisions" SET fit_sheet = ${sheet}`);
  await queryRunner.query(`SELECT set_config('settlewright.erasing', 'off', true)`);
}
