// Lists and saves with 50 people at once, and a bare route that writes the same row in the same run.
import autocannon from 'autocannon';
import { openBareSave } from './lib/bare-save.mjs';
import { openProduct } from './lib/product.mjs';

const CONNECTIONS = 50;
const SECONDS = 8;

const measure = (options) =>
  autocannon({ connections: CONNECTIONS, duration: SECONDS, ...options }).then((result) => {
    if (result.errors > 0 || result.non2xx > 0) {
      throw new Error(`${options.url}: ${result.errors} errors, ${result.non2xx} refused`);
    }
    return result.latency;
  });

/** Each connection has its own draft and its own next number. */
function savers(paths, headers, document) {
  let next = 0;
  return (client) => {
    const path = paths[next % paths.length];
    next += 1;
    let number = 1;
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
  const list = await measure({ url: `${address}/api${base}/sets?pageSize=20`, headers });

  const { document, savedBy } = await call('GET', `${base}/sets/${sets[0].id}/draft`);
  const drafts = sets.map(({ id }) => `/api${base}/sets/${id}/draft`);
  const save = await measure({ url: address, setupClient: savers(drafts, headers, document) });

  const bare = await openBareSave(product.database.url, savedBy);
  const rows = (await newSets()).map(({ id }) => `/sets/${id}/draft`);
  const bareSave = await measure({ url: bare.address, setupClient: savers(rows, {}, document) });
  await product.close();

  const figure = (name, value, unit, aim, reference = null) => ({ name, value, unit, aim, reference });
  const ratio = Math.round((save.p50 / Math.max(bareSave.p50, 1)) * 100) / 100;
  return [
    figure('api-list-p50', list.p50, 'ms', null),
    figure('api-list-p99', list.p99, 'ms', null),
    figure('api-save-p50', save.p50, 'ms', null, bareSave.p50),
    figure('api-save-p99', save.p99, 'ms', null, bareSave.p99),
    figure('api-save-ratio', ratio, 'ratio', 1.5, 'bare route'),
  ];
}
