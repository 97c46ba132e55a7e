import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import {
  as,
  createMember,
  createPerson,
  createWorkshop,
  type Person,
  type WorkshopWithOwner,
} from './factories/people';
import { startTestApp, type TestApp } from './test-app';

describe('productions', () => {
  let test: TestApp;
  let workshop: WorkshopWithOwner;
  let base: string;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    workshop = await createWorkshop(test);
    base = `/workshops/${workshop.id}/productions`;
  });

  const create = async (body: Record<string, unknown>, person: Person = workshop.owner) =>
    (await as(test, person).post(base).send(body).expect(201)).body as { id: string } & Record<
      string,
      unknown
    >;

  it('creates one with the units of the trade and reads it back', async () => {
    const made = await create({ name: '  Supper at Larch Junction ', summary: 'Dining car' });
    expect(made).toMatchObject({
      name: 'Supper at Larch Junction',
      summary: 'Dining car',
      units: 'feet-inches',
      roundTo: 16,
      status: 'active',
    });
    const read = await as(test, workshop.owner).get(`${base}/${made.id}`).expect(200);
    expect(read.body).toEqual(made);
  });

  it('lists with search, sort and pages, active and archived apart', async () => {
    for (const name of ['Ferry saloon', 'Night train 100%', 'Diner']) await create({ name });
    const archived = await create({ name: 'Old diner' });
    await as(test, workshop.owner).post(`${base}/${archived.id}/archive`).expect(200);

    const names = async (query: string) =>
      (await as(test, workshop.owner).get(`${base}${query}`).expect(200)).body as {
        items: { name: string }[];
        total: number;
      };
    expect((await names('')).items.map(({ name }) => name)).toEqual([
      'Diner',
      'Ferry saloon',
      'Night train 100%',
    ]);
    expect((await names('?sort=name&order=desc&pageSize=2')).items.map(({ name }) => name)).toEqual([
      'Night train 100%',
      'Ferry saloon',
    ]);
    expect(await names('?page=2&pageSize=2')).toMatchObject({
      items: [{ name: 'Night train 100%' }],
      total: 3,
    });
    expect((await names('?search=100%25')).items).toHaveLength(1);
    expect((await names('?search=dine&status=archived')).items.map(({ name }) => name)).toEqual([
      'Old diner',
    ]);

    await as(test, workshop.owner).post(`${base}/${archived.id}/restore`).expect(200);
    expect((await names('?search=dine')).total).toBe(2);
  });

  it('changes what is sent and leaves the rest', async () => {
    const made = await create({ name: 'Ferry', summary: 'Saloon deck' });
    const { body } = await as(test, workshop.owner)
      .patch(`${base}/${made.id}`)
      .send({ name: 'Night ferry', units: 'millimetres', summary: null })
      .expect(200);
    expect(body).toMatchObject({
      name: 'Night ferry',
      units: 'millimetres',
      summary: 'Saloon deck',
      roundTo: 16,
    });
  });

  it.each([
    [{}, 'name'],
    [{ name: '   ' }, 'name'],
    [{ name: 'x'.repeat(121) }, 'name'],
    [{ name: 'bell \u0007' }, 'name'],
    [{ name: 'nul \u0000' }, 'name'],
    [{ name: 12 }, 'name'],
    [{ name: 'Ferry', units: 'cubits' }, 'units'],
    [{ name: 'Ferry', roundTo: 7 }, 'roundTo'],
    [{ name: 'Ferry', roundTo: '16' }, 'roundTo'],
    [{ name: 'Ferry', summary: 'x'.repeat(2001) }, 'summary'],
    [{ name: 'Ferry', workshopId: 'other' }, 'workshopId'],
  ])('refuses %j and names the field', async (body, field) => {
    const answer = await as(test, workshop.owner).post(base).send(body).expect(400);
    expect(answer.headers['content-type']).toMatch(/application\/problem\+json/);
    expect(answer.body.fields.map(({ path }: { path: string }) => path)).toContain(field);
  });

  it.each([
    '?page=0',
    '?pageSize=1000',
    '?page=NaN',
    '?sort=password',
    '?order=up',
    '?status=gone',
    '?search=%00',
  ])('refuses the list with %s', async (query) => {
    await as(test, workshop.owner).get(`${base}${query}`).expect(400);
  });

  it('takes markup in a name for text', async () => {
    const made = await create({ name: '<b onclick="x()">Diner</b>' });
    expect(made.name).toBe('<b onclick="x()">Diner</b>');
  });

  it('does not exist for another workshop', async () => {
    const made = await create({ name: 'Ferry' });
    const other = await createWorkshop(test, 'Other shop');
    await as(test, other.owner).get(`${base}/${made.id}`).expect(404);
    await as(test, other.owner).get(`/workshops/${other.id}/productions/${made.id}`).expect(404);
    await as(test, other.owner)
      .patch(`/workshops/${other.id}/productions/${made.id}`)
      .send({ name: 'X' })
      .expect(404);
    await as(test, other.owner).post(`/workshops/${other.id}/productions/${made.id}/duplicate`).expect(404);
    await as(test, await createPerson(test))
      .get(base)
      .expect(404);
    await as(test, null).get(base).expect(401);
    await as(test, workshop.owner).get(`${base}/not-an-id`).expect(404);
  });

  it.each(['carpenter', 'reviewer'] as const)('lets a %s read and change nothing', async (role) => {
    const made = await create({ name: 'Ferry' });
    const person = await createMember(test, workshop.id, role);
    await as(test, person).get(base).expect(200);
    await as(test, person).get(`${base}/${made.id}`).expect(200);
    await as(test, person).post(base).send({ name: 'Mine' }).expect(403);
    await as(test, person).patch(`${base}/${made.id}`).send({ name: 'Mine' }).expect(403);
    for (const verb of ['archive', 'restore', 'duplicate']) {
      await as(test, person).post(`${base}/${made.id}/${verb}`).expect(403);
    }
  });

  it('refuses changes to an archived one until it is restored', async () => {
    const made = await create({ name: 'Ferry' });
    await as(test, workshop.owner).post(`${base}/${made.id}/archive`).expect(200);
    const refused = await as(test, workshop.owner)
      .patch(`${base}/${made.id}`)
      .send({ name: 'X' })
      .expect(409);
    expect(refused.body.code).toBe('production-archived');
    await as(test, workshop.owner).post(`${base}/${made.id}/cast`).send({ name: 'Imre' }).expect(409);
    await as(test, workshop.owner).post(`${base}/${made.id}/restore`).expect(200);
    await as(test, workshop.owner).patch(`${base}/${made.id}`).send({ name: 'X' }).expect(200);
  });
});
