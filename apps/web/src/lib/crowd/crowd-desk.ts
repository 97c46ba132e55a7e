import {
  createStudy,
  curveOf,
  loadRuleBook,
  mapOf,
  type Draws,
  type FitTally,
  type PlaceSituation,
  type Population,
  type RuleBook,
  type Study,
  type Tally,
} from '@settlewright/anthropometry';
import { peopleOf, type CrowdRequest } from './crowd-people.ts';
import type { CrowdTask, CrowdTasks, CrowdTold } from './crowd-tasks.ts';
import { CROWD_WEAR } from './crowds.ts';

/** The same people each time a page is opened. */
const SEED = 1;

/** Answers what is asked of crowds; it keeps the people it drew, and the last study of them. */
export interface CrowdDesk {
  answer<Task extends CrowdTask>(
    task: Task,
    asked: CrowdTasks[Task]['asked'],
  ): Promise<CrowdTasks[Task]['answer']>;
}

interface Drawn {
  population: Population;
  draws: Draws;
}

export function createCrowdDesk(): CrowdDesk {
  const drawn = new Map<string, Promise<Drawn>>();
  let ruleBook: Promise<RuleBook> | undefined;
  let last: { key: string; study: Study } | undefined;

  function draw(crowd: CrowdRequest, count: number): Promise<Drawn> {
    const key = `${crowd.own?.id ?? crowd.populationId} ${crowd.women} ${count}`;
    const known = drawn.get(key);
    if (known) return known;
    // One crowd at a time: twenty thousand people take a few megabytes.
    drawn.clear();
    last = undefined;
    const made = peopleOf(crowd).then((population) => ({ population, draws: population.draw(count, SEED) }));
    drawn.set(key, made);
    return made;
  }

  function rules(): Promise<RuleBook> {
    ruleBook ??= import('@settlewright/seed-data/fit-rules.json').then((file) => loadRuleBook(file.default));
    return ruleBook;
  }

  async function studyOf(
    asked: Omit<CrowdTasks['shares']['asked'], 'places'>,
    places: PlaceSituation[],
  ): Promise<Drawn & { study: Study }> {
    const { crowd, count, ticked, lensHeightMm } = asked;
    const [people, book] = await Promise.all([draw(crowd, count), rules()]);
    const key = `${people.population.id} ${count} ${lensHeightMm ?? ''}`;
    if (last?.key !== key) {
      const wear = { women: CROWD_WEAR, men: CROWD_WEAR };
      const { surveyed = {} } = people.population;
      const setup = {
        places,
        ruleBook: book,
        wear,
        surveyed,
        ...(lensHeightMm === undefined ? {} : { lensHeightMm }),
      };
      last = { key, study: createStudy(people.draws, setup) };
    } else last.study.move(places);
    last.study.tick(ticked ?? {});
    return { ...people, study: last.study };
  }

  const tasks: {
    [Task in CrowdTask]: (asked: CrowdTasks[Task]['asked']) => Promise<CrowdTasks[Task]['answer']>;
  } = {
    async shares({ places, ...asked }) {
      const { study, population } = await studyOf(asked, places);
      return { ...study.shares({ overDrop: true }), told: toldOf(population) };
    },
    async curve({ values, placesAt, ...asked }) {
      const { study, population, draws } = await studyOf(asked, placesAt[0] ?? []);
      const at = new Map(values.map((value, i) => [value, placesAt[i] ?? []]));
      const points = curveOf(study, values, (value) => at.get(value) ?? []);
      return {
        points: points.map(({ value, all }) => ({ value, ...shareOf(all, draws.count) })),
        told: toldOf(population),
      };
    },
    async map({ across, up, placesAt, ...asked }) {
      const { study, population, draws } = await studyOf(asked, placesAt[0]?.[0] ?? []);
      const counted = mapOf(
        study,
        across,
        up,
        (first, second) => placesAt[up.indexOf(second)]?.[across.indexOf(first)] ?? [],
      );
      return {
        across,
        up,
        fits: counted.all.map((row) => row.map((tally) => shareOf(tally, draws.count).fits ?? null)),
        told: toldOf(population),
      };
    },
  };
  return { answer: (task, asked) => tasks[task](asked) };
}

const toldOf = ({ name, source, cautions }: Population): CrowdTold => ({
  name,
  source,
  cautions: [...cautions],
});

const sum = ({ women, men }: Tally): number => women + men;

function shareOf(
  { fits, atLeastTight, unknown, silent }: FitTally,
  people: number,
): { fits?: number; atLeastTight?: number } {
  return unknown || silent !== undefined
    ? {}
    : { fits: sum(fits) / people, atLeastTight: sum(atLeastTight) / people };
}
