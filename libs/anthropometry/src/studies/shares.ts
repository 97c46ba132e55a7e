import { normalQuantile } from '../people/normal.ts';
import { SURVEY_CAUTION, type Caution } from './caution.ts';
import { GROUPS, type FitTally, type Group, type PartialStudy, type Tally } from './counts.ts';
import { lostBy, mixedLost, type Lost } from './lost.ts';

/** Share of each sex; need not add to 1. */
export type Mix = Tally;

/** How counts become shares. */
export interface ShareSetup {
  /** Share of each sex among those who will sit; as drawn when absent. */
  mix?: Mix;
  /** People of each sex that the body data were measured on; widens the range of a share where given. */
  surveyed?: Partial<Tally>;
}

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

/** What a study says of a rule, a place or all at once. */
export type ShareOutcome =
  | { kind: 'shares'; fits: GroupShares; atLeastTight: GroupShares }
  | { kind: 'silent'; reason: string }
  /** A measure that is read is not known of these people: never a share, never a pass. */
  | { kind: 'notKnown' };

/** The rule that turns most people away, and how many of those asked: 0 to 1. */
export interface Rejection {
  ruleId: string;
  lost: number;
}

/** What share of a population a set fits. */
export interface StudyShares {
  people: Tally;
  cells: { placeId: string; ruleId: string; outcome: ShareOutcome }[];
  /** Ticked rules together at each ticked place. */
  places: { placeId: string; outcome: ShareOutcome }[];
  /** Each ticked rule at all ticked places, and who does not fit it. */
  checks: { ruleId: string; outcome: ShareOutcome; lost?: Lost }[];
  /** Ticked rules together at all ticked places. */
  all: ShareOutcome;
  rejectsMost?: Rejection;
  /** Of those whom the first rule leaves, this one turns away most. */
  rejectsNext?: Rejection;
  caution: Caution;
}

const RANGE = 0.95;
const Z = normalQuantile(0.5 + RANGE / 2);

/**
 * Shares from the counts of a study.
 *
 * @param counts - of the whole study
 * @param setup - mix of the sexes, and how many people stand behind the body data
 * @returns shares from 0 to 1
 * @throws RangeError when the mix asks for a sex of which nobody was drawn
 */
export function sharesOf(counts: PartialStudy, setup: ShareSetup = {}): StudyShares {
  const weights = weightsOf(counts.people, setup.mix);
  const outcomeOf = (tally: FitTally): ShareOutcome => {
    if (tally.silent !== undefined) return { kind: 'silent', reason: tally.silent };
    if (tally.unknown) return { kind: 'notKnown' };
    return {
      kind: 'shares',
      fits: groupShares(tally.fits, counts.people, weights, setup.surveyed),
      atLeastTight: groupShares(tally.atLeastTight, counts.people, weights, setup.surveyed),
    };
  };
  return {
    people: counts.people,
    cells: counts.cells.map(({ placeId, ruleId, ...tally }) => ({
      placeId,
      ruleId,
      outcome: outcomeOf(tally),
    })),
    places: counts.places.map(({ placeId, ...tally }) => ({ placeId, outcome: outcomeOf(tally) })),
    checks: counts.checks.map((check) => {
      const lost = lostBy(check, counts, weights);
      return { ruleId: check.ruleId, outcome: outcomeOf(check), ...(lost ? { lost } : {}) };
    }),
    all: outcomeOf(counts.all),
    ...rejections(counts, weights),
    caution: SURVEY_CAUTION,
  };
}

/**
 * Weight of each sex, adding to 1.
 *
 * @param people - people drawn
 * @param mix - as asked; as drawn when absent
 * @throws RangeError when the mix is empty or asks for a sex of which nobody was drawn
 */
export function weightsOf(people: Tally, mix: Mix = people): Tally {
  const sum = mix.women + mix.men;
  if (!(sum > 0)) throw new RangeError(`The mix adds to ${sum}; accepted: a number above 0`);
  for (const group of GROUPS) {
    if (mix[group] > 0 && people[group] === 0) {
      throw new RangeError(
        `The mix holds ${group}, of whom nobody was drawn; accepted: people of both sexes`,
      );
    }
  }
  return { women: mix.women / sum, men: mix.men / sum };
}

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

function rejections(counts: PartialStudy, weights: Tally): Pick<StudyShares, 'rejectsMost' | 'rejectsNext'> {
  const { people } = counts;
  const checks = counts.checks.filter(({ unknown }) => !unknown);
  const share = (tally: Tally): number => 1 - mixedLost(tally, people, weights);
  const first = mostOf(checks.map((check) => ({ check, lost: 1 - share(check.fits) })));
  if (!first) return {};
  const left = share(first.check.fits);
  const next = mostOf(
    checks
      .filter((check) => check !== first.check)
      .map((check) => {
        const both = first.check.fitsWith[check.ruleId] ?? check.fitsWith[first.check.ruleId];
        return { check, lost: both && left > 0 ? (left - share(both)) / left : 0 };
      }),
  );
  return {
    rejectsMost: { ruleId: first.check.ruleId, lost: first.lost },
    ...(next ? { rejectsNext: { ruleId: next.check.ruleId, lost: next.lost } } : {}),
  };
}

/** The one that loses most, the earlier of two alike; nothing when none loses anybody. */
const mostOf = <One extends { lost: number }>(ones: readonly One[]): One | undefined =>
  ones.reduce<One | undefined>((most, one) => (one.lost > (most?.lost ?? 0) ? one : most), undefined);
