import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, expect, it } from '@jest/globals';
import { DataSource } from 'typeorm';
import { dataSourceOptions } from '../src/database/data-source-options';
import { MIGRATIONS } from '../src/database/migrations';
import { runMigrations } from '../src/database/run-migrations';
import { makeWorkerDatabase } from './test-app';

let url: string;
let dataSource: DataSource;
beforeAll(async () => {
  url = await makeWorkerDatabase('_migrations');
  dataSource = await new DataSource(dataSourceOptions(url)).initialize();
});
afterAll(() => dataSource.destroy());

const tables = async (): Promise<string[]> => {
  const rows: { name: string }[] = await dataSource.query(
    `SELECT table_name AS name FROM information_schema.tables WHERE table_schema = 'public' ORDER BY 1`,
  );
  return rows.map(({ name }) => name);
};
const pendingChanges = async () =>
  (await dataSource.driver.createSchemaBuilder().log()).upQueries.map(({ query }) => query);

it('goes up, all the way down and up again, and then says what the entities say', async () => {
  await runMigrations(dataSource);
  const first = await tables();
  expect(await pendingChanges()).toEqual([]);
  for (const _migration of MIGRATIONS) await dataSource.undoLastMigration();
  expect(await tables()).toEqual(['migrations']);
  await runMigrations(dataSource);
  expect(await tables()).toEqual(first);
  expect(await pendingChanges()).toEqual([]);
});

it('gives messages and events written before to the upholsterer who has the order', async () => {
  const old = await new DataSource(dataSourceOptions(await makeWorkerDatabase('_messages'))).initialize();
  await runMigrations(old);
  const upTo = MIGRATIONS.findIndex(({ name }) => name.startsWith('UpholstererOfMessages'));
  for (let count = MIGRATIONS.length; count > upTo; count -= 1) await old.undoLastMigration();
  const [firm, order, other] = [randomUUID(), randomUUID(), randomUUID()];
  await old.transaction(async (manager) => {
    // What stands around an order matters nothing here.
    await manager.query('SET LOCAL session_replication_role = replica');
    await manager.query(
      `INSERT INTO upholsterers (id, workshop_id, name, contact_name, email, telephone, notes)
       VALUES ($1, $2, 'Marrow & Tuft', '', '', '', '')`,
      [firm, other],
    );
    await manager.query(
      `INSERT INTO cushion_orders (id, workshop_id, production_id, set_id, number, revision_letter, title,
         cushion_count, spec, upholsterer_id, created_by_id)
       VALUES ($1, $3, $3, $3, 1, 'A', '', 1, '{}', $2, $3)`,
      [order, firm, other],
    );
    await manager.query(
      `INSERT INTO order_messages (order_id, side, author_name, text) VALUES ($1, 'upholsterer', '', '')`,
      [order],
    );
    for (const kind of ['created', 'sent']) {
      await manager.query(
        `INSERT INTO order_events (order_id, kind, side, by_name, revision_letter, note)
         VALUES ($1, $2, 'workshop', '', 'A', '')`,
        [order, kind],
      );
    }
  });
  await runMigrations(old);
  expect(await old.query('SELECT upholsterer_id FROM order_messages')).toEqual([{ upholsterer_id: firm }]);
  expect(await old.query('SELECT kind, upholsterer_id FROM order_events ORDER BY kind')).toEqual([
    { kind: 'created', upholsterer_id: null },
    { kind: 'sent', upholsterer_id: firm },
  ]);
  await old.destroy();
});

it('writes on sheets issued before what all verdicts asked for then, and takes it off again', async () => {
  const old = await new DataSource(dataSourceOptions(await makeWorkerDatabase('_sheets'))).initialize();
  await runMigrations(old);
  const upTo = MIGRATIONS.findIndex(({ name }) => name.startsWith('ConfidenceOfAWorkshop'));
  const back = async () => {
    for (let count = MIGRATIONS.length; count > upTo; count -= 1) await old.undoLastMigration();
  };
  await back();
  await old.transaction(async (manager) => {
    await manager.query('SET LOCAL session_replication_role = replica');
    await manager.query(
      `INSERT INTO set_revisions (set_id, ordinal, letter, draft_number, document, fit_sheet, counts, note, issued_by_id)
       VALUES ($1, 1, 'A', 1, '{}', '{"rows": []}', '{}', '', $1)`,
      [randomUUID()],
    );
  });
  const sheets = () => old.query('SELECT fit_sheet FROM set_revisions');
  await runMigrations(old);
  expect(await sheets()).toEqual([{ fit_sheet: { rows: [], confidence: 0.9 } }]);
  await expect(old.query('UPDATE set_revisions SET fit_sheet = NULL')).rejects.toThrow(/cannot be changed/);
  await back();
  expect(await sheets()).toEqual([{ fit_sheet: { rows: [] } }]);
  await old.destroy();
});

it('keeps migrations in the order of their times', () => {
  const times = MIGRATIONS.map((migration) => Number(migration.name.slice(-13)));
  expect(times).toEqual([...times].sort((one, other) => one - other));
  expect(new Set(times).size).toBe(times.length);
});

it('is migrated once when several processes start together', async () => {
  const fresh = await makeWorkerDatabase('_together');
  const starts = await Promise.all(
    [1, 2, 3].map(() => new DataSource(dataSourceOptions(fresh)).initialize()),
  );
  await Promise.all(starts.map((one) => runMigrations(one)));
  const [{ count }] = await starts[0]!.query('SELECT count(*)::int AS count FROM migrations');
  expect(count).toBe(MIGRATIONS.length);
  await Promise.all(starts.map((one) => one.destroy()));
});

it('stores every time with its zone, every id as uuid, and every name in snake case', async () => {
  const columns: { table: string; column: string; type: string }[] = await dataSource.query(
    `SELECT table_name AS table, column_name AS column, data_type AS type
       FROM information_schema.columns WHERE table_schema = 'public' AND table_name <> 'migrations'`,
  );
  const names = columns.map(({ table, column }) => `${table}.${column}`);
  expect(names.filter((name) => !/^[a-z0-9_.]+$/.test(name))).toEqual([]);
  expect(columns.filter(({ type }) => type === 'timestamp without time zone')).toEqual([]);
  const ids = columns.filter(({ column, type }) => column === 'id' && type !== 'uuid');
  expect(ids).toEqual([]);
});
