import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { formatLength } from '@settlewright/geometry';
import { OutboxAttachment } from '../src/mail/entities/outbox-attachment.entity';
import { findMail, mailedToken } from './factories/mails';
import { createIssuedSet, issue, type IssuedSet } from './factories/orders';
import { as, createMember, createPerson, createWorkshop, type Person } from './factories/people';
import { startTestApp, type TestApp } from './test-app';

const CAST_NAME = 'Wilhelmina Sittersworth';

interface Order {
  id: string;
  number: number;
  state: string;
  cushions: { mark: string; finishedMm: { widthMm: number; depthMm: number; thicknessMm: number } }[];
  events: { kind: string; toState: string | null; byName: string; note: string }[];
  [key: string]: unknown;
}

describe('cushion orders', () => {
  let test: TestApp;
  let made: IssuedSet;
  let owner: Person;

  beforeAll(async () => {
    test = await startTestApp();
    made = await createIssuedSet(test, CAST_NAME);
    owner = made.workshop.owner;
  });
  afterAll(() => test.close());

  const create = async (body: Record<string, unknown> = {}) =>
    (
      await as(test, owner)
        .post(made.orders)
        .send({ setId: made.setId, revisionLetter: 'A', title: 'Seat cushions', ...body })
        .expect(201)
    ).body as Order;
  const upholsterer = async (email = 'odile@fennimore.test') =>
    (
      await as(test, owner)
        .post(`/workshops/${made.workshop.id}/upholsterers`)
        .send({ name: 'Fennimore & Daughter', contactName: 'Odile Fennimore', email })
        .expect(201)
    ).body as { id: string };
  const send = async (orderId: string, upholstererId: string, message = '') =>
    (
      await as(test, owner)
        .post(`${made.orders}/${orderId}/send`)
        .send({ upholstererId, message })
        .expect(200)
    ).body as Order;
  const get = async (orderId: string) =>
    (await as(test, owner).get(`${made.orders}/${orderId}`).expect(200)).body as Order;

  it('counts through the workshop, also when two are made at once', async () => {
    const orders = await Promise.all([create(), create(), create()]);
    const numbers = orders.map(({ number }) => number).sort((a, b) => a - b);
    expect(numbers).toEqual([numbers[0]!, numbers[0]! + 1, numbers[0]! + 2]);
    const list = await as(test, owner).get(`${made.orders}?sort=number&order=desc&pageSize=1`).expect(200);
    expect(list.body).toMatchObject({
      total: 3,
      items: [{ number: numbers[2], setName: 'Dining car', state: 'draft' }],
    });
  });

  it('cites an issued revision and asks for its cushions or some of them', async () => {
    const all = await create();
    expect(all.cushions.length).toBeGreaterThanOrEqual(2);
    expect(all).toMatchObject({
      revisionLetter: 'A',
      cushionMarks: null,
      link: { state: 'none' },
      sent: null,
    });
    const some = await create({
      cushionMarks: ['C2'],
      neededBy: '2027-02-26',
      spec: { cover: 'plum moquette' },
    });
    expect(some.cushions.map(({ mark }) => mark)).toEqual(['C2']);
    expect(some).toMatchObject({ neededBy: '2027-02-26', spec: { cover: 'plum moquette', foam: '' } });
    const changed = await as(test, owner)
      .patch(`${made.orders}/${some.id}`)
      .send({ title: 'Two seats', cushionMarks: null, neededBy: null, spec: { foam: 'wrapped' } })
      .expect(200);
    expect(changed.body).toMatchObject({
      title: 'Two seats',
      neededBy: null,
      cushionMarks: null,
      spec: { cover: 'plum moquette', foam: 'wrapped' },
    });
  });

  it('refuses what it cannot use, by field', async () => {
    const fields = async (body: Record<string, unknown>, status = 400) => {
      const answer = await as(test, owner)
        .post(made.orders)
        .send({ setId: made.setId, revisionLetter: 'A', title: 'x', ...body })
        .expect(status);
      return ((answer.body as { fields?: { path: string }[] }).fields ?? []).map(({ path }) => path);
    };
    expect(await fields({ title: '' })).toEqual(['title']);
    expect(await fields({ neededBy: '2027-02-30' })).toEqual(['neededBy']);
    expect(await fields({ cushionMarks: [] })).toEqual(['cushionMarks']);
    expect(await fields({ cushionMarks: ['C1', 'C900'] })).toEqual(['cushionMarks']);
    expect(await fields({ spec: { leather: 'yes' } })).toEqual(['spec.leather']);
    expect(await fields({ spec: 'plum' })).toContain('spec');
    expect(await fields({ revisionLetter: 'Q' }, 404)).toEqual([]);
    expect(await fields({ setId: made.productionId }, 404)).toEqual([]);
  });

  it('is sent once with its drawing pack, a private link and an event, all or nothing', async () => {
    const order = await create({ neededBy: '2027-02-26' });
    const { id: upholstererId } = await upholsterer('pack@fennimore.test');
    const sent = await send(order.id, upholstererId, 'Please start with one.');
    expect(sent).toMatchObject({
      state: 'sent',
      sent: { revisionLetter: 'A', byName: owner.name, changedSince: false },
      upholsterer: { name: 'Fennimore & Daughter', removed: false },
      link: { state: 'valid' },
      lastMail: { state: 'queued' },
    });
    const mail = await findMail(test, 'pack@fennimore.test', 'cushion-order');
    expect(mail).toMatchObject({ relatedId: order.id, replyTo: owner.email });
    expect(mail?.messageId).toMatch(/^<[\w-]+@settlewright\.test>$/);
    expect(mail?.text).toContain('Please start with one.');
    expect(mail?.text).toContain('Friday 26 February 2027');
    expect(mail?.text).toContain('http://settlewright.test/order/');
    const files = await test.dataSource.manager.findBy(OutboxAttachment, { mailId: mail!.id });
    expect(files.map(({ filename, contentType }) => [filename, contentType])).toEqual([
      [`cushion-order-${order.number}-A.pdf`, 'application/pdf'],
    ]);
    const own = await as(test, owner).get(`${made.orders}/${order.id}/spec.pdf`).expect(200);
    expect(own.headers['content-type']).toBe('application/pdf');
    expect(files[0]!.content.equals(own.body as Buffer)).toBe(true);
    const days =
      (new Date((sent.link as { expiresAt: string }).expiresAt).getTime() - Date.now()) / 86_400_000;
    expect(days).toBeGreaterThan(59.9);
    expect(days).toBeLessThan(60.1);
  });

  it('keeps only a hash of the link', async () => {
    const order = await create();
    const { id } = await upholsterer('hash@fennimore.test');
    await send(order.id, id);
    const token = await mailedToken(test, 'hash@fennimore.test', 'cushion-order');
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    const rows = await test.dataSource.query<unknown[]>('SELECT * FROM order_links WHERE order_id = $1', [
      order.id,
    ]);
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(token);
  });

  it('asks for a confirmed address before anything goes out', async () => {
    const order = await create();
    const { id: upholstererId } = await upholsterer();
    const unconfirmed = await createPerson(test, { name: 'Uma', emailConfirmed: false });
    await test.dataSource.query(
      `INSERT INTO memberships (workshop_id, user_id, role) VALUES ($1, $2, 'designer')`,
      [made.workshop.id, unconfirmed.id],
    );
    const answer = await as(test, unconfirmed)
      .post(`${made.orders}/${order.id}/send`)
      .send({ upholstererId })
      .expect(403);
    expect(answer.body).toMatchObject({ code: 'email-not-confirmed' });
    expect(await get(order.id)).toMatchObject({ state: 'draft', link: { state: 'none' } });
  });

  it('goes from state to state in order, each with who recorded it and why', async () => {
    const order = await create();
    const { id: upholstererId } = await upholsterer();
    const record = (to: string, note = '') =>
      as(test, owner).post(`${made.orders}/${order.id}/state`).send({ to, note });
    const early = await record('quoted').expect(409);
    expect(early.body).toMatchObject({
      code: 'state-not-reachable',
      state: 'draft',
      accepted: ['cancelled'],
    });
    await record('sent').expect(400);
    await send(order.id, upholstererId);
    await record('agreed').expect(409);
    for (const to of ['quoted', 'agreed', 'first-article', 'in-work', 'shipped', 'received', 'closed']) {
      expect((await record(to, `heard of ${to}`).expect(200)).body).toMatchObject({ state: to });
    }
    await record('cancelled').expect(409);
    const closed = await get(order.id);
    expect(closed.nextStates).toEqual([]);
    expect(
      closed.events
        .filter(({ kind }) => kind === 'state')
        .map(({ toState, note, byName }) => [toState, note, byName]),
    ).toEqual(
      ['quoted', 'agreed', 'first-article', 'in-work', 'shipped', 'received', 'closed'].map((to) => [
        to,
        `heard of ${to}`,
        owner.name,
      ]),
    );
  });

  it('is agreed only with the word of the upholsterer on what was last sent, or with a note', async () => {
    const order = await create();
    const { id: upholstererId } = await upholsterer('agree@fennimore.test');
    const record = (to: string, note?: string) =>
      as(test, owner).post(`${made.orders}/${order.id}/state`).send({ to, note });
    const acknowledge = async () => {
      const token = await mailedToken(test, 'agree@fennimore.test', 'cushion-order');
      await as(test, null).post(`/link/${token}/acknowledge`).send({ name: 'Odile Fennimore' }).expect(200);
    };
    await send(order.id, upholstererId);
    await acknowledge();
    await send(order.id, upholstererId);
    await record('quoted').expect(200);
    for (const note of [undefined, '', '  ']) {
      expect((await record('agreed', note).expect(409)).body).toMatchObject({
        code: 'not-acknowledged',
        detail: expect.stringMatching(/through the link.*or write in the note how and with whom/),
      });
    }
    await acknowledge();
    expect((await record('agreed').expect(200)).body).toMatchObject({ state: 'agreed' });

    await send(order.id, upholstererId);
    await record('quoted').expect(200);
    await record('agreed', 'by telephone with Odile').expect(200);
  });

  it('is cancelled before it is shipped, and the upholsterer is told', async () => {
    const order = await create();
    const { id: upholstererId } = await upholsterer('cancel@fennimore.test');
    await send(order.id, upholstererId);
    const cancelled = await as(test, owner).post(`${made.orders}/${order.id}/cancel`).send({}).expect(200);
    expect(cancelled.body).toMatchObject({ state: 'cancelled', maySend: false, mayChange: false });
    expect((await findMail(test, 'cancel@fennimore.test', 'cushion-order-cancelled'))?.text).toContain(
      'is cancelled',
    );
    await as(test, owner).post(`${made.orders}/${order.id}/send`).send({ upholstererId }).expect(409);
    await as(test, owner).patch(`${made.orders}/${order.id}`).send({ title: 'late' }).expect(409);
    await as(test, owner).post(`${made.orders}/${order.id}/messages`).send({ text: 'late' }).expect(409);
  });

  it('is sent again after a new revision, and is not agreed in between', async () => {
    const order = await create();
    const { id: upholstererId } = await upholsterer();
    await send(order.id, upholstererId);
    await as(test, owner).post(`${made.orders}/${order.id}/state`).send({ to: 'quoted' }).expect(200);
    const set = `${made.production}/sets/${made.setId}`;
    const draft = (await as(test, owner).get(`${set}/draft`).expect(200)).body as { number: number };
    const letter = await issue(test, owner, set, draft.number);
    const changed = await as(test, owner)
      .patch(`${made.orders}/${order.id}`)
      .send({ revisionLetter: letter })
      .expect(200);
    expect(changed.body).toMatchObject({
      state: 'quoted',
      revisionLetter: letter,
      sent: { revisionLetter: 'A', changedSince: true },
    });
    const early = await as(test, owner)
      .post(`${made.orders}/${order.id}/state`)
      .send({ to: 'agreed' })
      .expect(409);
    expect(early.body).toMatchObject({ code: 'changed-since-sent' });
    expect(await send(order.id, upholstererId)).toMatchObject({
      state: 'sent',
      sent: { revisionLetter: letter, changedSince: false },
    });
  });

  it('mails what the workshop writes and lists the thread', async () => {
    const order = await create();
    await as(test, owner).post(`${made.orders}/${order.id}/messages`).send({ text: 'too soon' }).expect(409);
    const { id: upholstererId } = await upholsterer('thread@fennimore.test');
    await send(order.id, upholstererId, 'First words.');
    await as(test, owner)
      .post(`${made.orders}/${order.id}/messages`)
      .send({ text: 'The zip is 48¾″.' })
      .expect(201);
    expect((await findMail(test, 'thread@fennimore.test', 'cushion-order-message'))?.text).toContain(
      'The zip is 48¾″.',
    );
    const list = await as(test, owner).get(`${made.orders}/${order.id}/messages`).expect(200);
    expect(
      (list.body as { items: { text: string; side: string }[] }).items.map(({ text, side }) => [side, text]),
    ).toEqual([
      ['workshop', 'First words.'],
      ['workshop', 'The zip is 48¾″.'],
    ]);
    await as(test, owner).post(`${made.orders}/${order.id}/messages`).send({ text: ' ' }).expect(400);
  });

  it('sends a mail again only when nobody knows that it went out', async () => {
    const order = await create();
    const { id: upholstererId } = await upholsterer();
    await send(order.id, upholstererId);
    const again = () => as(test, owner).post(`${made.orders}/${order.id}/mail/send-again`);
    await again().expect(409);
    await test.dataSource.query(`UPDATE outbox_mails SET state = 'perhaps-sent' WHERE related_id = $1`, [
      order.id,
    ]);
    expect(await get(order.id)).toMatchObject({ lastMail: { state: 'perhaps-sent' } });
    expect((await again().expect(200)).body).toMatchObject({ lastMail: { state: 'queued' } });
  });

  it('keeps orders when an upholsterer is removed, without the contact', async () => {
    const order = await create();
    const { id } = await upholsterer('gone@fennimore.test');
    await send(order.id, id);
    await as(test, owner).delete(`/workshops/${made.workshop.id}/upholsterers/${id}`).expect(204);
    expect(await get(order.id)).toMatchObject({
      upholsterer: { name: 'Fennimore & Daughter', contactName: '', removed: true },
    });
    await as(test, owner).post(`${made.orders}/${order.id}/messages`).send({ text: 'hello?' }).expect(409);
  });

  describe('roles', () => {
    it('lets carpenter and reviewer read orders and papers and change nothing', async () => {
      const order = await create();
      const path = `${made.orders}/${order.id}`;
      for (const role of ['carpenter', 'reviewer'] as const) {
        const member = as(test, await createMember(test, made.workshop.id, role));
        await member.get(made.orders).expect(200);
        await member.get(path).expect(200);
        await member.get(`${path}/spec.pdf`).expect(200);
        await member.post(made.orders).send({}).expect(403);
        await member.patch(path).send({}).expect(403);
        await member.get(`${path}/messages`).expect(403);
        for (const action of [
          'send',
          'cancel',
          'state',
          'messages',
          'link/revoke',
          'link/renew',
          'mail/send-again',
        ]) {
          await member.post(`${path}/${action}`).send({}).expect(403);
        }
      }
      const designer = as(test, await createMember(test, made.workshop.id, 'designer'));
      await designer.patch(path).send({ title: 'By a designer' }).expect(200);
    });

    it('shows another workshop nothing', async () => {
      const order = await create();
      const other = await createWorkshop(test);
      await as(test, other.owner).get(`${made.orders}/${order.id}`).expect(404);
      const elsewhere = `/workshops/${other.id}/productions/${made.productionId}/orders/${order.id}`;
      await as(test, other.owner).get(elsewhere).expect(404);
      await as(test, other.owner).get(`${elsewhere}/spec.pdf`).expect(404);
      await as(test, null).get(`${made.orders}/${order.id}`).expect(401);
    });
  });

  describe('the drawing pack', () => {
    const folder = mkdtempSync(join(tmpdir(), 'spec-'));
    afterAll(() => rmSync(folder, { recursive: true }));
    const read = async (orderId: string) => {
      const { body } = await as(test, owner).get(`${made.orders}/${orderId}/spec.pdf`).expect(200);
      const file = join(folder, `${orderId}.pdf`);
      writeFileSync(file, body as Buffer);
      return {
        bytes: body as Buffer,
        text: execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8' }),
        file,
      };
    };

    it('has the same bytes every time it is made', async () => {
      const order = await create();
      const [first, second] = [await read(order.id), await read(order.id)];
      expect(first.bytes.equals(second.bytes)).toBe(true);
      expect(first.bytes.subarray(0, 5).toString()).toBe('%PDF-');
    });

    it('names the order and every cushion, and nobody who sits', async () => {
      const order = await create({
        title: 'Seats for the dining car',
        neededBy: '2027-02-26',
        spec: { cover: 'plum moquette, 54″ wide', flammability: 'maker’s label in the zip' },
      });
      const { text, file } = await read(order.id);
      for (const words of [
        'Supper at Larch Junction',
        'Dining car',
        'Ropewalk Scenic',
        '555 0142',
        'FINISHED, seam to seam',
      ]) {
        expect(text).toContain(words);
      }
      for (const { mark, finishedMm } of order.cushions) {
        expect(text).toMatch(new RegExp(`\\b${mark}\\b`));
        const inches = (mm: number) => formatLength(mm, { system: 'feet-inches', roundTo: 16 });
        const { widthMm, depthMm, thicknessMm } = finishedMm;
        const size = `${inches(widthMm)} × ${inches(depthMm)} × ${inches(thicknessMm)}`.replace(
          /″(?= ×)/g,
          '',
        );
        expect(text.replace(/\u00a0/g, ' ')).toContain(size);
      }
      expect(text.replace(/\s+/g, ' ')).toContain('plum moquette');
      expect(text).toContain('Recorded here, not');
      for (const secret of [CAST_NAME, 'Wilhelmina', 'sits at the end', '1987', '123'])
        expect(text).not.toContain(secret);
      const info = execFileSync('pdfinfo', [file], { encoding: 'utf8' });
      expect(info).toMatch(/Title:\s+Cushion order \d+, Seats for the dining car, revision A/);
      expect(info).toMatch(/Author:\s+Ropewalk Scenic/);
      expect(info).toMatch(/Page size:\s+841\.\d+ x 595\.\d+ pts \(A4\)/);
    });
  });
});
