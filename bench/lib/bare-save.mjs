// The least that a server can do to save a draft: what the product's save is measured against.
//
// It does: Express (the very one that Nest stands on) with its JSON body parser; one INSERT of one row of `set_drafts`,
// the product's own table with its keys and references, the same columns filled; a pool of as many connections as the
// product's; an answer with the same fields. It runs in a process of its own, as the product does.
//
// It does not: sign-in, roles, the path of workshop and production, reading the document by its schema, asking who
// sits, comparing the draft number and counting it on, trimming old drafts, a log, security headers, compression.
import { once } from 'node:events';
import { createRequire } from 'node:module';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import pg from 'pg';
import { launch } from '../../scripts/processes.mjs';
import { root } from '../../scripts/root.mjs';

const POOL_SIZE = 20;
const INSERT = `
  INSERT INTO set_drafts (set_id, number, document, counts, counted_at, saved_by_id)
  VALUES ($1, $2, $3, NULL, 'epoch', $4)
  RETURNING number, saved_at`;

/** Starts the bare server on the product's database; answers its address. */
export async function openBareSave(databaseUrl, savedBy) {
  const server = launch([process.execPath, fileURLToPath(import.meta.url)], {
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    env: { ...process.env, DATABASE_URL: databaseUrl, SAVED_BY: JSON.stringify(savedBy) },
  });
  const [{ port }] = await once(server, 'message');
  return { server, address: `http://127.0.0.1:${port}` };
}

function serve() {
  const ofApi = createRequire(path.join(root, 'apps/api/package.json'));
  const express = createRequire(ofApi.resolve('@nestjs/platform-express'))('express');
  const pool = new pg.Pool({ connectionString: process.env.DATABASE_URL, max: POOL_SIZE });
  const savedBy = JSON.parse(process.env.SAVED_BY);
  const app = express();
  app.use(express.json({ limit: '3mb' }));
  app.put('/sets/:setId/draft', async ({ params, body }, response) => {
    const { rows } = await pool.query(INSERT, [params.setId, body.baseNumber + 1, body.document, savedBy.id]);
    response.json({ number: rows[0].number, savedAt: rows[0].saved_at, savedBy });
  });
  const server = app.listen(0, '127.0.0.1', () => process.send({ port: server.address().port }));
}

if (process.argv[1] === fileURLToPath(import.meta.url)) serve();
