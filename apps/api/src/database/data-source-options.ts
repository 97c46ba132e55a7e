import type { DataSourceOptions } from 'typeorm';
import { ENTITIES } from './entities';
import { MIGRATIONS } from './migrations';
import { SnakeNaming } from './snake-naming';

/** One description of the database for the server, the tests and the migration command. */
export function dataSourceOptions(databaseUrl: string): DataSourceOptions {
  return {
    type: 'postgres',
    url: databaseUrl,
    entities: ENTITIES,
    migrations: MIGRATIONS,
    namingStrategy: new SnakeNaming(),
    synchronize: false,
    migrationsRun: false,
    uuidExtension: 'pgcrypto',
    installExtensions: false,
    poolSize: 20,
    extra: { connectionTimeoutMillis: 10_000 },
  };
}
