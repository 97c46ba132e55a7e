import type { RuleBook } from '../checks/rule-book.ts';
import type { PlaceSituation } from '../checks/situation.ts';
import type { Draws } from '../populations/population.ts';
import { compilePlace, type CompiledPlace } from './compile.ts';
import { countAll, countEnd, countStudy, countTicked } from './count-study.ts';
import {
  mergePartials,
  type DropEnd,
  type EndCounts,
  type FitTally,
  type Group,
  type PartialStudy,
} from './counts.ts';
import { createCrowd } from './crowd.ts';
import type { GroupStudies, GroupStudy, Ticks } from './demands.ts';
import { placesAtDrop } from './drop-ends.ts';
import { createPeopleSets } from './people-sets.ts';
import { sharesOf, type ShareSetup, type StudyShares } from './shares.ts';
import type { Wear } from './symbols.ts';

/** What counts for "all at once"; everything when absent. */
export interface Ticked {
  ruleIds?: readonly string[];
  placeIds?: readonly string[];
}

/** What a study asks of a set. */
export interface StudySetup extends ShareSetup {
  places: readonly PlaceSituation[];
  ruleBook: RuleBook;
  /** Shoe and clothes of the people. */
  wear: Record<Group, Wear>;
  /** Lens over the floor; left out where no camera is asked about. */
  lensHeightMm?: number;
  ticked?: Ticked;
}

/** What a study counts besides. */
export interface Counting {
  /** Counts again with cushions that go down least and most: three times the work. */
  overDrop?: boolean;
}

/** How many people of a population a set fits. */
export interface Study {
  /**
   * Shares of each rule, of all ticked ones at once, and who is lost.
   *
   * @param counting - as for `partial`
   */
  shares(counting?: Counting): StudyShares;
  /**
   * What this study counted, to be put together by `mergePartials` with the counts of other blocks of people.
   *
   * @param block - number of its block, 0 for a study that is not split
   * @param counting - what is counted besides
   */
  partial(block?: number, counting?: Counting): PartialStudy;
  /** Changes what counts for "all at once". */
  tick(ticked: Ticked): void;
  /** Puts changed places before the same people: only what moved is counted again. */
  move(places: readonly PlaceSituation[]): void;
  /** Counts ticked rules for other places, without moving the study there. */
  countAt(places: readonly PlaceSituation[]): ReturnType<typeof countTicked>;
  /** Counts ticked rules all at once for other places, without moving the study there. */
  countAllAt(places: readonly PlaceSituation[]): FitTally;
}

/**
 * Puts the rules of scope person to many people at every place of a set.
 *
 * @param draws - the people
 * @param setup - places, rules, what people wear and what counts
 * @returns the study
 * @throws Error when a rule decides by best values of a body
 */
export function createStudy(draws: Draws, setup: StudySetup): Study {
  const { wear } = setup;
  const alike = wear.women.shoeMm === wear.men.shoeMm && wear.women.clothing === wear.men.clothing;
  const rows = { women: rowsOf(draws, 1), men: rowsOf(draws, 0) };
  const compiled = new WeakMap<PlaceSituation, Record<Group, CompiledPlace>>();
  const compile = (place: PlaceSituation): Record<Group, CompiledPlace> => {
    let known = compiled.get(place);
    if (!known) {
      const { ruleBook, lensHeightMm } = setup;
      const women = compilePlace(place, wear.women, ruleBook, lensHeightMm);
      known = { women, men: alike ? women : compilePlace(place, wear.men, ruleBook, lensHeightMm) };
      compiled.set(place, known);
    }
    return known;
  };
  const studyOf = (group: Group): GroupStudy => {
    const crowd = createCrowd(draws.columns, rows[group]);
    return { crowd, sets: createPeopleSets(crowd), places: [] };
  };
  const base = { women: studyOf('women'), men: studyOf('men') };
  const at = (places: readonly PlaceSituation[]): GroupStudies => {
    const both = places.map(compile);
    base.women.sets.nextRound();
    base.men.sets.nextRound();
    const women = both.map((place) => place.women);
    return {
      women: { ...base.women, places: women },
      men: { ...base.men, places: alike ? women : both.map((place) => place.men) },
    };
  };
  const expectMoves = (): void => {
    base.women.crowd.sortNeeds();
    base.men.crowd.sortNeeds();
  };

  let { places } = setup;
  let studies = at(places);
  let ticks = ticksOf(setup.ticked);
  const endOf = (end: DropEnd): EndCounts => countEnd(at(placesAtDrop(places, end)), ticks);
  const partial = (block = 0, { overDrop = false }: Counting = {}): PartialStudy => ({
    ...countStudy(studies, ticks, block),
    ...(overDrop &&
      places.some(({ foam }) => foam) && { overDrop: { least: endOf('least'), most: endOf('most') } }),
  });
  return {
    partial,
    shares: (counting) => sharesOf(mergePartials([partial(0, counting)]), setup),
    tick(ticked) {
      ticks = ticksOf(ticked);
    },
    move(moved) {
      expectMoves();
      places = moved;
      studies = at(places);
    },
    countAt(tried) {
      expectMoves();
      return countTicked(at(tried), ticks);
    },
    countAllAt(tried) {
      expectMoves();
      return countAll(at(tried), ticks);
    },
  };
}

function ticksOf({ ruleIds, placeIds }: Ticked = {}): Ticks {
  return {
    rule: (id) => !ruleIds || ruleIds.includes(id),
    place: (id) => !placeIds || placeIds.includes(id),
  };
}

function rowsOf({ count, isWoman }: Draws, asked: 0 | 1): Uint32Array {
  const rows = new Uint32Array(count);
  let people = 0;
  for (let row = 0; row < count; row += 1) {
    rows[people] = row;
    if (isWoman[row] === asked) people += 1;
  }
  return rows.subarray(0, people);
}
