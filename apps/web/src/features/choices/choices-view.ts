import type { FitSheet, RuleBook } from '@settlewright/anthropometry';
import type { LengthStyle, SetDocument } from '@settlewright/geometry';
import { createContext, useContext } from 'react';

/** What the pages about choosing a number read; the route that composes them provides it. */
export interface ChoicesView {
  document: SetDocument;
  /** Of the sitters, pieces and ways; the same sheet for the same document. */
  check: (document: SetDocument) => FitSheet;
  /** Takes a document as one named step; absent when it cannot be changed here. */
  replace?: (document: SetDocument, step: string) => void;
  /** A paper of the draft that the server makes; rejects with a sentence for a person. */
  paper: (paper: string, asked: Readonly<Record<string, unknown>>) => Promise<void>;
  ruleBook: RuleBook;
  style: LengthStyle;
  /** `verdicts` for members who may not see what a verdict rests on. */
  detail: 'full' | 'verdicts';
  colourOf: (sitterId: string) => number;
  /** Words behind a name: "5′ 2″", "5′ 10″, est."; empty when not for this reader. */
  aside: (sitterId: string) => string;
  setName: string;
  /** "41, after revision C". */
  draft: string;
}

export const ChoicesContext = createContext<ChoicesView | null>(null);

export function useChoices(): ChoicesView {
  const view = useContext(ChoicesContext);
  if (view === null) throw new Error('Part of the story stick stands outside a ChoicesContext.');
  return view;
}
