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
