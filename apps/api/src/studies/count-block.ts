import {
  createStudy,
  type Draws,
  mergePartials,
  type PartialStudy,
  type RuleBook,
  sharesOf,
} from '@settlewright/anthropometry';
import type { Crowd } from '../populations/crowd';
import { STUDY_WEAR, type StudyQuestion, type StudyResult } from './study-question';

/**
 * Counts one block of a study. Whoever counts it gets the same numbers: the people of a block are settled by the seed
 * and the number of the block.
 */
export function countBlock(
  question: StudyQuestion,
  { population }: Crowd,
  ruleBook: RuleBook,
  block: number,
): PartialStudy {
  const { people, blockPeople, seed, places, lensHeightMm, ticked } = question;
  const drawn = population.draw(blockPeople, seed, block);
  const draws = firstOf(drawn, Math.min(blockPeople, people - block * blockPeople));
  const setup = { places, ruleBook, wear: STUDY_WEAR, ticked };
  return createStudy(draws, { ...setup, ...(lensHeightMm === undefined ? {} : { lensHeightMm }) }).partial(
    block,
  );
}

/** Shares of the whole study from the counts of all its blocks. */
export const resultOf = (
  partials: readonly PartialStudy[],
  { surveyed }: Pick<Crowd, 'surveyed'>,
): StudyResult => sharesOf(mergePartials(partials), surveyed ? { surveyed } : {});

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
