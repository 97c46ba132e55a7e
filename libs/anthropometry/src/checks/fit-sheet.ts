import type { MeasureKey } from '../measures/measures.ts';
import type { KnownPerson } from '../people/person.ts';

/** The four verdicts of a check. `notKnown` is never shown as a pass. */
export type Verdict = 'fits' | 'tight' | 'wontFit' | 'notKnown';

/** What a rule is asked of. */
export type RuleScope = 'person' | 'pair' | 'bench' | 'table' | 'way' | 'set';

/** Unit of the value a rule compares. */
export type RuleUnit = 'mm' | 'deg' | 'count';

/** How a source was read; the screen shows the words of `SOURCE_MARK_WORDS`. */
export type SourceMark = 'RETRIEVED' | 'FROM MEMORY' | 'DERIVED' | 'HOUSE RULE';

/** One line of the sum that leads to a limit or to a value. `total` closes the lines above it. */
export interface LedgerLine {
  label: string;
  value: number;
  kind: 'term' | 'total';
}

/** The two lines of a rule on either side; `undefined` where that side is open. */
export interface LimitLines {
  lower?: number;
  upper?: number;
}

/** Best estimate of a drop, and the range it lies in with 90 in 100. */
export interface SinkBand {
  lowMm: number;
  bestMm: number;
  highMm: number;
  /** Whether the foam bottoms out over the range: nowhere, in part of it, or all over. */
  bottomsOut: 'no' | 'perhaps' | 'yes';
}

/** How far a cushion goes down under a sitter, in a verdict that hangs on it. */
export interface CushionDrop extends SinkBand {
  /** Half the 90 % range, of the drop. */
  error: number;
  /** Test sits that it rests on; 0 for the estimate by itself. */
  sits: number;
}

/** A verdict with everything the slip shows. Values in the rule's unit. */
export interface VerdictOutcome {
  kind: 'verdict';
  verdict: Verdict;
  value: number;
  /** Best estimate of the pass line(s) for this sitter. */
  pass: LimitLines;
  /** Best estimate of the fail line(s). */
  fail: LimitLines;
  /** Room left to the nearest fail line; negative when missing. */
  margin: number;
  /** 90 % range of the margin when something was predicted, the drop of a cushion included. */
  marginRange?: { low: number; high: number };
  /** True when a predicted or told value decides, of the sitter or of how far the cushion goes down. */
  estimated: boolean;
  probability: { pass: number; insideFail: number };
  /** For an uncertain verdict: the tape measures that would settle it, most useful first. */
  settleWith: MeasureKey[];
  /** Cushions that the value hangs on; absent where it hangs on none. */
  drops?: CushionDrop[];
  /** For an uncertain verdict: sitting on the foam would help to settle it. */
  settleBySit?: true;
  bodyLedger: LedgerLine[];
  setLedger: LedgerLine[];
}

/** A code clause: a number inside or outside it, never "fits". */
export interface ClauseOutcome {
  kind: 'clause';
  inside: boolean;
  clause: string;
  value: number;
  limits: LimitLines;
  /** Each part of the clause that was asked, in words with its numbers. */
  parts: { label: string; value: number; limits: LimitLines; inside: boolean }[];
}

/** A check that has no object here, or was not asked. */
export interface SilentOutcome {
  kind: 'doesNotApply' | 'notAsked';
  /** Words such as "no table", "no piece is marked accessible". */
  reason: string;
}

/** A number shown without a verdict. */
export interface InformationOutcome {
  kind: 'information';
  value: number;
  words: string;
}

/** What one check says. */
export type Outcome = VerdictOutcome | ClauseOutcome | SilentOutcome | InformationOutcome;

/** One cell of the fit sheet. */
export interface FitCell {
  /** Stable within a sheet: `${ruleId}|${placeId or piece ids}`. */
  id: string;
  ruleId: string;
  scope: RuleScope;
  /** Filled for person rules. */
  placeId?: string;
  sitterId?: string;
  /** Pieces that take part, so that a change of one can be offered. */
  pieceIds: string[];
  marks: string[];
  /** Which hand, for a sill or a wall. */
  side?: 'left' | 'right';
  outcome: Outcome;
}

/** Whoever is at a place. */
export interface Sitter {
  id: string;
  /** Shown name: "Ottilie Brandt", "Woman, 5th in stature". */
  name: string;
  kind: 'cast' | 'mannequin';
  placeId: string;
  person: KnownPerson;
  /** Nobody is behind the name any more: no check at the place is known, whatever would hold of just anybody. */
  noBody?: true;
}

/** One row of the grid: a sitter at a place. */
export interface SitterRow {
  sitterId: string;
  name: string;
  kind: Sitter['kind'];
  placeId: string;
  mark: string;
  place: number;
  cells: FitCell[];
  worst: Verdict;
  /** As of the sitter: numbers beside the verdicts are of anybody. */
  noBody?: true;
}

/** The row of the public: each rule read at the end of the population that it protects. */
export interface PublicRow {
  cells: (FitCell & { readAs: string })[];
}

/** The whole sheet of one document. */
export interface FitSheet {
  rows: SitterRow[];
  publicRow: PublicRow;
  piecesAndWays: FitCell[];
  /** Places nobody sits at. */
  emptyPlaceIds: string[];
  counts: Record<Verdict, number>;
  /** Probability from which its verdicts were given. */
  confidence: number;
  /** Version of the rule data the sheet was made with. */
  ruleVersion: string;
}
