import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  type FitSheet,
  type Sitter,
} from '@settlewright/anthropometry';
import {
  ARRANGEMENTS,
  dimensionsOf,
  judgeChoices,
  measureSet,
  suggestDimensions,
  type SetDocument,
  type Suggestion,
  type Tried,
} from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { useState } from 'react';
import { SuggestPage } from '../components/suggest-page.tsx';
import type { SearchAsked, SearchTold } from '../search.ts';
import { SuggestContext } from '../suggest-view.ts';

const model = createBodyModel(summary);
export const ruleBook = loadRuleBook(rules);
export const INCHES = { system: 'feet-inches', roundTo: 8 } as const;
export const bay = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')?.build() as SetDocument;

const seated = (name: string, placeId: string, bodyData: 'women' | 'men', percentile: number): Sitter => ({
  id: name.toLowerCase(),
  name,
  kind: 'mannequin',
  placeId,
  person: model.mannequin({ bodyData, measure: 'stature', percentile }),
});

/** Two that no seat height serves together. */
export const sitters = [seated('Hetty', 'b1:1', 'women', 2), seated('Marcus', 'b2:1', 'men', 98)];

export const check = (document: SetDocument): FitSheet =>
  checkSet({ situation: measureSet(document, ruleBook), sitters, ruleBook, model, settings: document.asked });

const FEW = 40;

/** A short search of its own, told at once; it takes the place of the worker. */
export function searchAtOnce(asked: SearchAsked): SearchTold {
  const tried: Tried[] = [];
  const input = { document: asked.document, dimensions: dimensionsOf(asked.document), free: asked.free };
  const { counted, unknown, metByNobody, ...judging } = judgeChoices(input, {
    sitters: asked.sitters,
    ruleBook,
    model,
  });
  const steps = suggestDimensions({
    ...input,
    ...judging,
    known: asked.known,
    most: FEW,
    onTried: (one) => tried.push(one),
  });
  for (;;) {
    const step = steps.next();
    if (step.done) {
      const suggestion = step.value satisfies Suggestion;
      return { suggestion, tried, counted, unknown, metByNobody, ended: true };
    }
  }
}

interface ShownProps {
  canEdit?: boolean;
  placesWithoutBody?: number;
  onReplace?: (document: SetDocument, step: string) => void;
}

/** The page over a real set, real people and real rules. */
export function Shown({ canEdit = true, placesWithoutBody = 0, onReplace }: ShownProps) {
  const [document, setDocument] = useState(bay);
  const replace = (next: SetDocument, step: string) => {
    setDocument(next);
    onReplace?.(next, step);
  };
  return (
    <SuggestContext
      value={{
        setId: 'set-1',
        setName: 'Dining car',
        document,
        sheet: check(document),
        check,
        ...(canEdit && { replace }),
        sitters,
        placesWithoutBody,
        ruleBook,
        style: INCHES,
        colourOf: () => 1,
      }}
    >
      <SuggestPage roomTo="/room" />
    </SuggestContext>
  );
}
