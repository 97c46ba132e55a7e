import { DataSource } from 'typeorm';
import { readSettings } from '../config/settings';
import { dataSourceOptions } from './data-source-options';

/**
 * For TypeORM's own command line. A new migration, with DATABASE_URL set and in apps/api:
 * `node -C source -r @swc-node/register ../../node_modules/typeorm/cli.js migration:generate
 * -d src/database/data-source.ts src/database/migrations/<name>`
 */
export default new DataSource(dataSourceOptions(readSettings(process.env).databaseUrl));
