import { MigrationInterface, QueryRunner } from 'typeorm';

export class CushionOrders1796142000000 implements MigrationInterface {
  name = 'CushionOrders1796142000000';

  public async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `CREATE TABLE "upholsterers" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "workshop_id" uuid NOT NULL, "name" text NOT NULL, "contact_name" text NOT NULL, "email" text NOT NULL, "telephone" text NOT NULL, "notes" text NOT NULL, "removed_at" TIMESTAMP WITH TIME ZONE, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "updated_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "upholsterers_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "upholsterers_name_workshop_id_ix" ON "upholsterers"  ("workshop_id", "name") `,
    );
    await queryRunner.query(
      `CREATE TABLE "cushion_orders" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "workshop_id" uuid NOT NULL, "production_id" uuid NOT NULL, "set_id" uuid NOT NULL, "number" integer NOT NULL, "revision_letter" text NOT NULL, "title" text NOT NULL, "needed_by" date, "cushion_count" integer NOT NULL, "cushion_marks" text array, "spec" jsonb NOT NULL, "state" text NOT NULL DEFAULT 'draft', "upholsterer_id" uuid, "sent" jsonb, "created_by_id" uuid NOT NULL, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), "updated_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "cushion_orders_number_workshop_id_uq" UNIQUE ("workshop_id", "number"), CONSTRAINT "cushion_orders_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "cushion_orders_production_id_ix" ON "cushion_orders"  ("production_id") `,
    );
    await queryRunner.query(
      `CREATE TABLE "order_events" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "order_id" uuid NOT NULL, "kind" text NOT NULL, "side" text NOT NULL, "by_id" uuid, "by_name" text NOT NULL, "from_state" text, "to_state" text, "revision_letter" text NOT NULL, "note" text NOT NULL, "at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "order_events_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "order_events_at_order_id_ix" ON "order_events"  ("order_id", "at") `,
    );
    await queryRunner.query(
      `CREATE TABLE "order_links" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "order_id" uuid NOT NULL, "token_hash" text NOT NULL, "expires_at" TIMESTAMP WITH TIME ZONE NOT NULL, "revoked_at" TIMESTAMP WITH TIME ZONE, "created_at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "order_links_token_hash_uq" UNIQUE ("token_hash"), CONSTRAINT "order_links_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(`CREATE INDEX "order_links_order_id_ix" ON "order_links"  ("order_id") `);
    await queryRunner.query(
      `CREATE TABLE "order_messages" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "order_id" uuid NOT NULL, "side" text NOT NULL, "author_id" uuid, "author_name" text NOT NULL, "text" text NOT NULL, "at" TIMESTAMP WITH TIME ZONE NOT NULL DEFAULT now(), CONSTRAINT "order_messages_pk" PRIMARY KEY ("id"))`,
    );
    await queryRunner.query(
      `CREATE INDEX "order_messages_at_order_id_ix" ON "order_messages"  ("order_id", "at") `,
    );
    await queryRunner.query(
      `ALTER TABLE "upholsterers" ADD CONSTRAINT "upholsterers_workshop_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "workshops"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "cushion_orders" ADD CONSTRAINT "cushion_orders_production_id_fk" FOREIGN KEY ("production_id") REFERENCES "productions"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "cushion_orders" ADD CONSTRAINT "cushion_orders_set_id_fk" FOREIGN KEY ("set_id") REFERENCES "sets"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "cushion_orders" ADD CONSTRAINT "cushion_orders_revision_letter_set_id_fk" FOREIGN KEY ("set_id", "revision_letter") REFERENCES "set_revisions"("set_id","letter") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "cushion_orders" ADD CONSTRAINT "cushion_orders_upholsterer_id_fk" FOREIGN KEY ("upholsterer_id") REFERENCES "upholsterers"("id") ON DELETE RESTRICT ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "order_events" ADD CONSTRAINT "order_events_order_id_fk" FOREIGN KEY ("order_id") REFERENCES "cushion_orders"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "order_links" ADD CONSTRAINT "order_links_order_id_fk" FOREIGN KEY ("order_id") REFERENCES "cushion_orders"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
    await queryRunner.query(
      `ALTER TABLE "order_messages" ADD CONSTRAINT "order_messages_order_id_fk" FOREIGN KEY ("order_id") REFERENCES "cushion_orders"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
    );
  }

  public async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(`ALTER TABLE "order_messages" DROP CONSTRAINT "order_messages_order_id_fk"`);
    await queryRunner.query(`ALTER TABLE "order_links" DROP CONSTRAINT "order_links_order_id_fk"`);
    await queryRunner.query(`ALTER TABLE "order_events" DROP CONSTRAINT "order_events_order_id_fk"`);
    await queryRunner.query(
      `ALTER TABLE "cushion_orders" DROP CONSTRAINT "cushion_orders_upholsterer_id_fk"`,
    );
    await queryRunner.query(
      `ALTER TABLE "cushion_orders" DROP CONSTRAINT "cushion_orders_revision_letter_set_id_fk"`,
    );
    await queryRunner.query(`ALTER TABLE "cushion_orders" DROP CONSTRAINT "cushion_orders_set_id_fk"`);
    await queryRunner.query(`ALTER TABLE "cushion_orders" DROP CONSTRAINT "cushion_orders_production_id_fk"`);
    await queryRunner.query(`ALTER TABLE "upholsterers" DROP CONSTRAINT "upholsterers_workshop_id_fk"`);
    await queryRunner.query(`DROP INDEX "public"."order_messages_at_order_id_ix"`);
    await queryRunner.query(`DROP TABLE "order_messages"`);
    await queryRunner.query(`DROP INDEX "public"."order_links_order_id_ix"`);
    await queryRunner.query(`DROP TABLE "order_links"`);
    await queryRunner.query(`DROP INDEX "public"."order_events_at_order_id_ix"`);
    await queryRunner.query(`DROP TABLE "order_events"`);
    await queryRunner.query(`DROP INDEX "public"."cushion_orders_production_id_ix"`);
    await queryRunner.query(`DROP TABLE "cushion_orders"`);
    await queryRunner.query(`DROP INDEX "public"."upholsterers_name_workshop_id_ix"`);
    await queryRunner.query(`DROP TABLE "upholsterers"`);
  }
}
