import { type EntityManager, type EntityTarget, In, type Repository, type SelectQueryBuilder } from 'typeorm';
import type { DocumentJob } from './entities/document-job.entity';
import { UNFINISHED } from './job-states';

/** Jobs of one set that are listed. */
export const LISTED = 20;

/** The last jobs of a set, newest first, without the columns that would make a list large. */
export function lastJobs<Job extends DocumentJob>(
  jobs: Repository<Job>,
  setId: string,
  without: (keyof Job)[],
): Promise<Job[]> {
  return shown(jobs, without)
    .where('job.setId = :setId', { setId })
    .orderBy('job.startedAt', 'DESC')
    .addOrderBy('job.id')
    .take(LISTED)
    .getMany();
}

/** A job of a set, without what only workers read. */
export function oneJob<Job extends DocumentJob>(
  jobs: Repository<Job>,
  { setId, id }: { setId: string; id: string },
  without: (keyof Job)[],
): Promise<Job | null> {
  return shown(jobs, without).where('job.id = :id AND job.setId = :setId', { id, setId }).getOne();
}

/** How many jobs of a workshop are not done. */
export function countUnfinished(
  manager: EntityManager,
  kind: EntityTarget<DocumentJob>,
  workshopId: string,
): Promise<number> {
  return manager
    .createQueryBuilder(kind, 'job')
    .innerJoin('job.set', 'set')
    .innerJoin('set.production', 'production')
    .where('production.workshopId = :workshopId', { workshopId })
    .andWhere({ state: In([...UNFINISHED]) })
    .getCount();
}

/** With the name of who started it. */
function shown<Job extends DocumentJob>(
  jobs: Repository<Job>,
  without: (keyof Job)[],
): SelectQueryBuilder<Job> {
  const columns = jobs.metadata.columns.map(({ propertyName }) => propertyName as keyof Job & string);
  return jobs
    .createQueryBuilder('job')
    .select(columns.filter((column) => !without.includes(column)).map((column) => `job.${column}`))
    .leftJoin('job.startedBy', 'starter')
    .addSelect(['starter.id', 'starter.name']);
}
