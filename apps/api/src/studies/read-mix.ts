import type { ProblemField } from '../common/problem';
import { type CrowdData, crowdFrom } from '../populations/crowd-data';
import type { StudyQuestion } from './study-question';

const WHOLE = 100;
const EVENLY = 50;

type Mix = Pick<StudyQuestion, 'womenShare'>;
type AskedPercent = number | null | undefined;

/** How women and men are mixed, evenly where nothing is asked, or why they are not: a population of one sex stays so. */
export function readMix(crowd: CrowdData, asked: AskedPercent): { mix: Mix; faults: ProblemField[] } {
  const [only, other] = crowdFrom(crowd).groups.map(({ group }) => group);
  if (other !== undefined) return { mix: { womenShare: (asked ?? EVENLY) / WHOLE }, faults: [] };
  const accepted = only === 'women' ? WHOLE : 0;
  if ((asked ?? accepted) === accepted) return { mix: {}, faults: [] };
  const message = `read ${asked}; the population holds ${only} only; accepted: ${accepted}, or leave it out`;
  return { mix: {}, faults: [{ path: 'womenPercent', code: 'one-sex', message }] };
}

/** Women of 100 people as they were asked for; null for a population of one sex. */
export const womenPercentOf = ({ womenShare }: Mix, asked: AskedPercent): number | null =>
  womenShare === undefined ? null : (asked ?? womenShare * WHOLE);
