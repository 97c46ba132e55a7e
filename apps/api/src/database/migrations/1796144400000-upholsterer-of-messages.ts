import { MigrationInterface, QueryRunner } from 'typeorm';

const TABLES = ['order_messages', 'order_events'] as const;

export class UpholstererOfMessages1796144400000 implements MigrationInterface {
  name = 'UpholstererOfMessages1796144400000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    for (const table of TABLES) {
      await queryRunner.query(`ALTER TABLE "${table}" ADD "upholsterer_id" uuid`);
      await queryRunner.query(
        `UPDATE "${table}" written SET upholsterer_id = ordered.upholsterer_id FROM "cushion_orders" ordered WHERE ordered.id = written.order_id`,
      );
      await queryRunner.query(
        `ALTER TABLE "${table}" ADD CONSTRAINT "${table}_upholsterer_id_fk" FOREIGN KEY ("upholsterer_id") REFERENCES "upholsterers"("id") ON DELETE RESTRICT ON UPDATE NO ACTION`,
      );
    }
    await queryRunner.query(`UPDATE "order_events" SET upholsterer_id = NULL WHERE kind = 'created'`);
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    for (const table of TABLES) {
      await queryRunner.query(`ALTER TABLE "${table}" DROP CONSTRAINT "${table}_upholsterer_id_fk"`);
      await queryRunner.query(`ALTER TABLE "${table}" DROP COLUMN "upholsterer_id"`);
    }
  }
}
