// A local stand-in for the payment provider: the part of its HTTP API that is used, a page to pay on, and signed events that
// are told again until somebody listens. No money moves and nothing leaves this machine.
import { createHmac, randomBytes } from 'node:crypto';
import http from 'node:http';

const port = Number(process.env.FAKE_PAYMENTS_PORT ?? 0);
const eventsUrl = process.env.FAKE_PAYMENTS_EVENTS_URL;
const secret = process.env.FAKE_PAYMENTS_WEBHOOK_SECRET ?? '';
const RETRY_MS = Number(process.env.FAKE_PAYMENTS_RETRY_MS ?? 500);
const MOST_TRIES = 200;

const sessions = new Map();
/** Answers by account and idempotency key. */
const answered = new Map();
const newId = (kind) => `${kind}_${randomBytes(12).toString('hex')}`;
const escape = (text) => String(text ?? '').replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`);

function signed(payload) {
  const at = Math.floor(Date.now() / 1000);
  const mac = createHmac('sha256', secret).update(`${at}.${payload}`).digest('hex');
  return `t=${at},v1=${mac}`;
}

async function tell(type, account, object, id = newId('evt')) {
  if (!eventsUrl) return;
  const payload = JSON.stringify({ id, object: 'event', type, account, data: { object } });
  for (let tries = 0; tries < MOST_TRIES; tries += 1) {
    const answer = await fetch(eventsUrl, {
      method: 'POST',
      headers: { 'content-type': 'application/json', 'stripe-signature': signed(payload) },
      body: payload,
    }).catch(() => null);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, RETRY_MS));
  }
}

function createSession(account, form, base) {
  const id = newId('cs_test');
  const session = {
    id,
    object: 'checkout.session',
    account,
    client_reference_id: form.get('client_reference_id'),
    amount_total: Number(form.get('line_items[0][price_data][unit_amount]')),
    currency: form.get('line_items[0][price_data][currency]'),
    what: form.get('line_items[0][price_data][product_data][name]'),
    success_url: form.get('success_url'),
    cancel_url: form.get('cancel_url'),
    status: 'open',
    payment_status: 'unpaid',
    payment_intent: null,
    url: `${base}/pay/${id}`,
  };
  sessions.set(id, session);
  return session;
}

const refuse = (message) => ({ error: { type: 'invalid_request_error', message } });

/** [status, body] of one call of the API. */
function call(method, path, account, form, base) {
  if (method === 'POST' && path === '/v1/checkout/sessions') return [200, createSession(account, form, base)];
  const [, id, step] = /^\/v1\/checkout\/sessions\/([^/]+)(?:\/(expire))?$/.exec(path) ?? [];
  const session = sessions.get(id);
  if (session?.account === account && method === 'GET' && !step) return [200, session];
  if (session?.account === account && method === 'POST' && step) {
    if (session.status !== 'open') return [400, refuse('This session is not open.')];
    session.status = 'expired';
    void tell('checkout.session.expired', account, session);
    return [200, session];
  }
  if (method === 'POST' && path === '/v1/refunds') {
    const paid = [...sessions.values()].find((one) => one.payment_intent === form.get('payment_intent'));
    if (!paid || paid.account !== account) return [404, refuse('No such payment.')];
    const amount = Number(form.get('amount') ?? paid.amount_total);
    const refund = { id: newId('re'), object: 'refund', amount, payment_intent: paid.payment_intent };
    Object.assign(refund, { currency: paid.currency, status: 'succeeded' });
    void tell('refund.created', account, refund);
    return [200, refund];
  }
  return [404, refuse(`Nothing at ${method} ${path}.`)];
}

function page(session) {
  const money = new Intl.NumberFormat('en-US', { style: 'currency', currency: session.currency });
  const amount = session.amount_total / 10 ** (money.resolvedOptions().maximumFractionDigits ?? 2);
  const open = session.status === 'open';
  return `<!doctype html><html lang="en"><meta charset="utf-8"><meta name="viewport" content="width=device-width">
    <title>Payment on this machine</title>
    <style>body{font:16px/1.5 sans-serif;max-width:30rem;margin:2rem auto;padding:0 1rem;background:#f5efe3;color:#231d16}
    b{font-size:2rem;font-weight:300}button{font:inherit;min-height:44px;padding:0 1.25rem;margin:0 .75rem .75rem 0}</style>
    <main><h1>A page that stands for the payment provider</h1><p>No money moves here.</p>
    <p>${escape(session.what)}</p><p><b>${escape(money.format(amount))}</b></p>
    ${
      open
        ? `<form method="post" action="/pay/${session.id}/pay"><button>Pay</button></form>
           <form method="post" action="/pay/${session.id}/leave"><button>Cancel</button></form>`
        : `<p>This payment is ${escape(session.status)}.</p>`
    }</main></html>`;
}

function pay(session) {
  if (session.status !== 'open') return;
  Object.assign(session, { status: 'complete', payment_status: 'paid', payment_intent: newId('pi') });
  void tell('checkout.session.completed', session.account, session);
}

async function bodyOf(request) {
  const chunks = [];
  for await (const chunk of request) chunks.push(chunk);
  return Buffer.concat(chunks).toString('utf8');
}

const server = http.createServer(async (request, response) => {
  const base = `http://127.0.0.1:${server.address().port}`;
  const { pathname } = new URL(request.url ?? '/', base);
  const body = await bodyOf(request);
  const [, id, step] = /^\/pay\/([^/]+)(?:\/(pay|leave))?$/.exec(pathname) ?? [];
  const session = sessions.get(id);
  if (session && request.method === 'POST' && step) {
    if (step === 'pay') pay(session);
    const to = step === 'pay' ? session.success_url : session.cancel_url;
    response.writeHead(303, { location: to }).end();
    return;
  }
  if (session) {
    response.writeHead(200, { 'content-type': 'text/html; charset=utf-8' }).end(page(session));
    return;
  }
  const account = request.headers['stripe-account'] ?? null;
  const key = request.headers['idempotency-key'] && `${account} ${request.headers['idempotency-key']}`;
  const answer =
    answered.get(key) ?? call(request.method, pathname, account, new URLSearchParams(body), base);
  if (key) answered.set(key, answer);
  response.writeHead(answer[0], { 'content-type': 'application/json' }).end(JSON.stringify(answer[1]));
});

server.listen(port, '127.0.0.1', () => process.send?.({ port: server.address().port }));
process.on('SIGTERM', () => process.exit(0));
process.on('SIGINT', () => process.exit(0));
process.on('disconnect', () => process.exit(0));
