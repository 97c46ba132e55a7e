import type { Population, Tally } from '@settlewright/anthropometry';

/** People to draw from, and how many of each sex were measured where that is known. */
export interface Crowd {
  population: Population;
  surveyed?: Partial<Tally>;
}
