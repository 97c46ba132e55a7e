import type { MeasureKey } from '../measures/measures.ts';

/** Which survey group describes a person when nothing better is known. */
export type BodyData = 'women' | 'men' | 'mixed';

/** Clothing worn while seated; the allowance in millimetres is rule data. */
export type Clothing = 'light' | 'medium' | 'heavy';

/**
 * What is known of one person. Everything else is predicted from it.
 *
 * Lengths in millimetres, weight in kilograms. A measured value wins over a prediction.
 */
export interface KnownPerson {
  bodyData: BodyData;
  stature?: { mm: number; source: 'measured' | 'told' };
  weightKg?: number;
  /** Years; moves a few measures of a person of known stature and weight, where the survey says by how much. */
  age?: number;
  /** Values taken with a tape. */
  measured: Partial<Record<MeasureKey, number>>;
  /** Height the shoe adds under the heel. */
  shoeMm: number;
  clothing: Clothing;
  /**
   * A percentile mannequin: the conditional mean is taken for every measure and no range is shown.
   * Absent for a living person.
   */
  exact?: true;
  /** A child by size mark: besides height, weight and lower leg everything is borrowed of grown-ups, to draw with. */
  child?: true;
}

/** A percentile mannequin as the set document names it: "woman, 5th in stature". */
export interface PercentileMannequin {
  bodyData: 'women' | 'men';
  measure: MeasureKey;
  /** Strictly between 0 and 100. */
  percentile: number;
}

/** One component of an estimate; `sd` is 0 for a measured value. */
export interface EstimateComponent {
  weight: number;
  mean: number;
  sd: number;
  /** Third standardised moment: above 0 where large values reach further than small ones. */
  skew: number;
}

/**
 * What is believed of a linear combination of a person's measures: a mixture of
 * shifted lognormals (one component when the sex is known, two when it is not).
 */
export interface Estimate {
  components: EstimateComponent[];
  /** True when every measure that enters was measured with a tape (or the person is `exact`). */
  measured: boolean;
}

/** A linear combination of body measures plus a constant in millimetres. */
export interface Linear {
  constant: number;
  weights: Partial<Record<MeasureKey, number>>;
}
