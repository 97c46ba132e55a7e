import { createHmac } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import { Client } from 'pg';
import request from 'supertest';
import { createIssuedSet, type IssuedSet } from './factories/orders';
import { as, type Person } from './factories/people';
import { type LifeBody, SentOrders, type SentTo } from './factories/sent-orders';
import { ApiProcess, freePort, PAYMENT_SECRETS, startPayments, type StandIn } from './factories/stand-ins';
import { startTestApp, type TestApp } from './test-app';

jest.setTimeout(240_000);

const ACCOUNT = 'acct_1Fennimore';

let test: TestApp;
let made: IssuedSet;
let owner: Person;
let orders: SentOrders;
let provider: StandIn;
let port: number;

beforeAll(async () => {
  port = await freePort();
  provider = await startPayments(`http://127.0.0.1:${port}/api/payments/events`);
  test = await startTestApp({ payments: { ...PAYMENT_SECRETS, apiUrl: provider.url } });
  made = await createIssuedSet(test, 'Wilhelmina Sittersworth');
  owner = made.workshop.owner;
  orders = new SentOrders(test, made);
});
afterAll(async () => {
  await test.close();
  await provider.end();
});

const by = () => as(test, owner);
const lifeOf = async ({ path }: SentTo) => (await by().get(`${path}/life`).expect(200)).body as LifeBody;
const begin = async ({ path }: SentTo, amountMinor: number, status = 200) =>
  (await by().post(`${path}/payments/checkout`).send({ amountMinor }).expect(status)).body as { url: string };

/** An order with an accepted quote of $800. */
async function quoted(firm: object = { accountId: ACCOUNT }): Promise<SentTo> {
  const order = await orders.send(firm);
  const body = {
    lines: [{ text: 'Cushions', quantity: 4, unitMinor: 20_000 }],
    ...{ currency: 'USD', validUntil: '2099-01-01', heard: 'by telephone' },
  };
  const life = (await by().post(`${order.path}/quotes`).send(body).expect(200)).body as LifeBody;
  await by().post(`${order.path}/quotes/${life.quotes[0]!.id}/accept`).expect(200);
  return order;
}

/** Tells the API an event, as the provider would. */
function told(event: { id: string; type: string; object: object; account?: string | null }, secret = '') {
  const { id, type, object, account = ACCOUNT } = event;
  const payload = JSON.stringify({ id, object: 'event', type, account, data: { object } });
  const at = Math.floor(Date.now() / 1000);
  const key = secret || PAYMENT_SECRETS.webhookSecret;
  const mac = createHmac('sha256', key).update(`${at}.${payload}`).digest('hex');
  return request(test.app.getHttpServer())
    .post('/api/payments/events')
    .set({ 'content-type': 'application/json', 'stripe-signature': `t=${at},v1=${mac}` })
    .send(payload);
}
const completed = (paymentId: string, intent = `pi_${paymentId}`) => ({
  id: `cs_${paymentId}`,
  client_reference_id: paymentId,
  payment_status: 'paid',
  payment_intent: intent,
});
const begun = async (order: SentTo) => {
  await begin(order, 40_000);
  return (await lifeOf(order)).payments[0]!.id;
};
const eventsOf = async ({ path }: SentTo) =>
  ((await by().get(path).expect(200)).body as { events: { kind: string }[] }).events.map(({ kind }) => kind);
const mailsAbout = (order: SentTo, words: string) =>
  test.dataSource.query<unknown[]>(`SELECT 1 FROM outbox_mails WHERE related_id = $1 AND subject LIKE $2`, [
    order.id,
    `%${words}%`,
  ]);

describe('a deposit', () => {
  it('is begun on the page of the provider, for the account of the upholsterer, once', async () => {
    const order = await quoted();
    const [first, second] = await Promise.all([begin(order, 40_000), begin(order, 40_000)]);
    expect(first.url).toMatch(new RegExp(`^${provider.url}/pay/cs_test_`));
    expect(second.url).toBe(first.url);
    const page = await (await fetch(first.url)).text();
    expect(page).toContain('$400.00');
    expect((await lifeOf(order)).payments).toMatchObject([{ state: 'begun', amountMinor: 40_000 }]);
    expect(await begin(order, 30_000, 409)).toMatchObject({ code: 'deposit-begun' });
  });

  it('is no more than what the quote leaves, and only for an accepted one', async () => {
    const order = await quoted();
    await begin(order, 80_001, 400);
    const open = await orders.send({ accountId: ACCOUNT });
    expect(await begin(open, 100, 409)).toMatchObject({ code: 'no-accepted-quote' });
  });

  it('goes by hand alone where the upholsterer has no account', async () => {
    const order = await quoted({});
    expect(await lifeOf(order)).toMatchObject({ depositOnline: false });
    expect(await begin(order, 100, 409)).toMatchObject({ code: 'deposit-by-hand-only' });
    const pay = (body: object, status = 200) =>
      by()
        .post(`${order.path}/payments`)
        .send({ currency: 'USD', ...body })
        .expect(status);
    await pay({ kind: 'deposit', amountMinor: 40_000 }, 400);
    await pay({ kind: 'deposit', amountMinor: 40_000, note: 'bank transfer, 2 February' });
    const tooMuch = await pay({ kind: 'refund', amountMinor: 40_001, note: 'transfer' }, 409);
    expect(tooMuch.body).toMatchObject({ code: 'refund-too-much' });
    await pay({ kind: 'refund', amountMinor: 10_000, note: 'one cushion fewer' });
    expect((await lifeOf(order)).payments).toMatchObject([
      { kind: 'deposit', byHand: true, state: 'paid' },
      { kind: 'refund', amountMinor: 10_000 },
    ]);
  });

  it('that nobody paid is ended, and another begun', async () => {
    const order = await quoted();
    const id = await begun(order);
    const life = (await by().post(`${order.path}/payments/${id}/end`).expect(200)).body as LifeBody;
    expect(life.payments).toMatchObject([{ state: 'lapsed' }]);
    await begin(order, 30_000);
  });

  it('is not taken from whoever cannot sign, nor for another account', async () => {
    const order = await quoted();
    const id = await begun(order);
    const type = 'checkout.session.completed';
    await told({ id: 'evt_forged', type, object: completed(id) }, 'whsec_guess').expect(400);
    await told({ id: 'evt_other', type, object: completed(id), account: 'acct_other' }).expect(204);
    await told({ id: 'evt_none', type, object: completed(id), account: null }).expect(204);
    expect((await lifeOf(order)).payments).toMatchObject([{ state: 'begun' }]);
  });

  it('told again and again, at once and late, is paid once and mailed once', async () => {
    const order = await quoted();
    const id = await begun(order);
    const event = { id: `evt_${id}`, type: 'checkout.session.completed', object: completed(id) };
    const answers = await Promise.all(Array.from({ length: 6 }, () => told(event)));
    expect(answers.map(({ status }) => status)).toEqual(Array(6).fill(204));
    // The same thing told under another name, and that the page has closed, told late.
    await told({ ...event, id: `evt_again_${id}` }).expect(204);
    const expired = { id: `evt_late_${id}`, type: 'checkout.session.expired', object: completed(id) };
    await told(expired).expect(204);
    expect((await lifeOf(order)).payments).toMatchObject([{ state: 'paid', amountMinor: 40_000 }]);
    expect((await eventsOf(order)).filter((kind) => kind === 'deposit-paid')).toHaveLength(1);
    expect(await mailsAbout(order, 'a deposit was paid')).toHaveLength(2);
  });

  it('given back before it was told as paid is both, once', async () => {
    const order = await quoted();
    const id = await begun(order);
    const refund = { id: `re_${id}`, amount: 15_000, payment_intent: `pi_${id}`, status: 'succeeded' };
    await told({ id: `evt_r_${id}`, type: 'refund.created', object: refund }).expect(204);
    expect((await lifeOf(order)).payments).toMatchObject([{ state: 'begun' }]);
    await told({ id: `evt_p_${id}`, type: 'checkout.session.completed', object: completed(id) }).expect(204);
    await told({ id: `evt_u_${id}`, type: 'refund.updated', object: refund }).expect(204);
    expect((await lifeOf(order)).payments).toMatchObject([
      { kind: 'deposit', state: 'paid' },
      { kind: 'refund', state: 'paid', amountMinor: 15_000 },
    ]);
    expect(await mailsAbout(order, 'was given back')).toHaveLength(2);
    const pending: unknown[] = await test.dataSource.query(
      `SELECT event_id FROM payment_events WHERE payment_id = $1 AND applied_at IS NULL`,
      [`pi_${id}`],
    );
    expect(pending).toEqual([]);
  });

  it('outlives a server that is killed between hearing of it and keeping it', async () => {
    const order = await quoted();
    const { url } = await begin(order, 40_000);
    const first = await ApiProcess.start(test.settings, port);
    const holder = new Client({ connectionString: test.settings.databaseUrl });
    await holder.connect();
    await holder.query('BEGIN');
    await holder.query('SELECT 1 FROM order_payments WHERE order_id = $1 FOR UPDATE', [order.id]);
    await fetch(`${url}/pay`, { method: 'POST', redirect: 'manual' });
    // It has written the event and waits for the payment.
    await until(async () => {
      const { rows } = await holder.query(
        `SELECT 1 FROM pg_stat_activity WHERE datname = current_database() AND wait_event_type = 'Lock'`,
      );
      return rows.length > 0;
    });
    await first.kill();
    await holder.query('COMMIT');
    await holder.end();
    expect((await lifeOf(order)).payments).toMatchObject([{ state: 'begun' }]);
    // Another server takes its place, and is told again.
    await test.app.listen(port, '127.0.0.1');
    await until(async () => (await lifeOf(order)).payments[0]?.state === 'paid');
    expect((await eventsOf(order)).filter((kind) => kind === 'deposit-paid')).toHaveLength(1);
    expect(await mailsAbout(order, 'a deposit was paid')).toHaveLength(2);
  });
});

async function until(holds: () => Promise<boolean>): Promise<void> {
  while (!(await holds())) await new Promise((resolve) => setTimeout(resolve, 100));
}
