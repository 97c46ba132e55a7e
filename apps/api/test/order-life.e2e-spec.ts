import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import { chooseCushion, deriveCushions, type SetDocument } from '@settlewright/geometry';
import { findMail } from './factories/mails';
import { createIssuedSet, issue, type IssuedSet } from './factories/orders';
import { type LifeBody, SentOrders, type SentTo } from './factories/sent-orders';
import { paperText } from './factories/papers';
import { as, createMember, type Person } from './factories/people';
import { startTestApp, type TestApp } from './test-app';

jest.setTimeout(60_000);

const LINES = [
  { text: 'Seat cushion, foam and labour', quantity: 4, unitMinor: 42_500 },
  { text: 'Buttons', quantity: 32, unitMinor: 150 },
];
const TOTAL = 4 * 42_500 + 32 * 150 + 14_000;

describe('the life of a cushion order', () => {
  let test: TestApp;
  let made: IssuedSet;
  let owner: Person;
  let orders: SentOrders;

  beforeAll(async () => {
    test = await startTestApp();
    made = await createIssuedSet(test, 'Wilhelmina Sittersworth');
    owner = made.workshop.owner;
    orders = new SentOrders(test, made);
  });
  afterAll(() => test.close());

  const byLink = async ({ token }: SentTo, path: string, body: object, status = 200) =>
    (await as(test, null).post(`/link/${token}/${path}`).send(body).expect(status)).body as LifeBody;
  const byShop = async ({ path }: SentTo, step: string, body: object = {}, status = 200) =>
    (await as(test, owner).post(`${path}/${step}`).send(body).expect(status)).body as LifeBody;
  const stateOf = async ({ path }: SentTo) =>
    ((await as(test, owner).get(path).expect(200)).body as { state: string }).state;
  const quote = async (order: SentTo, more: object = {}, status = 200) =>
    byLink(
      order,
      'quote',
      {
        ...{ name: 'Odile Fennimore', sentAt: await orders.sentAt(order), currency: 'USD', lines: LINES },
        ...{ taxText: 'Sales tax', taxMinor: 14_000, validUntil: '2099-02-19', deliveryOn: '2099-02-26' },
        ...more,
      },
      status,
    );
  const acknowledge = (order: SentTo) => byLink(order, 'acknowledge', { name: 'Odile Fennimore' });
  const agreed = async () => {
    const order = await orders.send();
    const { quotes } = await quote(order);
    await acknowledge(order);
    await byShop(order, `quotes/${quotes[0]!.id}/accept`);
    return order;
  };
  const inspect = (order: SentTo, outcome: string, more: object = {}, status = 200) => {
    const { widthMm, depthMm, thicknessMm } = order.cushion.finishedMm;
    const row = { mark: order.cushion.mark, widthMm, depthMm, thicknessMm };
    return byShop(order, 'inspections', { kind: 'first-article', outcome, cushions: [row], ...more }, status);
  };

  describe('a quote', () => {
    it('is added up in whole smallest units, dated, and mailed', async () => {
      const order = await orders.send();
      const life = await quote(order);
      expect(life.quotes).toMatchObject([
        { totalMinor: TOTAL, currency: 'USD', state: 'offered', inForce: true, byName: 'Odile Fennimore' },
      ]);
      expect(await stateOf(order)).toBe('quoted');
      const mail = await findMail(test, owner.email, 'cushion-order-progress');
      expect(mail?.text).toContain('Odile Fennimore quotes $1,888.00 for revision A');
    });

    it.each([
      ['currency', { currency: 'XQZ' }],
      ['lines', { lines: [] }],
      ['lines.0.unitMinor', { lines: [{ text: 'x', quantity: 1, unitMinor: 12.5 }] }],
      ['lines', { lines: Array(40).fill({ text: 'x', quantity: 9999, unitMinor: 100_000_000 }) }],
      ['validUntil', { validUntil: '2020-01-01' }],
      ['validUntil', { validUntil: '2099-02-30' }],
      ['name', { name: ' ' }],
    ])('is refused by its %s', async (path, wrong) => {
      const order = await orders.send();
      const refusal = (await quote(order, wrong, 400)) as unknown as { fields: { path: string }[] };
      expect(refusal.fields.map((field) => field.path)).toContain(path);
      expect(await stateOf(order)).toBe('sent');
    });

    it('is replaced by a later one, which alone can be accepted', async () => {
      const order = await orders.send();
      const first = (await quote(order)).quotes[0]!;
      const { quotes } = await quote(order, { taxMinor: 0 });
      expect(quotes.map(({ state }) => state)).toEqual(['offered', 'replaced']);
      await byShop(order, `quotes/${first.id}/accept`, {}, 409);
    });

    it('is declined with a reason that is mailed', async () => {
      const order = await orders.send();
      const { quotes } = await quote(order);
      await byShop(order, `quotes/${quotes[0]!.id}/decline`, { reason: ' ' }, 400);
      const life = await byShop(order, `quotes/${quotes[0]!.id}/decline`, { reason: 'Two days too late.' });
      expect(life.quotes).toMatchObject([{ state: 'declined', answer: 'Two days too late.' }]);
      expect((await findMail(test, order.email, 'cushion-order-news'))?.text).toContain('Two days too late.');
      await byShop(order, `quotes/${quotes[0]!.id}/accept`, {}, 409);
      expect(await stateOf(order)).toBe('quoted');
    });

    it('is not accepted once its day has passed', async () => {
      const order = await orders.send();
      const { quotes } = await quote(order);
      await test.dataSource.query(`UPDATE order_quotes SET valid_until = '2020-01-01' WHERE id = $1`, [
        quotes[0]!.id,
      ]);
      expect(await byShop(order, `quotes/${quotes[0]!.id}/accept`, {}, 409)).toMatchObject({
        code: 'quote-expired',
      });
    });

    it('may be noted by hand, with how it is known', async () => {
      const order = await orders.send();
      const body = { lines: LINES, currency: 'EUR', validUntil: '2099-01-01' };
      await byShop(order, 'quotes', body, 400);
      const life = await byShop(order, 'quotes', { ...body, heard: 'by telephone with Odile' });
      expect(life.quotes).toMatchObject([{ side: 'workshop', note: 'by telephone with Odile' }]);
      expect(await stateOf(order)).toBe('quoted');
    });
  });

  describe('agreement', () => {
    it('needs both sides, in either order', async () => {
      const order = await agreed();
      expect(await stateOf(order)).toBe('agreed');

      const other = await orders.send();
      const { quotes } = await quote(other);
      const life = await byShop(other, `quotes/${quotes[0]!.id}/accept`);
      expect(await stateOf(other)).toBe('quoted');
      expect(life.agreement).toMatchObject({ workshop: { name: owner.name }, upholsterer: null });
      await acknowledge(other);
      expect(await stateOf(other)).toBe('agreed');
      const mail = await findMail(test, owner.email, 'cushion-order-acknowledged');
      expect(mail?.text).toContain('so revision A is agreed');
    });

    it('is not made by a quote for an earlier sending', async () => {
      const order = await orders.send();
      const { quotes } = await quote(order);
      const set = `${made.production}/sets/${made.setId}`;
      const draft = (await as(test, owner).get(`${set}/draft`).expect(200)).body as { number: number };
      const letter = await issue(test, owner, set, draft.number);
      await as(test, owner).patch(order.path).send({ revisionLetter: letter }).expect(200);
      expect(await byShop(order, `quotes/${quotes[0]!.id}/accept`, {}, 409)).toMatchObject({
        code: 'changed-since-sent',
      });
      await byShop(order, 'send', { upholstererId: order.upholstererId });
      expect(await quote(order, { sentAt: '2020-01-01T00:00:00Z' }, 409)).toMatchObject({
        code: 'order-sent-again',
      });
      await byShop(order, 'state', { to: 'quoted' });
      expect(await byShop(order, `quotes/${quotes[0]!.id}/accept`, {}, 409)).toMatchObject({
        code: 'quote-of-older-revision',
      });
      expect(await stateOf(order)).toBe('quoted');
    });

    it('ends when the order is sent again, and what changed is said side by side', async () => {
      const order = await agreed();
      await as(test, owner)
        .patch(order.path)
        .send({ toleranceMm: 3, spec: { cover: 'green cord' } })
        .expect(200);
      await byShop(order, 'send', { upholstererId: order.upholstererId });
      const life = (await as(test, null).get(`/link/${order.token}/life`).expect(200)).body as LifeBody;
      expect(await stateOf(order)).toBe('sent');
      expect(life.agreement).toEqual({ upholsterer: null, workshop: null });
      expect(life.earlierRevision).toBe('A');
      expect(life.changes).toEqual([
        { mark: null, field: 'tolerance', before: [{ mm: 6.35 }], after: [{ mm: 3 }] },
        {
          ...{ mark: null, field: 'cover' },
          before: [{ text: 'plum moquette' }],
          after: [{ text: 'green cord' }],
        },
      ]);
      expect(life.quotes).toMatchObject([{ inForce: false }]);
    });

    it('says make, outline, joints, tufting and wear of another revision, and asks for a new word', async () => {
      const order = await agreed();
      const set = `${made.production}/sets/${made.setId}`;
      const { body } = await as(test, owner).get(`${set}/draft`).expect(200);
      const { number, document } = body as { number: number; document: SetDocument };
      const cushion = deriveCushions(document).find(({ mark }) => mark === order.cushion.mark)!;
      const changed = chooseCushion(document, cushion.key, {
        make: { ...cushion.make, welt: 'bias' },
        shape: { notches: [{ edge: 'back', fromMm: 0, widthMm: 100, depthMm: 50 }] },
        tufting: {
          ...{ kind: 'biscuit', tuftMm: { widthMm: 127, heightMm: 127 } },
          ...{ borderMm: 76.2, fullness: 'foam-thickness' },
        },
        wear: [{ place: 'left-end', look: 'patch' }],
      });
      const saved = await as(test, owner)
        .put(`${set}/draft`)
        .send({ baseNumber: number, document: changed })
        .expect(200);
      const letter = await issue(test, owner, set, (saved.body as { number: number }).number);
      await as(test, owner).patch(order.path).send({ revisionLetter: letter }).expect(200);
      await byShop(order, 'send', { upholstererId: order.upholstererId });
      const life = (await as(test, null).get(`/link/${order.token}/life`).expect(200)).body as LifeBody;
      const own = (
        life.changes as { mark: string; field: string; after: object[]; outlines?: object }[]
      ).filter(({ mark }) => mark === order.cushion.mark);
      expect(own.map(({ field }) => field)).toEqual(
        expect.arrayContaining(['make', 'outline', 'tufting', 'wear']),
      );
      const outline = own.find(({ field }) => field === 'outline')!;
      expect(outline.after).toContainEqual({ mm: 50 });
      expect(outline.outlines).toMatchObject({ before: { length: 4 }, after: { length: 6 } });
      expect(life.agreement).toEqual({ upholsterer: null, workshop: null });
      expect(await stateOf(order)).toBe('sent');
    });
  });

  describe('the pack of an order', () => {
    const boxOf = (pdf: Buffer) => /\/MediaBox \[([^\]]*)\]/.exec(pdf.toString('latin1'))?.[1];
    const pack = async (at: string, who: Person | null) =>
      (await as(test, who).get(at).responseType('blob').expect(200)).body as Buffer;

    it('is on the paper and in the units that its upholsterer prefers, unless another is asked for', async () => {
      const order = await orders.send({ units: 'millimetres', paper: 'letter' });
      const plain = await orders.send();
      const shown = (await as(test, null).get(`/link/${order.token}`).expect(200)).body as object;
      expect(shown).toMatchObject({ units: 'millimetres', paper: 'letter' });
      expect((await as(test, null).get(`/link/${plain.token}`).expect(200)).body).toMatchObject({
        paper: 'a4',
      });
      const theirs = await pack(`/link/${order.token}/spec.pdf`, null);
      const asked = await pack(`/link/${order.token}/spec.pdf?paper=a4`, null);
      expect(boxOf(theirs)).toMatch(/^0 0 792/);
      expect(boxOf(asked)).toMatch(/^0 0 841/);
      expect(boxOf(await pack(`${order.path}/spec.pdf`, owner))).toBe(boxOf(theirs));
      expect(await paperText(theirs)).toMatch(/95\smm/);
      expect(
        await paperText(await pack(`/link/${order.token}/spec.pdf?units=feet-inches&roundTo=16`, null)),
      ).toContain('″');
      await as(test, null).get(`/link/${order.token}/spec.pdf?paper=a3`).expect(400);
    });
  });

  it('says on its paper what is new since it was sent before', async () => {
    const order = await orders.send();
    const text = async () => {
      const { body } = await as(test, null)
        .get(`/link/${order.token}/spec.pdf?units=feet-inches`)
        .responseType('blob')
        .expect(200);
      return (await paperText(body as Buffer)).replace(/\s+/g, ' ');
    };
    expect(await text()).not.toContain('Since A');
    await as(test, owner)
      .patch(order.path)
      .send({ spec: { cover: 'green cord' } })
      .expect(200);
    await byShop(order, 'send', { upholstererId: order.upholstererId });
    expect(await text()).toContain('Since A');
    expect(await text()).toContain('cover: green cord, was plum moquette');
  });

  describe('the cloths of an order', () => {
    const CLOTH = {
      ...{ name: 'plum moquette', widthMm: 1400, selvedgeMm: 10, direction: 'up-roll', nap: 'to-the-front' },
      ...{ repeatMm: { acrossMm: 350, alongMm: 320 }, controlLine: 'run', startMm: 300, stepMm: 100 },
      ...{ pricePerMetreMinor: 4800, currency: 'EUR' },
      com: { sampleKept: true, dyeLot: 'K 7', measuredWidthMm: 1390, flaws: 'a pull at 2 m' },
    };
    const change = (order: SentTo, covers: unknown, status = 200) =>
      as(test, owner).patch(order.path).send({ covers }).expect(status);
    const read = async ({ path }: SentTo) => (await as(test, owner).get(path).expect(200)).body as object;

    it('are kept, sent, and said side by side when they change', async () => {
      const order = await orders.send();
      expect(await read(order)).toMatchObject({ covers: [], sent: { changedSince: false } });
      await change(order, [{ ...CLOTH, cushionMarks: [order.cushion.mark] }]);
      expect(await read(order)).toMatchObject({
        covers: [{ ...CLOTH, cushionMarks: [order.cushion.mark] }],
        sent: { changedSince: true },
      });
      await byShop(order, 'send', { upholstererId: order.upholstererId });
      expect(await read(order)).toMatchObject({ sent: { changedSince: false } });
      const life = (await as(test, null).get(`/link/${order.token}/life`).expect(200)).body as LifeBody;
      expect(life.changes).toEqual([
        { mark: null, field: 'cloths', before: [], after: expect.arrayContaining([{ mm: 1400 }]) },
      ]);
      const shown = (await as(test, null).get(`/link/${order.token}`).expect(200)).body as {
        covers: { name: string; widthMm: number }[];
      };
      expect(shown.covers).toMatchObject([{ name: 'plum moquette', widthMm: 1400 }]);
      expect(JSON.stringify(shown.covers)).not.toMatch(/price|EUR/);
      const priced = { ...CLOTH, cushionMarks: [order.cushion.mark], pricePerMetreMinor: 5200 };
      await change(order, [priced]);
      expect(await read(order)).toMatchObject({ covers: [priced], sent: { changedSince: false } });
      expect(JSON.stringify(life)).not.toContain('EUR');
      await as(test, owner).patch(order.path).send({ title: 'Seats again' }).expect(200);
      expect(await read(order)).toMatchObject({ covers: [{ name: 'plum moquette' }] });
    });

    it.each([
      ['covers.0.direction', [{ ...CLOTH, direction: 'either' }]],
      ['covers.0.currency', [{ ...CLOTH, currency: undefined }]],
      ['covers.0.pricePerMetreMinor', [{ ...CLOTH, pricePerMetreMinor: 12.5 }]],
      ['covers.0.cushionMarks', [{ ...CLOTH, cushionMarks: ['C900'] }]],
      ['covers.0.com.dyeLot', [{ ...CLOTH, com: { ...CLOTH.com, dyeLot: 'K\u0000' } }]],
      ['covers', [CLOTH, CLOTH]],
      ['covers', { 0: CLOTH }],
    ])('are refused by %s', async (path, covers) => {
      const order = await orders.send();
      const { body } = await change(order, covers, 400);
      expect((body as { fields: { path: string }[] }).fields.map((field) => field.path)).toContain(path);
      expect(await read(order)).toMatchObject({ covers: [] });
    });
  });

  describe('the first article', () => {
    const mark = (order: SentTo, to: string, status = 200, more: object = {}) =>
      byLink(order, 'state', { to, name: 'Odile', ...more }, status);

    it('locks the batch until it is accepted', async () => {
      const order = await agreed();
      expect(await mark(order, 'in-work', 409)).toMatchObject({ code: 'state-not-reachable' });
      expect((await mark(order, 'first-article')).firstArticle).toBe('waiting');
      expect(await mark(order, 'in-work', 409)).toMatchObject({ code: 'first-article-not-accepted' });
      expect(await byShop(order, 'state', { to: 'in-work' }, 409)).toMatchObject({
        code: 'first-article-not-accepted',
      });
      await inspect(order, 'rejected', { note: 'The welt is loose.' });
      expect(await mark(order, 'in-work', 409)).toMatchObject({ code: 'first-article-not-accepted' });
      const again = await mark(order, 'first-article');
      expect(again).toMatchObject({ firstArticle: 'waiting', upholstererMayMark: [] });
      const life = await inspect(order, 'accepted');
      expect(life).toMatchObject({ firstArticle: 'accepted', upholstererMayMark: ['in-work'] });
      await mark(order, 'in-work');
      await mark(order, 'shipped', 200, { note: 'Two parcels' });
      expect(await stateOf(order)).toBe('shipped');
      expect((await findMail(test, owner.email, 'cushion-order-progress'))?.text).toContain('Two parcels');
    });
  });

  describe('an inspection', () => {
    const shipped = async () => {
      const order = await agreed();
      const heard = { note: 'by telephone' };
      for (const to of ['first-article', 'in-work', 'shipped'])
        await byShop(order, 'state', { to, ...heard });
      return order;
    };

    it('says within and out in words, takes no unknown for a pass, and closes nothing that is rejected', async () => {
      const order = await shipped();
      const { mark, finishedMm } = order.cushion;
      const measured = (widthMm: number | null) => ({
        kind: 'received',
        cushions: [{ mark, ...finishedMm, widthMm }],
      });
      for (const width of [null, finishedMm.widthMm + 7]) {
        const refusal = (await inspect(order, 'accepted', measured(width), 400)) as unknown;
        expect(refusal).toMatchObject({ fields: [{ path: 'note', code: 'reason-missing' }] });
      }
      const rejected = { ...measured(finishedMm.widthMm + 12.7), note: 'Too wide for the bay.' };
      const life = await inspect(order, 'rejected', rejected);
      expect(life.inspections[0]).toMatchObject({
        outcome: 'rejected',
        toleranceMm: 6.35,
        cushions: [{ mark, verdict: 'out', sizes: [{ size: 'widthMm', verdict: 'out' }, {}, {}] }],
      });
      expect(await stateOf(order)).toBe('received');
      const mail = await findMail(test, order.email, 'cushion-order-news');
      expect(mail?.text).toMatch(/Too wide for the bay\.[^]*: out; depth .*: within/);
      expect(await byShop(order, 'state', { to: 'closed' }, 409)).toMatchObject({
        code: 'delivery-not-accepted',
      });
      const rest = { note: 'The others were measured on the bench.' };
      await inspect(order, 'accepted', { ...measured(finishedMm.widthMm), ...rest });
      await byShop(order, 'state', { to: 'closed' });
    });

    it('of a delivery takes no cushion for right that is not on the sheet', async () => {
      const order = await shipped();
      const part = { kind: 'received' };
      expect(await inspect(order, 'accepted', part, 400)).toMatchObject({
        fields: [{ path: 'note', code: 'reason-missing' }],
      });
      await inspect(order, 'accepted', { ...part, note: 'The others come on Friday.' });
      expect(await stateOf(order)).toBe('received');
    });

    it('is refused while there is nothing to inspect, or of a cushion that was not ordered', async () => {
      const order = await agreed();
      expect(await inspect(order, 'accepted', {}, 409)).toMatchObject({ code: 'nothing-to-inspect' });
      const there = await shipped();
      await inspect(there, 'rejected', { kind: 'received', note: 'x', cushions: [{ mark: 'C900' }] }, 400);
      const photoIds = ['6b1f0c5e-1a0e-4c53-9a55-0a3d6f6f9c01'];
      await inspect(there, 'accepted', { kind: 'received', photoIds }, 400);
      expect(await stateOf(there)).toBe('shipped');
    });
  });

  describe('a question', () => {
    it('is pinned to a cushion, open until the other side answers, once', async () => {
      const order = await orders.send();
      const mark = order.cushion.mark;
      await byLink(order, 'questions', { cushionMark: 'C900', text: 'Which side?' }, 400);
      const { questions } = await byLink(order, 'questions', { cushionMark: mark, text: 'Which side?' });
      expect(questions).toMatchObject([{ cushionMark: mark, answer: '', side: 'upholsterer' }]);
      const id = questions[0]!.id;
      expect((await as(test, owner).get(order.path)).body).toMatchObject({ openQuestions: 1 });
      expect(await byLink(order, `questions/${id}/answer`, { answer: 'mine' }, 409)).toMatchObject({
        code: 'own-question',
      });
      await byShop(order, `questions/${id}/answer`, { answer: 'The window side.' });
      expect((await as(test, owner).get(order.path)).body).toMatchObject({ openQuestions: 0 });
      await byShop(order, `questions/${id}/answer`, { answer: 'Again.' }, 409);
      expect((await findMail(test, order.email, 'cushion-order-news'))?.text).toContain('The window side.');
    });

    it('of the workshop names nobody but the contact', async () => {
      const order = await orders.send();
      const designer = await createMember(test, made.workshop.id, 'designer');
      await as(test, designer).post(`${order.path}/questions`).send({ text: 'Which thread?' }).expect(200);
      const { body } = await as(test, null).get(`/link/${order.token}/life`).expect(200);
      expect((body as LifeBody).questions).toMatchObject([{ byName: 'Ropewalk Scenic' }]);
      expect(JSON.stringify(body)).not.toContain(designer.name);
    });
  });

  it('shows another upholsterer nothing of what the first quoted, asked and was told', async () => {
    const order = await orders.send();
    await quote(order);
    await byLink(order, 'questions', { text: 'Whose cloth?' });
    const next = await orders.sendOn(order);
    const { body } = await as(test, null).get(`/link/${next}/life`).expect(200);
    expect(body).toMatchObject({ quotes: [], questions: [], changes: [], earlierRevision: null });
    const own = (await as(test, owner).get(`${order.path}/life`).expect(200)).body as LifeBody;
    expect(own.quotes).toMatchObject([{ current: false }]);
    await as(test, null).post(`/link/${order.token}/questions`).send({ text: 'Hello?' }).expect(410);
  });
});
