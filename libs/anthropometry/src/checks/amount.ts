import type { MeasureKey } from '../measures/measures.ts';
import type { Body, JointComponent } from '../people/body.ts';

/** What one body adds to an amount. */
interface Term {
  body: Body;
  weights: Partial<Record<MeasureKey, number>>;
}

/** A number that may hang on the measures of one or more bodies. */
export interface Amount {
  constant: number;
  terms: readonly Term[];
}

/** A plain number. */
export const fixed = (constant: number): Amount => ({ constant, terms: [] });

/** A measure of a body, times a factor. */
export const ofBody = (body: Body, key: MeasureKey, factor = 1): Amount => ({
  constant: 0,
  terms: [{ body, weights: { [key]: factor } }],
});

/** `a` + factor · `b`. */
export function plus(a: Amount, b: Amount, factor = 1): Amount {
  const constant = a.constant + factor * b.constant;
  if (b.terms.length === 0) return { constant, terms: a.terms };
  if (a.terms.length === 0 && factor === 1) return { constant, terms: b.terms };
  const terms = [...a.terms];
  for (const { body, weights } of b.terms) {
    const index = terms.findIndex((term) => term.body === body);
    const sum = { ...terms[index]?.weights };
    for (const key in weights) {
      const measure = key as MeasureKey;
      sum[measure] = (sum[measure] ?? 0) + factor * (weights[measure] as number);
    }
    if (index < 0) terms.push({ body, weights: sum });
    else terms[index] = { body, weights: sum };
  }
  return { constant, terms };
}

/** `a` − `b`. */
export const minus = (a: Amount, b: Amount): Amount => plus(a, b, -1);

/** `a` times a factor. */
export const times = (a: Amount, factor: number): Amount => plus(fixed(0), a, factor);

/** `a` moved by millimetres. */
export const moved = (a: Amount, by: number): Amount => ({ constant: a.constant + by, terms: a.terms });

/** Best value of an amount. */
export function best(amount: Amount): number {
  let sum = amount.constant;
  for (const { body, weights } of amount.terms) {
    for (const key in weights) sum += (weights[key as MeasureKey] as number) * body.mean(key as MeasureKey);
  }
  return sum;
}

/** Measures that enter and were not taken from the person, by body. */
export function predictedMeasures(amount: Amount): { body: Body; key: MeasureKey }[] {
  return amount.terms.flatMap(({ body, weights }) =>
    (Object.keys(weights) as MeasureKey[])
      .filter((key) => weights[key] !== 0 && !body.isMeasured(key))
      .map((key) => ({ body, key })),
  );
}

const NOTHING: Partial<Record<MeasureKey, number>> = {};
/** More components than this are taken together into one normal of the same mean and spread. */
const MOST_COMPONENTS = 8;

/**
 * What is believed of one or two amounts together: different bodies are independent.
 *
 * @param amounts - one or two amounts
 * @returns a mixture; weights add to 1
 */
export function jointOf(amounts: readonly Amount[]): JointComponent[] {
  const bodies = new Set<Body>();
  for (const { terms } of amounts) for (const { body } of terms) bodies.add(body);
  if (bodies.size === 1) {
    const [only] = [...bodies] as [Body];
    return only.joint(
      amounts.map(({ constant, terms }) => ({ constant, weights: terms[0]?.weights ?? NOTHING })),
    );
  }
  let joined: JointComponent[] = [
    {
      weight: 1,
      means: amounts.map(({ constant }) => constant),
      covariances: amounts.map(() => amounts.map(() => 0)),
    },
  ];
  for (const body of bodies) {
    const parts = body.joint(
      amounts.map(({ terms }) => ({
        constant: 0,
        weights: terms.find((term) => term.body === body)?.weights ?? NOTHING,
      })),
    );
    joined = joined.flatMap((a) =>
      parts.map((b) => ({
        weight: a.weight * b.weight,
        means: a.means.map((mean, i) => mean + (b.means[i] as number)),
        covariances: a.covariances.map((row, i) => row.map((c, j) => c + (b.covariances[i]?.[j] as number))),
      })),
    );
    if (joined.length > MOST_COMPONENTS) joined = [takenTogether(joined)];
  }
  return joined;
}

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
  return { weight: 1, means, covariances };
}
