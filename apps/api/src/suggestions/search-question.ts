import type { Sitter } from '@settlewright/anthropometry';
import type {
  AnswerKind,
  Blame,
  CellState,
  Dimension,
  FreeDimension,
  Miss,
  SetDocument,
  Tried,
} from '@settlewright/geometry';
import type { StudyQuestion } from '../studies/study-question';

/** All that a search looks at. Frozen when it begins: drafts, people and populations may change meanwhile. */
export interface SearchQuestion {
  /** Version of the work, so that it goes on as it was begun. */
  workVersion: string;
  document: SetDocument;
  free: FreeDimension[];
  /** Everyone who must be served. */
  sitters: Sitter[];
  /** Probability that the workshop asks of a verdict; absent: as the rule book does. */
  confidence?: number;
  /** After them, as many as can be of these people. */
  crowd?: Pick<StudyQuestion, 'crowd' | 'womenShare'>;
}

/** A dimension that may move, as it was when the search began. */
export type ToldDimension = FreeDimension &
  Pick<Dimension, 'label' | 'unit' | 'marks' | 'tableMarks' | 'value'>;

/** Whom the search serves. Names of the cast stand in the cast alone. */
export type ToldSitter = { kind: 'cast'; id: string } | { kind: 'mannequin'; id: string; name: string };

/** A miss as it is kept; an erased person's has lost its number. */
export type KeptMiss = Omit<Miss, 'byMm'> & { byMm?: number };

/** A check that an answer turns, against the set as it is. */
export interface CheckChange {
  ruleId: string;
  from: CellState;
  to: CellState;
}

/** What an answer does to one sitter. */
export interface SitterChange {
  sitterId: string;
  gains: CheckChange[];
  losses: CheckChange[];
}

export interface PieceChange extends CheckChange {
  marks: string[];
}

/** A choice of the free dimensions, as it is kept. */
export type KeptTried = Omit<Tried, 'misses'> & { misses: KeptMiss[] };

/** An answer with what it does to everybody. */
export interface FoundAnswer {
  kind: AnswerKind;
  tried: KeptTried;
  sitters: SitterChange[];
  pieces: { gains: PieceChange[]; losses: PieceChange[] };
}

/** What a search has found so far. */
export interface Found {
  /** The set as it is; absent where the ranges leave it out. */
  present?: KeptTried;
  answers: FoundAnswer[];
  /** The one sitter or rule that keeps every answer from serving all; when the search is done. */
  blame?: Blame;
  /** Rules that the share counts at once, that its people are not known by, and that nobody meets. */
  counted: string[];
  unknown: string[];
  metByNobody: string[];
}
