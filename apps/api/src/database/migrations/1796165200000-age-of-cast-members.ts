import type { MigrationInterface, QueryRunner } from 'typeorm';

export class AgeOfCastMembers1796165200000 implements MigrationInterface {
  name = 'AgeOfCastMembers1796165200000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "cast_members" ADD "age" smallint`);
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "cast_members" DROP COLUMN "age"`);
  }
}
