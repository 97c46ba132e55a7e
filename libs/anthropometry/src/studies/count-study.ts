import type { MeasureKey } from '../measures/measures.ts';
import type { CompiledCheck, Demand } from './compile.ts';
import {
  GROUPS,
  tallyOf,
  type CellCount,
  type CheckCount,
  type EndCounts,
  type FitTally,
  type Group,
  type PartialStudy,
} from './counts.ts';
import {
  bothSexes,
  byRule,
  demandOf,
  joined,
  silenceOf,
  type Demands,
  type GroupStudies,
  type GroupStudy,
  type Ticks,
} from './demands.ts';
import type { PeopleSet } from './people-sets.ts';
import { questionOf } from './question-of.ts';

/** A rule at all ticked places. */
interface Everywhere extends FitTally {
  ruleId: string;
  demands: Demands;
  reads: readonly MeasureKey[];
  twoSided: boolean;
}

const NOBODY_COUNTED = { fits: { women: 0, men: 0 }, atLeastTight: { women: 0, men: 0 } } as const;
const silence = (reason: string): FitTally => ({ ...NOBODY_COUNTED, unknown: false, silent: reason });

/** Who is lost is told by these, and by the first measures that the rule itself reads. */
const TELLING: readonly MeasureKey[] = ['stature', 'weight_kg'];
const OWN_MEASURES = 2;

/** Counts ticked rules at all ticked places together; silent where none of them speaks. */
export function countAll(studies: GroupStudies, ticks: Ticks): FitTally {
  const demands = joined(studies, ticks);
  return demands ? counted(studies, demands) : silence(silenceOf(studies.women, ticks));
}

/**
 * Counts of one set without the people behind them: what a curve needs.
 *
 * @param studies - people and questions by sex
 * @param ticks - what counts
 * @returns ticked rules at all ticked places, one by one and together
 */
export function countTicked(
  studies: GroupStudies,
  ticks: Ticks,
): { all: FitTally; checks: (FitTally & { ruleId: string })[] } {
  return {
    all: countAll(studies, ticks),
    checks: everywhere(studies, ticks).map(({ ruleId, fits, atLeastTight, unknown }) => ({
      ruleId,
      fits,
      atLeastTight,
      unknown,
    })),
  };
}

/**
 * Counts everything that shares are made from.
 *
 * @param studies - people and questions by sex
 * @param ticks - what counts for "all at once"
 * @param block - number of the block of people
 */
export function countStudy(studies: GroupStudies, ticks: Ticks, block: number): PartialStudy {
  const checks = everywhere(studies, ticks);
  const told = new Set([...TELLING, ...checks.flatMap(({ reads }) => reads)]);
  const known = [...told].filter((key) =>
    GROUPS.every((group) => studies[group].crowd.people === 0 || studies[group].crowd.measure(key)),
  );
  return {
    blocks: [block],
    question: questionOf(studies, checks),
    people: tallyOf((group) => studies[group].crowd.people),
    cells: cellsOf(studies),
    places: placesOf(studies, ticks),
    checks: checks.map((check, at) => checkCount(studies, check, checks.slice(at + 1), known)),
    all: countAll(studies, ticks),
    everyone: Object.fromEntries(
      known.map((key) => [
        key,
        {
          sum: tallyOf((group) => studies[group].sets.sums(key).sum),
          squares: tallyOf((group) => studies[group].sets.sums(key).squares),
        },
      ]),
    ),
  };
}

/**
 * Counts with cushions at one end of how far they may go down.
 *
 * @param studies - people and questions by sex, the cushions at that end
 * @param ticks - what counts
 */
export const countEnd = (studies: GroupStudies, ticks: Ticks): EndCounts => ({
  ...countTicked(studies, ticks),
  places: placesOf(studies, ticks),
});

function placesOf(studies: GroupStudies, ticks: Ticks): PartialStudy['places'] {
  const placeIds = studies.women.places.map(({ placeId }) => placeId).filter(ticks.place);
  return placeIds.map((placeId) => ({
    placeId,
    ...countAll(studies, { ...ticks, place: (id) => id === placeId }),
  }));
}

function cellsOf(studies: GroupStudies): CellCount[] {
  const { women, men } = studies;
  return women.places.flatMap(({ placeId, checks }, place) =>
    checks.map((check, at) => ({
      placeId,
      ruleId: check.ruleId,
      ...(check.silent === undefined
        ? counted(studies, { women: check, men: men.places[place]?.checks[at] as CompiledCheck })
        : silence(check.silent)),
    })),
  );
}

function everywhere(studies: GroupStudies, ticks: Ticks): Everywhere[] {
  const asked = { women: byRule(studies.women, ticks), men: byRule(studies.men, ticks) };
  return [...asked.women].map(([ruleId, checks]) => {
    const demands = bothSexes(studies, (group) => demandOf(asked[group].get(ruleId) ?? []));
    const reads = new Set(checks.flatMap((check) => check.reads));
    return {
      ruleId,
      demands,
      reads: [...reads].filter((key) => !TELLING.includes(key)).slice(0, OWN_MEASURES),
      twoSided: checks.some((check) => check.twoSided),
      ...counted(studies, demands),
    };
  });
}

function counted(studies: GroupStudies, demands: Demands): FitTally {
  const isKnown = GROUPS.every((group) =>
    [demands[group].fits, demands[group].atLeastTight].every((demand) => known(studies[group], demand)),
  );
  if (!isKnown) return { ...NOBODY_COUNTED, unknown: true };
  const count = (name: 'fits' | 'atLeastTight') =>
    tallyOf((group) => studies[group].sets.countMeeting(demands[group][name]));
  return { fits: count('fits'), atLeastTight: count('atLeastTight'), unknown: false };
}

const known = ({ crowd }: GroupStudy, { windows, either }: Demand): boolean =>
  crowd.people === 0 ||
  ([...windows.values()].every(({ need }) => crowd.isKnown(need)) &&
    either.every(({ pair }) => pair.every(({ need }) => crowd.isKnown(need))));

function checkCount(
  studies: GroupStudies,
  { ruleId, demands, reads, twoSided, fits, atLeastTight, unknown }: Everywhere,
  later: readonly Everywhere[],
  knownKeys: readonly MeasureKey[],
): CheckCount {
  const setOf = (group: Group, of: Demands): PeopleSet => studies[group].sets.meeting(of[group].fits);
  const told = unknown ? [] : knownKeys.filter((key) => TELLING.includes(key) || reads.includes(key));
  const others = unknown ? [] : later.filter((other) => !other.unknown);
  return {
    ruleId,
    twoSided,
    fits,
    atLeastTight,
    unknown,
    fitsWith: Object.fromEntries(
      others.map((other) => [
        other.ruleId,
        tallyOf((group) =>
          studies[group].sets.countOfBoth(setOf(group, demands), setOf(group, other.demands)),
        ),
      ]),
    ),
    sums: Object.fromEntries(
      told.map((key) => [key, tallyOf((group) => studies[group].sets.sum(setOf(group, demands), key))]),
    ),
  };
}
