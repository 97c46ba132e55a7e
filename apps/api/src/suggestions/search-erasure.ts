import type { EntityManager } from 'typeorm';
import type { KeptRow } from '../common/kept-text';
import { UNFINISHED } from '../jobs/job-states';
import { changedWords } from '../populations/population-texts';
import { DimensionSearch } from './entities/dimension-search.entity';
import type { Found, KeptTried } from './search-question';
import { endSearch } from './search-rows';

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
    const isServed = served.some((one) => one.id === castId);
    const emptied = found && isServed ? { found: without(found, castId) } : undefined;
    if (UNFINISHED.includes(state)) {
      await endSearch(manager, id, { ...emptied, state: 'failed', fault: ERASED });
    } else if (emptied) await manager.save(DimensionSearch, { id, ...emptied });
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
