import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity';
import { as, createMember, createPerson, createWorkshop, type WorkshopWithOwner } from './factories/people';
import { startTestApp, type TestApp } from './test-app';

let test: TestApp;
let shop: WorkshopWithOwner;
beforeAll(async () => {
  test = await startTestApp();
  shop = await createWorkshop(test);
});
afterAll(() => test.close());

describe('a workshop', () => {
  it('is made by anybody who is signed in, who owns it', async () => {
    const person = await createPerson(test);
    const made = await as(test, person).post('/workshops').send({ name: 'Second Shop' }).expect(201);
    expect(made.body).toEqual({
      id: expect.any(String),
      name: 'Second Shop',
      telephone: '',
      paper: 'letter',
      timeZone: 'UTC',
      confidence: null,
      confidenceSetAt: null,
      isDemo: false,
      role: 'owner',
    });
    const me = await as(test, person).get('/auth/me').expect(200);
    expect(me.body.workshops).toEqual([expect.objectContaining({ id: made.body.id, role: 'owner' })]);
  });

  it('changes what is given and keeps the rest', async () => {
    const { id, owner } = await createWorkshop(test);
    const path = `/workshops/${id}`;
    await as(test, owner).patch(path).send({ telephone: '555 01 02', timeZone: 'Europe/Rome' }).expect(200);
    const changed = await as(test, owner).patch(path).send({ paper: 'a4' }).expect(200);
    expect(changed.body).toMatchObject({ telephone: '555 01 02', timeZone: 'Europe/Rome', paper: 'a4' });
  });

  it('refuses an unknown paper and time zone, saying what was read', async () => {
    const sent = { paper: 'a5', timeZone: 'Mars/Base' };
    const refused = await as(test, shop.owner).patch(`/workshops/${shop.id}`).send(sent).expect(400);
    expect(refused.body.fields.map((field: { path: string }) => field.path)).toEqual(['paper', 'timeZone']);
    expect(refused.body.fields[0].message).toContain('"a5"');
  });

  it.each(['not-an-id', randomUUID(), ''])('answers 404 for the id %j', async (id) => {
    await as(test, shop.owner).get(`/workshops/${id}`).expect(404);
  });
});

describe('members', () => {
  it('are listed by page; addresses are shown to the owner only', async () => {
    const { id, owner } = await createWorkshop(test);
    const carpenter = await createMember(test, id, 'carpenter');
    const path = `/workshops/${id}/members?sort=role&order=desc&pageSize=1`;
    const page = await as(test, owner).get(path).expect(200);
    expect(page.body).toMatchObject({ total: 2, page: 1, pageSize: 1 });
    expect(page.body.items).toEqual([expect.objectContaining({ userId: owner.id, email: owner.email })]);
    const seen = await as(test, carpenter).get(`/workshops/${id}/members`).expect(200);
    expect(seen.body.items).toHaveLength(2);
    expect(seen.text).not.toContain('email');
  });

  it('are found by name, with a sign of the search language taken as itself', async () => {
    const { id, owner } = await createWorkshop(test);
    const found = async (search: string) =>
      (await as(test, owner).get(`/workshops/${id}/members?search=${search}`).expect(200)).body.total;
    expect(await found('OLIVE')).toBe(1);
    expect(await found('%25')).toBe(0);
    await as(test, owner).get(`/workshops/${id}/members?search=%00`).expect(400);
  });

  it.each([
    ['page=0', 'page'],
    ['pageSize=201', 'pageSize'],
    ['sort=passwordHash', 'sort'],
    ['order=up', 'order'],
    ['page=1&page=2', 'page'],
    ['colour=red', 'colour'],
  ])('refuses the page query %s', async (query, path) => {
    const refused = await as(test, shop.owner).get(`/workshops/${shop.id}/members?${query}`).expect(400);
    expect(refused.body.fields[0].path).toBe(path);
  });

  it('get another role from the owner, which is recorded', async () => {
    const { id, owner } = await createWorkshop(test);
    const member = await createMember(test, id, 'reviewer');
    const path = `/workshops/${id}/members/${member.id}`;
    await as(test, owner).patch(path).send({ role: 'designer' }).expect(200);
    await as(test, owner).patch(path).send({ role: 'director' }).expect(400);
    const recorded = await test.dataSource.manager.findOneByOrFail(AuditEntry, { subjectId: member.id });
    expect(recorded).toMatchObject({
      action: 'member-role-changed',
      userId: owner.id,
      detail: { from: 'reviewer', to: 'designer' },
    });
  });

  it('leave by themselves; only an owner removes somebody else', async () => {
    const { id, owner } = await createWorkshop(test);
    const designer = await createMember(test, id, 'designer');
    const carpenter = await createMember(test, id, 'carpenter');
    await as(test, designer).delete(`/workshops/${id}/members/${carpenter.id}`).expect(403);
    await as(test, designer).delete(`/workshops/${id}/members/${designer.id}`).expect(204);
    await as(test, designer).get(`/workshops/${id}`).expect(404);
    await as(test, owner).delete(`/workshops/${id}/members/${carpenter.id}`).expect(204);
    await as(test, owner).delete(`/workshops/${id}/members/${carpenter.id}`).expect(404);
  });

  it('keep one owner', async () => {
    const { id, owner } = await createWorkshop(test);
    const path = `/workshops/${id}/members/${owner.id}`;
    expect((await as(test, owner).delete(path).expect(409)).body.code).toBe('last-owner');
    expect((await as(test, owner).patch(path).send({ role: 'designer' }).expect(409)).body.code).toBe(
      'last-owner',
    );
    await as(test, owner).patch(path).send({ role: 'owner' }).expect(200);
  });

  it('keep one owner when two step down at the same moment', async () => {
    const { id, owner } = await createWorkshop(test);
    const second = await createMember(test, id, 'owner');
    const stepDown = (who: typeof owner) => as(test, who).delete(`/workshops/${id}/members/${who.id}`);
    const [one, two] = await Promise.all([stepDown(owner), stepDown(second)]);
    expect([one.status, two.status].sort()).toEqual([204, 409]);
  });
});
