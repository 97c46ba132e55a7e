import type { EntityManager, EntityTarget } from 'typeorm';
import type { DocumentJob } from './entities/document-job.entity';

/** After this nobody waits any longer for a worker of another version, hours. */
const WAIT_HOURS = 1;

/** What it is told whose work no fitting worker was left to do. */
export const ABANDONED =
  'It was begun with another version of the fit rules or the programme, and no worker of that version is left: begin it again.';

/** Ids of rows that are not done, were begun for workers of another version, and have waited long enough. */
export async function abandonedIds(
  manager: EntityManager,
  kind: EntityTarget<DocumentJob & { question: object | null }>,
  own: string,
): Promise<string[]> {
  const found = await manager
    .createQueryBuilder(kind, 'row')
    .select('row.id', 'id')
    .where('row.question IS NOT NULL')
    .andWhere(`row.question->>'workVersion' IS DISTINCT FROM :own`, { own })
    .andWhere(`row.startedAt < now() - interval '${WAIT_HOURS} hours'`)
    .getRawMany<{ id: string }>();
  return found.map(({ id }) => id);
}
