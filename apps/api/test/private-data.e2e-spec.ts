import { execFile } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import type { Response } from 'supertest';
import type { Role } from '../src/common/access.decorator';
import { OrderLink } from '../src/cushion-orders/entities/order-link.entity';
import { OutboxAttachment } from '../src/mail/entities/outbox-attachment.entity';
import { EXPECTED_ACCESS } from './access/expected-access';
import { fillPath, listRoutes, type Route } from './access/routes';
import { as } from './factories/people';
import { createShop, PRIVATE, type Shop } from './factories/shop';
import { startObjects, type StandIn, STORE_KEYS } from './factories/stand-ins';
import { startTestApp, type TestApp } from './test-app';

jest.setTimeout(60_000);

let test: TestApp;
let store: StandIn;
let shop: Shop;
let other: Shop;
let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'private-data-'));
  store = await startObjects();
  test = await startTestApp({ objectStore: { ...STORE_KEYS, endpoint: store.url } });
  shop = await createShop(test, 'Ours');
  other = await createShop(test, 'Theirs');
});
afterAll(async () => {
  await test.close();
  await rm(folder, { recursive: true });
});

const { statureMm, weightKg, poplitealMm, shoeMm, notes, name, sitKg, sitNote } = PRIVATE;
const MEASURES = [statureMm, weightKg, poplitealMm, shoeMm, sitKg].map(String);

async function pdfText(content: Buffer): Promise<string> {
  const file = join(folder, 'paper.pdf');
  await writeFile(file, content);
  const { stdout } = await promisify(execFile)('pdftotext', ['-layout', file, '-']);
  return stdout;
}

/** What a person could read in an answer, also when it is a paper. */
async function readable(answer: Response): Promise<string> {
  if (answer.type === 'application/pdf') return pdfText(answer.body as Buffer);
  // A photograph, or a cutting file.
  return Buffer.isBuffer(answer.body) ? answer.body.toString('latin1') : answer.text;
}

const isPaper = (path: string) => path.endsWith('.pdf');

async function get(path: string, who: { accessToken: string } | null): Promise<Response> {
  const asked = as(test, who).get(path);
  const binary = (answer: NodeJS.ReadableStream, done: (fault: Error | null, body: Buffer) => void) => {
    const chunks: Buffer[] = [];
    answer.on('data', (chunk: Buffer) => chunks.push(chunk));
    answer.on('end', () => done(null, Buffer.concat(chunks)));
  };
  return isPaper(path) ? asked.buffer(true).parse(binary as never) : asked;
}

function routesRead(by: Role): Route[] {
  return listRoutes(test).filter(
    (route) => route.method === 'get' && (EXPECTED_ACCESS[route.name] as readonly string[]).includes(by),
  );
}

const S = () => fillPath('/workshops/{workshopId}/productions/{productionId}/sets/{setId}', shop.parameters);
const P = () => fillPath('/workshops/{workshopId}/productions/{productionId}', shop.parameters);

describe('a measure that is looked for', () => {
  it('is found where it belongs, so that not finding it elsewhere says something', async () => {
    const cast = await get(`${P()}/cast`, shop.people.designer);
    const sits = await get(`${S()}/test-sits`, shop.people.designer);
    const found = cast.text + sits.text;
    for (const secret of [...MEASURES, notes, name, sitNote]) expect(found).toContain(secret);
  });
});

describe.each(['carpenter', 'reviewer'] as const)('the %s', (role) => {
  it('gets no measure, weight or note of a person from any route', async () => {
    for (const route of routesRead(role)) {
      const answer = await get(fillPath(route.path, shop.parameters), shop.people[role]);
      expect([route.name, answer.status]).toEqual([route.name, 200]);
      const text = await readable(answer);
      const leaked = [...MEASURES, notes, sitNote].filter((secret) => text.includes(secret));
      expect([route.name, leaked]).toEqual([route.name, []]);
    }
  });

  it('gets four fields of a cast member', async () => {
    const { body } = await get(`${P()}/cast`, shop.people[role]);
    expect(body.items).toEqual([
      { id: shop.parameters.castId, name, role: 'the conductor', colour: expect.any(Number) },
    ]);
  });

  it.each(['draft/fit-sheet', 'revisions/A'])('gets verdicts and a coarse body from %s', async (path) => {
    const { body } = await get(`${S()}/${path}`, shop.people[role]);
    const sheet = body.fitSheet ?? body;
    expect(sheet.detail).toBe('verdicts');
    expect(sheet.rows).toHaveLength(1);
    expect(sheet.bodies).toHaveLength(1);
    for (const [key, mm] of Object.entries(sheet.bodies[0].means as Record<string, number>)) {
      expect([key, mm % 20]).toEqual([key, 0]);
    }
    expect(sheet.bodies[0].shoeMm % 20).toBe(0);
    expect(sheet.bodies[0].means).not.toHaveProperty('weight_kg');
    const cells: { outcome: { kind: string } }[] = sheet.rows[0].cells;
    const verdicts = cells.filter(({ outcome }) => outcome.kind === 'verdict');
    expect(verdicts.length).toBeGreaterThan(5);
    const shown = new Set(verdicts.flatMap(({ outcome }) => Object.keys(outcome)));
    const open = ['kind', 'verdict', 'margin', 'marginRange', 'estimated'];
    expect([...shown].filter((key) => !open.includes(key))).toEqual([]);
  });
});

describe('owner and designer', () => {
  it.each(['owner', 'designer'] as const)('the %s gets the whole fit sheet', async (role) => {
    const { body } = await get(`${S()}/draft/fit-sheet`, shop.people[role]);
    expect(body.detail).toBe('full');
    expect(body).not.toHaveProperty('bodies');
  });
});

describe('the holder of a private link', () => {
  const LINK = listOfLinkRoutes();

  it('reads one order, without a word about the people who will sit there', async () => {
    for (const path of LINK.get) {
      const answer = await get(fillPath(path, { ...shop.parameters, token: shop.linkToken }), null);
      expect([path, answer.status]).toEqual([path, 200]);
      const text = await readable(answer);
      const people = Object.values(shop.people).map((person) => person.email);
      const leaked = [...MEASURES, notes, name, 'the conductor', ...people.slice(1)].filter((secret) =>
        text.includes(secret),
      );
      expect([path, leaked]).toEqual([path, []]);
      expect(answer.get('Cache-Control')).toContain('no-store');
    }
  });

  it('gets no cast data by mail either', async () => {
    const mails: { text: string; subject: string; id: string }[] = await test.dataSource.query(
      `SELECT id, subject, text FROM outbox_mails WHERE related_id = $1`,
      [shop.parameters.orderId],
    );
    expect(mails).not.toEqual([]);
    for (const mail of mails) {
      const attached = await test.dataSource.manager.findBy(OutboxAttachment, { mailId: mail.id });
      const papers = await Promise.all(attached.map(({ content }) => pdfText(content)));
      const all = [mail.subject, mail.text, ...papers].join('\n');
      expect([...MEASURES, name].filter((secret) => all.includes(secret))).toEqual([]);
    }
  });

  it('gets the order of the own link and no other', async () => {
    const ours = await get(`/link/${shop.linkToken}`, null);
    const theirs = await get(`/link/${other.linkToken}`, null);
    expect(ours.text).not.toContain(other.parameters.orderId);
    expect(theirs.text).not.toContain(shop.parameters.orderId);
    expect(ours.text).not.toContain('Theirs');
  });

  it('is let into nothing else', async () => {
    const closed = listRoutes(test).filter(
      ({ name: route }) => !['public', 'link'].includes(String(EXPECTED_ACCESS[route]?.[0])),
    );
    for (const route of closed) {
      const path = fillPath(route.path, shop.parameters);
      const answer = await as(test, { accessToken: shop.linkToken })[route.method](path);
      expect([route.name, answer.status]).toEqual([route.name, 401]);
    }
  });

  it.each([
    ['made up', () => Promise.resolve('A'.repeat(43))],
    ['of another kind', () => Promise.resolve('invented')],
    ['expired', () => endLink({ expiresAt: new Date(Date.now() - 1) })],
    ['revoked', () => endLink({ revokedAt: new Date() })],
  ])('is refused everywhere when the link is %s', async (_what, makeToken) => {
    const token = await makeToken();
    for (const path of LINK.get) {
      expect([404, 410]).toContain((await get(fillPath(path, { ...shop.parameters, token }), null)).status);
    }
    for (const [path, body] of LINK.post) {
      const answer = await as(test, null)
        .post(fillPath(path, { ...shop.parameters, token }))
        .send(body);
      expect([404, 410]).toContain(answer.status);
    }
  });

  async function endLink(change: Partial<OrderLink>): Promise<string> {
    const ended = await createShop(test, 'With an ended link');
    await test.dataSource.manager.update(OrderLink, { orderId: ended.parameters.orderId }, change);
    return ended.linkToken;
  }
});

/** The invitation's link is another one; its tests stand with the invitations. */
function listOfLinkRoutes(): { get: string[]; post: [string, object][] } {
  const bodies: Record<string, object> = {
    '/link/{token}/acknowledge': { name: 'Uma Upholsterer' },
    '/link/{token}/reply': { text: 'In three weeks' },
    '/link/{token}/quote': {
      ...{ name: 'Uma', sentAt: '2026-01-01T00:00:00Z', currency: 'USD', validUntil: '2099-01-01' },
      lines: [{ text: 'Cushions', quantity: 1, unitMinor: 100 }],
    },
    '/link/{token}/state': { name: 'Uma', to: 'shipped' },
    '/link/{token}/questions': { text: 'Which day?' },
    '/link/{token}/questions/{questionId}/answer': { answer: 'On Friday' },
  };
  const names = Object.keys(EXPECTED_ACCESS).filter((route) => route.includes('/link/{token}'));
  return {
    get: names.flatMap((route) => (route.startsWith('GET ') ? [route.slice(4)] : [])),
    post: names.flatMap((route) => {
      const path = route.slice(5);
      return route.startsWith('POST ') ? [[path, bodies[path] ?? {}] as [string, object]] : [];
    }),
  };
}
