import { MigrationInterface, QueryRunner } from 'typeorm';

export class PopulationsAndStudies1796161490650 implements MigrationInterface {
  name = 'PopulationsAndStudies1796161490650';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "populations" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "workshop_id" uuid NOT NULL, "name" text NOT NULL, "source" text NOT NULL, "women" integer NOT NULL, "men" integer NOT NULL, "left_out" integer NOT NULL, "read" text array NOT NULL, "estimated" text array NOT NULL, "summary" jsonb NOT NULL, "added_by_id" uuid NOT NULL, "added_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "populations_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "populations_name_workshop_id_ix" ON "populations"  ("workshop_id", "name") `,
    );
    await queryRunner.query(
      `CREATE TABLE "population_rows" ("population_id" uuid NOT NULL, "csv" text NOT NULL, CONSTRAINT "population_rows_pk" PRIMARY KEY ("population_id"))`,
    );
    await queryRunner.query(
      `CREATE TABLE "studies" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "set_id" uuid NOT NULL, "draft_number" integer, "revision_letter" text, "population" jsonb NOT NULL, "women_percent" double precision, "people" integer NOT NULL, "seed" integer NOT NULL, "rule_ids" text array, "place_ids" text array, "rule_version" text NOT NULL, "state" text NOT NULL, "blocks" integer NOT NULL, "blocks_done" integer NOT NULL, "question" jsonb, "result" jsonb, "outcome" jsonb, "fault" text, "started_by_id" uuid NOT NULL, "started_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "ended_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "studies_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "studies_set_id_started_at_ix" ON "studies"  ("set_id", "started_at") `,
    );
    await queryRunner.query(
      `CREATE TABLE "study_blocks" ("study_id" uuid NOT NULL, "block" integer NOT NULL, "counts" json NOT NULL, CONSTRAINT "study_blocks_pk" PRIMARY KEY ("study_id", "block"))`,
    );
    await queryRunner.query(
      `ALTER TABLE "populations" ADD CONSTRAINT "populations_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "workshops"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "populations" ADD CONSTRAINT "populations_added_by_id_fk" FOREIGN KEY ("added_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "population_rows" ADD CONSTRAINT "population_rows_population_id_fk" FOREIGN KEY ("population_id") REFERENCES "populations"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "studies" ADD CONSTRAINT "studies_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "sets"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "studies" ADD CONSTRAINT "studies_started_by_id_fk" FOREIGN KEY ("started_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "study_blocks" ADD CONSTRAINT "study_blocks_study_id_fk" FOREIGN KEY ("study_id") REFERENCES "studies"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "study_blocks" DROP CONSTRAINT "study_blocks_study_id_fk"`);
    await queryRunner.query(`ALTER TABLE "studies" DROP CONSTRAINT "studies_started_by_id_fk"`);
    await queryRunner.query(`ALTER TABLE "studies" DROP CONSTRAINT "studies_set_id_fk"`);
    await queryRunner.query(
      `ALTER TABLE "population_rows" DROP CONSTRAINT "population_rows_population_id_fk"`,
    );
    await queryRunner.query(`ALTER TABLE "populations" DROP CONSTRAINT "populations_added_by_id_fk"`);
    await queryRunner.query(`ALTER TABLE "populations" DROP CONSTRAINT "populations_workshop_id_fk"`);
    await queryRunner.query(`DROP TABLE "study_blocks"`);
    await queryRunner.query(`DROP INDEX "public"."studies_set_id_started_at_ix"`);
    await queryRunner.query(`DROP TABLE "studies"`);
    await queryRunner.query(`DROP TABLE "population_rows"`);
    await queryRunner.query(`DROP INDEX "public"."populations_name_workshop_id_ix"`);
    await queryRunner.query(`DROP TABLE "populations"`);
  }
}
