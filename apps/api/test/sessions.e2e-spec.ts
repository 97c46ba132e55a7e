import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import request, { type Response } from 'supertest';
import { RefreshToken } from '../src/auth/entities/refresh-token.entity';
import { Session } from '../src/auth/entities/session.entity';
import { CleanUp } from '../src/auth/clean-up';
import { User } from '../src/users/entities/user.entity';
import { as, createPerson } from './factories/people';
import { startTestApp, type TestApp } from './test-app';

const PASSWORD = 'a long enough password';
let test: TestApp;
beforeAll(async () => {
  test = await startTestApp();
});
afterAll(() => test.close());

const open = () => as(test, null);
const signUp = (email: string, more: object = {}) =>
  open()
    .post('/auth/sign-up')
    .send({ name: 'Ida', email, password: PASSWORD, workshopName: 'Ida Benches', ...more });
const signIn = (email: string, password = PASSWORD) => open().post('/auth/sign-in').send({ email, password });

function refreshCookie(response: Response): string {
  const cookies = response.get('Set-Cookie') ?? [];
  const cookie = cookies.find((one) => one.startsWith('settlewright_refresh='));
  if (!cookie) throw new Error('no refresh cookie was set');
  return cookie;
}

const pair = (response: Response) => refreshCookie(response).split(';', 1)[0] ?? '';
const refresh = (cookie: string) => open().post('/auth/refresh').set('Cookie', cookie);

describe('signing up', () => {
  it('opens a session in a new workshop, with a cookie that scripts and other sites cannot use', async () => {
    const response = await signUp('ida@people.test').expect(201);
    expect(response.body).toEqual({
      accessToken: expect.any(String),
      expiresInSeconds: 600,
      user: { id: expect.any(String), name: 'Ida', email: 'ida@people.test', emailConfirmed: false },
      workshops: [{ id: expect.any(String), name: 'Ida Benches', role: 'owner', isDemo: false }],
    });
    const cookie = refreshCookie(response);
    expect(cookie).toContain('HttpOnly');
    expect(cookie).toContain('SameSite=Strict');
    expect(cookie).toContain('Path=/api/auth');
    expect(response.get('Cache-Control')).toBe('no-store');
    const me = await as(test, response.body).get('/auth/me').expect(200);
    expect(me.body.user.name).toBe('Ida');
  });

  it('stores an argon2id hash and no refresh token in clear', async () => {
    const response = await signUp('hash@people.test').expect(201);
    const user = await test.dataSource.manager.findOneByOrFail(User, { email: 'hash@people.test' });
    expect(user.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    const token = pair(response).split('=')[1];
    const stored = await test.dataSource.query('SELECT token_hash FROM refresh_tokens');
    expect(stored.map((row: { token_hash: string }) => row.token_hash)).not.toContain(token);
  });

  it('answers the same for an address that has an account, and tells only the address', async () => {
    const known = await createPerson(test, { email: 'known@people.test' });
    const response = await signUp('KNOWN@people.test').expect(201);
    expect(response.body.user).toEqual({
      id: expect.any(String),
      name: 'Ida',
      email: 'known@people.test',
      emailConfirmed: false,
    });
    expect(response.body.user.id).not.toBe(known.id);
    const kinds = await test.dataSource.query(`SELECT kind FROM outbox_mails WHERE "to" = $1`, [known.email]);
    expect(kinds).toEqual([{ kind: 'email-known' }]);
  });

  it('names every fault of the form at once and repeats no password', async () => {
    const response = await signUp('not an address', { password: 'short', name: '  ', role: 'owner' }).expect(
      400,
    );
    expect(response.type).toBe('application/problem+json');
    expect(response.body.code).toBe('invalid-request');
    const paths = response.body.fields.map((field: { path: string }) => field.path);
    expect(new Set(paths)).toEqual(new Set(['email', 'password', 'name', 'role']));
    expect(response.text).not.toContain('short');
    expect(response.text).toContain('not an address');
  });

  it.each([10, 200])('takes a password of %d characters', async (length) => {
    await signUp(`p${length}@people.test`, { password: 'é'.repeat(length) }).expect(201);
  });

  it.each([9, 201])('refuses a password of %d characters', async (length) => {
    const response = await signUp(`q${length}@people.test`, { password: 'x'.repeat(length) }).expect(400);
    expect(response.body.fields).toEqual([expect.objectContaining({ path: 'password' })]);
  });
});

describe('signing in', () => {
  it('takes the address in any case', async () => {
    await signUp('case@people.test').expect(201);
    await signIn('Case@People.test').expect(200);
  });

  it('says the same for a wrong password and an unknown address', async () => {
    await signUp('same@people.test').expect(201);
    const wrong = await signIn('same@people.test', 'another password').expect(401);
    const unknown = await signIn('nobody@people.test').expect(401);
    expect(wrong.body).toEqual(unknown.body);
    expect(wrong.body.code).toBe('wrong-credentials');
  });

  it('refuses the eleventh attempt at one address, also with the right password, but not another address', async () => {
    await signUp('limit@people.test').expect(201);
    for (let attempt = 0; attempt < 10; attempt += 1) {
      await signIn('limit@people.test', 'another password').expect(401);
    }
    const refused = await signIn('limit@people.test').expect(429);
    expect(refused.body.code).toBe('too-many-attempts');
    expect(refused.body.retryAfterSeconds).toBeGreaterThan(0);
    expect(refused.get('Retry-After')).toBe(String(refused.body.retryAfterSeconds));
    await signUp('other-limit@people.test').expect(201);
    await signIn('other-limit@people.test').expect(200);
  });
});

describe('refreshing', () => {
  it('changes the cookie with each use', async () => {
    const first = await signUp('rotate@people.test').expect(201);
    const second = await refresh(pair(first)).expect(200);
    expect(pair(second)).not.toBe(pair(first));
    expect(second.body.user.email).toBe('rotate@people.test');
    await refresh(pair(second)).expect(200);
  });

  it('lets a second tab use the same cookie within ten seconds', async () => {
    const first = await signUp('tabs@people.test').expect(201);
    const [one, two] = await Promise.all([refresh(pair(first)), refresh(pair(first))]);
    expect([one.status, two.status]).toEqual([200, 200]);
    await refresh(pair(one)).expect(200);
    await refresh(pair(two)).expect(200);
  });

  it('ends the whole session when a used cookie comes back later', async () => {
    const first = await signUp('thief@people.test').expect(201);
    const second = await refresh(pair(first)).expect(200);
    const tenSecondsAgo = new Date(Date.now() - 10_001);
    const { manager } = test.dataSource;
    const used = await manager.find(RefreshToken, {
      order: { usedAt: { direction: 'DESC', nulls: 'LAST' } },
    });
    await manager.update(RefreshToken, { id: used[0]?.id }, { usedAt: tenSecondsAgo });
    const refused = await refresh(pair(first)).expect(401);
    expect(refused.body.code).toBe('session-ended');
    expect(refreshCookie(refused)).toContain('settlewright_refresh=;');
    await refresh(pair(second)).expect(401);
    await as(test, second.body).get('/auth/me').expect(401);
    const session = await manager.findOneByOrFail(Session, { userId: first.body.user.id });
    expect(session.endedBecause).toBe('token-reused');
  });

  it('refuses an unknown cookie, an expired session and no cookie', async () => {
    await refresh('settlewright_refresh=invented').expect(401);
    await open().post('/auth/refresh').expect(401);
    const first = await signUp('expired@people.test').expect(201);
    await test.dataSource.manager.update(
      Session,
      { userId: first.body.user.id },
      { expiresAt: new Date(Date.now() - 1) },
    );
    await refresh(pair(first)).expect(401);
    await as(test, first.body).get('/auth/me').expect(401);
  });
});

describe('signing out', () => {
  it('ends this session at once and leaves the others', async () => {
    const here = await signUp('leave@people.test').expect(201);
    const elsewhere = await signIn('leave@people.test').expect(200);
    const out = await open().post('/auth/sign-out').set('Cookie', pair(here)).expect(204);
    expect(refreshCookie(out)).toContain('settlewright_refresh=;');
    await as(test, here.body).get('/auth/me').expect(401);
    await refresh(pair(here)).expect(401);
    await as(test, elsewhere.body).get('/auth/me').expect(200);
  });

  it('ends all sessions everywhere', async () => {
    const here = await signUp('all@people.test').expect(201);
    const elsewhere = await signIn('all@people.test').expect(200);
    await as(test, here.body).post('/auth/sign-out-everywhere').expect(204);
    await as(test, elsewhere.body).get('/auth/me').expect(401);
    await refresh(pair(elsewhere)).expect(401);
  });

  it('is no fault without a session', async () => {
    await open().post('/auth/sign-out').expect(204);
  });
});

describe('access tokens', () => {
  it('are refused when made up, unsigned or signed with another secret', async () => {
    const { accessToken } = await createPerson(test);
    const [, payload] = accessToken.split('.');
    const unsigned = `${Buffer.from('{"alg":"none","typ":"JWT"}').toString('base64url')}.${payload}.`;
    for (const token of ['nonsense', unsigned, `${accessToken.slice(0, -4)}AAAA`]) {
      await as(test, { accessToken: token }).get('/auth/me').expect(401);
    }
  });

  it('end after ten minutes', async () => {
    const { accessToken } = await createPerson(test);
    const payload = JSON.parse(Buffer.from(accessToken.split('.')[1] ?? '', 'base64url').toString());
    expect(payload.exp - payload.iat).toBe(600);
  });
});

it('removes expired sessions with their tokens', async () => {
  const first = await signUp('old@people.test').expect(201);
  const owner = { userId: first.body.user.id };
  await test.dataSource.manager.update(Session, owner, { expiresAt: new Date(Date.now() - 1) });
  await test.app.get(CleanUp).run();
  expect(await test.dataSource.manager.countBy(Session, owner)).toBe(0);
});

it('renames whoever asks', async () => {
  const person = await createPerson(test);
  const changed = await as(test, person).patch('/auth/me').send({ name: ' Bo Builder ' }).expect(200);
  expect(changed.body.user.name).toBe('Bo Builder');
  await request(test.app.getHttpServer()).patch('/api/auth/me').send({ name: 'x' }).expect(401);
});
