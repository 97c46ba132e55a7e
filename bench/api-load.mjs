// Lists and saves with 50 people at once, and a bare route that writes the same row in the same run.
import autocannon from 'autocannon';
import { openBareSave } from './lib/bare-save.mjs';
import { openProduct } from './lib/product.mjs';

const CONNECTIONS = 50;
/** Saves and bare saves take turns, so that whatever else the machine does falls on both. */
const TURNS = 3;
const SECONDS = 4;

const measure = (options, seconds = SECONDS) =>
  autocannon({ connections: CONNECTIONS, duration: seconds, ...options }).then((result) => {
    if (result.errors > 0 || result.non2xx > 0) {
      throw new Error(`${options.url}: ${result.errors} errors, ${result.non2xx} refused`);
    }
    return result.latency;
  });

const median = (values) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)];

/** Each connection has its own draft and its own next number. */
function savers(drafts, headers, document) {
  let next = 0;
  return (client) => {
    const { path, newest } = drafts[next % drafts.length];
    next += 1;
    let number = newest;
    const sent = { 'content-type': 'application/json', ...headers };
    const body = () => JSON.stringify({ baseNumber: number, document });
    client.setRequests([{ method: 'PUT', path, headers: sent, body: body() }]);
    client.on('body', (answer) => {
      number = JSON.parse(answer.toString()).number ?? number;
      client.setHeadersAndBody(sent, body());
    });
  };
}

export async function run() {
  const product = await openProduct();
  const { call, workshopId, token, address } = product;
  const production = await call('POST', `/workshops/${workshopId}/productions`, {
    name: 'Load',
    summary: '',
    units: 'feet-inches',
    roundTo: 8,
  });
  const base = `/workshops/${workshopId}/productions/${production.id}`;
  const newSets = async () => {
    const sets = [];
    for (let n = 0; n < CONNECTIONS; n += 1) {
      sets.push(await call('POST', `${base}/sets`, { name: `Set ${n + 1}`, arrangement: 'facing-benches' }));
    }
    return sets;
  };
  const sets = await newSets();
  const headers = { authorization: `Bearer ${token}` };
  const list = await measure({ url: `${address}/api${base}/sets?pageSize=20`, headers }, 2 * SECONDS);

  const { document, savedBy } = await call('GET', `${base}/sets/${sets[0].id}/draft`);
  const bare = await openBareSave(product.database.url, savedBy);
  const bareSets = await newSets();
  const turns = [];
  for (let turn = 1; turn <= TURNS; turn += 1) {
    // What was under way when a turn ended may be saved or not: the number is asked for again, or leaps ahead.
    const drafts = [];
    for (const { id } of sets) {
      const path = `${base}/sets/${id}/draft`;
      drafts.push({ path: `/api${path}`, newest: (await call('GET', path)).number });
    }
    const rows = bareSets.map(({ id }) => ({ path: `/sets/${id}/draft`, newest: turn * 1_000_000 }));
    const save = await measure({ url: address, setupClient: savers(drafts, headers, document) });
    const bareSave = await measure({ url: bare.address, setupClient: savers(rows, {}, document) });
    turns.push({ save, bareSave, ratio: save.p50 / Math.max(bareSave.p50, 1) });
  }
  await product.close();

  const figure = (name, value, unit, aim, reference = null) => ({ name, value, unit, aim, reference });
  const over = (read) => median(turns.map(read));
  return [
    figure('api-list-p50', list.p50, 'ms', null),
    figure('api-list-p99', list.p99, 'ms', null),
    figure(
      'api-save-p50',
      over(({ save }) => save.p50),
      'ms',
      null,
      over(({ bareSave }) => bareSave.p50),
    ),
    figure(
      'api-save-p99',
      over(({ save }) => save.p99),
      'ms',
      null,
      over(({ bareSave }) => bareSave.p99),
    ),
    figure('api-save-ratio', Math.round(over(({ ratio }) => ratio) * 100) / 100, 'ratio', 1.5, 'bare route'),
  ];
}
