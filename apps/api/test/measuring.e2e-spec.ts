import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { readPaper } from './factories/papers';
import { as, createMember, createWorkshop, type WorkshopWithOwner } from './factories/people';
import { createCastMember, createProduction, createSet, type SetPlace } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

describe('what to measure', () => {
  let test: TestApp;
  let workshop: WorkshopWithOwner;
  let place: SetPlace;
  let tobias: string;
  let hetty: string;

  beforeAll(async () => {
    test = await startTestApp();
    workshop = await createWorkshop(test);
    const production = await createProduction(test, {}, workshop);
    tobias = await createCastMember(test, production, {
      name: 'Tobias Marr',
      role: 'the guard',
      bodyData: 'men',
      statureMm: 1790,
      statureSource: 'told',
    });
    hetty = await createCastMember(test, production, { name: 'Hetty Vance', statureMm: 1511 });
    place = await createSet(test, production);
    const draft = await owner().get(`${place.setPath}/draft`).expect(200);
    const { number, document } = draft.body;
    const bench = document.pieces.find(({ kind }: { kind: string }) => kind === 'bench');
    document.seating = [{ pieceId: bench.id, place: 1, sitter: { kind: 'cast', castId: tobias } }];
    await owner().put(`${place.setPath}/draft`).send({ baseNumber: number, document }).expect(200);
  });
  afterAll(() => test.close());
  const owner = () => as(test, workshop.owner);

  it('names for each person who sits the one or two measures that settle most', async () => {
    const { body } = await owner().get(`${place.setPath}/draft/measure-next`).expect(200);
    expect(body.items).toHaveLength(1);
    const [item] = body.items;
    expect(item).toMatchObject({ castId: tobias, sets: ['Dining car'] });
    expect(item.uncertain).toBeGreaterThan(0);
    expect(item.order.length).toBeGreaterThan(0);
    expect(item.order.length).toBeLessThanOrEqual(2);
    const all = await owner().get(`${place.path}/cast/measure-next`).expect(200);
    expect(all.body).toEqual(body);

    // Once both are taken, other measures come first.
    const { measured } = (await owner().get(`${place.path}/cast?search=Tobias`).expect(200)).body.items[0];
    const keys: string[] = item.order.map(({ key }: { key: string }) => key);
    const taken = Object.fromEntries(
      keys.filter((key) => !['stature', 'weight_kg'].includes(key)).map((key) => [key, { mm: LIKELY[key] }]),
    );
    await owner()
      .patch(`${place.path}/cast/${tobias}`)
      .send({ measured: { ...measured, ...taken } })
      .expect(200);
    const after = (await owner().get(`${place.setPath}/draft/measure-next`).expect(200)).body.items[0];
    for (const { key } of after.order) expect(Object.keys(taken)).not.toContain(key);
  });

  it('prints a sheet of one person with nobody else on it', async () => {
    const text = await readPaper(
      test,
      workshop.owner,
      `${place.path}/cast/measuring-sheet.pdf?person=${hetty}`,
    );
    expect(text).toContain('Hetty Vance');
    expect(text).not.toContain('Tobias');
    expect(text).toMatch(/Elbow rest/);
    expect(text).toMatch(/personal data/);
    const all = await readPaper(test, workshop.owner, `${place.path}/cast/measuring-sheet.pdf`);
    expect(all).toContain('Hetty Vance');
    expect(all).toContain('Tobias Marr');
  });

  it('refuses a carpenter, and knows nobody by another production’s id', async () => {
    const carpenter = await createMember(test, workshop.id, 'carpenter');
    for (const path of [
      'cast/measure-next',
      'cast/measuring-sheet.pdf',
      `sets/${place.setId}/draft/measure-next`,
    ]) {
      await as(test, carpenter).get(`${place.path}/${path}`).expect(403);
    }
    const other = await createProduction(test, {}, workshop);
    await owner().get(`${other.path}/cast/measuring-sheet.pdf?person=${hetty}`).expect(404);
    await owner().get(`${other.path}/cast/measuring-sheet.pdf`).expect(409);
    await owner().get(`${place.path}/cast/measuring-sheet.pdf?person=Hetty`).expect(400);
  });
});

/** Middling values of a man, to be taken as measured. */
const LIKELY: Record<string, number> = {
  sitting_height: 920,
  eye_height_sitting: 800,
  acromial_height_sitting: 600,
  elbow_rest_height: 245,
  popliteal_height: 440,
  knee_height_sitting: 560,
  buttock_popliteal_length: 500,
  buttock_knee_length: 620,
  thigh_clearance: 175,
  hip_breadth_sitting: 375,
  bideltoid_breadth: 500,
  forearm_forearm_breadth: 550,
  abdominal_extension_depth_sitting: 255,
};
