import { ownPopulation, readSurvey, type WholeSummary } from '@settlewright/anthropometry';
import { builtInCrowd } from './built-in';
import type { Crowd } from './crowd';

/** All it takes to make a crowd again elsewhere, whatever becomes of the population meanwhile. */
export type CrowdData =
  | { kind: 'built-in'; id: string }
  | { kind: 'own'; id: string; name: string; source: string; summary: WholeSummary };

export function crowdFrom(data: CrowdData): Crowd {
  if (data.kind === 'built-in') {
    const crowd = builtInCrowd(data.id);
    if (!crowd) throw new Error(`no population ${data.id} comes with this version`);
    return crowd;
  }
  const { id, name, source, summary } = data;
  return {
    population: ownPopulation(readSurvey(summary), { id, name, source, licence: 'the workshop’s own' }),
    surveyed: { women: summary.log.women.n, men: summary.log.men.n },
  };
}
