import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { Invitation } from '../src/invitations/entities/invitation.entity';
import { mailedToken } from './factories/mails';
import { as, createMember, createPerson, createWorkshop, type WorkshopWithOwner } from './factories/people';
import { startTestApp, type TestApp } from './test-app';

const PASSWORD = 'a long enough password';
let test: TestApp;
let shop: WorkshopWithOwner;
beforeAll(async () => {
  test = await startTestApp();
  shop = await createWorkshop(test, 'Joinery');
});
afterAll(() => test.close());

const invite = (email: string, role = 'designer', from = shop) =>
  as(test, from.owner).post(`/workshops/${from.id}/invitations`).send({ email, role });

async function invited(email: string, role = 'designer'): Promise<string> {
  await invite(email, role).expect(201);
  return mailedToken(test, email, 'invitation');
}

const accept = (token: string, given: object = {}, who: { accessToken: string } | null = null) =>
  as(test, who).post(`/invitations/${token}/accept`).send(given);

describe('inviting', () => {
  it('needs a confirmed address of the owner', async () => {
    const unconfirmed = await createPerson(test, { emailConfirmed: false });
    const made = await as(test, unconfirmed).post('/workshops').send({ name: 'New' }).expect(201);
    const from = { id: made.body.id as string, owner: unconfirmed };
    expect((await invite('a@people.test', 'designer', from).expect(403)).body.code).toBe(
      'email-not-confirmed',
    );
  });

  it('lists what is open and withdraws it', async () => {
    const from = await createWorkshop(test);
    const path = `/workshops/${from.id}/invitations`;
    const made = await invite('open@people.test', 'reviewer', from).expect(201);
    const list = await as(test, from.owner).get(path).expect(200);
    expect(list.body.items).toEqual([made.body]);
    expect(list.text).not.toMatch(/token/i);
    await as(test, from.owner).delete(`${path}/${made.body.id}`).expect(204);
    await as(test, from.owner).delete(`${path}/${made.body.id}`).expect(404);
    const token = await mailedToken(test, 'open@people.test', 'invitation');
    expect((await accept(token).expect(410)).body.code).toBe('invitation-over');
  });

  it('replaces an earlier invitation to the same address', async () => {
    const first = await invited('twice@people.test', 'carpenter');
    await invite('Twice@people.test', 'designer').expect(201);
    const second = await mailedToken(test, 'twice@people.test', 'invitation');
    await as(test, null).get(`/invitations/${first}`).expect(410);
    expect((await as(test, null).get(`/invitations/${second}`).expect(200)).body.role).toBe('designer');
  });

  it('refuses who is a member already', async () => {
    const member = await createMember(test, shop.id, 'carpenter');
    expect((await invite(member.email).expect(409)).body.code).toBe('already-member');
  });
});

describe('accepting', () => {
  it('makes an account with a confirmed address and opens a session', async () => {
    const token = await invited('new@people.test');
    const shown = await as(test, null).get(`/invitations/${token}`).expect(200);
    expect(shown.body).toEqual({
      workshopName: 'Joinery',
      invitedByName: shop.owner.name,
      email: 'new@people.test',
      role: 'designer',
      expiresAt: expect.any(String),
      accountExists: false,
    });
    const session = await accept(token, { name: 'New Person', password: PASSWORD }).expect(200);
    expect(session.body.user).toMatchObject({ email: 'new@people.test', emailConfirmed: true });
    expect(session.body.workshops).toEqual([expect.objectContaining({ id: shop.id, role: 'designer' })]);
    await accept(token, { name: 'Second', password: PASSWORD }).expect(410);
  });

  it('asks a new person for a name and a password', async () => {
    const token = await invited('blank@people.test');
    const refused = await accept(token, { password: 'short' }).expect(400);
    expect(refused.body.fields.map((field: { path: string }) => field.path)).toEqual(['name', 'password']);
  });

  it('asks somebody with an account for the password of that account', async () => {
    const email = 'has-one@people.test';
    const wanted = { name: 'Has One', email, password: PASSWORD, workshopName: 'Own' };
    await as(test, null).post('/auth/sign-up').send(wanted).expect(201);
    const confirmation = await mailedToken(test, email, 'email-confirm');
    await as(test, null).post('/auth/email/confirm').send({ token: confirmation }).expect(200);
    const token = await invited(email, 'reviewer');
    expect((await as(test, null).get(`/invitations/${token}`).expect(200)).body.accountExists).toBe(true);
    await accept(token).expect(400);
    await accept(token, { name: 'Taken Over', password: 'not the password' }).expect(401);
    const session = await accept(token, { password: PASSWORD }).expect(200);
    expect(session.body.user.name).toBe('Has One');
    expect(session.body.workshops).toHaveLength(2);
  });

  it('asks nothing of who is signed in with that address, and refuses another account', async () => {
    const person = await createPerson(test);
    const other = await createPerson(test);
    const token = await invited(person.email, 'carpenter');
    expect((await accept(token, {}, other).expect(409)).body.code).toBe('other-account');
    const session = await accept(token, {}, person).expect(200);
    expect(session.body.workshops).toEqual([expect.objectContaining({ id: shop.id, role: 'carpenter' })]);
  });

  it('brings in one person when the link is used twice at once', async () => {
    const token = await invited('race@people.test');
    const given = { name: 'Racer', password: PASSWORD };
    const [one, two] = await Promise.all([accept(token, given), accept(token, given)]);
    expect([one.status, two.status].sort()).toEqual([200, 410]);
  });

  it('refuses an old and an unknown link', async () => {
    const token = await invited('slow@people.test');
    const row = { email: 'slow@people.test' };
    await test.dataSource.manager.update(Invitation, row, { expiresAt: new Date(Date.now() - 1) });
    await as(test, null).get(`/invitations/${token}`).expect(410);
    await as(test, null).get('/invitations/made-up').expect(404);
  });
});
