import {
  CROWD_WEAR,
  mixOf,
  type PlaceSituation,
  type Population,
  type StudyShares,
  type Ticked,
} from '@settlewright/anthropometry';
import { type CrowdData, crowdFrom } from '../populations/crowd-data';

/** What people of a study wear; the same for everybody. */
export const STUDY_WEAR = { women: CROWD_WEAR, men: CROWD_WEAR };

/** All that a block is counted from. Frozen when the study begins: drafts and populations may change meanwhile. */
export interface StudyQuestion {
  /** Version of the work, so that all blocks are counted alike. */
  workVersion: string;
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
export function studyCrowd({ crowd, womenShare }: Pick<StudyQuestion, 'crowd' | 'womenShare'>): Population {
  const population = crowdFrom(crowd);
  return womenShare === undefined ? population : mixOf(population, population, womenShare);
}
