import type { RuleBook } from '@settlewright/anthropometry';
import type { LengthStyle } from '@settlewright/geometry';
import type { Paper } from '../../paper/pack';
import type { ShownSheet } from '../shown-sheet';

/** All that the printed fit sheet says. */
export interface FitSheetPaper {
  sheet: ShownSheet;
  ruleBook: RuleBook;
  style: LengthStyle;
  paper: Paper;
  timeZone: string;
  workshop: { name: string; telephone: string };
  productionName: string;
  setName: string;
  /** An issued revision, or the draft with its number. */
  state: { kind: 'revision'; letter: string } | { kind: 'draft'; number: number };
  /** When it was issued, or when the draft was saved. */
  at: Date;
  by: string;
  /** The sentence about the probability that the verdicts ask for. */
  confidence: string;
}
