import { MigrationInterface, QueryRunner } from 'typeorm';

export class TestSits1796240400000 implements MigrationInterface {
  name = 'TestSits1796240400000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "test_sits" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "set_id" uuid NOT NULL, "cast_id" uuid, "name" text, "sat_on" date NOT NULL, "grade" text NOT NULL, "ifd25_newtons" double precision NOT NULL, "support_factor" double precision NOT NULL, "thickness_mm" double precision NOT NULL, "weight_kg" double precision NOT NULL, "predicted_mm" double precision NOT NULL, "measured_mm" double precision NOT NULL, "note" text NOT NULL, "created_by_id" uuid NOT NULL, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "test_sits_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "test_sits_cast_id_ix" ON "test_sits"  ("cast_id")`);
    await queryRunner.query(`CREATE INDEX "test_sits_sat_on_set_id_ix" ON "test_sits"  ("set_id", "sat_on")`);
    await queryRunner.query(
      `ALTER TABLE "test_sits" ADD CONSTRAINT "test_sits_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "sets"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "test_sits" ADD CONSTRAINT "test_sits_cast_id_fk" FOREIGN KEY ("cast_id") REFERENCES "cast_members"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "test_sits" ADD CONSTRAINT "test_sits_created_by_id_fk" FOREIGN KEY ("created_by_id") REFERENCES "users"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
    );
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`DROP TABLE "test_sits"`);
  }
}
