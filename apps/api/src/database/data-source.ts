import { DataSource } from 'typeorm';
import { readSettings } from '../config/settings';
import { dataSourceOptions } from './data-source-options';

/** For TypeORM's own command line, see DEVELOPERS.md. */
export default new DataSource(dataSourceOptions(readSettings(process.env).databaseUrl));
