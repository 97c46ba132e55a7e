import {
  createStudy,
  type Draws,
  mergePartials,
  type PartialStudy,
  type PlaceSituation,
  type Population,
  type RuleBook,
  sharesOf,
  standInPlaces,
  type Ticked,
} from '@settlewright/anthropometry';
import { STUDY_WEAR, type StudyQuestion, type StudyResult } from './study-question';

/**
 * Counts one block of a study. Whoever counts it gets the same numbers: the people of a block are settled by the seed
 * and the number of the block. Of places that are alike one is counted.
 */
export function countBlock(
  question: StudyQuestion,
  population: Population,
  ruleBook: RuleBook,
  block: number,
): PartialStudy {
  const { people, blockPeople, seed, places, lensHeightMm, ticked } = question;
  const drawn = population.draw(blockPeople, seed, block);
  const draws = firstOf(drawn, Math.min(blockPeople, people - block * blockPeople));
  const standIns = standInPlaces(places);
  const setup = {
    places: [...new Set(standIns.values())],
    ruleBook,
    wear: STUDY_WEAR,
    ticked: tickedStandIns(ticked, standIns),
  };
  const study = createStudy(draws, { ...setup, ...(lensHeightMm === undefined ? {} : { lensHeightMm }) });
  return study.partial(block, { overDrop: true });
}

/** Shares of the whole study from the counts of all its blocks; every place has those of the one counted for it. */
export function resultOf(
  partials: readonly PartialStudy[],
  { places, ticked: { placeIds } }: Pick<StudyQuestion, 'places' | 'ticked'>,
  { surveyed = {} }: Population,
): StudyResult {
  const result = sharesOf(mergePartials(partials), { surveyed });
  const pairs = [...standInPlaces(places)].map(([placeId, standIn]) => ({ placeId, of: standIn.placeId }));
  const told = <One extends { placeId: string }>(
    ones: readonly One[],
    { placeId, of }: (typeof pairs)[number],
  ) => ones.filter((one) => one.placeId === of).map((one) => ({ ...one, placeId }));
  return {
    ...result,
    cells: pairs.flatMap((pair) => told(result.cells, pair)),
    places: pairs
      .filter(({ placeId }) => !placeIds || placeIds.includes(placeId))
      .flatMap((pair) => told(result.places, pair)),
  };
}

function tickedStandIns(ticked: Ticked, standIns: ReadonlyMap<string, PlaceSituation>): Ticked {
  const { placeIds } = ticked;
  if (!placeIds) return ticked;
  return { ...ticked, placeIds: placeIds.flatMap((id) => standIns.get(id)?.placeId ?? []) };
}

/** The last block is drawn whole, since where a block begins follows from its length. */
function firstOf(draws: Draws, count: number): Draws {
  if (count === draws.count) return draws;
  const columns = Object.entries(draws.columns).map(([key, column]) => [key, column.subarray(0, count)]);
  return {
    ...draws,
    count,
    columns: Object.fromEntries(columns) as Draws['columns'],
    isWoman: draws.isWoman.subarray(0, count),
  };
}
