import { MigrationInterface, QueryRunner } from 'typeorm';

export class LifeOfAnOrder1796201340000 implements MigrationInterface {
  name = 'LifeOfAnOrder1796201340000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "order_payments" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "order_id" uuid NOT NULL, "upholsterer_id" uuid NOT NULL, "side" text NOT NULL, "by_id" uuid, "by_name" text NOT NULL, "at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "kind" text NOT NULL, "by_hand" boolean NOT NULL, "amount_minor" integer NOT NULL, "currency" text NOT NULL, "state" text NOT NULL, "note" text NOT NULL, "account_id" text, "session_id" text, "payment_id" text, "refund_id" text, "settled_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "order_payments_refund_id_uq" UNIQUE ("refund_id"), CONSTRAINT "order_payments_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "order_payments_at_order_id_ix" ON "order_payments"  ("order_id", "at") `,
    );
    await queryRunner.query(
      `CREATE TABLE "payment_events" ("event_id" text NOT NULL, "type" text NOT NULL, "account_id" text, "payment_id" text, "told" jsonb NOT NULL, "received_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "applied_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "payment_events_pk" PRIMARY KEY ("event_id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "payment_events_payment_id_ix" ON "payment_events"  ("payment_id") `,
    );
    await queryRunner.query(
      `CREATE TABLE "order_files" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "order_id" uuid NOT NULL, "upholsterer_id" uuid NOT NULL, "side" text NOT NULL, "by_id" uuid, "by_name" text NOT NULL, "at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "cushion_mark" text, "name" text NOT NULL, "type" text NOT NULL, "bytes" integer NOT NULL, "width_px" integer, "height_px" integer, "object_key" text NOT NULL, "state" text NOT NULL, CONSTRAINT "order_files_object_key_uq" UNIQUE ("object_key"), CONSTRAINT "order_files_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "order_files_at_state_ix" ON "order_files"  ("state", "at") `);
    await queryRunner.query(
      `CREATE INDEX "order_files_at_order_id_ix" ON "order_files"  ("order_id", "at") `,
    );
    await queryRunner.query(
      `CREATE TABLE "order_inspections" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "order_id" uuid NOT NULL, "upholsterer_id" uuid NOT NULL, "side" text NOT NULL, "by_id" uuid, "by_name" text NOT NULL, "at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "kind" text NOT NULL, "revision_letter" text NOT NULL, "tolerance_mm" double precision NOT NULL, "cushions" jsonb NOT NULL, "outcome" text NOT NULL, "note" text NOT NULL, "photo_ids" uuid array NOT NULL DEFAULT '{}', CONSTRAINT "order_inspections_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "order_inspections_at_order_id_ix" ON "order_inspections"  ("order_id", "at") `,
    );
    await queryRunner.query(
      `CREATE TABLE "order_questions" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "order_id" uuid NOT NULL, "upholsterer_id" uuid NOT NULL, "side" text NOT NULL, "by_id" uuid, "by_name" text NOT NULL, "at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "cushion_mark" text, "text" text NOT NULL, "answer" text NOT NULL DEFAULT '', "answered_by_name" text NOT NULL DEFAULT '', "answered_by_id" uuid, "answered_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "order_questions_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "order_questions_at_order_id_ix" ON "order_questions"  ("order_id", "at") `,
    );
    await queryRunner.query(
      `CREATE TABLE "order_quotes" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "order_id" uuid NOT NULL, "upholsterer_id" uuid NOT NULL, "side" text NOT NULL, "by_id" uuid, "by_name" text NOT NULL, "at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "revision_letter" text NOT NULL, "sent_at" TIMESTAMP WITH TIME ZONE NOT NULL, "lines" jsonb NOT NULL, "currency" text NOT NULL, "tax_text" text NOT NULL, "tax_minor" integer NOT NULL, "total_minor" integer NOT NULL, "valid_until" date NOT NULL, "delivery_on" date, "note" text NOT NULL, "state" text NOT NULL DEFAULT 'offered', "answered_at" TIMESTAMP WITH TIME ZONE, "answered_by_name" text NOT NULL DEFAULT '', "answer" text NOT NULL DEFAULT '', CONSTRAINT "order_quotes_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "order_quotes_at_order_id_ix" ON "order_quotes"  ("order_id", "at") `,
    );
    await queryRunner.query(`ALTER TABLE "upholsterers" ADD "lead_days" integer`);
    await queryRunner.query(`ALTER TABLE "upholsterers" ADD "cloth_notes" text NOT NULL DEFAULT ''`);
    await queryRunner.query(`ALTER TABLE "upholsterers" ADD "units" text`);
    await queryRunner.query(`ALTER TABLE "upholsterers" ADD "paper" text`);
    await queryRunner.query(`ALTER TABLE "upholsterers" ADD "currency" text`);
    await queryRunner.query(`ALTER TABLE "upholsterers" ADD "account_id" text`);
    await queryRunner.query(
      `ALTER TABLE "cushion_orders" ADD "tolerance_mm" double precision NOT NULL DEFAULT '6.35'`,
    );
    await queryRunner.query(`ALTER TABLE "cushion_orders" ADD "sent_before" jsonb`);
    await queryRunner.query(
      `ALTER TABLE "order_payments" ADD CONSTRAINT "order_payments_order_id_fk" FOREIGN KEY ("order_id") REFERENCES "cushion_orders"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "order_files" ADD CONSTRAINT "order_files_order_id_fk" FOREIGN KEY ("order_id") REFERENCES "cushion_orders"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "order_inspections" ADD CONSTRAINT "order_inspections_order_id_fk" FOREIGN KEY ("order_id") REFERENCES "cushion_orders"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "order_questions" ADD CONSTRAINT "order_questions_order_id_fk" FOREIGN KEY ("order_id") REFERENCES "cushion_orders"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "order_quotes" ADD CONSTRAINT "order_quotes_order_id_fk" FOREIGN KEY ("order_id") REFERENCES "cushion_orders"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`DROP TABLE "order_quotes"`);
    await queryRunner.query(`DROP TABLE "order_questions"`);
    await queryRunner.query(`DROP TABLE "order_inspections"`);
    await queryRunner.query(`DROP TABLE "order_files"`);
    await queryRunner.query(`DROP TABLE "payment_events"`);
    await queryRunner.query(`DROP TABLE "order_payments"`);
    await queryRunner.query(`ALTER TABLE "cushion_orders" DROP COLUMN "sent_before"`);
    await queryRunner.query(`ALTER TABLE "cushion_orders" DROP COLUMN "tolerance_mm"`);
    await queryRunner.query(`ALTER TABLE "upholsterers" DROP COLUMN "account_id"`);
    await queryRunner.query(`ALTER TABLE "upholsterers" DROP COLUMN "currency"`);
    await queryRunner.query(`ALTER TABLE "upholsterers" DROP COLUMN "paper"`);
    await queryRunner.query(`ALTER TABLE "upholsterers" DROP COLUMN "units"`);
    await queryRunner.query(`ALTER TABLE "upholsterers" DROP COLUMN "cloth_notes"`);
    await queryRunner.query(`ALTER TABLE "upholsterers" DROP COLUMN "lead_days"`);
  }
}
