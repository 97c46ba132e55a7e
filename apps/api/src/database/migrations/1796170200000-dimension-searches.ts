import { MigrationInterface, QueryRunner } from 'typeorm';

export class DimensionSearches1796170200000 implements MigrationInterface {
  name = 'DimensionSearches1796170200000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "dimension_searches" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "set_id" uuid NOT NULL, "draft_number" integer, "revision_letter" text, "free" jsonb NOT NULL, "served" jsonb NOT NULL, "population" jsonb, "women_percent" double precision, "rule_version" text NOT NULL, "state" text NOT NULL, "done" integer NOT NULL, "most" integer NOT NULL, "part" integer NOT NULL, "question" json, "digest" text, "found" json, "fault" text, "started_by_id" uuid NOT NULL, "started_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "ended_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "dimension_searches_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "dimension_searches_set_id_started_at_ix" ON "dimension_searches"  ("set_id", "started_at") `,
    );
    await queryRunner.query(
      `CREATE TABLE "search_tries" ("search_id" uuid NOT NULL, "part" integer NOT NULL, "tried" json NOT NULL, CONSTRAINT "search_tries_pk" PRIMARY KEY ("search_id", "part"))`,
    );
    await queryRunner.query(
      `ALTER TABLE "dimension_searches" ADD CONSTRAINT "dimension_searches_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "sets"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "dimension_searches" ADD CONSTRAINT "dimension_searches_started_by_id_fk" FOREIGN KEY ("started_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "search_tries" ADD CONSTRAINT "search_tries_search_id_fk" FOREIGN KEY ("search_id") REFERENCES "dimension_searches"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`DROP TABLE "search_tries"`);
    await queryRunner.query(`DROP TABLE "dimension_searches"`);
  }
}
