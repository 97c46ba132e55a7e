import {
  createTrials,
  type FreeDimension,
  type Miss,
  type SuggestInput,
  type Trials,
  type Tried,
} from './candidates.ts';

/** What makes an answer worth looking at. */
export type AnswerKind = 'best' | 'nearest' | 'another';

/** One of several good answers. */
export interface Answer {
  kind: AnswerKind;
  tried: Tried;
}

/** The one thing that keeps every answer from serving all. */
export interface Blame {
  kind: 'sitter' | 'rule';
  id: string;
  /** Misses that are left in the best answer without it. */
  left: number;
}

/** What a search has found so far. */
export interface Suggestion {
  /** Choices tried, of about how many. */
  done: number;
  of: number;
  present: Tried | undefined;
  answers: Answer[];
  /** Set at the end, when no answer serves everybody. */
  blame?: Blame;
}

const MOST = 400;
/** Choices strewn over the whole range before the best are refined. */
const STREWN = 24;
/** Best choices that are refined, far enough from each other. */
const STARTS = 3;
const APART = 0.25;
/** Weights of the one number that choices are compared by; a miss counts before everything else. */
const COST = { miss: 1000, missPerMm: 4, missMost: 400, share: 100, worse: 25, tight: 0.5, distance: 1 };

/** What a choice costs; the least is the best. */
export function costOf(
  { misses, share = 0, tight, worse, distance }: Tried,
  without?: (miss: Miss) => boolean,
): number {
  const counted = without ? misses.filter((miss) => !without(miss)) : misses;
  const missed = counted.reduce(
    (sum, { byMm, gone }) =>
      sum + COST.miss + (gone ? COST.missMost : Math.min(COST.missMost, COST.missPerMm * byMm)),
    0,
  );
  return (
    missed + COST.share * (1 - share) + COST.worse * worse + COST.tight * tight + COST.distance * distance
  );
}

/**
 * Searches the free dimensions for sets in which everybody named is at least tight and then the largest share of a
 * population fits.
 *
 * Choices are strewn evenly over the ranges, and the best few are refined one dimension at a time with steps that
 * halve down to the rounding step. The same input gives the same answers.
 *
 * @param input - the set, the free dimensions with their ranges and steps, the checks, and what is known from before
 * @returns a generator that yields what was found after each choice and returns the end result
 */
export function* suggestDimensions(input: SuggestInput): Generator<Suggestion, Suggestion, void> {
  const trials = createTrials(input);
  const most = input.most ?? MOST;
  const { free } = input;
  let done = 0;
  // What is known from before must not lead the search another way than it went then.
  const seen = new Set<Tried>();
  const told = () => resultOf(trials, done, most, input);
  const attempt = function* (values: readonly number[]): Generator<Suggestion, Tried | undefined, void> {
    const found = trials.at(trials.onGrid(values));
    if (found) seen.add(found);
    done += 1;
    yield told();
    return found;
  };

  yield* attempt(trials.present);
  for (let n = 1; n <= STREWN * Math.max(1, free.length) && done < most / 2; n += 1) {
    yield* attempt(strewn(free, n));
  }
  for (const start of starts([...seen], free)) yield* refine(start, free, attempt, () => done < most);
  const end = { ...told(), of: done };
  const blame = blameOf(trials.all(), end.answers[0]?.tried.misses ?? []);
  return { ...end, ...(blame ? { blame } : {}) };
}

/** The n-th point of an even additive sequence over the ranges. */
function strewn(free: readonly FreeDimension[], n: number): number[] {
  const root = additiveRoot(free.length);
  return free.map(({ min, max }, i) => {
    const share = (0.5 + n * root ** -(i + 1)) % 1;
    return min + share * (max - min);
  });
}

/** Root of x^(d+1) = x + 1: its powers strew d dimensions evenly. */
function additiveRoot(dimensions: number): number {
  let x = 2;
  for (let step = 0; step < 32; step += 1) x = (1 + x) ** (1 / (dimensions + 1));
  return x;
}

/** The best choices so far that lie apart. */
function starts(seen: readonly Tried[], free: readonly FreeDimension[]): Tried[] {
  const chosen: Tried[] = [];
  for (const one of [...seen].sort((a, b) => costOf(a) - costOf(b))) {
    if (chosen.length === STARTS) break;
    if (chosen.every((other) => gapOf(one, other, free) > APART)) chosen.push(one);
  }
  return chosen;
}

const gapOf = (a: Tried, b: Tried, free: readonly FreeDimension[]): number =>
  Math.max(
    ...free.map(
      ({ min, max, step }, i) =>
        Math.abs((a.values[i] as number) - (b.values[i] as number)) / Math.max(max - min, step),
    ),
    0,
  );

function* refine(
  start: Tried,
  free: readonly FreeDimension[],
  attempt: (values: readonly number[]) => Generator<Suggestion, Tried | undefined, void>,
  mayGoOn: () => boolean,
): Generator<Suggestion, void, void> {
  let best = start;
  for (let scale = 1 / 4; mayGoOn(); scale /= 2) {
    let moved = true;
    let finest = true;
    while (moved && mayGoOn()) {
      moved = false;
      for (const [i, { min, max, step }] of free.entries()) {
        const by = Math.max(step, scale * (max - min));
        if (by > step) finest = false;
        for (const sign of [1, -1]) {
          if (!mayGoOn()) return;
          const values = best.values.map((value, j) => (i === j ? value + sign * by : value));
          const found = yield* attempt(values);
          if (found && costOf(found) < costOf(best) - 1e-9) {
            best = found;
            moved = true;
            break;
          }
        }
      }
    }
    if (finest) return;
  }
}

function resultOf(trials: Trials, done: number, of: number, { free }: SuggestInput): Suggestion {
  const all = trials.all();
  const present = all.find(({ distance }) => distance === 0);
  const best = least(all, costOf);
  if (!best) return { done, of, present, answers: [] };
  const answers: Answer[] = [{ kind: 'best', tried: best }];
  const equal = all.filter(({ misses, worse }) => misses.length <= best.misses.length && worse <= best.worse);
  const nearest = least(equal, ({ distance, tight }) => distance + tight / 1000);
  if (nearest && nearest !== best) answers.push({ kind: 'nearest', tried: nearest });
  const apart = equal.filter((one) => answers.every(({ tried }) => gapOf(one, tried, free) > APART));
  const another = least(apart, costOf);
  if (another) answers.push({ kind: 'another', tried: another });
  return { done, of, present, answers };
}

function least(all: readonly Tried[], costing: (tried: Tried) => number): Tried | undefined {
  let best: Tried | undefined;
  let lowest = Infinity;
  for (const one of all) {
    const cost = costing(one);
    if (cost < lowest) [best, lowest] = [one, cost];
  }
  return best;
}

/** Of the sitters and the rules that the best answer misses, the one without which the fewest misses are left. */
function blameOf(all: readonly Tried[], missed: readonly Miss[]): Blame | undefined {
  const suspects: Omit<Blame, 'left'>[] = [
    ...[...new Set(missed.map(({ sitterId }) => sitterId))].map((id) => ({ kind: 'sitter' as const, id })),
    ...[...new Set(missed.flatMap(({ ruleId }) => ruleId ?? []))].map((id) => ({
      kind: 'rule' as const,
      id,
    })),
  ];
  const judged = suspects.map((suspect): Blame => {
    const own = ({ sitterId, ruleId }: Miss) =>
      suspect.id === (suspect.kind === 'sitter' ? sitterId : ruleId);
    const left = Math.min(...all.map(({ misses }) => misses.filter((miss) => !own(miss)).length));
    return { ...suspect, left };
  });
  return judged.sort((a, b) => a.left - b.left)[0];
}
