import { expect } from '@jest/globals';
import type { TestApp } from '../test-app';
import { as, createWorkshop, type Person, type WorkshopWithOwner } from './people';

export interface IssuedSet {
  workshop: WorkshopWithOwner;
  productionId: string;
  setId: string;
  /** /workshops/…/productions/… */
  production: string;
  /** the orders of that production */
  orders: string;
}

/** A set with cushions, cast seated in it, and revision A issued. */
export async function createIssuedSet(test: TestApp, castName: string): Promise<IssuedSet> {
  const workshop = await createWorkshop(test, 'Ropewalk Scenic');
  const owner = as(test, workshop.owner);
  await owner.patch(`/workshops/${workshop.id}`).send({ telephone: '555 0142', paper: 'a4' }).expect(200);
  const { id: productionId } = await made(
    owner.post(`/workshops/${workshop.id}/productions`).send({ name: 'Supper at Larch Junction' }),
  );
  const production = `/workshops/${workshop.id}/productions/${productionId}`;
  const { id: castId } = await made(
    owner
      .post(`${production}/cast`)
      .send({ name: castName, statureMm: 1987, weightKg: 123, notes: 'sits at the end' }),
  );
  const { id: setId } = await made(
    owner.post(`${production}/sets`).send({ name: 'Dining car', arrangement: 'facing-benches' }),
  );
  const draft = await owner.get(`${production}/sets/${setId}/draft`).expect(200);
  const { number, document } = draft.body as { number: number; document: SeatableDocument };
  const bench = document.pieces.find(({ kind }) => kind === 'bench');
  if (!bench) throw new Error('the arrangement has no bench');
  document.seating = [{ pieceId: bench.id, place: 1, sitter: { kind: 'cast', castId } }];
  const saved = await owner
    .put(`${production}/sets/${setId}/draft`)
    .send({ baseNumber: number, document })
    .expect(200);
  await issue(test, workshop.owner, `${production}/sets/${setId}`, (saved.body as { number: number }).number);
  return { workshop, productionId, setId, production, orders: `${production}/orders` };
}

/** Issues the draft and returns its letter. */
export async function issue(test: TestApp, person: Person, set: string, baseNumber: number): Promise<string> {
  const answer = await as(test, person).post(`${set}/revisions`).send({ baseNumber, note: '' }).expect(201);
  return (answer.body as { letter: string }).letter;
}

interface SeatableDocument {
  pieces: { id: string; kind: string }[];
  seating: unknown[];
}

async function made(answer: Promise<{ status: number; body: unknown }>): Promise<{ id: string }> {
  const { status, body } = await answer;
  expect([status, body]).toEqual([201, expect.anything()]);
  return body as { id: string };
}
