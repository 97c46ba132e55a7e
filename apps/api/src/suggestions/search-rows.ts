import type { EntityManager } from 'typeorm';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { countUnfinished, LISTED } from '../jobs/document-jobs';
import { womenPercentOf } from '../studies/read-mix';
import { toldPopulation } from '../studies/told-population';
import type { StartSuggestionDto } from './dto/start-suggestion.dto';
import { DimensionSearch } from './entities/dimension-search.entity';
import { SearchTries } from './entities/search-tries.entity';
import type { SearchQuestion, ToldDimension, ToldSitter } from './search-question';

/** So that one workshop does not keep the others waiting. */
const MOST_UNFINISHED = 5;

/** A row for a search that waits for a worker. */
export function begunSearch(
  { userId }: MemberInfo,
  setId: string,
  { draftNumber, revisionLetter, womenPercent }: StartSuggestionDto,
  { question, told, digest }: { question: SearchQuestion; told: ToldDimension[]; digest: string },
): Partial<DimensionSearch> {
  const { crowd } = question;
  const sitters = new Map(
    question.sitters.map(({ kind, id, name }): [string, ToldSitter] => [
      id,
      kind === 'cast' ? { kind, id } : { kind, id, name },
    ]),
  );
  return {
    setId,
    draftNumber: draftNumber ?? null,
    revisionLetter: revisionLetter?.toUpperCase() ?? null,
    free: told,
    served: [...sitters.values()],
    population: crowd ? toldPopulation(crowd.crowd) : null,
    womenPercent: womenPercentOf(crowd ?? {}, womenPercent),
    state: 'queued',
    done: 0,
    most: 0,
    part: 0,
    question,
    digest,
    found: null,
    fault: null,
    startedById: userId,
    endedAt: null,
  };
}

/**
 * Part of the caller's transaction, which keeps the workshop, so that two at once are counted one by one. Refuses when
 * too many are not done; of the set's ended ones, the oldest go.
 */
export async function makeRoom(manager: EntityManager, workshopId: string, setId: string): Promise<void> {
  const unfinished = await countUnfinished(manager, DimensionSearch, workshopId);
  if (unfinished >= MOST_UNFINISHED) {
    const detail = `${unfinished} searches of this workshop are not done yet; accepted: up to ${MOST_UNFINISHED} at a time.`;
    throw Problem.conflict('too-many-searches', detail);
  }
  await manager.query(
    `DELETE FROM dimension_searches WHERE set_id = $1 AND ended_at IS NOT NULL AND id NOT IN (
       SELECT id FROM dimension_searches WHERE set_id = $1 ORDER BY started_at DESC, id LIMIT $2)`,
    [setId, LISTED - 1],
  );
}

/** The search, kept from other writers until the transaction ends. */
export function locked(manager: EntityManager, id: string): Promise<DimensionSearch | null> {
  return manager.findOne(DimensionSearch, { where: { id }, lock: { mode: 'pessimistic_write' } });
}

/** Part of the caller's transaction: the search is over; what was only needed to go on with it goes. */
export async function endSearch(
  manager: EntityManager,
  searchId: string,
  changes: Partial<DimensionSearch>,
): Promise<void> {
  await manager.delete(SearchTries, { searchId });
  const ended = { ...changes, question: null, digest: null, endedAt: new Date() };
  await manager.save(DimensionSearch, { id: searchId, ...ended });
}
