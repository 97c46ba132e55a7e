import { mixOf, type PlaceSituation, type StudyShares, type Ticked } from '@settlewright/anthropometry';
import type { Crowd } from '../populations/crowd';
import { type CrowdData, crowdFrom } from '../populations/crowd-data';

/** What people of a study wear; the same for everybody. */
const SHOE_MM = 25;
const CLOTHING = 'light' as const;
export const STUDY_WEAR = {
  women: { shoeMm: SHOE_MM, clothing: CLOTHING },
  men: { shoeMm: SHOE_MM, clothing: CLOTHING },
};

/** All that a block is counted from. Frozen when the study begins: drafts and populations may change meanwhile. */
export interface StudyQuestion {
  crowd: CrowdData;
  /** Share of women, 0 to 1; absent for a population of one sex. */
  womenShare?: number;
  people: number;
  seed: number;
  /** People of each block; the last one holds what is left. */
  blockPeople: number;
  places: PlaceSituation[];
  lensHeightMm?: number;
  ticked: Ticked;
}

/** The result as it is kept. */
export type StudyResult = StudyShares;

export const blocksOf = ({ people, blockPeople }: Pick<StudyQuestion, 'people' | 'blockPeople'>): number =>
  Math.ceil(people / blockPeople);

/** The people, mixed as asked. */
export function studyCrowd({ crowd, womenShare }: Pick<StudyQuestion, 'crowd' | 'womenShare'>): Crowd {
  const { population, ...rest } = crowdFrom(crowd);
  return {
    population: womenShare === undefined ? population : mixOf(population, population, womenShare),
    ...rest,
  };
}
