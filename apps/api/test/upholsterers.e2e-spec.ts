import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { as, createMember, createWorkshop, type WorkshopWithOwner } from './factories/people';
import { startTestApp, type TestApp } from './test-app';

describe('the address book of upholsterers', () => {
  let test: TestApp;
  let workshop: WorkshopWithOwner;
  let base: string;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());
  beforeEach(async () => {
    workshop = await createWorkshop(test);
    base = `/workshops/${workshop.id}/upholsterers`;
  });

  const add = async (body: Record<string, unknown> = {}) =>
    (
      await as(test, workshop.owner)
        .post(base)
        .send({ name: 'Fennimore & Daughter', email: 'odile@fennimore.test', ...body })
        .expect(201)
    ).body as { id: string };

  it('keeps an address, changes only what is sent, and removes it', async () => {
    const made = await add({ contactName: 'Odile Fennimore', telephone: '555 0199', notes: 'two\nlines' });
    expect(made).toMatchObject({
      name: 'Fennimore & Daughter',
      contactName: 'Odile Fennimore',
      notes: 'two\nlines',
    });
    const changed = await as(test, workshop.owner)
      .patch(`${base}/${made.id}`)
      .send({ telephone: '' })
      .expect(200);
    expect(changed.body).toEqual({ ...made, telephone: '' });
    await as(test, workshop.owner).delete(`${base}/${made.id}`).expect(204);
    const list = await as(test, workshop.owner).get(base).expect(200);
    expect(list.body).toEqual({ items: [], total: 0, page: 1, pageSize: 50 });
    await as(test, workshop.owner).patch(`${base}/${made.id}`).send({ name: 'Back' }).expect(404);
  });

  it('finds by part of a name and sorts by name', async () => {
    for (const name of ['Tufts', 'Bolster & Sons', 'Cord 100%']) await add({ name });
    const names = async (query: string) =>
      (
        (await as(test, workshop.owner).get(`${base}${query}`).expect(200)).body as {
          items: { name: string }[];
        }
      ).items.map(({ name }) => name);
    expect(await names('')).toEqual(['Bolster & Sons', 'Cord 100%', 'Tufts']);
    expect(await names('?search=0%25')).toEqual(['Cord 100%']);
    expect(await names('?sort=createdAt&order=desc')).toEqual(['Cord 100%', 'Bolster & Sons', 'Tufts']);
  });

  it('names every field that cannot be used', async () => {
    const answer = await as(test, workshop.owner)
      .post(base)
      .send({ name: ' ', email: 'nobody', notes: 'a\u0000b', fax: '1' })
      .expect(400);
    const paths = (answer.body as { fields: { path: string }[] }).fields.map(({ path }) => path);
    expect([...new Set(paths)].sort()).toEqual(['email', 'fax', 'name', 'notes']);
    await as(test, workshop.owner).patch(`${base}/${randomUUID()}`).send({ name: 'x' }).expect(404);
    await as(test, workshop.owner).patch(`${base}/none`).send({ name: 'x' }).expect(404);
    const made = await add();
    await as(test, workshop.owner).patch(`${base}/${made.id}`).send({ email: null }).expect(400);
  });

  it('belongs to owner and designer of one workshop', async () => {
    const made = await add();
    const designer = await createMember(test, workshop.id, 'designer');
    await as(test, designer).get(base).expect(200);
    for (const role of ['carpenter', 'reviewer'] as const) {
      const member = await createMember(test, workshop.id, role);
      await as(test, member).get(base).expect(403);
      await as(test, member).post(base).send({ name: 'x', email: 'x@y.test' }).expect(403);
      await as(test, member).patch(`${base}/${made.id}`).send({ name: 'x' }).expect(403);
      await as(test, member).delete(`${base}/${made.id}`).expect(403);
    }
    const other = await createWorkshop(test);
    await as(test, other.owner).get(base).expect(404);
    await as(test, other.owner)
      .patch(`/workshops/${other.id}/upholsterers/${made.id}`)
      .send({ name: 'taken' })
      .expect(404);
    await as(test, null).get(base).expect(401);
  });
});
