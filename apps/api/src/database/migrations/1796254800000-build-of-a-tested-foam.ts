import { MigrationInterface, QueryRunner } from 'typeorm';

export class BuildOfATestedFoam1796254800000 implements MigrationInterface {
  name = 'BuildOfATestedFoam1796254800000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "test_sits" ADD "layers" jsonb, ADD "wrap" jsonb`);
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "test_sits" DROP COLUMN "layers", DROP COLUMN "wrap"`);
  }
}
