import type { CellState, StoryStick } from '@settlewright/geometry';
import { SERVED } from './suggestion.ts';

export type SitterAlong = StoryStick['sitters'][number];

/** A value of the dimension, and whom it leaves out by every check that the dimension moves. */
export interface Offer {
  value: number;
  /** Who is not at least tight there by some check. */
  lost: SitterAlong[];
  /** Checks of all sitters that are not at least tight there. */
  missed: number;
  /** Answers about pieces and ways that are good now and not there. */
  worse: number;
}

type Along = Pick<StoryStick, 'values' | 'sitters' | 'worse'>;

const isServed = (state: CellState | undefined): boolean => SERVED.includes(state ?? 'gone');

/** Whom each tried value leaves out. */
function offersOf({ values, sitters, worse }: Along): Offer[] {
  return values.map((value, i) => ({
    value,
    lost: sitters.filter(({ states }) => !isServed(states[i])),
    missed: sitters.reduce((sum, { missed }) => sum + (missed[i] ?? 0), 0),
    worse: worse[i] ?? 0,
  }));
}

/**
 * The value that is at least tight for most by every check that the dimension moves, for all where there is one. Of
 * equals the one with the fewest checks missed, then the one that spoils least about pieces and ways, then the nearest
 * to the present value.
 */
export function bestOffer(stick: Along, present: number): Offer | undefined {
  if (stick.sitters.length === 0) return undefined;
  const costs = ({ lost, missed, worse, value }: Offer) => [
    lost.length,
    missed,
    worse,
    Math.abs(value - present),
  ];
  const isLess = (a: readonly number[], b: readonly number[]) => {
    const at = a.findIndex((cost, i) => Math.abs(cost - (b[i] ?? 0)) > 1e-6);
    return at >= 0 && (a[at] ?? 0) < (b[at] ?? 0);
  };
  return offersOf(stick).reduce<Offer | undefined>(
    (best, one) => (!best || isLess(costs(one), costs(best)) ? one : best),
    undefined,
  );
}

/** What leaves whom out at the present value, for when nothing does better. */
export function offerAt(stick: Along, value: number): Offer | undefined {
  return offersOf(stick).find((offer) => Math.abs(offer.value - value) < 1e-6);
}
