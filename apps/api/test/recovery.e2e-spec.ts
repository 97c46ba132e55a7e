import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { MailedToken } from '../src/auth/entities/mailed-token.entity';
import { findMail, mailedToken } from './factories/mails';
import { as, createPerson } from './factories/people';
import { startTestApp, type TestApp } from './test-app';

const PASSWORD = 'a long enough password';
const OTHER = 'another long password';
let test: TestApp;
beforeAll(async () => {
  test = await startTestApp();
});
afterAll(() => test.close());

const open = () => as(test, null);
async function signUp(email: string): Promise<{ accessToken: string; user: { id: string } }> {
  const wanted = { name: 'Ida', email, password: PASSWORD, workshopName: 'Ida Benches' };
  return (await open().post('/auth/sign-up').send(wanted).expect(201)).body;
}
const signIn = (email: string, password: string) => open().post('/auth/sign-in').send({ email, password });
const confirm = (token: string) => open().post('/auth/email/confirm').send({ token });
const askReset = (email: string) => open().post('/auth/password-reset').send({ email }).expect(202);
const reset = (token: string, password = OTHER) =>
  open().post('/auth/password-reset/confirm').send({ token, password });

async function signUpConfirmed(email: string) {
  const session = await signUp(email);
  await confirm(await mailedToken(test, email, 'email-confirm')).expect(200);
  return session;
}

describe('confirming the address', () => {
  it('works once, with the mailed link', async () => {
    const session = await signUp('first@people.test');
    const token = await mailedToken(test, 'first@people.test', 'email-confirm');
    const confirmed = await confirm(token).expect(200);
    expect(confirmed.body).toEqual({ email: 'first@people.test' });
    const me = await as(test, session).get('/auth/me').expect(200);
    expect(me.body.user.emailConfirmed).toBe(true);
    expect((await confirm(token).expect(400)).body.code).toBe('link-not-valid');
  });

  it('sends a new link on request, after which the old one no longer works', async () => {
    const session = await signUp('again@people.test');
    const old = await mailedToken(test, 'again@people.test', 'email-confirm');
    await as(test, session).post('/auth/email/resend').expect(202);
    const fresh = await mailedToken(test, 'again@people.test', 'email-confirm');
    expect(fresh).not.toBe(old);
    await confirm(old).expect(400);
    await confirm(fresh).expect(200);
  });

  it('gives an address to the first account that confirms it', async () => {
    await signUp('shared@people.test');
    const firstToken = await mailedToken(test, 'shared@people.test', 'email-confirm');
    await signUp('shared@people.test');
    const secondToken = await mailedToken(test, 'shared@people.test', 'email-confirm');
    await confirm(secondToken).expect(200);
    expect((await confirm(firstToken).expect(409)).body.code).toBe('email-in-use');
  });

  it('refuses a link that is too old', async () => {
    const session = await signUp('late@people.test');
    const token = await mailedToken(test, 'late@people.test', 'email-confirm');
    await test.dataSource.manager.update(
      MailedToken,
      { userId: session.user.id },
      { expiresAt: new Date(Date.now() - 1) },
    );
    await confirm(token).expect(400);
  });
});

describe('a forgotten password', () => {
  it('is replaced through the mailed link, which ends every session', async () => {
    const session = await signUpConfirmed('forgot@people.test');
    await askReset('Forgot@people.test');
    const token = await mailedToken(test, 'forgot@people.test', 'password-reset');
    await reset(token).expect(204);
    await as(test, session).get('/auth/me').expect(401);
    await signIn('forgot@people.test', PASSWORD).expect(401);
    await signIn('forgot@people.test', OTHER).expect(200);
    await reset(token).expect(400);
    expect(await findMail(test, 'forgot@people.test', 'password-changed')).not.toBeNull();
  });

  it('answers the same for an unknown address and sends nothing there', async () => {
    const unknown = await askReset('unknown@people.test');
    expect(unknown.body).toEqual({});
    expect(await findMail(test, 'unknown@people.test', 'password-reset')).toBeNull();
  });

  it('keeps the link good when the new password is refused', async () => {
    await signUpConfirmed('weak@people.test');
    await askReset('weak@people.test');
    const token = await mailedToken(test, 'weak@people.test', 'password-reset');
    await reset(token, 'short').expect(400);
    await reset(token).expect(204);
  });

  it('is not opened by a link for something else', async () => {
    await signUp('mixed@people.test');
    await reset(await mailedToken(test, 'mixed@people.test', 'email-confirm')).expect(400);
  });

  it('sends at most five mails an hour to one address', async () => {
    for (let asked = 0; asked < 5; asked += 1) await askReset('often@people.test');
    await open().post('/auth/password-reset').send({ email: 'often@people.test' }).expect(429);
  });
});

describe('another address', () => {
  const change = (session: { accessToken: string }, newEmail: string, password = PASSWORD) =>
    as(test, session).post('/auth/email/change').send({ newEmail, password });

  it('is used once it is confirmed, and the old one is told', async () => {
    const session = await signUpConfirmed('moving@people.test');
    await change(session, 'Moved@people.test').expect(202);
    const before = await as(test, session).get('/auth/me').expect(200);
    expect(before.body.user.email).toBe('moving@people.test');
    await confirm(await mailedToken(test, 'moved@people.test', 'email-change')).expect(200);
    await signIn('moved@people.test', PASSWORD).expect(200);
    await signIn('moving@people.test', PASSWORD).expect(401);
    expect((await findMail(test, 'moving@people.test', 'email-changed'))?.text).toContain(
      'moved@people.test',
    );
  });

  it('asks for the password', async () => {
    const session = await signUpConfirmed('careful@people.test');
    const refused = await change(session, 'x@people.test', 'not my password').expect(400);
    expect(refused.body.fields[0].path).toBe('password');
  });

  it('does not tell that the new address has an account', async () => {
    const session = await signUpConfirmed('curious@people.test');
    await createPerson(test, { email: 'taken@people.test' });
    await change(session, 'taken@people.test').expect(202);
    expect(await findMail(test, 'taken@people.test', 'email-change')).toBeNull();
    expect(await findMail(test, 'taken@people.test', 'email-known')).not.toBeNull();
  });
});
