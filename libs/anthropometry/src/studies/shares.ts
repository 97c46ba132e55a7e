import { SURVEY_CAUTION, type Caution } from './caution.ts';
import { GROUPS, type FitTally, type PartialStudy, type Tally } from './counts.ts';
import { groupShares, type GroupShares } from './group-shares.ts';
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

/** Least and most of a share of both sexes as they are mixed: with cushions that go down least, as is best known, or most. */
export interface DropSpan {
  low: number;
  high: number;
}

/** What a study says of a rule, a place or all at once. */
export type ShareOutcome =
  | {
      kind: 'shares';
      fits: GroupShares;
      atLeastTight: GroupShares;
      /** Absent where it was not counted, or where it moves nobody over a line. */
      overDrop?: { fits: DropSpan; atLeastTight: DropSpan };
    }
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
  const { overDrop } = counts;
  const spanOf = (tallies: readonly Tally[]): DropSpan => {
    const values = tallies.map((tally) => 1 - mixedLost(tally, counts.people, weights));
    return { low: Math.min(...values), high: Math.max(...values) };
  };
  const outcomeOf = (tally: FitTally, ends: readonly FitTally[]): ShareOutcome => {
    if (tally.silent !== undefined) return { kind: 'silent', reason: tally.silent };
    if (tally.unknown) return { kind: 'notKnown' };
    const [fits, atLeastTight] = (['fits', 'atLeastTight'] as const).map((name) =>
      spanOf([tally, ...ends].map((end) => end[name])),
    ) as [DropSpan, DropSpan];
    const moves = fits.low < fits.high || atLeastTight.low < atLeastTight.high;
    return {
      kind: 'shares',
      fits: groupShares(tally.fits, counts.people, weights, setup.surveyed),
      atLeastTight: groupShares(tally.atLeastTight, counts.people, weights, setup.surveyed),
      ...(moves && { overDrop: { fits, atLeastTight } }),
    };
  };
  const ends = overDrop ? [overDrop.least, overDrop.most] : [];
  return {
    people: counts.people,
    cells: counts.cells.map(({ placeId, ruleId, ...tally }) => ({
      placeId,
      ruleId,
      outcome: outcomeOf(tally, []),
    })),
    places: counts.places.map(({ placeId, ...tally }, n) => ({
      placeId,
      outcome: outcomeOf(
        tally,
        ends.flatMap(({ places }) => places[n] ?? []),
      ),
    })),
    checks: counts.checks.map((check, n) => {
      const lost = lostBy(check, counts, weights);
      const outcome = outcomeOf(
        check,
        ends.flatMap(({ checks }) => checks[n] ?? []),
      );
      return { ruleId: check.ruleId, outcome, ...(lost ? { lost } : {}) };
    }),
    all: outcomeOf(
      counts.all,
      ends.map(({ all }) => all),
    ),
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
