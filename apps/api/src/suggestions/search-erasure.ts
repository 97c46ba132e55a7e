import type { EntityManager } from 'typeorm';
import type { KeptRow } from '../common/kept-text';
import { UNFINISHED } from '../jobs/job-states';
import { changedWords } from '../populations/population-texts';
import { DimensionSearch } from './entities/dimension-search.entity';
import { SearchTries } from './entities/search-tries.entity';
import type { Found, KeptTried } from './search-question';

const ERASED = 'Somebody was erased from the workshop meanwhile: begin it again.';

/**
 * Part of the caller's transaction, which erases a person: searches of the workshop that are not done hold bodies and
 * documents and are ended; what others found loses the numbers that tell of the person, and keeps the rest.
 */
export async function removeFromSearches(
  manager: EntityManager,
  workshopId: string,
  castId: string,
): Promise<void> {
  const searches = await manager
    .createQueryBuilder(DimensionSearch, 'search')
    .select(['search.id', 'search.state', 'search.served', 'search.found'])
    .innerJoin('search.set', 'set')
    .innerJoin('set.production', 'production')
    .where('production.workshopId = :workshopId', { workshopId })
    .setLock('pessimistic_write', undefined, ['search'])
    .getMany();
  for (const { id, state, served, found } of searches) {
    const changes: Partial<DimensionSearch> = {};
    if (found && served.some((one) => one.id === castId)) changes.found = without(found, castId);
    if (UNFINISHED.includes(state)) {
      const ended = { state: 'failed', fault: ERASED, question: null, digest: null } as const;
      Object.assign(changes, ended, { endedAt: new Date() });
      await manager.delete(SearchTries, { searchId: id });
    }
    if (Object.keys(changes).length > 0) await manager.save(DimensionSearch, { id, ...changes });
  }
}

/** The words of own populations as the searches of a workshop keep them. */
export async function* searchTexts(manager: EntityManager, workshopId: string): AsyncGenerator<KeptRow> {
  const searches = await manager.find(DimensionSearch, {
    where: { set: { production: { workshopId } } },
    select: { id: true, population: true },
    order: { startedAt: 'ASC', id: 'ASC' },
  });
  for (const { id, population } of searches) {
    if (population?.kind !== 'own') continue;
    yield {
      texts: [
        { where: 'Search for dimensions, name of its population', text: population.name },
        { where: 'Search for dimensions, source of its population', text: population.source },
      ],
      rewrite: (change) =>
        manager.update(
          DimensionSearch,
          { id },
          { population: { ...population, ...changedWords(population, change) } },
        ),
    };
  }
}

function without({ present, answers, ...found }: Found, castId: string): Found {
  return {
    ...found,
    ...(present ? { present: emptied(present, castId) } : {}),
    answers: answers.map((answer) => ({ ...answer, tried: emptied(answer.tried, castId) })),
  };
}

function emptied(tried: KeptTried, castId: string): KeptTried {
  const misses = tried.misses.map(({ byMm, ...miss }) =>
    miss.sitterId === castId || byMm === undefined ? miss : { ...miss, byMm },
  );
  return { ...tried, misses };
}
