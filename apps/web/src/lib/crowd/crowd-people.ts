import {
  builtInPopulations,
  mixOf,
  ownPopulation,
  readSurvey,
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

let shipped: Promise<ReadonlyMap<string, Population>> | undefined;

/** Read when first asked for, and then kept. */
function shippedPopulations(): Promise<ReadonlyMap<string, Population>> {
  shipped ??= Promise.all([
    import('@settlewright/seed-data/populations/ansur2.json'),
    import('@settlewright/seed-data/populations/civilian-2015.json'),
    import('@settlewright/seed-data/populations/nations.json'),
    import('@settlewright/seed-data/populations/children.json'),
  ]).then(
    ([ansur2, civilian, nations, children]) =>
      builtInPopulations({
        ansur2: ansur2.default,
        civilian: civilian.default,
        nations: nations.default,
        children: children.default,
      }),
    (fault: unknown) => {
      shipped = undefined;
      throw fault;
    },
  );
  return shipped;
}

async function populationOf({ populationId, own }: CrowdRequest): Promise<Population> {
  if (own) {
    const { id, name, source, summary } = own;
    return ownPopulation(readSurvey(summary), { id, name, source, licence: 'the workshop’s own' });
  }
  const found = (await shippedPopulations()).get(populationId);
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
