import type { DataSource } from 'typeorm';

/** Any number that nothing else in this database uses; several processes may start at once. */
const MIGRATION_LOCK = 761_204_118;

export async function runMigrations(dataSource: DataSource): Promise<void> {
  await withAdvisoryLock(dataSource, MIGRATION_LOCK, async () => {
    await dataSource.runMigrations({ transaction: 'each' });
  });
}

/** Runs `work` while no other process that asks for the same number does. */
export async function withAdvisoryLock<T>(
  dataSource: DataSource,
  lock: number,
  work: () => Promise<T>,
): Promise<T> {
  const holder = dataSource.createQueryRunner();
  await holder.connect();
  try {
    await holder.query('SELECT pg_advisory_lock($1)', [lock]);
    try {
      return await work();
    } finally {
      await holder.query('SELECT pg_advisory_unlock($1)', [lock]);
    }
  } finally {
    await holder.release();
  }
}
