import { normalQuantile } from '../people/normal.ts';
import { GROUPS, type Group, type Tally } from './counts.ts';

/** A share from 0 to 1 with the range that holds it 95 times in 100. */
export interface Share {
  value: number;
  low: number;
  high: number;
}

/** A share of each sex that was drawn, and of both as they are mixed. */
export interface GroupShares extends Partial<Record<Group, Share>> {
  mixed: Share;
}

const RANGE = 0.95;
const Z = normalQuantile(0.5 + RANGE / 2);

/**
 * Share of each sex and of both together, with its range: Wilson's interval for the people drawn, and for the people
 * surveyed where their number is given.
 *
 * @param tally - people who fit
 * @param people - people drawn
 * @param weights - adding to 1
 * @param surveyed - people behind the body data
 */
export function groupShares(
  tally: Tally,
  people: Tally,
  weights: Tally,
  surveyed: Partial<Tally> = {},
): GroupShares {
  const shares: Partial<Record<Group, Share>> = {};
  let value = 0;
  let variance = 0;
  let unitVariance = 0;
  for (const group of GROUPS) {
    if (people[group] === 0) continue;
    const own = tally[group] / people[group];
    const perPerson = 1 / people[group] + 1 / (surveyed[group] ?? Infinity);
    shares[group] = wilson(own, 1 / perPerson);
    value += weights[group] * own;
    variance += weights[group] ** 2 * own * (1 - own) * perPerson;
    unitVariance += weights[group] ** 2 * perPerson;
  }
  const trials = variance > 0 ? (value * (1 - value)) / variance : 1 / unitVariance;
  return { ...shares, mixed: wilson(value, trials) };
}

function wilson(share: number, trials: number): Share {
  const z2 = (Z * Z) / trials;
  const middle = (share + z2 / 2) / (1 + z2);
  const half = (Z * Math.sqrt((share * (1 - share)) / trials + z2 / (4 * trials))) / (1 + z2);
  return {
    value: share,
    low: Math.max(0, Math.min(share, middle - half)),
    high: Math.min(1, Math.max(share, middle + half)),
  };
}
