import type { ServerStudy } from '@/lib/contract.ts';
import { CROWDS, crowdWords } from '@/lib/crowd/crowds.ts';

/** "US adults 2015–16, men and women equally": the people of a count, called as in the list of populations. */
export function studyPeople({ population: { id, name, kind }, womenPercent }: ServerStudy): string {
  if (womenPercent === undefined) return CROWDS.find((one) => one.id === id)?.words ?? name;
  const own = { id, words: name, kind };
  return crowdWords({ populationId: id, women: womenPercent }, [...CROWDS, own]);
}
