import { minus, type Amount } from '../checks/amount.ts';
import type { Said } from '../checks/person-check.ts';
import { PERSON_CHECKS } from '../checks/person-checks.ts';
import type { RuleBook } from '../checks/rule-book.ts';
import type { PlaceSituation } from '../checks/situation.ts';
import type { Question } from '../checks/verdict.ts';
import type { MeasureKey } from '../measures/measures.ts';
import { windowFrom, windowOf, type Firmness, type Window } from './need.ts';
import { askSymbols, createSymbols, type Symbols, type Wear } from './symbols.ts';

/** People who keep within every window, and within one or the other of every pair. */
export interface Demand {
  /** The same for demands that the same people meet. */
  key: string;
  /** False when a line is broken that no body enters. */
  possible: boolean;
  /** One window a need. */
  windows: ReadonlyMap<string, Window>;
  either: readonly Either[];
}

/** Two lines of one side of which the looser one hangs on the person. */
export interface Either {
  key: string;
  pair: readonly [Window, Window];
}

/** What one rule asks of bodies at one place. */
export interface CompiledCheck {
  ruleId: string;
  /** Why the rule has nothing to say here. */
  silent?: string;
  fits: Demand;
  atLeastTight: Demand;
  /** Measures that enter, in the order of first use. */
  reads: readonly MeasureKey[];
  /** True when one may be on either side of what the set offers. */
  twoSided: boolean;
}

/** What all rules ask of bodies at one place. */
export interface CompiledPlace {
  placeId: string;
  checks: readonly CompiledCheck[];
}

const ANYONE = demandFrom(true, new Map(), []);

/**
 * Puts every person rule once to a place, with symbols in place of a body, and reads from each answer which bodies
 * fit and which are at least tight.
 *
 * @param place - what the set offers there
 * @param wear - shoe and clothes of the people
 * @param ruleBook - the rules
 * @param lensHeightMm - lens over the floor; left out where no camera is asked about
 * @returns the tests, in the order of the checks
 * @throws Error when a rule decides by best values of a body: it could not be counted
 */
export function compilePlace(
  place: PlaceSituation,
  wear: Wear,
  ruleBook: RuleBook,
  lensHeightMm?: number,
): CompiledPlace {
  const symbols = createSymbols(wear);
  return {
    placeId: place.placeId,
    checks: PERSON_CHECKS.map((check) => {
      const rule = ruleBook.rule(check.id);
      const said = askSymbols(check, { rule, place, symbols, lensHeightMm });
      return compiled(rule.id, said, (amount) =>
        roomOf(amount, symbols, place, ruleBook.boundaryTolerance[rule.unit]),
      );
    }),
  };
}

type ReadRoom = (amount: Amount) => Window | boolean;

function compiled(ruleId: string, said: Said, read: ReadRoom): CompiledCheck {
  if (!Array.isArray(said)) {
    const silent = 'reason' in said ? said.reason : said.information.words;
    return { ruleId, silent, fits: ANYONE, atLeastTight: ANYONE, reads: [], twoSided: false };
  }
  const sides = said.flatMap(({ question }) => sidesOf(question, read));
  return {
    ruleId,
    fits: demandOf(sides.map(({ pass }) => [pass])),
    atLeastTight: demandOf(sides.map(({ pass, fail }) => [pass, fail])),
    reads: readsOf(sides),
    twoSided: said.some(({ question: { pass } }) => pass.lower !== undefined && pass.upper !== undefined),
  };
}

interface Side {
  pass: Window | boolean;
  fail: Window | boolean;
}

/** Room to the lines of each side that the rule has. */
function sidesOf({ value, pass, fail }: Question, read: ReadRoom): Side[] {
  const sides: Side[] = [];
  if (pass.lower) {
    const { lower = pass.lower } = fail;
    sides.push({ pass: read(minus(value, pass.lower)), fail: read(minus(value, lower)) });
  }
  if (pass.upper) {
    const { upper = pass.upper } = fail;
    sides.push({ pass: read(minus(pass.upper, value)), fail: read(minus(upper, value)) });
  }
  return sides;
}

function roomOf(
  { constant, terms }: Amount,
  { body, sinkBody }: Symbols,
  { foam }: PlaceSituation,
  tolerance: number,
): Window | boolean {
  const factors = new Map<MeasureKey, number>();
  let sink: { foam: Firmness; factor: number } | undefined;
  for (const term of terms) {
    for (const [key, factor] of term.parts) {
      if (term.body === body) factors.set(key, (factors.get(key) ?? 0) + factor);
      else if (term.body === sinkBody && foam) {
        sink = { foam, factor: (sink?.factor ?? 0) + factor * foam.thicknessMm };
      } else throw new Error('A rule of scope person reads another body; accepted: the one it is asked of');
    }
  }
  return windowOf({ constant: constant + tolerance, factors, ...(sink ? { sink } : {}) });
}

/** All of these, each by one or the other of its lines. */
function demandOf(choices: readonly (readonly (Window | boolean)[])[]): Demand {
  let possible = true;
  const windows = new Map<string, Window>();
  const either: Either[] = [];
  for (const choice of choices) {
    if (choice.includes(true)) continue;
    const open = choice.filter((line) => typeof line !== 'boolean');
    const [first, second] = open;
    if (!first) possible = false;
    else if (!second) narrow(windows, first);
    else if (first.need.id === second.need.id) narrow(windows, looser(first, second));
    else either.push({ key: `${first.key}|${second.key}`, pair: [first, second] });
  }
  return demandFrom(possible, windows, either);
}

/** Both are open towards the same end: they are lines of one side. */
const looser = (a: Window, b: Window): Window =>
  windowFrom(a.need, Math.min(a.low, b.low), Math.max(a.high, b.high));

function narrow(windows: Map<string, Window>, window: Window): void {
  const known = windows.get(window.need.id);
  if (!known) windows.set(window.need.id, window);
  else if (window.low > known.low || window.high < known.high) {
    const [low, high] = [Math.max(known.low, window.low), Math.min(known.high, window.high)];
    windows.set(window.need.id, windowFrom(known.need, low, high));
  }
}

/**
 * All demands at once.
 *
 * @param demands - any number
 * @returns one demand; of several windows of one need their overlap
 */
export function together(demands: Iterable<Demand>): Demand {
  let possible = true;
  const windows = new Map<string, Window>();
  const either: Either[] = [];
  for (const demand of demands) {
    possible &&= demand.possible;
    for (const window of demand.windows.values()) narrow(windows, window);
    either.push(...demand.either);
  }
  return demandFrom(possible, windows, either);
}

function demandFrom(possible: boolean, windows: Demand['windows'], either: Demand['either']): Demand {
  if (!possible) return { key: 'nobody', possible, windows, either };
  const keys = Array.from(windows.values(), ({ key }) => key);
  for (const { key } of either) keys.push(key);
  return { key: keys.sort().join('&'), possible, windows, either };
}

function readsOf(sides: readonly Side[]): MeasureKey[] {
  const keys = new Set<MeasureKey>();
  for (const { pass, fail } of sides) {
    for (const line of [pass, fail]) {
      if (typeof line === 'boolean') continue;
      for (const [key] of line.need.parts) keys.add(key);
      if (line.need.sink) keys.add('weight_kg');
    }
  }
  return [...keys];
}
