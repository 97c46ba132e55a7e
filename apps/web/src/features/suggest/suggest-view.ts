import type { FitSheet, RuleBook, Sitter } from '@settlewright/anthropometry';
import type { LengthStyle, SetDocument } from '@settlewright/geometry';
import { createContext, useContext } from 'react';

/** What the page of suggested dimensions reads; the route that composes it provides it. */
export interface SuggestView {
  setId: string;
  setName: string;
  document: SetDocument;
  sheet: FitSheet;
  check: (document: SetDocument) => FitSheet;
  /** Takes a document as one named step; absent when it cannot be changed here. */
  replace?: (document: SetDocument, step: string) => void;
  /** Everyone whose body is known. */
  sitters: Sitter[];
  /** Places that name somebody who was removed. */
  placesWithoutBody: number;
  ruleBook: RuleBook;
  style: LengthStyle;
  colourOf: (sitterId: string) => number;
}

export const SuggestContext = createContext<SuggestView | null>(null);

export function useSuggestView(): SuggestView {
  const view = useContext(SuggestContext);
  if (view === null) throw new Error('Part of the suggestions stands outside a SuggestContext.');
  return view;
}
