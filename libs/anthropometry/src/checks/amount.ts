import type { MeasureKey } from '../measures/measures.ts';
import type { Body, Combination, JointComponent } from '../people/body.ts';
import { covarianceOf, doubtsTogether, type Doubt } from './doubt.ts';

/** What one body adds to an amount. */
interface Term {
  body: Body;
  parts: Combination;
}

/** A number that may hang on the measures of one or more bodies, and on how far cushions go down. */
export interface Amount {
  constant: number;
  terms: readonly Term[];
  doubts: readonly Doubt[];
}

const NO_TERMS: readonly Term[] = [];
const NO_DOUBTS: readonly Doubt[] = [];
const NO_PARTS: Combination = [];

/** A plain number. */
export const fixed = (constant: number): Amount => ({ constant, terms: NO_TERMS, doubts: NO_DOUBTS });

/** A measure of a body, times a factor. */
export const ofBody = (body: Body, key: MeasureKey, factor = 1): Amount => ({
  constant: 0,
  terms: [{ body, parts: [[key, factor]] }],
  doubts: NO_DOUBTS,
});

/** `a` with the doubt about a cushion. */
export const doubted = (a: Amount, doubt: Doubt): Amount => ({ ...a, doubts: [...a.doubts, doubt] });

/** `a` + factor · `b`. */
export function plus(a: Amount, b: Amount, factor = 1): Amount {
  const constant = a.constant + factor * b.constant;
  const doubts = doubtsTogether(a.doubts, b.doubts, factor);
  if (b.terms.length === 0) return { constant, terms: a.terms, doubts };
  if (a.terms.length === 0 && factor === 1) return { constant, terms: b.terms, doubts };
  const terms = a.terms.slice();
  for (const { body, parts } of b.terms) {
    const index = terms.findIndex((term) => term.body === body);
    const sum = (index < 0 ? NO_PARTS : (terms[index] as Term).parts).slice();
    for (const [key, weight] of parts) {
      const at = sum.findIndex((part) => part[0] === key);
      if (at < 0) sum.push([key, factor * weight]);
      else sum[at] = [key, (sum[at] as Combination[number])[1] + factor * weight];
    }
    if (index < 0) terms.push({ body, parts: sum });
    else terms[index] = { body, parts: sum };
  }
  return { constant, terms, doubts };
}

/** `a` − `b`. */
export const minus = (a: Amount, b: Amount): Amount => plus(a, b, -1);

/** `a` times a factor. */
export const times = (a: Amount, factor: number): Amount => plus(fixed(0), a, factor);

/** `a` moved by millimetres. */
export const moved = (a: Amount, by: number): Amount => ({ ...a, constant: a.constant + by });

/** Best value of an amount. */
export function best(amount: Amount): number {
  let sum = amount.constant;
  for (const { body, parts } of amount.terms) {
    for (const [key, factor] of parts) sum += factor * body.mean(key);
  }
  return sum;
}

/** A measure that was not taken from the person. */
export interface PredictedMeasure {
  body: Body;
  key: MeasureKey;
}

/** Adds to a list the measures that enter an amount and were not taken from the person. */
export function collectPredicted(amount: Amount, found: PredictedMeasure[]): void {
  for (const { body, parts } of amount.terms) {
    for (const [key, factor] of parts) {
      if (factor === 0 || body.isMeasured(key)) continue;
      if (!found.some((one) => one.body === body && one.key === key)) found.push({ body, key });
    }
  }
}

/** More components than this are taken together into one of the same mean, spread and skew. */
const MOST_COMPONENTS = 8;

/**
 * What is believed of one or two amounts together: different bodies are independent, and so are bodies and cushions.
 *
 * @param amounts - one or two amounts
 * @returns a mixture; weights add to 1
 * @source how far a cushion goes down is taken as normal about its best value, the 90 % range as `sinkBand` gives it
 */
export function jointOf(amounts: readonly Amount[]): JointComponent[] {
  const components = jointOfBodies(amounts);
  for (const [i, { doubts }] of amounts.entries()) {
    if (doubts.length === 0) continue;
    for (const [j, other] of amounts.entries()) {
      const together = covarianceOf(doubts, other.doubts);
      for (const { covariances } of components) (covariances[i] as number[])[j]! += together;
    }
  }
  return components;
}

function jointOfBodies(amounts: readonly Amount[]): JointComponent[] {
  const bodies: Body[] = [];
  for (const { terms } of amounts) {
    for (const { body } of terms) if (!bodies.includes(body)) bodies.push(body);
  }
  const [only] = bodies;
  if (bodies.length === 1 && only) {
    // By far the most common case: no mixing, only the plain numbers to add.
    const components = only.joint(amounts.map(({ terms }) => terms[0]?.parts ?? NO_PARTS));
    for (const { means } of components) {
      for (let i = 0; i < means.length; i += 1) {
        means[i] = (means[i] as number) + (amounts[i] as Amount).constant;
      }
    }
    return components;
  }
  let joined: JointComponent[] = [
    {
      weight: 1,
      means: amounts.map(({ constant }) => constant),
      covariances: amounts.map(() => amounts.map(() => 0)),
      thirds: amounts.map(() => 0),
    },
  ];
  for (const body of bodies) {
    const parts = body.joint(
      amounts.map(({ terms }) => terms.find((term) => term.body === body)?.parts ?? NO_PARTS),
    );
    joined = joined.flatMap((a) => parts.map((b) => added(a, b)));
    if (joined.length > MOST_COMPONENTS) joined = [takenTogether(joined)];
  }
  return joined;
}

const added = (a: JointComponent, b: JointComponent): JointComponent => ({
  weight: a.weight * b.weight,
  means: a.means.map((mean, i) => mean + (b.means[i] as number)),
  covariances: a.covariances.map((row, i) => row.map((c, j) => c + (b.covariances[i]?.[j] as number))),
  thirds: a.thirds.map((third, i) => third + (b.thirds[i] as number)),
});

function takenTogether(components: readonly JointComponent[]): JointComponent {
  const size = (components[0] as JointComponent).means.length;
  const indexes = Array.from({ length: size }, (_, i) => i);
  const means = indexes.map((i) => components.reduce((sum, c) => sum + c.weight * (c.means[i] as number), 0));
  const covariances = indexes.map((i) =>
    indexes.map((j) =>
      components.reduce(
        (sum, c) =>
          sum +
          c.weight *
            ((c.covariances[i]?.[j] as number) +
              ((c.means[i] as number) - (means[i] as number)) *
                ((c.means[j] as number) - (means[j] as number))),
        0,
      ),
    ),
  );
  const thirds = indexes.map((i) =>
    components.reduce((sum, c) => {
      const off = (c.means[i] as number) - (means[i] as number);
      const variance = c.covariances[i]?.[i] as number;
      return sum + c.weight * ((c.thirds[i] as number) + 3 * off * variance + off ** 3);
    }, 0),
  );
  return { weight: 1, means, covariances, thirds };
}
