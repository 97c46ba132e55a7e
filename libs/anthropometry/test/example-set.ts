import { checkSet } from '../src/checks/check-set.ts';
import type { FitCell, FitSheet, Sitter, VerdictOutcome } from '../src/checks/fit-sheet.ts';
import type { CheckSettings } from '../src/checks/piece-check.ts';
import type {
  BenchSituation,
  PlaceSituation,
  PlaceTableSituation,
  SetSituation,
  SillSituation,
  TableSituation,
} from '../src/checks/situation.ts';
import type { KnownPerson } from '../src/people/person.ts';
import { model, ruleBook } from './seed.ts';

/** A hard bench place 407 above the floor with nothing near it. */
export const place = (change: Partial<PlaceSituation> = {}): PlaceSituation => ({
  placeId: 'b1:1',
  pieceId: 'b1',
  mark: 'B1',
  place: 1,
  seatTopFrontMm: 407,
  seatTopHipMm: 407,
  deckHeightMm: 407,
  foam: undefined,
  effectiveDepthMm: 432,
  widthMm: 610,
  heelRoomMm: undefined,
  seatTiltRad: 0,
  backLeanRad: 0.14,
  backTopMm: undefined,
  wallMm: {},
  sills: [],
  table: undefined,
  overhead: undefined,
  ...change,
});

export const bench = (change: Partial<BenchSituation> = {}): BenchSituation => ({
  pieceId: 'b1',
  mark: 'B1',
  lengthMm: 1219,
  effectiveDepthMm: 432,
  placeIds: ['b1:1'],
  unpressedSeatTopMm: 457,
  accessible: false,
  back: undefined,
  ...change,
});

export const lapTable = (change: Partial<PlaceTableSituation> = {}): PlaceTableSituation => ({
  pieceId: 't1',
  mark: 'T1',
  topMm: 737,
  undersideMm: 700,
  overlapMm: 50,
  topThicknessMm: 32,
  ...change,
});

export const sill = (change: Partial<SillSituation> = {}): SillSituation => ({
  pieceId: 's1',
  mark: 'S1',
  side: 'left',
  topMm: 660,
  usableDepthMm: 89,
  centreToEdgeMm: 230,
  ...change,
});

export const table = (change: Partial<TableSituation> = {}): TableSituation => ({
  pieceId: 't1',
  mark: 'T1',
  topMm: 737,
  accessible: false,
  edges: [],
  kneeSpace: { clearHeightMm: 700, widthMm: 900, depthAt: [], toeDepthMm: 500 },
  ...change,
});

export const set = (change: Partial<SetSituation> = {}): SetSituation => ({
  places: [],
  benches: [],
  tables: [],
  facing: [],
  corners: [],
  ways: [],
  ...change,
});

export const person = (change: Partial<KnownPerson> = {}): KnownPerson => ({
  bodyData: 'women',
  weightKg: 60,
  measured: {},
  shoeMm: 25,
  clothing: 'medium',
  ...change,
});

export const sitter = (who: KnownPerson, placeId = 'b1:1', name = 'Ada'): Sitter => ({
  id: `sitter at ${placeId}`,
  name,
  kind: 'cast',
  placeId,
  person: who,
});

export const check = (
  situation: SetSituation,
  sitters: Sitter[] = [],
  settings: Partial<CheckSettings> = {},
): FitSheet =>
  checkSet({
    situation,
    sitters,
    ruleBook,
    model,
    settings: { backPosture: 'dining', trafficBehind: 'none', ...settings },
  });

/** The cell of one rule for a single person at a single place. */
export function personCell(ruleId: string, at: PlaceSituation, who: KnownPerson): FitCell {
  const [row] = check(set({ places: [at] }), [sitter(who, at.placeId)]).rows;
  return found(row?.cells ?? [], ruleId);
}

export const publicCell = (ruleId: string, at: PlaceSituation) =>
  found(check(set({ places: [at] })).publicRow.cells, ruleId);

export const pieceCell = (
  ruleId: string,
  situation: SetSituation,
  sitters: Sitter[] = [],
  settings: Partial<CheckSettings> = {},
): FitCell => found(check(situation, sitters, settings).piecesAndWays, ruleId);

/** The cell of one rule. */
export function found<T extends FitCell>(cells: readonly T[], ruleId: string): T {
  const cell = cells.find((one) => one.ruleId === ruleId);
  if (!cell) throw new Error(`no cell of ${ruleId}`);
  return cell;
}

export function verdictOf({ outcome }: FitCell): VerdictOutcome {
  if (outcome.kind !== 'verdict')
    throw new Error(`${outcome.kind}, not a verdict: ${JSON.stringify(outcome)}`);
  return outcome;
}
