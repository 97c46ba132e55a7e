import type { RuleBook } from '@settlewright/anthropometry';
import type { SetDocument } from '@settlewright/geometry';
import { createContext, useContext } from 'react';

/** What the page of shares reads; the route that composes it provides it. */
export interface CrowdView {
  setName: string;
  /** Address of the set on the server, and the draft that the server has. */
  setAt: string;
  draftNumber: number;
  document: SetDocument;
  ruleBook: RuleBook;
}

export const CrowdContext = createContext<CrowdView | null>(null);

export function useCrowdView(): CrowdView {
  const view = useContext(CrowdContext);
  if (view === null) throw new Error('Part of the shares stands outside a CrowdContext.');
  return view;
}
