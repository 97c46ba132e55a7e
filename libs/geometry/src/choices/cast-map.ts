import type { FitSheet, PlaceSituation, Verdict } from '@settlewright/anthropometry';
import type { SetDocument } from '../room/document.ts';
import { measureSet } from '../situation/measure-set.ts';
import type { Dimension } from './dimension.ts';

/** What a sitter's worst verdict comes to; what is not known is not served. */
type Served = 'served' | 'notKnown' | 'lost';

/** Where one sitter is at least tight, over two dimensions. */
export interface MapRegion {
  sitterId: string;
  placeId: string;
  name: string;
  /** Room to the nearest fail line at each point, rows of `up`; negative when missing. */
  rooms: number[][];
  states: Served[][];
  /** The check that keeps the sitter from fitting anywhere on the map, where one does. */
  blockedBy?: string;
}

/** Two dimensions tried against each other. */
export interface CastMap {
  across: number[];
  up: number[];
  /** Rules of a person that were looked at. */
  ruleIds: string[];
  regions: MapRegion[];
  placesAt: PlaceSituation[][][];
}

const ACROSS = 20;
const FAR = 300;

/**
 * Values along a dimension that a map tries: multiples of the rounding step, about twenty.
 *
 * @param range - ends of the dimension, in its unit
 * @param step - rounding step, same unit, above 0
 * @returns rising values
 */
export function gridValues({ min, max }: Pick<Dimension, 'min' | 'max'>, step: number): number[] {
  const wide = step * Math.max(1, Math.ceil((max - min) / step / ACROSS - 1e-6));
  const values: number[] = [];
  for (let n = Math.ceil(min / wide - 1e-6); n * wide <= max + 1e-6; n += 1) values.push(n * wide);
  return values;
}

interface MapInput {
  across: readonly number[];
  up: readonly number[];
  documentAt: (across: number, up: number) => SetDocument | undefined;
  check: (document: SetDocument) => FitSheet;
  /** Rules to look at; every rule of a person that either number moves when absent. */
  shown?: ReadonlySet<string> | undefined;
}

type Said = Map<string, { margin: number; verdict: Verdict }>;

/**
 * Tries every pair of values.
 *
 * @param input - the values of both dimensions; the set at a pair of them; the check of a set; and the rules to look at
 * @returns a generator that yields how many points were tried and returns the map
 */
export function* castMap({
  across,
  up,
  documentAt,
  check,
  shown,
}: MapInput): Generator<number, CastMap, void> {
  const sheets: (FitSheet | undefined)[][] = [];
  const placesAt: PlaceSituation[][][] = [];
  let done = 0;
  for (const second of up) {
    const row: (FitSheet | undefined)[] = [];
    const places: PlaceSituation[][] = [];
    for (const first of across) {
      const document = documentAt(first, second);
      row.push(document && check(document));
      places.push(document ? measureSet(document).places : []);
      done += 1;
      yield done;
    }
    sheets.push(row);
    placesAt.push(places);
  }
  const people = sheets.flat().find((sheet) => sheet !== undefined)?.rows ?? [];
  const answers = people.map(({ placeId }) =>
    sheets.map((row) => row.map((sheet) => saidAt(sheet, placeId))),
  );
  const all = movingRules(answers.map((grid) => grid.flat()));
  const moving = shown ? new Set([...all].filter((ruleId) => shown.has(ruleId))) : all;
  const regions = people.flatMap(({ sitterId, placeId, name, noBody }, n): MapRegion[] => {
    const grid = answers[n] ?? [];
    const asked = askedOf(grid.flat(), moving);
    if (asked.size === 0) return [];
    // Nobody's room is not known; numbers beside the verdicts are of anybody.
    const rooms = grid.map((row) => row.map((said) => (noBody ? -FAR : roomOf(said, asked))));
    const states = grid.map((row) => row.map((said) => stateOf(said, asked)));
    const isBlocked = !noBody && rooms.flat().every((room) => room < 0);
    const blockedBy = isBlocked ? blockOf(grid.flat(), asked) : undefined;
    return [{ sitterId, placeId, name, rooms, states, ...(blockedBy ? { blockedBy } : {}) }];
  });
  return { across: [...across], up: [...up], ruleIds: [...moving], regions, placesAt };
}

function saidAt(sheet: FitSheet | undefined, placeId: string): Said | undefined {
  const cells = sheet?.rows.find((row) => row.placeId === placeId)?.cells;
  if (!cells) return undefined;
  const said: Said = new Map();
  for (const { ruleId, outcome } of cells) {
    if (outcome.kind === 'verdict') said.set(ruleId, outcome);
  }
  return said;
}

/** Rules whose room changes for somebody somewhere on the map. */
function movingRules(answers: readonly (Said | undefined)[][]): Set<string> {
  const moving = new Set<string>();
  for (const along of answers) {
    const first = along.find((said) => said !== undefined);
    for (const said of along) {
      for (const [ruleId, { margin }] of said ?? []) {
        if (Math.abs(margin - (first?.get(ruleId)?.margin ?? Infinity)) > 1e-6) moving.add(ruleId);
      }
    }
  }
  return moving;
}

/** Moving rules that are asked of a sitter somewhere on the map. */
const askedOf = (along: readonly (Said | undefined)[], moving: ReadonlySet<string>): Set<string> =>
  new Set(along.flatMap((said) => [...(said?.keys() ?? [])].filter((ruleId) => moving.has(ruleId))));

/** What the asked rules say; `undefined` where one of them is no longer asked, as when the place or its table is gone. */
function outcomesOf(said: Said | undefined, asked: ReadonlySet<string>) {
  const found = [...asked].flatMap((ruleId) => said?.get(ruleId) ?? []);
  return found.length === asked.size ? found : undefined;
}

function roomOf(said: Said | undefined, asked: ReadonlySet<string>): number {
  const rooms = outcomesOf(said, asked)?.map(({ margin }) => margin) ?? [-FAR];
  return Math.min(FAR, Math.max(-FAR, Math.min(...rooms)));
}

function stateOf(said: Said | undefined, asked: ReadonlySet<string>): Served {
  const verdicts = outcomesOf(said, asked)?.map(({ verdict }) => verdict);
  if (!verdicts || verdicts.includes('wontFit')) return 'lost';
  return verdicts.includes('notKnown') ? 'notKnown' : 'served';
}

/** The rule with the least room where a sitter has most of it. */
function blockOf(along: readonly (Said | undefined)[], moving: ReadonlySet<string>): string | undefined {
  let best: { room: number; ruleId: string | undefined } = { room: -Infinity, ruleId: undefined };
  for (const said of along) {
    const room = roomOf(said, moving);
    if (room <= best.room) continue;
    const [worst] = [...(said ?? [])]
      .filter(([ruleId]) => moving.has(ruleId))
      .sort(([, a], [, b]) => a.margin - b.margin);
    best = { room, ruleId: worst?.[0] };
  }
  return best.ruleId;
}

/** A pair of values that is worth a look. */
export interface BestPair {
  across: number;
  up: number;
  served: number;
  share: number | undefined;
}

/**
 * Pairs that serve most sitters, then most of the public, then lie nearest to the present.
 *
 * @param map - what was tried
 * @param shares - share of the public at each point, 0 to 1, null where not known; rows of `up`
 * @param present - where the set stands
 * @param most - pairs wanted
 */
export function bestPairs(
  { across, up, regions }: Pick<CastMap, 'across' | 'up' | 'regions'>,
  shares: readonly (readonly (number | null)[])[] | undefined,
  present: { across: number; up: number },
  most = 5,
): BestPair[] {
  const far = (pair: BestPair) =>
    Math.abs(pair.across - present.across) / span(across) + Math.abs(pair.up - present.up) / span(up);
  return up
    .flatMap((second, i) =>
      across.map((first, j): BestPair => ({
        across: first,
        up: second,
        served: regions.filter(({ states }) => states[i]?.[j] === 'served').length,
        share: shares?.[i]?.[j] ?? undefined,
      })),
    )
    .sort(
      (a, b) =>
        b.served - a.served ||
        Math.round((b.share ?? 0) * 100) - Math.round((a.share ?? 0) * 100) ||
        far(a) - far(b),
    )
    .slice(0, most);
}

const span = (values: readonly number[]): number => Math.max((values.at(-1) ?? 0) - (values[0] ?? 0), 1e-6);
