import { MigrationInterface, QueryRunner } from 'typeorm';

export class CushionSettings1796202960000 implements MigrationInterface {
  name = 'CushionSettings1796202960000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "cushion_settings" ("workshop_id" uuid NOT NULL, "allowances_mm" jsonb NOT NULL, "foams" jsonb NOT NULL, "number" integer NOT NULL, "changed_at" TIMESTAMP WITH TIME ZONE NOT NULL, "changed_by_id" uuid NOT NULL, CONSTRAINT "cushion_settings_pk" PRIMARY KEY ("workshop_id"))`,
    );
    await queryRunner.query(
      `ALTER TABLE "cushion_settings" ADD CONSTRAINT "cushion_settings_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "workshops"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "cushion_settings" ADD CONSTRAINT "cushion_settings_changed_by_id_fk" FOREIGN KEY ("changed_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    // Revisions that were issued before have none of their own: they were made the usual way.
    await queryRunner.query(`ALTER TABLE "set_revisions" ADD "cushion_rules" jsonb`);
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "set_revisions" DROP COLUMN "cushion_rules"`);
    await queryRunner.query(`DROP TABLE "cushion_settings"`);
  }
}
