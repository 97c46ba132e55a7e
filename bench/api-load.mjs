// Lists and saves with 50 people at once, and a bare route that writes the same row in the same run.
import http from 'node:http';
import autocannon from 'autocannon';
import pg from 'pg';
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

/** The least a server can do for a save: lock the draft, compare its number, write it. */
async function bareRoute(databaseUrl, document) {
  const pool = new pg.Pool({ connectionString: databaseUrl, max: 20 });
  await pool.query('create table if not exists bare_draft (id int primary key, number int, document jsonb)');
  for (let id = 0; id < CONNECTIONS; id += 1) {
    await pool.query('insert into bare_draft values ($1, 1, $2) on conflict (id) do nothing', [id, document]);
  }
  const server = http.createServer((request, response) => {
    const chunks = [];
    request.on('data', (chunk) => chunks.push(chunk));
    request.on('end', () => {
      const { document: sent } = JSON.parse(Buffer.concat(chunks).toString());
      const id = Number(request.url.slice(1));
      pool
        .query('update bare_draft set number = number + 1, document = $2 where id = $1 returning number', [
          id,
          sent,
        ])
        .then(({ rows }) => {
          response.writeHead(200, { 'content-type': 'application/json' }).end(JSON.stringify(rows[0]));
        });
    });
  });
  await new Promise((resolve) => server.listen(0, '127.0.0.1', resolve));
  const close = async () => {
    server.closeAllConnections();
    server.close();
    await pool.query('drop table bare_draft');
    await pool.end();
  };
  return { url: `http://127.0.0.1:${server.address().port}`, close };
}

/** Gives each connection its own set and its own next draft number. */
function savers(paths, body) {
  let next = 0;
  return (client) => {
    const path = paths[next % paths.length];
    next += 1;
    let number = 1;
    const set = () =>
      client.setHeadersAndBody({ 'content-type': 'application/json', ...path.headers }, body(number));
    client.setRequests([
      {
        method: 'PUT',
        path: path.path,
        headers: { 'content-type': 'application/json', ...path.headers },
        body: body(number),
      },
    ]);
    client.on('body', (answer) => {
      number = JSON.parse(answer.toString()).number ?? number;
      set();
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
  const sets = [];
  for (let n = 0; n < CONNECTIONS; n += 1) {
    sets.push(await call('POST', `${base}/sets`, { name: `Set ${n + 1}`, arrangement: 'facing-benches' }));
  }
  const { document } = await call('GET', `${base}/sets/${sets[0].id}/draft`);
  const headers = { authorization: `Bearer ${token}` };

  const list = await measure({ url: `${address}/api${base}/sets?pageSize=20`, headers });
  const save = await measure({
    url: address,
    setupClient: savers(
      sets.map((set) => ({ path: `/api${base}/sets/${set.id}/draft`, headers })),
      (baseNumber) => JSON.stringify({ baseNumber, document }),
    ),
  });
  const bare = await bareRoute(product.database.url, document);
  const bareSave = await measure({
    url: bare.url,
    setupClient: savers(
      sets.map((_, id) => ({ path: `/${id}`, headers: {} })),
      (baseNumber) => JSON.stringify({ baseNumber, document }),
    ),
  });
  await bare.close();
  await product.close();
  const figure = (name, value, unit, aim, reference = null) => ({ name, value, unit, aim, reference });
  return [
    figure('api-list-p50', list.p50, 'ms', null),
    figure('api-list-p99', list.p99, 'ms', null),
    figure('api-save-p50', save.p50, 'ms', null, bareSave.p50),
    figure('api-save-p99', save.p99, 'ms', null, bareSave.p99),
    figure(
      'api-save-ratio',
      Math.round((save.p50 / Math.max(bareSave.p50, 1)) * 100) / 100,
      'ratio',
      1.5,
      'bare route',
    ),
  ];
}
