import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { as, createMember } from './factories/people';
import { createCastMember, createProduction, createSet, type SetPlace } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

const POUND_KG = 0.45359237;
const LBF_N = 4.4482216152605;
/** Vector of the trade's estimator: 170 lb on 4 in of IFD 36, support factor 2, goes down 1.28 in. */
const FOAM = { grade: 'seat', ifd25N: 36 * LBF_N, supportFactor: 2, thicknessMm: 101.6 };
const SAT = { satOn: '2026-11-03', ...FOAM, measuredMm: 36 };

describe('test sits', () => {
  let test: TestApp;
  let place: SetPlace;
  let castId: string;
  const owner = () => as(test, place.workshop.owner);
  const path = () => `${place.setPath}/test-sits`;
  const add = (body: object) =>
    owner()
      .post(path())
      .send({ ...SAT, ...body });
  const list = async () =>
    (await owner().get(path()).expect(200)).body.items as { id: string; name: string }[];

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    const production = await createProduction(test, { name: 'Dining car' });
    castId = await createCastMember(test, production, { name: 'Ottilie Brandt', weightKg: 170 * POUND_KG });
    place = await createSet(test, production, { name: 'Saloon' });
  });

  it('take the weight from the cast, and say what the estimate would have been', async () => {
    const { body } = await add({ castId }).expect(201);
    expect(body).toMatchObject({
      castId,
      name: 'Ottilie Brandt',
      satOn: '2026-11-03',
      measuredMm: 36,
      note: '',
    });
    expect(body.weightKg).toBeCloseTo(170 * POUND_KG, 9);
    expect(body.predictedMm / 25.4).toBeCloseTo(1.28, 2);
    expect(await list()).toEqual([body]);
  });

  it('of layers in a wrap are kept with them, and estimated as springs one on another', async () => {
    const layers = [
      { share: 0.5, times: 0.5 },
      { share: 0.5, times: 2 },
    ];
    const wrap = { thicknessMm: 25.4, lostMm: 12.7 };
    const { body } = await add({ castId, layers }).expect(201);
    expect(body).toMatchObject({ layers });
    // p 0.844 psi of 170 lb on layers of 18 and 72 lb: 0.25 + 0.4 · (0.844 − 0.36)/0.36 is beyond 0.65; 0.25 · 0.844/1.44.
    expect(body.predictedMm / 25.4).toBeCloseTo(2 * 0.65 + 2 * 0.1465, 2);
    const wrapped = (await add({ castId, layers, wrap }).expect(201)).body;
    expect(wrapped).toMatchObject({ layers, wrap });
    expect(await list()).toEqual(expect.arrayContaining([body, wrapped]));
    await add({ castId, layers: layers.slice(1) }).expect(400);
    await add({ castId, layers: [{ share: 0.5, times: 0 }, layers[1]] }).expect(400);
    await add({ castId, wrap: { thicknessMm: 25.4 } }).expect(400);
    await add({ castId, wrap: [] }).expect(400);
  });

  it('of somebody of no cast need a weight; a typed weight stands over that of the cast', async () => {
    const { body } = await add({ name: 'The painter' }).expect(400);
    expect(body.fields).toEqual([expect.objectContaining({ path: 'weightKg', code: 'not-known' })]);
    await add({ name: 'The painter', weightKg: 80 }).expect(201);
    expect((await add({ castId, weightKg: 78 }).expect(201)).body.weightKg).toBe(78);
    expect((await list()).map(({ name }) => name)).toContain('The painter');
  });

  it.each([
    ['nobody', {}],
    ['two people at once', { castId: '00000000-0000-4000-8000-000000000000', name: 'The painter' }],
    ['a day to come', { name: 'The painter', weightKg: 80, satOn: '2199-01-01' }],
    ['a drop beyond the thickness', { name: 'The painter', weightKg: 80, measuredMm: 110 }],
    ['a drop ten times the estimate', { name: 'A child', weightKg: 10, measuredMm: 60 }],
    ['no drop', { name: 'The painter', weightKg: 80, measuredMm: 0 }],
    ['a weight in grams', { name: 'The painter', weightKg: 80_000 }],
  ])('refuse %s', async (_words, body) => {
    await add(body).expect(400);
    expect(await list()).toEqual([]);
  });

  it('take nobody of another production', async () => {
    const elsewhere = await createProduction(test, { name: 'Elsewhere' });
    const stranger = await createCastMember(test, elsewhere, { name: 'Stranger', weightKg: 70 });
    await add({ castId: stranger }).expect(404);
  });

  it('go one by one, and only of their own set', async () => {
    const { body } = await add({ castId }).expect(201);
    const other = await createSet(test, place, { name: 'Galley' });
    await owner().delete(`${other.setPath}/test-sits/${body.id}`).expect(404);
    await owner().delete(`${path()}/${body.id}`).expect(204);
    await owner().delete(`${path()}/${body.id}`).expect(404);
    expect(await list()).toEqual([]);
    const entries = await test.dataSource.query(
      'SELECT action, detail FROM audit_entries WHERE subject_id = $1 ORDER BY at',
      [body.id],
    );
    expect(entries).toEqual(
      ['test-sit.kept', 'test-sit.removed'].map((action) => ({ action, detail: null })),
    );
  });

  it('are for owner and designer alone', async () => {
    for (const [role, status] of [
      ['designer', 200],
      ['carpenter', 403],
      ['reviewer', 403],
    ] as const) {
      const member = await createMember(test, place.workshop.id, role);
      await as(test, member).get(path()).expect(status);
    }
  });

  it('go with the person who is erased, by link or by name, and the name goes from the notes of others', async () => {
    await add({ castId }).expect(201);
    await add({ name: 'ottilie  brandt', weightKg: 78 }).expect(201);
    await add({ name: 'The painter', weightKg: 80, note: 'Beside Ottilie Brandt' }).expect(201);
    const { body } = await owner().get(`${place.path}/cast/${castId}/named`).expect(200);
    expect(body.places.map(({ where }: { where: string }) => where)).toEqual(
      expect.arrayContaining(['Saloon, test sit, who sat', 'Saloon, test sit, note']),
    );
    await owner().delete(`${place.path}/cast/${castId}`).expect(204);
    expect(await list()).toEqual([
      expect.objectContaining({ name: 'The painter', note: 'Beside a person erased' }),
    ]);
    const kept = await test.dataSource.query('SELECT * FROM test_sits WHERE set_id = $1', [place.setId]);
    expect(JSON.stringify(kept)).not.toMatch(/Ottilie/i);
  });
});
