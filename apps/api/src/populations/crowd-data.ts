import { ownPopulation, readSurvey, type Population, type WholeSummary } from '@settlewright/anthropometry';
import { builtInPopulation } from './built-in';

/** All it takes to make a crowd again elsewhere, whatever becomes of the population meanwhile. */
export type CrowdData =
  | { kind: 'built-in'; id: string }
  | { kind: 'own'; id: string; name: string; source: string; summary: WholeSummary };

export function crowdFrom(data: CrowdData): Population {
  if (data.kind === 'built-in') {
    const population = builtInPopulation(data.id);
    if (!population) throw new Error(`no population ${data.id} comes with this version`);
    return population;
  }
  const { id, name, source, summary } = data;
  return ownPopulation(readSurvey(summary), { id, name, source, licence: 'the workshop’s own' });
}
