import {
  checkSet,
  createBodyModel,
  loadRuleBook,
  type FitSheet,
  type KnownPerson,
  type Sitter,
} from '@settlewright/anthropometry';
import { ARRANGEMENTS, measureSet, type SetDocument } from '@settlewright/geometry';
import rules from '@settlewright/seed-data/fit-rules.json';
import summary from '@settlewright/seed-data/populations/ansur2.json';
import { useState } from 'react';
import { renderPage, signInAs, WORKSHOP_ID } from '@/test/render-page.tsx';
import { server } from '@/test/server.ts';
import { http, HttpResponse } from 'msw';
import { ChoicesContext, type ChoicesView } from '../choices-view.ts';
import { StickPage } from '../components/stick-page.tsx';

const model = createBodyModel(summary);
export const ruleBook = loadRuleBook(rules);
export const INCHES = { system: 'feet-inches', roundTo: 8 } as const;

const arrangement = ARRANGEMENTS.find(({ id }) => id === 'facing-benches');
export const facingBenches: SetDocument = arrangement?.build() ?? failed();
function failed(): never {
  throw new Error('There is no arrangement of facing benches.');
}

const person = (mm: number, popliteal: number, weightKg: number): KnownPerson => ({
  bodyData: mm < 1700 ? 'women' : 'men',
  stature: { mm, source: 'measured' },
  weightKg,
  measured: { popliteal_height: popliteal, buttock_popliteal_length: popliteal + 90 },
  shoeMm: 25,
  clothing: 'light',
});

interface Seated {
  id: string;
  name: string;
  person: KnownPerson;
}

/** A short woman and a tall man, both measured; no seat height suits both. */
export const HETTY: Seated = { id: 'hetty', name: 'Hetty Vance', person: person(1511, 360, 52) };
const MARCUS: Seated = { id: 'marcus', name: 'Marcus Adeyemi-Rowe', person: person(1905, 480, 95) };

/** As the room checks these people: one sheet a document, also for another document that says the same. */
export function checkOf(people: readonly Seated[]): ChoicesView['check'] {
  const sheets = new Map<string, FitSheet>();
  return (document) => {
    const key = JSON.stringify(document);
    const known = sheets.get(key);
    if (known) return known;
    const situation = measureSet(document, ruleBook);
    const sitters = people.map((one, n): Sitter => ({
      ...one,
      kind: 'cast',
      placeId: situation.places[n]?.placeId ?? '',
    }));
    const settings = document.asked;
    const sheet = checkSet({ situation, sitters, ruleBook, model, settings, sittersOnly: true });
    sheets.set(key, sheet);
    return sheet;
  };
}

const check = checkOf([HETTY, MARCUS]);

interface Shown extends Partial<ChoicesView> {
  /** Told of every step that is taken. */
  onStep?: (document: SetDocument, step: string) => void;
}

function Stick({ onStep, ...view }: Shown) {
  const [document, setDocument] = useState(facingBenches);
  const replace = (next: SetDocument, step: string) => {
    setDocument(next);
    onStep?.(next, step);
  };
  const whole: ChoicesView = {
    document,
    check,
    replace,
    paper: () => Promise.resolve(),
    ruleBook,
    style: INCHES,
    detail: 'full',
    colourOf: () => 1,
    aside: () => '',
    setName: 'Dining car',
    draft: '4, nothing issued',
    ...view,
  };
  return (
    <ChoicesContext value={whole}>
      <StickPage roomTo="/room" fitTo="/fit" />
    </ChoicesContext>
  );
}

/** The page as a route composes it, on a set that follows; an owner of a workshop without surveys looks at it. */
export function showStick(view: Shown = {}, search = '?d=seat-height') {
  signInAs('owner');
  server.use(
    http.get('/api/workshops/:id/populations', () =>
      HttpResponse.json({ items: [], total: 0, page: 1, pageSize: 200 }),
    ),
  );
  return renderPage(<Stick {...view} />, {
    path: '/w/:workshopId/stick',
    at: `/w/${WORKSHOP_ID}/stick${search}`,
  });
}
