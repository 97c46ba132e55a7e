import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Controller, Get } from '@nestjs/common';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import request from 'supertest';
import { Access } from '../src/common/access.decorator';
import { HealthModule } from '../src/health/health.module';
import { as, createPerson } from './factories/people';
import { startTestApp, type TestApp } from './test-app';

let test: TestApp;
let webDist: string;
beforeAll(async () => {
  webDist = await mkdtemp(join(tmpdir(), 'web-dist-'));
  await mkdir(join(webDist, 'assets'));
  await writeFile(join(webDist, 'index.html'), '<!doctype html><title>The page</title>');
  await writeFile(join(webDist, 'assets', 'app-1a2b.js'), 'export {};');
  test = await startTestApp({ webDist });
});
afterAll(async () => {
  await test.close();
  await rm(webDist, { recursive: true });
});

const http = () => request(test.app.getHttpServer());
const signIn = { email: 'a@people.test', password: 'a long enough password' };

describe('what cannot be read', () => {
  it('is told from malformed JSON', async () => {
    const refused = await http()
      .post('/api/auth/sign-in')
      .type('json')
      .send('{"email": "a@b')
      .expect(400)
      .expect('Content-Type', /application\/problem\+json/);
    expect(refused.body).toEqual({
      type: 'about:blank',
      title: 'Bad Request',
      status: 400,
      code: 'malformed-json',
      detail: 'The body is not valid JSON.',
    });
  });

  it('is refused above 3 MB and read below', async () => {
    const person = await createPerson(test);
    const send = (length: number) =>
      as(test, person)
        .patch('/auth/me')
        .send({ name: 'x'.repeat(length) });
    const refused = await send(3 * 1024 * 1024).expect(413);
    expect(refused.body).toMatchObject({ code: 'too-large', detail: expect.stringContaining('3 MB') });
    expect((await send(3 * 1024 * 1024 - 100).expect(400)).body.code).toBe('invalid-request');
  });

  it.each([
    ['a form', 'application/x-www-form-urlencoded', 'email=a'],
    ['text', 'text/plain', 'hello'],
    ['nothing', 'application/json', ''],
    ['a list', 'application/json', '[]'],
    ['null', 'application/json', 'null'],
  ])('names the missing fields for %s', async (_what, type, body) => {
    const refused = await http().post('/api/auth/sign-in').type(type).send(body).expect(400);
    expect(refused.body.status).toBe(400);
  });

  it('answers 404 to an unknown address without repeating it', async () => {
    const refused = await http().get('/api/link-with-secret').expect(404);
    expect(refused.text).not.toContain('secret');
    await http().get('/api/%FF').expect(400);
  });
});

describe('other sites', () => {
  const fromSite = (headers: Record<string, string>) =>
    http().post('/api/auth/sign-in').set('Host', 'settlewright.test').set(headers).send(signIn);

  it.each([
    [{ 'Sec-Fetch-Site': 'cross-site' }],
    [{ 'Sec-Fetch-Site': 'same-site' }],
    [{ Origin: 'https://elsewhere.test' }],
    [{ Origin: 'null' }],
  ])('may not change anything: %j', async (headers) => {
    expect((await fromSite(headers as Record<string, string>).expect(403)).body.code).toBe('other-site');
  });

  it.each([[{ 'Sec-Fetch-Site': 'same-origin' }], [{ Origin: 'http://settlewright.test' }], [{}]])(
    'are not meant by %j',
    async (headers) => {
      await fromSite(headers as Record<string, string>).expect(401);
    },
  );

  it('get no leave to read either', async () => {
    const answer = await http().get('/api/health/live').set('Origin', 'https://elsewhere.test').expect(200);
    expect(answer.get('Access-Control-Allow-Origin')).toBeUndefined();
    await http().options('/api/auth/sign-in').set('Origin', 'https://elsewhere.test').expect(404);
  });
});

describe('headers', () => {
  it('allow only our own scripts and do not name the server', async () => {
    const answer = await http().get('/api/health').expect(200);
    expect(answer.get('Content-Security-Policy')).toContain("script-src 'self';");
    expect(answer.get('Content-Security-Policy')).toContain("default-src 'self'");
    expect(answer.get('X-Content-Type-Options')).toBe('nosniff');
    expect(answer.get('X-Powered-By')).toBeUndefined();
    expect(answer.get('X-Request-Id')).toMatch(/^[\da-f-]{36}$/);
  });

  it('compress what is worth it', async () => {
    const answer = await http().get('/api/openapi.json').set('Accept-Encoding', 'gzip').expect(200);
    expect(answer.get('Content-Encoding')).toBe('gzip');
  });
});

describe('the web application', () => {
  it.each(['/', '/sign-in', '/w/one/p/two', '/apiary'])('has its page at %s', async (path) => {
    const answer = await http().get(path).expect(200);
    expect(answer.text).toContain('The page');
    expect(answer.get('Cache-Control')).toBe('no-cache');
  });

  it('asks search engines to leave the page of a private link alone', async () => {
    const robots = async (path: string) => (await http().get(path).expect(200)).headers['x-robots-tag'];
    expect(await robots('/order/any-token')).toBe('noindex, nofollow, noarchive');
    expect(await robots('/w/one/p/two/orders/three')).toBeUndefined();
  });

  it('has files that never change, and no page in place of a missing one', async () => {
    const file = await http().get('/assets/app-1a2b.js').expect(200);
    expect(file.get('Cache-Control')).toBe('public, max-age=31536000, immutable');
    const missing = await http().get('/assets/app-old.js').expect(404);
    expect(missing.type).toBe('application/problem+json');
    await http().get('/api').expect(404);
    await http().get('/api/nope').expect(404);
  });
});

describe('a route without a usable rule keeps the application from starting', () => {
  @Controller('open')
  class ForgottenController {
    @Get()
    read(): string {
      return 'read';
    }
  }

  @Controller('things')
  class PathlessController {
    @Get()
    @Access('owner')
    read(): string {
      return 'read';
    }
  }

  @Controller('workshops/:workshopId/things')
  class TooOpenController {
    @Get()
    @Access('signed-in')
    read(): string {
      return 'read';
    }
  }

  it.each([
    [ForgottenController, /ForgottenController\.read: none declared/],
    [PathlessController, /PathlessController\.read: roles and :workshopId/],
    [TooOpenController, /TooOpenController\.read: roles and :workshopId/],
  ])('%p', async (controller, words) => {
    class WithRoute {}
    const start = startTestApp({}, '_unruled', (builder) =>
      builder.overrideModule(HealthModule).useModule({ module: WithRoute, controllers: [controller] }),
    );
    await expect(start).rejects.toThrow(words);
  });
});
