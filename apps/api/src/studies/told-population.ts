import type { PopulationKind } from '@settlewright/anthropometry';
import { type CrowdData, crowdFrom } from '../populations/crowd-data';

/** What is told of the people, whatever becomes of the population later. */
export interface ToldPopulation {
  id: string;
  name: string;
  kind: PopulationKind;
  source: string;
  licence: string;
  cautions: string[];
}

export function toldPopulation(crowd: CrowdData): ToldPopulation {
  const { name, kind, source, licence, cautions } = crowdFrom(crowd);
  return { id: crowd.id, name, kind, source, licence, cautions: [...cautions] };
}
