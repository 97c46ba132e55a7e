import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { ARRANGEMENTS, type SetDocument } from '@settlewright/geometry';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity';
import { as, createWorkshop, type WorkshopWithOwner } from './factories/people';
import { createProduction } from './factories/productions';
import { startTestApp, type TestApp } from './test-app';

const booth = ARRANGEMENTS.find(({ id }) => id === 'facing-benches')!.build();
const mannequin = { kind: 'mannequin', bodyData: 'women', measure: 'stature', percentile: 5 } as const;
const seated = { ...booth, seating: [{ pieceId: booth.pieces[0]!.id, place: 1, sitter: mannequin }] };

describe('arrangements that a workshop keeps', () => {
  let test: TestApp;
  let workshop: WorkshopWithOwner;
  let base: string;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    workshop = await createWorkshop(test);
    base = `/workshops/${workshop.id}/arrangements`;
  });
  const owner = () => as(test, workshop.owner);
  const keep = (body: Record<string, unknown> = {}) =>
    owner()
      .post(base)
      .send({ name: 'Booth of six', document: booth, ...body });

  it('are kept, listed by name, and taken off the list, each with a record of it', async () => {
    const { body: made } = await keep().expect(201);
    await keep({ name: 'A corner' }).expect(201);
    const list = async () =>
      (await owner().get(base).expect(200)).body.items as { name: string; document: SetDocument }[];
    expect((await list()).map(({ name }) => name)).toEqual(['A corner', 'Booth of six']);
    expect((await list())[1]!.document.pieces).toEqual(booth.pieces);
    await owner().delete(`${base}/${made.id}`).expect(204);
    await owner().delete(`${base}/${made.id}`).expect(404);
    expect((await list()).map(({ name }) => name)).toEqual(['A corner']);
    const recorded = await test.dataSource.manager.find(AuditEntry, {
      where: { subjectId: made.id },
      order: { id: 'ASC' },
    });
    expect(recorded.map(({ action }) => action).sort()).toEqual(['arrangement.kept', 'arrangement.removed']);
  });

  it('keep nobody who sits in them', async () => {
    const { body } = await keep({ document: seated }).expect(201);
    expect(body.document.seating).toEqual([]);
  });

  it('begin a set of any production of the workshop', async () => {
    const { body: made } = await keep().expect(201);
    const production = await createProduction(test, {}, workshop);
    const { body: set } = await owner()
      .post(`${production.path}/sets`)
      .send({ name: 'Another car', document: made.document })
      .expect(201);
    expect(set.name).toBe('Another car');
  });

  it.each([
    [{ name: ' ' }, 'name'],
    [{ document: { ...booth, pieces: [] } }, 'document.pieces'],
    [
      { document: { ...booth, pieces: [{ ...booth.pieces[0], lengthMm: 'long' }] } },
      'document.pieces.0.lengthMm',
    ],
  ])('are refused with the field that is wrong: %#', async (change, path) => {
    const { body } = await keep(change).expect(400);
    expect((body.fields as { path: string }[]).map((field) => field.path)).toContain(path);
    expect((await owner().get(base).expect(200)).body.total).toBe(0);
  });

  it('of another workshop are not found', async () => {
    const { body: made } = await keep().expect(201);
    const other = await createWorkshop(test);
    await as(test, other.owner).delete(`/workshops/${other.id}/arrangements/${made.id}`).expect(404);
    await as(test, other.owner).get(base).expect(404);
    expect((await owner().get(base).expect(200)).body.total).toBe(1);
  });
});
