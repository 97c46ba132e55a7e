import type { WholeSummary } from '@settlewright/anthropometry';
import type { EntityManager } from 'typeorm';
import type { KeptRow } from '../common/kept-text';
import { OwnPopulation } from './entities/own-population.entity';

/** Name and source of a population are read from every study, so they stand in more places than one. */
export interface PopulationWords {
  name: string;
  source: string;
}

/** What people typed about the populations of a workshop. Kept rows hold only the columns of measures. */
export async function* populationTexts(manager: EntityManager, workshopId: string): AsyncGenerator<KeptRow> {
  const ids = await manager.find(OwnPopulation, {
    where: { workshopId },
    select: { id: true },
    order: { name: 'ASC', id: 'ASC' },
  });
  // One by one, as summaries are large.
  for (const { id } of ids) {
    const population = await manager.findOneBy(OwnPopulation, { id });
    if (!population) continue;
    yield {
      texts: [
        { where: 'Population, its name', text: population.name },
        { where: 'Population, its source', text: population.source },
      ],
      rewrite: (change) =>
        manager.update(
          OwnPopulation,
          { id },
          { ...changedWords(population, change), summary: changedSummary(population.summary, change) },
        ),
    };
  }
}

export function changedWords(
  { name, source }: PopulationWords,
  change: (text: string) => string,
): PopulationWords {
  return { name: change(name), source: change(source) };
}

/** The summary says its source too. */
export function changedSummary(summary: WholeSummary, change: (text: string) => string): WholeSummary {
  return { ...summary, about: { ...summary.about, source: change(summary.about.source) } };
}
