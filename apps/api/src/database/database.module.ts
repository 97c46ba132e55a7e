import { Module } from '@nestjs/common';
import type { ConfigType } from '@nestjs/config';
import { TypeOrmModule } from '@nestjs/typeorm';
import { DataSource, type DataSourceOptions } from 'typeorm';
import { settings } from '../config/settings';
import { dataSourceOptions } from './data-source-options';
import { runMigrations } from './run-migrations';

async function openDatabase(options?: DataSourceOptions): Promise<DataSource> {
  if (!options) throw new Error('the database was opened without options');
  const dataSource = await new DataSource(options).initialize();
  try {
    await runMigrations(dataSource);
  } catch (fault) {
    await dataSource.destroy();
    throw fault;
  }
  return dataSource;
}

@Module({
  imports: [
    TypeOrmModule.forRootAsync({
      inject: [settings.KEY],
      useFactory: (config: ConfigType<typeof settings>) => ({
        ...dataSourceOptions(config.databaseUrl),
        retryAttempts: config.production ? 10 : 1,
      }),
      dataSourceFactory: openDatabase,
    }),
  ],
})
export class DatabaseModule {}
