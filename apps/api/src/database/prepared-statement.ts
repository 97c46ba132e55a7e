import type { Pool } from 'pg';
import { type DataSource, QueryFailedError } from 'typeorm';

/**
 * A statement of the few paths that are asked for all the time, where making the SQL and mapping the rows would cost
 * more than the database does. The name is the statement's own: each connection prepares it once.
 */
export interface PreparedStatement {
  name: string;
  text: string;
}

/** Runs it on any free connection of the mapper's pool, as a transaction of its own; rows come as they are. */
export async function runPrepared<Row>(
  dataSource: DataSource,
  statement: PreparedStatement,
  values: unknown[],
): Promise<Row[]> {
  const { master: pool } = dataSource.driver as unknown as { master: Pool };
  try {
    return (await pool.query<Row & object>({ ...statement, values })).rows;
  } catch (fault) {
    throw new QueryFailedError(statement.text, values, fault as Error);
  }
}
