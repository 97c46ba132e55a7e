import { MigrationInterface, QueryRunner } from 'typeorm';

export class ClothsOfAnOrder1796206800000 implements MigrationInterface {
  name = 'ClothsOfAnOrder1796206800000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "cushion_orders" ADD "covers" jsonb NOT NULL DEFAULT '[]'`);
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "cushion_orders" DROP COLUMN "covers"`);
  }
}
