import type { AppleBoxes } from './apple-boxes.ts';
import type { Body } from '../people/body.ts';
import type { BodyModel } from '../people/body-model.ts';
import { fixed } from './amount.ts';
import type { ClauseOutcome, SilentOutcome } from './fit-sheet.ts';
import { ledgerOf, question, type Side } from './question.ts';
import type { Rule } from './rule-book.ts';
import type { PlaceSituation, SetSituation } from './situation.ts';
import type { Question } from './verdict.ts';

/** How a set is asked about things that a single sitter does not decide. */
export interface CheckSettings {
  /** Which posture BACK-01 reads. */
  backPosture: 'dining' | 'lounge';
  /** Who passes behind loose seats (EGRESS-02). */
  trafficBehind: 'none' | 'edge-past' | 'walk-past' | 'wheelchair';
  /** Height of the lens over the floor, millimetres; absent where no camera is asked about (HEAD-05). */
  lensHeightMm?: number | undefined;
  /** How many apple boxes of each size are at hand; absent where eye lines are not asked about (HEAD-04). */
  appleBoxes?: AppleBoxes | undefined;
  /** The door on the way in: clear width and depth of the opening, millimetres (ACC-09). */
  door?: { clearWidthMm: number; depthMm: number } | undefined;
  /** Spaces kept among fixed seats for people who bring a wheelchair (ACC-10). */
  wheelchairSpaces?: number | undefined;
  /** Probability from which a verdict is given; the rule book's when absent. */
  confidence?: number;
}

/** Somebody at a place. */
export interface Seated {
  name: string;
  body: Body;
  /** Nobody is behind the name any more: the body is anybody's. */
  noBody?: true;
}

/** A rule put to the pieces and ways of a set. */
export interface PieceAsked {
  rule: Rule;
  situation: SetSituation;
  /** Whoever sits, by place. */
  seated: ReadonlyMap<string, Seated>;
  places: ReadonlyMap<string, PlaceSituation>;
  model: BodyModel;
  settings: CheckSettings;
  /** How far past a line still counts as on it, in the rule's unit. */
  tolerance: number;
}

/** What a rule says of one piece, pair or way. */
export interface PieceAnswer {
  pieceIds: string[];
  marks: string[];
  /** Tells answers about the same pieces apart. */
  part?: string;
  said: Question | ClauseOutcome | SilentOutcome;
}

/** A rule that stands below the grid. */
export interface PieceCheck {
  id: string;
  ask: (asked: PieceAsked) => PieceAnswer[];
}

/** The single answer of a rule that lacks something the crew would have to say. */
export const notAsked = (reason: string): PieceAnswer[] => [
  { pieceIds: [], marks: [], said: { kind: 'notAsked', reason } },
];

/** The single answer of a rule that finds nothing to look at. */
export const nothing = (reason: string): PieceAnswer[] => [
  { pieceIds: [], marks: [], said: { kind: 'doesNotApply', reason } },
];

/** A value that only the set decides, with what it is called and its lines. */
export function plainQuestion(
  label: string,
  value: number,
  sides: { lower?: Side | undefined; upper?: Side | undefined },
): Question {
  return question({
    value: fixed(value),
    setLedger: () => ledgerOf([[label, fixed(value)]], 'value'),
    ...sides,
  });
}
