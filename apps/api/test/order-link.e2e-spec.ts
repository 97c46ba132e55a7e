import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { findMail, mailedToken } from './factories/mails';
import { createIssuedSet, type IssuedSet } from './factories/orders';
import { as, createMember, type Person } from './factories/people';
import { startTestApp, type TestApp } from './test-app';

const CAST_NAME = 'Wilhelmina Sittersworth';
const OTHER_MEMBER = 'Quentin Otherhand';

const PUBLIC_FIELDS = [
  'acknowledgement',
  'covers',
  'cushions',
  'linkExpiresAt',
  'messages',
  'neededBy',
  'number',
  'paper',
  'productionName',
  'revisionIssuedAt',
  'revisionLetter',
  'roundTo',
  'sentAt',
  'setName',
  'spec',
  'state',
  'title',
  'units',
  'upholstererName',
  'workshop',
];

describe('the private link to an order', () => {
  let test: TestApp;
  let made: IssuedSet;
  let owner: Person;
  let count = 0;

  beforeAll(async () => {
    test = await startTestApp();
    made = await createIssuedSet(test, CAST_NAME);
    owner = made.workshop.owner;
  });
  afterAll(() => test.close());

  /** A sent order with the token that went out. */
  const sendOrder = async (title = 'Seat cushions', sender = owner) => {
    count += 1;
    const email = `firm-${count}@upholstery.test`;
    const firm = await as(test, owner)
      .post(`/workshops/${made.workshop.id}/upholsterers`)
      .send({ name: `Firm ${count}`, contactName: 'Odile Fennimore', email })
      .expect(201);
    const order = await as(test, owner)
      .post(made.orders)
      .send({ setId: made.setId, revisionLetter: 'A', title, spec: { cover: 'plum moquette' } })
      .expect(201);
    const path = `${made.orders}/${(order.body as { id: string }).id}`;
    await as(test, sender)
      .post(`${path}/send`)
      .send({ upholstererId: (firm.body as { id: string }).id, message: 'Good morning.' })
      .expect(200);
    const token = await mailedToken(test, email, 'cushion-order');
    return { orderId: (order.body as { id: string }).id, path, email, token };
  };
  const open = (token: string) => as(test, null).get(`/link/${token}`);
  const answer = (token: string, what: 'acknowledge' | 'reply', body: Record<string, unknown>) =>
    as(test, null).post(`/link/${token}/${what}`).send(body);

  it('shows the order, its cushions and the contact, and nothing else', async () => {
    const { token } = await sendOrder('Seats of the dining car');
    const { body } = await open(token).expect(200);
    expect(Object.keys(body as object).sort()).toEqual(PUBLIC_FIELDS);
    expect(body).toMatchObject({
      workshop: { name: 'Ropewalk Scenic', telephone: '555 0142', contactName: owner.name },
      title: 'Seats of the dining car',
      productionName: 'Supper at Larch Junction',
      setName: 'Dining car',
      state: 'sent',
      revisionLetter: 'A',
      spec: { cover: 'plum moquette' },
      messages: [{ side: 'workshop', authorName: owner.name, text: 'Good morning.' }],
      acknowledgement: null,
    });
    expect((body as { cushions: unknown[] }).cushions.length).toBeGreaterThanOrEqual(2);
  });

  it('tells nothing of who sits, of other members or of other orders', async () => {
    const { token, path } = await sendOrder();
    await sendOrder('A secret order');
    const other = await createMember(test, made.workshop.id, 'designer');
    await test.dataSource.query('UPDATE users SET name = $1 WHERE id = $2', [OTHER_MEMBER, other.id]);
    await as(test, other).post(`${path}/messages`).send({ text: 'From a colleague.' }).expect(201);
    const { body } = await open(token).expect(200);
    const text = JSON.stringify(body);
    expect(text).toContain('From a colleague.');
    for (const secret of [
      CAST_NAME,
      'castId',
      'seating',
      'statureMm',
      OTHER_MEMBER,
      owner.email,
      other.id,
      'A secret order',
      made.setId,
    ]) {
      expect(text).not.toContain(secret);
    }
  });

  it('gives the drawing pack without anybody who sits', async () => {
    const { token } = await sendOrder();
    const folder = mkdtempSync(join(tmpdir(), 'link-'));
    const { body, headers } = await as(test, null).get(`/link/${token}/spec.pdf`).expect(200);
    expect(headers['content-type']).toBe('application/pdf');
    writeFileSync(join(folder, 'spec.pdf'), body as Buffer);
    const text = execFileSync('pdftotext', [join(folder, 'spec.pdf'), '-'], { encoding: 'utf8' });
    rmSync(folder, { recursive: true });
    expect(text).toContain('FINISHED, seam to seam');
    for (const secret of [CAST_NAME, 'Wilhelmina', OTHER_MEMBER, owner.email])
      expect(text).not.toContain(secret);
  });

  it('is not passed on, listed or kept by whoever opens it, whatever the answer', async () => {
    const { token } = await sendOrder();
    const private_ = {
      'referrer-policy': 'no-referrer',
      'x-robots-tag': expect.stringContaining('noindex'),
      'cache-control': 'no-store',
    };
    expect((await open(token).expect(200)).headers).toMatchObject(private_);
    expect((await as(test, null).get(`/link/${token}/spec.pdf`).expect(200)).headers).toMatchObject(private_);
    expect((await open('x'.repeat(43)).expect(404)).headers).toMatchObject(private_);
    expect((await answer(token, 'reply', {}).expect(400)).headers).toMatchObject(private_);
  });

  it('changes nothing when it is only opened', async () => {
    const { token, orderId } = await sendOrder();
    const state = async () =>
      JSON.stringify(
        await Promise.all(
          [
            'cushion_orders',
            'order_links',
            'order_messages',
            'order_events',
            'outbox_mails',
            'audit_entries',
          ].map((table) => test.dataSource.query(`SELECT * FROM ${table} ORDER BY id`)),
        ),
      );
    const before = await state();
    await open(token).expect(200);
    await as(test, null).get(`/link/${token}/spec.pdf`).expect(200);
    await as(test, null).get(`/link/${token}/acknowledge`).expect(404);
    await as(test, null).get(`/link/${token}/reply`).expect(404);
    expect(await state()).toBe(before);
    expect(before).toContain(orderId);
  });

  it('does not work with anything but its token', async () => {
    const { token } = await sendOrder();
    const flipped = (token.startsWith('A') ? 'B' : 'A') + token.slice(1);
    for (const wrong of [flipped, token.slice(1), `${token}A`, 'none', '%00', '..']) {
      expect([wrong, (await open(wrong)).status]).toEqual([wrong, 404]);
    }
    expect((await answer(flipped, 'reply', { text: 'hello' })).status).toBe(404);
    expect((await answer(flipped, 'acknowledge', { name: 'Odile' })).status).toBe(404);
  });

  it('stops working when it expires or is revoked, and says so', async () => {
    const expired = await sendOrder();
    await test.dataSource.query(
      `UPDATE order_links SET expires_at = now() - interval '1 second' WHERE order_id = $1`,
      [expired.orderId],
    );
    expect((await open(expired.token).expect(410)).body).toMatchObject({
      code: 'link-expired',
      detail: expect.stringContaining('expired'),
    });
    await as(test, null).get(`/link/${expired.token}/spec.pdf`).expect(410);
    await answer(expired.token, 'reply', { text: 'too late' }).expect(410);
    await answer(expired.token, 'acknowledge', { name: 'Odile' }).expect(410);

    const revoked = await sendOrder();
    const after = await as(test, owner).post(`${revoked.path}/link/revoke`).expect(200);
    expect(after.body).toMatchObject({ link: { state: 'revoked', expiresAt: null } });
    expect((await open(revoked.token).expect(410)).body).toMatchObject({ code: 'link-revoked' });
    await answer(revoked.token, 'reply', { text: 'too late' }).expect(410);
  });

  it('is renewed by mail; the old one ends', async () => {
    const { token, path, email } = await sendOrder();
    const after = await as(test, owner).post(`${path}/link/renew`).expect(200);
    expect(after.body).toMatchObject({ link: { state: 'valid' } });
    const fresh = await mailedToken(test, email, 'cushion-order-link');
    expect(fresh).not.toBe(token);
    await open(token).expect(410);
    await open(fresh).expect(200);
  });

  it('opens only its own order', async () => {
    const [first, second] = [await sendOrder('The first'), await sendOrder('The second')];
    expect((await open(first.token).expect(200)).body).toMatchObject({ title: 'The first' });
    expect((await open(second.token).expect(200)).body).toMatchObject({ title: 'The second' });
    await answer(second.token, 'reply', { text: 'about the second' }).expect(200);
    expect(JSON.stringify((await open(first.token).expect(200)).body)).not.toContain('about the second');
    for (const path of [made.orders, first.path, `${first.path}/messages`]) {
      await as(test, { accessToken: first.token }).get(path).expect(401);
    }
  });

  it('shows what was sent until it is sent again', async () => {
    const { token, path } = await sendOrder('As sent');
    await as(test, owner)
      .patch(path)
      .send({ title: 'As changed', spec: { cover: 'green cord' } })
      .expect(200);
    expect((await open(token).expect(200)).body).toMatchObject({
      title: 'As sent',
      spec: { cover: 'plum moquette' },
    });
  });

  it('takes a reply, mails it to the sender and counts it as open until somebody answers', async () => {
    const { token, path } = await sendOrder('Replies');
    const asked = await answer(token, 'reply', { text: 'Which day does the cloth come?' }).expect(200);
    expect((asked.body as { messages: unknown[] }).messages.at(-1)).toMatchObject({
      side: 'upholsterer',
      authorName: 'Odile Fennimore',
      text: 'Which day does the cloth come?',
    });
    const mail = await findMail(test, owner.email, 'cushion-order-reply');
    expect(mail?.text).toContain('Which day does the cloth come?');
    expect(mail?.text).toContain(
      `http://settlewright.test/w/${made.workshop.id}/p/${made.productionId}/orders/`,
    );
    expect((await as(test, owner).get(path).expect(200)).body).toMatchObject({ openQuestions: 1 });
    await as(test, owner).post(`${path}/messages`).send({ text: 'On Friday.' }).expect(201);
    expect((await as(test, owner).get(path).expect(200)).body).toMatchObject({ openQuestions: 0 });
    await answer(token, 'reply', { text: '' }).expect(400);
    await answer(token, 'reply', { text: 'x'.repeat(4001) }).expect(400);
  });

  it.each([
    [
      'left',
      (userId: string) => test.dataSource.query('DELETE FROM memberships WHERE user_id = $1', [userId]),
    ],
    [
      'no longer reads messages',
      (userId: string) =>
        test.dataSource.query(`UPDATE memberships SET role = 'carpenter' WHERE user_id = $1`, [userId]),
    ],
  ])('goes to the first owner when its sender %s', async (_what, change) => {
    const sender = await createMember(test, made.workshop.id, 'designer');
    await createMember(test, made.workshop.id, 'owner');
    const { token } = await sendOrder('Sent by another', sender);
    expect((await open(token).expect(200)).body).toMatchObject({ workshop: { contactName: sender.name } });
    await change(sender.id);
    const { body } = await answer(token, 'reply', { text: `Is ${sender.id} there?` }).expect(200);
    expect(body).toMatchObject({ workshop: { contactName: owner.name } });
    expect(await findMail(test, sender.email, 'cushion-order-reply')).toBeNull();
    expect((await findMail(test, owner.email, 'cushion-order-reply'))?.text).toContain(sender.id);
  });

  it('keeps the typed name, time and revision of an acknowledgement, once', async () => {
    const { token, path } = await sendOrder();
    await answer(token, 'acknowledge', { name: ' ' }).expect(400);
    const first = await answer(token, 'acknowledge', { name: 'Odile Fennimore' }).expect(200);
    expect(first.body).toMatchObject({ acknowledgement: { name: 'Odile Fennimore', revisionLetter: 'A' } });
    const second = await answer(token, 'acknowledge', { name: 'Somebody else' }).expect(200);
    expect((second.body as { acknowledgement: unknown }).acknowledgement).toEqual(
      (first.body as { acknowledgement: unknown }).acknowledgement,
    );
    const order = (await as(test, owner).get(path).expect(200)).body as {
      acknowledgement: unknown;
      state: string;
      events: { kind: string; side: string; byName: string }[];
    };
    expect(order.state).toBe('sent');
    expect(order.acknowledgement).toEqual((first.body as { acknowledgement: unknown }).acknowledgement);
    expect(order.events.filter(({ kind }) => kind === 'acknowledged')).toMatchObject([
      { side: 'upholsterer', byName: 'Odile Fennimore' },
    ]);
    expect((await findMail(test, owner.email, 'cushion-order-acknowledged'))?.subject).toContain(
      'can make it as drawn',
    );
  });

  it('takes no agreement to what was sent before the last time', async () => {
    const { token, path } = await sendOrder('First form');
    const read = (await open(token).expect(200)).body as { sentAt: string };
    await answer(token, 'acknowledge', { name: 'Odile', sentAt: read.sentAt }).expect(200);
    const order = (await as(test, owner).get(path).expect(200)).body as { upholsterer: { id: string } };
    await as(test, owner).patch(path).send({ title: 'Second form' }).expect(200);
    await as(test, owner).post(`${path}/send`).send({ upholstererId: order.upholsterer.id }).expect(200);
    expect((await open(token).expect(200)).body).toMatchObject({
      title: 'Second form',
      acknowledgement: null,
    });
    const late = await answer(token, 'acknowledge', { name: 'Odile', sentAt: read.sentAt }).expect(409);
    expect(late.body).toMatchObject({ code: 'order-sent-again' });
    await answer(token, 'acknowledge', { name: 'Odile' }).expect(200);
  });

  describe('of an order that goes to another upholsterer', () => {
    /** Sent to a first firm, answered and agreed there, then sent to a second. */
    const sendOn = async (secondMessage = '') => {
      const first = await sendOrder('Sent on');
      await answer(first.token, 'reply', { text: 'We charge a lot.' }).expect(200);
      await answer(first.token, 'acknowledge', { name: 'Odile Fennimore' }).expect(200);
      const email = `second-${first.email}`;
      const firm = await as(test, owner)
        .post(`/workshops/${made.workshop.id}/upholsterers`)
        .send({ name: 'Marrow & Tuft', contactName: 'Ines Marrow', email })
        .expect(201);
      const sent = await as(test, owner)
        .post(`${first.path}/send`)
        .send({ upholstererId: (firm.body as { id: string }).id, message: secondMessage })
        .expect(200);
      return { ...first, second: email, sent, token: await mailedToken(test, email, 'cushion-order') };
    };

    it('shows the second nothing of the first', async () => {
      const { token, sent, path } = await sendOn('A fresh start.');
      const { body } = await open(token).expect(200);
      expect((body as { messages: unknown }).messages).toEqual([
        { side: 'workshop', authorName: owner.name, text: 'A fresh start.', at: expect.any(String) },
      ]);
      expect(body).toMatchObject({ upholstererName: 'Marrow & Tuft', acknowledgement: null });
      const text = JSON.stringify(body);
      for (const secret of ['Odile', 'Firm ', 'a lot', 'Good morning']) expect(text).not.toContain(secret);
      expect(sent.body).toMatchObject({ acknowledgement: null });
      await answer(token, 'acknowledge', { name: 'Ines Marrow' }).expect(200);
      expect((await as(test, owner).get(path).expect(200)).body).toMatchObject({
        acknowledgement: { name: 'Ines Marrow' },
      });
    });

    it('tells the first that it is withdrawn, and not to whom it went', async () => {
      const { email, orderId } = await sendOn();
      const mail = await findMail(test, email, 'cushion-order-withdrawn');
      expect(mail).toMatchObject({ relatedId: orderId, replyTo: owner.email });
      expect(mail?.text).toContain('“Sent on”, is withdrawn. Please stop any work on it.');
      expect(mail?.text).not.toContain('Marrow');
    });

    it('does not wait for answers to the first', async () => {
      const { token, sent, path } = await sendOn();
      expect(sent.body).toMatchObject({ openQuestions: 0 });
      await answer(token, 'reply', { text: 'Which cloth?' }).expect(200);
      expect((await as(test, owner).get(path).expect(200)).body).toMatchObject({ openQuestions: 1 });
    });

    it('keeps the whole thread for the workshop, with whom each word was exchanged', async () => {
      const { path } = await sendOn('A fresh start.');
      const { body } = await as(test, owner).get(`${path}/messages`).expect(200);
      const { items } = body as { items: { text: string; upholstererName: string }[] };
      expect(items.map(({ text, upholstererName }) => [text, upholstererName])).toEqual([
        ['Good morning.', expect.stringMatching(/^Firm \d+$/)],
        ['We charge a lot.', expect.stringMatching(/^Firm \d+$/)],
        ['A fresh start.', 'Marrow & Tuft'],
      ]);
    });
  });

  it('takes no answer to a cancelled order, but still shows it', async () => {
    const { token, path } = await sendOrder();
    await as(test, owner).post(`${path}/cancel`).send({}).expect(200);
    expect((await open(token).expect(200)).body).toMatchObject({ state: 'cancelled' });
    expect((await answer(token, 'reply', { text: 'hello' }).expect(409)).body).toMatchObject({
      code: 'order-over',
    });
    await answer(token, 'acknowledge', { name: 'Odile' }).expect(409);
  });

  it('is limited by the hour in answers to one order', async () => {
    const { token } = await sendOrder();
    const statuses: number[] = [];
    for (let i = 0; i < 31; i++)
      statuses.push((await answer(token, 'reply', { text: `message ${i}` })).status);
    expect(statuses.slice(0, 30).every((status) => status === 200)).toBe(true);
    expect(statuses[30]).toBe(429);
    await open(token).expect(200);
  });
});
