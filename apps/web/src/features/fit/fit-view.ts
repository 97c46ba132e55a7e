import type {
  BodyModel,
  CheckSettings,
  FitCell,
  FitSheet,
  KnownPerson,
  NextMeasureKey,
  RuleBook,
  SetSituation,
  Sitter,
} from '@settlewright/anthropometry';
import type { Fix, LengthStyle, SetDocument } from '@settlewright/geometry';
import { createContext, useContext } from 'react';

/** What the rows of the sheet are made from, for readers who may see measures. */
export interface FitBasis {
  situation: SetSituation;
  sitters: readonly Sitter[];
  /** Everybody of the cast, seated or not. */
  people: readonly { id: string; name: string; person: KnownPerson }[];
  model: BodyModel;
  settings: CheckSettings;
}

/** What every part of the fit sheet reads; the page that shows the sheet provides it. */
export interface FitView {
  sheet: FitSheet;
  ruleBook: RuleBook;
  /** When the workshop last changed the probability that verdicts ask for, if it ever did. */
  confidenceSetAt?: string | null;
  style: LengthStyle;
  /** `verdicts` for members who may not see what a verdict rests on. */
  detail: 'full' | 'verdicts';
  colourOf: (sitterId: string) => number;
  /** Words behind a name: "5′ 2″", "5′ 10″, est."; empty when not for this reader. */
  aside: (sitterId: string) => string;
  /** Says that somebody is drawn in another posture than the one measured; empty where they are not. */
  measuredAs?: (sitterId: string) => string;
  litCellId: string | null;
  light: (cellId: string | null) => void;
  openCellId: string | null;
  open: (cellId: string | null) => void;
  /** Absent when the document cannot be changed here. */
  fixesFor?: (cell: FitCell) => Fix[];
  take?: (fix: Fix) => void;
  /** Absent for readers who may not see measures. */
  basis?: FitBasis;
  /** Where a measure of somebody of the cast is entered; absent where nothing can be. */
  personTo?: (castId: string, key: NextMeasureKey) => string;
  /** The set itself, for its plan. */
  document?: SetDocument;
  /** What the set says about itself; absent where it is not told. */
  asked?: SetDocument['asked'];
  /** Absent when the document cannot be changed here. */
  ask?: (asked: SetDocument['asked'], doing?: string) => void;
}

export const FitViewContext = createContext<FitView | null>(null);

export function useFitView(): FitView {
  const view = useContext(FitViewContext);
  if (view === null) throw new Error('Part of the fit sheet stands outside a FitViewContext.');
  return view;
}
