import { MEASURE_KEYS } from '../measures/measures.ts';
import { drawPeople } from './draws.ts';
import type { Population, PopulationDetails, PopulationKind, PopulationPart } from './population.ts';
import type { SurveyGroup } from './survey.ts';

const WHOLE = 1e-9;

/**
 * Makes a population of parts.
 *
 * @param details - what is told of it
 * @param parts - shares above 0 that add to 1
 * @returns the population; it knows what every part knows
 * @throws RangeError when the shares do not add to 1
 */
export function populationOf(details: PopulationDetails, parts: readonly PopulationPart[]): Population {
  const sum = parts.reduce((total, { share }) => total + share, 0);
  if (Math.abs(sum - 1) > WHOLE || parts.some(({ share }) => !(share > 0))) {
    throw new RangeError(
      `shares are ${parts.map(({ share }) => share).join(', ')}; accepted: numbers above 0 that add to 1`,
    );
  }
  const known = new Set(MEASURE_KEYS.filter((key) => parts.every(({ bodies }) => bodies.known.has(key))));
  const groups = (['women', 'men'] as const)
    .map((group) => ({ group, share: shareOf(parts, group) }))
    .filter(({ share }) => share > 0);
  return {
    ...details,
    known,
    groups,
    parts,
    draw: (count, seed, block, measures) => drawPeople(parts, known, count, seed, block, measures),
  };
}

/** A population and its share of a mix. */
export interface MixPart {
  population: Population;
  share: number;
}

/**
 * Mixes populations into one crowd.
 *
 * @param parts - populations with shares of 0 or more that add to 1; those of 0 are left out
 * @returns the mix; a measure counts as read when every part read it
 * @throws RangeError when the shares do not add to 1
 */
export function mixPopulations(parts: readonly MixPart[]): Population {
  const taken = parts.filter(({ share }) => share !== 0);
  const populations = taken.map(({ population }) => population);
  const [first] = populations;
  if (first && populations.length === 1 && taken[0]?.share === 1) return first;
  const each = <T>(of: (population: Population) => T): T[] => [...new Set(populations.map(of))];
  return populationOf(
    {
      id: taken.map(({ population, share }) => `${population.id}:${Number(share.toFixed(6))}`).join('+'),
      name: taken.map(({ population, share }) => `${population.name} ${percent(share)}`).join(', '),
      kind: worstKind(populations),
      source: each(({ source }) => source).join('; '),
      licence: each(({ licence }) => licence).join('; '),
      cautions: [...new Set(populations.flatMap(({ cautions }) => cautions))],
      read: new Set(MEASURE_KEYS.filter((key) => populations.every(({ read }) => read.has(key)))),
      surveyed: surveyedOf(taken),
    },
    taken.flatMap(({ population, share }) =>
      population.parts.map((part) => ({ ...part, share: part.share * share })),
    ),
  );
}

/**
 * A crowd of women of one population and men of the same or another.
 *
 * @param women - only its women are taken
 * @param men - only its men are taken
 * @param share - of women, 0 to 1
 * @returns the mix
 * @throws RangeError when a population has nobody of that sex
 */
export function mixOf(women: Population, men: Population, share: number): Population {
  if (!(share >= 0 && share <= 1)) throw new RangeError(`share is ${share}; accepted: 0 to 1`);
  return mixPopulations([
    ...(share > 0 ? [{ population: onlyOf(women, 'women'), share }] : []),
    ...(share < 1 ? [{ population: onlyOf(men, 'men'), share: 1 - share }] : []),
  ]);
}

/**
 * The people of one sex of a population.
 *
 * @throws RangeError when there are none
 */
export function onlyOf(population: Population, group: SurveyGroup): Population {
  const whole = shareOf(population.parts, group);
  if (whole === 0)
    throw new RangeError(`${population.name} has no ${group}; accepted: a population that has`);
  const parts = population.parts.filter(({ bodies }) => bodies.group === group);
  const people = population.surveyed?.[group];
  return populationOf(
    {
      ...population,
      id: `${population.id}-${group}`,
      name: `${population.name}, ${group}`,
      ...(people === undefined ? {} : { surveyed: { [group]: people } }),
    },
    parts.map((part) => ({ ...part, share: part.share / whole })),
  );
}

const shareOf = (parts: readonly PopulationPart[], group: SurveyGroup): number =>
  parts.reduce((sum, { share, bodies }) => sum + (bodies.group === group ? share : 0), 0);

const percent = (share: number): string => `${Number((100 * share).toFixed(1))} %`;

/**
 * People of each sex who count as measured, where every part tells its number: of parts with the weights w and n people
 * as many as give a share the same variance, 1 / sum of w² / n.
 */
function surveyedOf(taken: readonly MixPart[]): Partial<Record<SurveyGroup, number>> {
  const counts = (['women', 'men'] as const).map((group) => {
    const own = taken
      .map(({ population, share }) => ({
        weight: share * shareOf(population.parts, group),
        people: population.surveyed?.[group] ?? Infinity,
      }))
      .filter(({ weight }) => weight > 0);
    const whole = own.reduce((sum, { weight }) => sum + weight, 0);
    const variance = own.reduce((sum, { weight, people }) => sum + (weight / whole) ** 2 / people, 0);
    return [group, own.every(({ people }) => people < Infinity) ? 1 / variance : Infinity] as const;
  });
  return Object.fromEntries(counts.filter(([, people]) => people < Infinity));
}

/** What a mix rests on is what its weakest part rests on. */
const WORST_FIRST: readonly PopulationKind[] = ['estimated', 'generated', 'own', 'survey'];
const worstKind = (populations: readonly Population[]): PopulationKind =>
  WORST_FIRST.find((kind) => populations.some((population) => population.kind === kind)) ?? 'survey';
