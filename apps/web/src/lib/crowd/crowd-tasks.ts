import type { PlaceSituation, StudyShares, Ticked } from '@settlewright/anthropometry';
import type { CrowdRequest } from './crowd-people.ts';

interface Asked {
  crowd: CrowdRequest;
  /** People to draw. */
  count: number;
  /** What counts for "all at once"; everything when absent. */
  ticked?: Ticked;
  lensHeightMm?: number;
}

/** What can be asked of a crowd; every task has one answer. */
export interface CrowdTasks {
  /** Shares of a set as it stands. */
  shares: { asked: Asked & { places: PlaceSituation[] }; answer: StudyShares & { told: CrowdTold } };
  /** Shares along one dimension. */
  curve: { asked: Asked & { values: number[]; placesAt: PlaceSituation[][] }; answer: ShareCurve };
  /** Shares over two dimensions, row by row of the second. */
  map: {
    asked: Asked & { across: number[]; up: number[]; placesAt: PlaceSituation[][][] };
    answer: ShareMap;
  };
}

/** What is told of the people behind an answer. */
export interface CrowdTold {
  name: string;
  source: string;
  cautions: string[];
}

/** A share of all ticked rules at once, 0 to 1; absent where a measure that is read is not known of the people. */
export interface CurveShare {
  value: number;
  fits?: number;
  atLeastTight?: number;
}

export interface ShareCurve {
  points: CurveShare[];
  told: CrowdTold;
}

export interface ShareMap {
  across: number[];
  up: number[];
  /** `up.length` rows of `across.length` shares; null where not known. */
  fits: (number | null)[][];
  told: CrowdTold;
}

export type CrowdTask = keyof CrowdTasks;
