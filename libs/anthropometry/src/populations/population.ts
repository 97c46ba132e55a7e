import type { MeasureKey } from '../measures/measures.ts';
import type { SurveyGroup } from './survey.ts';

/** Whole people as columns: millimetres, kilograms for weight. */
export interface Draws {
  count: number;
  /** One value per person and known measure; a measure that is not known has no column. */
  columns: Readonly<Partial<Record<MeasureKey, Float32Array>>>;
  /** 1 for a woman, 0 for a man; of children girl and boy. */
  isWoman: Uint8Array;
  bodyDataKnown: boolean;
}

/** How a population came about: counted, made from counts, reckoned from a few sizes, or a workshop's own. */
export type PopulationKind = 'survey' | 'generated' | 'estimated' | 'own';

/** What is told of a population. */
export interface PopulationDetails {
  id: string;
  name: string;
  kind: PopulationKind;
  source: string;
  licence: string;
  cautions: readonly string[];
  /** Measures that were read in the source for every group; the other known ones are estimated. */
  read: ReadonlySet<MeasureKey>;
  /** People of each sex that were measured, where they are known; they widen the range of a share. */
  surveyed?: Partial<Record<SurveyGroup, number>>;
}

/** Writes one person's values; made for certain columns. */
export interface BodyWriter {
  /** Standard normal numbers that one person takes. */
  dimensions: number;
  /**
   * @param normals - as many independent standard normal numbers or more
   * @param row - where to write
   */
  write(normals: Float64Array, row: number): void;
}

/** The people of one sex. */
export interface GroupBodies {
  group: SurveyGroup;
  known: ReadonlySet<MeasureKey>;
  /** Prepares to fill the columns given; all of them of known measures. */
  writer(columns: ReadonlyMap<MeasureKey, Float32Array>): BodyWriter;
}

/** A part of a population; the shares of all parts add to 1. */
export interface PopulationPart {
  share: number;
  bodies: GroupBodies;
}

/** People to draw from. */
export interface Population extends PopulationDetails {
  /** Measures that a draw holds. */
  known: ReadonlySet<MeasureKey>;
  /** Shares add to 1. */
  groups: readonly { group: SurveyGroup; share: number }[];
  parts: readonly PopulationPart[];
  /**
   * Draws whole people, evenly spread.
   *
   * @param count - people, 1 or more
   * @param seed - whole number; another seed gives another sample
   * @param block - which stretch of the whole: block b holds rows b·count up to (b + 1)·count of the whole; 0 unless told
   * @param measures - which columns are wanted; all known ones unless told. The people are the same whatever is asked
   * @returns the same for the same arguments; a wanted measure that is not known has no column
   * @throws RangeError when a number is out of range
   */
  draw(count: number, seed: number, block?: number, measures?: readonly MeasureKey[]): Draws;
}
