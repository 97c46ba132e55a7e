import {
  childrenOfMark,
  civilians2015,
  mixOf,
  nationalPopulations,
  ownPopulation,
  readChildren,
  readSurvey,
  soldiers2012,
  type Population,
} from '@settlewright/anthropometry';
import type { CrowdChoice } from './crowds.ts';

/** A workshop's own survey as the server keeps it. */
export interface OwnCrowd {
  id: string;
  name: string;
  source: string;
  summary: unknown;
}

/** Whom a question is put to. */
export interface CrowdRequest extends CrowdChoice {
  /** Where the population is a workshop's own. */
  own?: OwnCrowd;
}

async function readSurveyOfSoldiers() {
  const summary = await import('@settlewright/seed-data/populations/ansur2.json');
  return readSurvey(summary.default);
}

async function populationOf({ populationId, own }: CrowdRequest): Promise<Population> {
  if (own) {
    const { id, name, source, summary } = own;
    return ownPopulation(readSurvey(summary), { id, name, source, licence: 'the workshop’s own' });
  }
  if (populationId === 'us-civilians-2015') {
    const file = await import('@settlewright/seed-data/populations/civilian-2015.json');
    return civilians2015(file.default);
  }
  const mark = /^children-(\d)$/.exec(populationId)?.[1];
  if (mark) {
    const file = await import('@settlewright/seed-data/populations/children.json');
    return childrenOfMark(readChildren(file.default), Number(mark));
  }
  const survey = await readSurveyOfSoldiers();
  if (populationId === 'us-soldiers-2012') return soldiers2012(survey);
  const file = await import('@settlewright/seed-data/populations/nations.json');
  const found = nationalPopulations(file.default, survey).find(({ id }) => id === populationId);
  if (!found) throw new Error(`There is no population “${populationId}”.`);
  return found;
}

/**
 * The people a request asks for, mixed as it says. A population of one sex stays that, whatever the mix.
 *
 * @throws Error when there is no such population, or its statistics do not hold together
 */
export async function peopleOf(request: CrowdRequest): Promise<Population> {
  const population = await populationOf(request);
  return population.groups.length < 2 ? population : mixOf(population, population, request.women / 100);
}
