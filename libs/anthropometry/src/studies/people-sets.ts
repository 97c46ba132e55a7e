import type { MeasureKey } from '../measures/measures.ts';
import {
  countOf,
  countOfBoth,
  everyone,
  inAll,
  inEither,
  sumOver,
  sumsOf,
  without,
  type Bits,
} from './bits.ts';
import type { Demand, Either } from './compile.ts';
import type { Crowd } from './crowd.ts';
import type { Window } from './need.ts';

/** People of a crowd who meet a demand. */
export interface PeopleSet {
  bits: Bits;
  count: number;
  sums: Map<MeasureKey, number>;
  both: WeakMap<PeopleSet, number>;
}

/** The sets of a crowd that a study has asked for, kept so that only what moved is worked out again. */
export interface PeopleSets {
  /** Begins a new round: sets that neither this nor the last one asked for are let go. */
  nextRound(): void;
  meeting(demand: Demand): PeopleSet;
  countMeeting(demand: Demand): number;
  countOfBoth(a: PeopleSet, b: PeopleSet): number;
  /** Sum of a known measure over a set, in tenths. */
  sum(set: PeopleSet, key: MeasureKey): number;
  /** Sums of a known measure over everyone, in tenths and square tenths. */
  sums(key: MeasureKey): { sum: number; squares: number };
}

interface Kept<Value> {
  value: Value;
  round: number;
}

const ROUNDS_KEPT = 1;
const NOTHING = new Float32Array(0);

/** Keeps the sets of one crowd. */
export function createPeopleSets(crowd: Crowd): PeopleSets {
  const all = everyone(crowd.people);
  const sets = new Map<string, Kept<PeopleSet>>();
  /** By need. */
  const windows = new Map<string, Kept<{ window: Window; bits: Bits }>[]>();
  const eithers = new Map<string, Kept<Bits>>();
  const totals = new Map<MeasureKey, { sum: number; squares: number }>();
  let round = 0;

  /** The people inside a window, made from those inside the window of the same need whose ends lie closest. */
  function within(window: Window): Bits {
    const { need, low, high } = window;
    let alike = windows.get(need.id);
    if (!alike) windows.set(need.id, (alike = []));
    let nearest: Kept<{ window: Window; bits: Bits }> | undefined;
    let least = Infinity;
    for (const one of alike) {
      const apart = Math.abs(one.value.window.low - low) + Math.abs(one.value.window.high - high);
      if (apart >= least) continue;
      least = apart;
      nearest = one;
    }
    if (nearest && least === 0) {
      nearest.round = round;
      return nearest.value.bits;
    }
    const bits = crowd.within(window, nearest?.value);
    alike.push({ value: { window, bits }, round });
    return bits;
  }

  function withinEither({ key, pair: [one, other] }: Either): Bits {
    let known = eithers.get(key);
    if (!known) {
      known = { value: inEither(within(one), within(other)), round };
      eithers.set(key, known);
    }
    known.round = round;
    return known.value;
  }

  function made(demand: Demand): PeopleSet {
    const parts: Bits[] = [];
    if (!demand.possible) parts.push(new Uint32Array(all.length));
    else {
      for (const window of demand.windows.values()) parts.push(within(window));
      for (const either of demand.either) parts.push(withinEither(either));
    }
    const bits = parts.length > 1 ? inAll(parts) : (parts[0] ?? all);
    return { bits, count: countOf(bits), sums: new Map(), both: new WeakMap() };
  }

  function meeting(demand: Demand): PeopleSet {
    let known = sets.get(demand.key);
    if (!known) {
      known = { value: made(demand), round };
      sets.set(demand.key, known);
    }
    known.round = round;
    return known.value;
  }

  const sums = (key: MeasureKey) => {
    const known = totals.get(key);
    if (known) return known;
    const total = sumsOf(crowd.measure(key) ?? NOTHING);
    totals.set(key, total);
    return total;
  };

  return {
    nextRound() {
      round += 1;
      const stays = (kept: Kept<unknown>): boolean => kept.round >= round - ROUNDS_KEPT;
      for (const map of [sets, eithers] as Map<string, Kept<unknown>>[]) {
        for (const [key, one] of map) if (!stays(one)) map.delete(key);
      }
      for (const [key, alike] of windows) windows.set(key, alike.filter(stays));
    },
    meeting,
    countMeeting(demand) {
      const [only] = demand.windows.values();
      if (demand.possible && demand.windows.size === 1 && demand.either.length === 0 && only) {
        const count = crowd.countWithin(only);
        if (count !== undefined) return count;
      }
      return meeting(demand).count;
    },
    countOfBoth(a, b) {
      let count = a.both.get(b);
      if (count === undefined) {
        count = countOfBoth(a.bits, b.bits);
        a.both.set(b, count);
      }
      return count;
    },
    sum(set, key) {
      let sum = set.sums.get(key);
      if (sum === undefined) {
        const values = crowd.measure(key) ?? NOTHING;
        // Of those inside and those outside the fewer are added up.
        sum =
          set.count * 2 <= crowd.people
            ? sumOver(set.bits, values)
            : sums(key).sum - sumOver(without(all, set.bits), values);
        set.sums.set(key, sum);
      }
      return sum;
    },
    sums,
  };
}
