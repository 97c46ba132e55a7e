import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  type FitSheet,
  type Sitter,
} from '@settlewright/anthropometry';
import { ARRANGEMENTS, measureSet, suggestFixes, type Fix, type SetDocument } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { render } from '@testing-library/react';
import { useState, type ReactNode } from 'react';
import { FitViewContext, type FitView } from '../fit-view.ts';

const model = createBodyModel(summary);
export const ruleBook = loadRuleBook(rules);
export const INCHES = { system: 'feet-inches', roundTo: 8 } as const;

const arrangement = ARRANGEMENTS.find(({ id }) => id === 'facing-benches');
export const facingBenches: SetDocument = arrangement?.build() ?? failed();
function failed(): never {
  throw new Error('There is no arrangement of facing benches.');
}

/** A short woman who was measured, and a tall man known by his height alone. */
function sittersAt(document: SetDocument): Sitter[] {
  const [first, second] = measureSet(document).places.map(({ placeId }) => placeId);
  return [
    {
      id: 'hetty',
      name: 'Hetty Vance',
      kind: 'cast',
      placeId: first ?? '',
      person: {
        bodyData: 'women',
        stature: { mm: 1511, source: 'measured' },
        weightKg: 52,
        measured: { popliteal_height: 371.5, buttock_popliteal_length: 465 },
        shoeMm: 25,
        clothing: 'light',
      },
    },
    {
      id: 'marcus',
      name: 'Marcus Adeyemi-Rowe',
      kind: 'cast',
      placeId: second ?? '',
      person: {
        bodyData: 'men',
        stature: { mm: 1905, source: 'told' },
        measured: {},
        shoeMm: 25,
        clothing: 'light',
      },
    },
  ];
}

export const check = (document: SetDocument): FitSheet =>
  checkSet({
    situation: measureSet(document, ruleBook),
    sitters: sittersAt(document),
    ruleBook,
    model,
    settings: document.asked,
  });

export const sheet = check(facingBenches);

/** What the rows are made from, as the room hands it on. */
export const basis: NonNullable<FitView['basis']> = {
  situation: measureSet(facingBenches, ruleBook),
  sitters: sittersAt(facingBenches),
  people: sittersAt(facingBenches).map(({ id, name, person }) => ({ id, name, person })),
  model,
  settings: facingBenches.asked,
};

interface Options extends Partial<FitView> {
  /** Makes what would change a cell by the real check. */
  fixes?: boolean;
  onTake?: (fix: Fix) => void;
}

function Provider({ children, options }: { children: ReactNode; options: Options }) {
  const { fixes, onTake, ...given } = options;
  const [openCellId, open] = useState<string | null>(null);
  const [litCellId, light] = useState<string | null>(null);
  const view: FitView = {
    sheet,
    ruleBook,
    style: INCHES,
    detail: 'full',
    colourOf: () => 1,
    aside: () => '',
    ...{ litCellId, light, openCellId, open },
    ...(fixes && { fixesFor: (cell) => suggestFixes({ document: facingBenches, cell, check }) }),
    ...(onTake && { take: onTake }),
    ...given,
  };
  return <FitViewContext value={view}>{children}</FitViewContext>;
}

/** Renders a part of the fit sheet over a sheet made by the real checks. */
export function showSheet(part: ReactNode, options: Options = {}) {
  const wrapped = (with_: Options) => <Provider options={with_}>{part}</Provider>;
  const view = render(wrapped(options));
  return { ...view, change: (next: Options) => view.rerender(wrapped(next)) };
}
