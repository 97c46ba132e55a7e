import { MigrationInterface, QueryRunner } from 'typeorm';

export class Arrangements1796238000000 implements MigrationInterface {
  name = 'Arrangements1796238000000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "arrangements" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "workshop_id" uuid NOT NULL, "name" text NOT NULL, "document" jsonb NOT NULL, "kept_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "kept_by_id" uuid NOT NULL, CONSTRAINT "arrangements_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "arrangements_name_workshop_id_ix" ON "arrangements" ("workshop_id", "name")`,
    );
    await queryRunner.query(
      `ALTER TABLE "arrangements" ADD CONSTRAINT "arrangements_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "workshops"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "arrangements" ADD CONSTRAINT "arrangements_kept_by_id_fk" FOREIGN KEY ("kept_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`DROP TABLE "arrangements"`);
  }
}
