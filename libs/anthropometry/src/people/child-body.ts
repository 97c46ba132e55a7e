import { MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import type { Body, Combination } from './body.ts';
import type { KnownPerson } from './person.ts';

/** What is known of a child; everything else is a grown-up's share of stature, to draw with. */
const OF_CHILDREN: ReadonlySet<MeasureKey> = new Set(['stature', 'weight_kg', 'popliteal_height']);

/**
 * Whether a measure of a body says anything of the person.
 *
 * @param body - from a body model
 * @param key - body measure
 * @returns false for what a child's body has borrowed
 */
export const saysSomething = ({ person }: Pick<Body, 'person'>, key: MeasureKey): boolean =>
  !person.child || OF_CHILDREN.has(key);

/**
 * The body of a child: its own height, weight and lower leg; the rest borrowed of a grown-up in proportion to stature,
 * so that there is something to draw. Nothing may be checked on what is borrowed.
 *
 * @param person - a child with stature, weight and popliteal height
 * @param adult - body of a grown-up
 * @returns a body without any spread
 * @throws RangeError when one of the three is missing
 */
export function childBody(person: KnownPerson, adult: Body): Body {
  const { stature, weightKg, measured } = person;
  const popliteal = measured.popliteal_height;
  if (!stature || weightKg === undefined || popliteal === undefined) {
    throw new RangeError('stature, weightKg and measured.popliteal_height are needed of a child');
  }
  const share = stature.mm / adult.mean('stature');
  const kneeOverSeat = adult.mean('knee_height_sitting') - adult.mean('popliteal_height');
  const own: Partial<Record<MeasureKey, number>> = {
    stature: stature.mm,
    weight_kg: weightKg,
    popliteal_height: popliteal,
    knee_height_sitting: popliteal + share * kneeOverSeat,
  };
  const mean = (key: MeasureKey): number => own[key] ?? share * adult.mean(key);
  const sum = (combination: Combination): number =>
    combination.reduce((so, [key, factor]) => so + factor * mean(key), 0);
  return {
    person,
    weightKg,
    mean,
    means: () =>
      Object.fromEntries(MEASURE_KEYS.map((key) => [key, mean(key)])) as Record<MeasureKey, number>,
    isMeasured: () => true,
    estimate(x) {
      const value =
        typeof x === 'string'
          ? mean(x)
          : x.constant + sum(Object.entries(x.weights) as [MeasureKey, number][]);
      return { components: [{ weight: 1, mean: value, sd: 0, skew: 0 }], measured: true };
    },
    joint: (combinations) => [
      {
        weight: 1,
        means: combinations.map(sum),
        covariances: combinations.map(() => combinations.map(() => 0)),
        thirds: combinations.map(() => 0),
      },
    ],
    sample: (count) => ({
      count,
      columns: Object.fromEntries(
        [...OF_CHILDREN].map((key) => [key, new Float32Array(count).fill(mean(key))]),
      ),
      isWoman: new Uint8Array(count),
      bodyDataKnown: false,
    }),
  };
}
